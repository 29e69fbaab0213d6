package org.kappatrail.report.slides;

import java.awt.geom.Rectangle2D;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.apache.poi.sl.usermodel.ShapeType;
import org.apache.poi.xslf.usermodel.XSLFAutoShape;
import org.kappatrail.report.chart.Palette;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Film;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.Level;
import org.kappatrail.review.decision.Decision;

/** One asset: headline, κ above contamination on one time axis, five questions, proposed act. */
final class AssetSlide {
  private static final double FACTS = 22;
  private static final double ACT = 66;
  private static final double GAP = 10;
  private static final double CHART_SHARE = 0.56;
  private static final double NARROW = 700;
  private static final double NARROW_SHARE = 0.5;
  private static final double KAPPA_SHARE = 0.6;
  private static final double TEXT = 14;
  private static final int FACT_NAME = 24;
  private static final double DUE_WIDTH = 200;

  private final Stage stage;
  private final AssetReview asset;

  AssetSlide(Stage stage, AssetReview asset) {
    this.stage = stage;
    this.asset = asset;
  }

  void add() throws IOException {
    Leaf leaf = stage.leaf(Words.headline(asset));
    Rectangle2D room = leaf.room();
    facts(leaf);
    double top = room.getY() + FACTS + 2;
    double height = room.getMaxY() - ACT - GAP - top;
    double width = room.getWidth() * (room.getWidth() < NARROW ? NARROW_SHARE : CHART_SHARE);
    charts(leaf, new Rectangle2D.Double(room.getX(), top, width, height));
    double right = room.getX() + width + 2 * GAP;
    Rectangle2D side = new Rectangle2D.Double(right, top, room.getMaxX() - right, height);
    Rectangle2D foot =
        new Rectangle2D.Double(room.getX(), room.getMaxY() - ACT, room.getWidth(), ACT);
    Optional<Decision> decision = asset.decision();
    if (decision.isPresent()) {
      QuestionPanel.draw(leaf, side, decision.get());
      act(leaf, foot, decision.get());
    } else {
      leaf.box(side)
          .fill(
              String.join(" ", asset.story()) + " Nothing can be decided before it is known.",
              18,
              TEXT,
              false);
    }
    stage.notes(leaf, notes());
  }

  /** All of what the slide had no room for. */
  private List<String> notes() {
    List<String> lines = new ArrayList<>();
    lines.add(asset.asset().name() + " (" + asset.asset().id() + ")");
    lines.addAll(asset.story());
    asset
        .decision()
        .ifPresent(
            decision -> {
              lines.add(
                  "Verdict: "
                      + Words.verdict(decision.verdict())
                      + ". "
                      + Words.sentence(decision.reason()));
              QuestionPanel.questions(decision)
                  .forEach(
                      question ->
                          lines.add(
                              question.words()
                                  + " "
                                  + question.reply().answer().label()
                                  + ": "
                                  + question.reply().why()));
              decision.assumptions().forEach(item -> lines.add("Assumed: " + item));
            });
    return lines;
  }

  private void facts(Leaf leaf) {
    Rectangle2D room = leaf.room();
    Optional<Level> level = asset.level();
    level.ifPresent(
        known -> LevelShape.draw(leaf.slide(), known, room.getX() + 7, room.getY() + 9, 12));
    double indent = level.isPresent() ? 20 : 0;
    leaf.box(room.getX() + indent, room.getY(), room.getWidth() - indent, FACTS)
        .line(facts(), TEXT, false);
  }

  private String facts() {
    StringBuilder line = new StringBuilder();
    asset.level().ifPresent(level -> line.append(level.label()).append(" · "));
    line.append(Words.name(asset.asset().id(), FACT_NAME));
    Optional<KappaPoint> latest = asset.governing().flatMap(BearingReview::latestFilm);
    asset
        .governing()
        .ifPresent(
            bearing ->
                line.append(", bearing ").append(Words.name(bearing.bearing().id(), FACT_NAME)));
    latest.ifPresent(
        point -> {
          Film film = point.film().orElseThrow();
          line.append(" · κ ")
              .append(Words.kappa(film.kappa()))
              .append(" (")
              .append(Words.interval(film))
              .append(") on ")
              .append(point.sample().day());
        });
    return line.append(" · oil ").append(Words.name(asset.oil().id(), FACT_NAME)).toString();
  }

  private void charts(Leaf leaf, Rectangle2D place) throws IOException {
    Optional<NativeChart> kappa = KappaTrend.of(asset);
    Optional<NativeChart> dirt = ContaminationTrend.of(asset);
    double upper =
        dirt.isEmpty() ? place.getHeight() : kappa.isEmpty() ? 0 : place.getHeight() * KAPPA_SHARE;
    if (kappa.isPresent()) {
      kappa
          .get()
          .draw(
              stage,
              leaf,
              new Rectangle2D.Double(place.getX(), place.getY(), place.getWidth(), upper));
    }
    if (dirt.isPresent()) {
      dirt.get()
          .draw(
              stage,
              leaf,
              new Rectangle2D.Double(
                  place.getX(), place.getY() + upper, place.getWidth(), place.getHeight() - upper));
    }
    if (kappa.isEmpty() && dirt.isEmpty()) {
      leaf.box(place).line("No sample of this asset shows anything to draw.", TEXT, false);
    }
  }

  private void act(Leaf leaf, Rectangle2D place, Decision decision) {
    XSLFAutoShape wash = leaf.slide().createAutoShape();
    wash.setShapeType(ShapeType.RECT);
    wash.setAnchor(place);
    wash.setFillColor(Palette.MIXED_WASH);
    wash.setLineColor(null);
    leaf.box(
            place.getX() + GAP,
            place.getY() + 5,
            place.getWidth() - DUE_WIDTH - 3 * GAP,
            place.getHeight() - 6)
        .ink(Palette.INK)
        .line("Proposed: " + Words.verdict(decision.verdict()), 16, true)
        .paragraph(Words.sentence(decision.reason()), TEXT, false, 2);
    Box due =
        leaf.box(
                place.getMaxX() - DUE_WIDTH - GAP,
                place.getY() + 5,
                DUE_WIDTH,
                place.getHeight() - 6)
            .ink(Palette.INK);
    String day = Words.due(asset, decision);
    if (!day.isEmpty()) {
      due.line("Due " + day, 16, true);
    }
    due.paragraph(Words.nextSample(asset), TEXT, day.isEmpty(), 2);
  }
}
