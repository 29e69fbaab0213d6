package org.kappatrail.report.slides;

import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.apache.poi.xslf.usermodel.XSLFConnectorShape;
import org.kappatrail.report.chart.Palette;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Film;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.Level;
import org.kappatrail.review.decision.Decision;

/** What needs a decision: an asset a row, as many slides as that takes. */
final class DecisionList {
  private static final double TEXT = 14;
  private static final double LEAST_ROW = 46;
  private static final double NARROW = 700;
  private static final double NARROW_ROW = 64;
  private static final double MOST_ROW = 80;
  private static final double PADDING = 10;
  private static final double HEADER = 22;
  private static final double GAP = 12;
  private static final double NOTE = 22;

  private static final String BEFORE = "before ";

  /** Shares of the width: asset, κ, verdict, why, due. */
  private static final double[] SHARES = {0.24, 0.14, 0.16, 0.33, 0.13};

  private static final double[] NARROW_SHARES = {0.28, 0.15, 0.17, 0.25, 0.15};

  private static final String[] HEADERS = {"asset", "κ, 95 %", "verdict", "why", "due"};

  private final Stage stage;
  private final Choice choice;

  DecisionList(Stage stage, Choice choice) {
    this.stage = stage;
    this.choice = choice;
  }

  void add() {
    List<AssetReview> left = new ArrayList<>(choice.shown());
    long need = left.stream().filter(Choice::needsDecision).count();
    int page = 0;
    do {
      Leaf leaf = stage.leaf(headline(need) + (page == 0 ? "" : ", continued"));
      double height = leaf.room().getHeight() - HEADER - NOTE;
      double least = leaf.room().getWidth() < NARROW ? NARROW_ROW : LEAST_ROW;
      int rows = (int) Math.max(1, Math.floor(height / least));
      List<AssetReview> here = left.subList(0, Math.min(rows, left.size()));
      double rowHeight = Math.min(MOST_ROW, height / Math.max(1, here.size()));
      draw(leaf, here, rowHeight);
      left = new ArrayList<>(left.subList(here.size(), left.size()));
      if (left.isEmpty() && choice.more() > 0) {
        note(leaf, here.size() * rowHeight);
      }
      page++;
    } while (!left.isEmpty());
  }

  private String headline(long need) {
    long all = need + choice.more();
    if (choice.shown().isEmpty()) {
      return "No asset needs a decision";
    }
    if (need < choice.shown().size()) {
      return "The chosen assets: " + need + " of " + choice.shown().size() + " need a decision";
    }
    return all == 1 ? "One asset needs a decision" : all + " assets need a decision";
  }

  private void note(Leaf leaf, double below) {
    leaf.box(
            leaf.room().getX(),
            leaf.room().getY() + HEADER + below + 4,
            leaf.room().getWidth(),
            NOTE)
        .line(
            "and " + choice.more() + " more: see the page of the pack, or name them with --asset",
            TEXT,
            true);
  }

  private static void draw(Leaf leaf, List<AssetReview> assets, double rowHeight) {
    Rectangle2D room = leaf.room();
    double[] shares = room.getWidth() < NARROW ? NARROW_SHARES : SHARES;
    double[] x = new double[shares.length + 1];
    x[0] = room.getX();
    for (int i = 0; i < shares.length; i++) {
      x[i + 1] = x[i] + shares[i] * room.getWidth();
    }
    if (!assets.isEmpty()) {
      for (int i = 0; i < HEADERS.length; i++) {
        leaf.box(x[i], room.getY(), x[i + 1] - x[i] - GAP, HEADER).line(HEADERS[i], TEXT, true);
      }
    }
    for (int r = 0; r < assets.size(); r++) {
      double y = room.getY() + HEADER + r * rowHeight;
      rule(leaf, y);
      row(leaf, x, y + 5, rowHeight - PADDING, assets.get(r));
    }
  }

  private static void row(Leaf leaf, double[] x, double y, double height, AssetReview asset) {
    Optional<Level> level = asset.level();
    level.ifPresent(known -> LevelShape.draw(leaf.slide(), known, x[0] + 7, y + 9, 11));
    cell(leaf, x, 0, y, height, 20)
        .paragraph(Words.name(asset.asset().name()), TEXT, true, nameLines(height))
        .line(
            level.map(Level::label).orElse("no κ") + " · " + Words.name(asset.asset().id()),
            TEXT,
            false);
    Optional<Film> film =
        asset.governing().flatMap(BearingReview::latestFilm).flatMap(KappaPoint::film);
    film.ifPresent(
        known ->
            cell(leaf, x, 1, y, height, 0)
                .line(Words.kappa(known.kappa()), TEXT, true)
                .paragraph(Words.interval(known), TEXT, false, 2));
    asset.decision().ifPresent(decision -> decided(leaf, x, y, height, asset, decision));
  }

  private static void decided(
      Leaf leaf, double[] x, double y, double height, AssetReview asset, Decision decision) {
    cell(leaf, x, 2, y, height, 0).paragraph(Words.verdict(decision.verdict()), TEXT, true, 3);
    cell(leaf, x, 3, y, height, 0).paragraph(Words.sentence(decision.reason()), TEXT, false, 4);
    Box due = cell(leaf, x, 4, y, height, 0);
    String day = Words.due(asset, decision);
    if (day.startsWith(BEFORE)) {
      due.line(BEFORE.strip(), TEXT, true).line(day.substring(BEFORE.length()), TEXT, true);
    } else {
      due.paragraph(day.isEmpty() ? "–" : day, TEXT, true, 2);
    }
  }

  /** One line is kept for level and id. */
  private static int nameLines(double height) {
    return (int) Math.max(1, Math.floor(height / (TEXT * TextFit.LINE)) - 1);
  }

  private static Box cell(
      Leaf leaf, double[] x, int column, double y, double height, double indent) {
    return leaf.box(x[column] + indent, y, x[column + 1] - x[column] - GAP - indent, height);
  }

  private static void rule(Leaf leaf, double y) {
    XSLFConnectorShape line = leaf.slide().createConnector();
    line.setAnchor(new Rectangle2D.Double(leaf.room().getX(), y, leaf.room().getWidth(), 0));
    line.setLineColor(Palette.RULE);
    line.setLineWidth(1);
  }
}
