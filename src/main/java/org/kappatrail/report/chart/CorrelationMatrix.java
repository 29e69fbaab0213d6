package org.kappatrail.report.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.AffineTransform;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.kappatrail.review.correlation.CorrelationSentences;
import org.kappatrail.review.correlation.Form;
import org.kappatrail.review.correlation.Link;
import org.kappatrail.review.correlation.Names;
import org.kappatrail.review.correlation.PairCorrelation;

/**
 * All pairs at no lag as a table of coloured cells: as measured below the diagonal, detrended above
 * it. What could be chance is pale, what is tied by construction is struck through and has no
 * colour.
 */
final class CorrelationMatrix {
  private static final int MOST_VARIABLES = 26;
  private static final int NAMES = 130;
  private static final int HEAD = 126;
  private static final int ROW = 22;
  private static final int LEGEND = 50;
  private static final double WIDEST = 62;
  private static final double ROOMY = 36;

  private final List<String> variables;
  private final int left;
  private final double column;
  private final Map<Key, PairCorrelation> cells = new HashMap<>();

  private record Key(String x, String y, Form form) {}

  /** The matrix of one asset's or the fleet's links, at most so many px wide. */
  CorrelationMatrix(List<Link> links, int width) {
    Set<String> names = new LinkedHashSet<>();
    for (Link link : links) {
      if (link.measured().lag() == 0) {
        put(link.measured());
        link.detrended().ifPresent(this::put);
        names.add(link.measured().x());
      }
    }
    // the last variable is never the first of a pair
    links.stream().map(link -> link.measured().y()).forEach(names::add);
    variables = names.stream().limit(MOST_VARIABLES).toList();
    left = names.size() - variables.size();
    column = Math.min(WIDEST, (double) (width - NAMES) / Math.max(1, variables.size()));
  }

  private void put(PairCorrelation test) {
    cells.put(new Key(test.x(), test.y(), test.form()), test);
  }

  int height() {
    return HEAD + variables.size() * ROW + LEGEND;
  }

  List<String> variables() {
    return variables;
  }

  /** Number of variables that did not find room. */
  int left() {
    return left;
  }

  /** The test in a row and a column; empty on the diagonal and where none was made. */
  Optional<PairCorrelation> at(int row, int place) {
    Form form = row > place ? Form.MEASURED : Form.DETRENDED;
    String x = variables.get(Math.min(row, place));
    String y = variables.get(Math.max(row, place));
    return Optional.ofNullable(cells.get(new Key(x, y, form)));
  }

  /** Paints the matrix with its upper left corner at the origin. */
  void paint(Graphics2D g) {
    int n = variables.size();
    for (int i = 0; i < n; i++) {
      g.setColor(Palette.INK);
      g.setFont(ChartFont.of(11.5f));
      String name = Fitted.to(g, Names.brief(variables.get(i)), NAMES - 8.0);
      double width = g.getFontMetrics().stringWidth(name);
      g.drawString(name, (float) (NAMES - 7 - width), HEAD + i * ROW + 15);
      upright(g, Names.brief(variables.get(i)), NAMES + (i + 0.5) * column + 4, HEAD - 6.0);
    }
    for (int row = 0; row < n; row++) {
      for (int place = 0; place < n; place++) {
        Rectangle2D cell =
            new Rectangle2D.Double(
                NAMES + place * column, HEAD + row * (double) ROW, column - 1, ROW - 1);
        if (row == place) {
          g.setColor(Palette.RULE);
          g.fill(cell);
        } else {
          at(row, place).ifPresent(test -> cell(g, cell, test));
        }
      }
    }
    legend(g, HEAD + n * ROW + 20);
  }

  private static void upright(Graphics2D g, String text, double x, double y) {
    AffineTransform before = g.getTransform();
    g.translate(x, y);
    g.rotate(-Math.PI / 2);
    g.drawString(Fitted.to(g, text, HEAD - 10.0), 0, 0);
    g.setTransform(before);
  }

  private void cell(Graphics2D g, Rectangle2D cell, PairCorrelation test) {
    double coefficient = test.coefficient();
    boolean sure = sure(test);
    if (!test.byConstruction()) {
      g.setColor(colour(coefficient, sure));
      g.fill(cell);
    } else {
      struck(g, cell);
    }
    String text = CorrelationSentences.coefficient(coefficient);
    boolean narrow = column < ROOMY;
    if (narrow) {
      text = text.replace("0.", ".").replace("1.00", "1");
    }
    float size = narrow ? 9f : 11f;
    g.setFont(sure ? ChartFont.bold(size) : ChartFont.of(size));
    double width = g.getFontMetrics().stringWidth(text);
    double start = cell.getCenterX() - width / 2;
    if (test.byConstruction()) {
      g.setColor(Palette.PAPER);
      g.fill(new Rectangle2D.Double(start - 2, cell.getMinY() + 2, width + 4, ROW - 4.0));
    }
    g.setColor(sure ? inkOn(coefficient) : Palette.QUIET_INK);
    g.drawString(text, (float) start, (float) (cell.getCenterY() + 4));
  }

  private static boolean sure(PairCorrelation test) {
    return test.q().isPresent() && test.q().getAsDouble() <= Link.LIMIT;
  }

  private static Color colour(double coefficient, boolean sure) {
    Color hue = coefficient >= 0 ? Palette.TOGETHER : Palette.AGAINST;
    double size = Math.abs(coefficient);
    return Palette.wash(hue, sure ? 0.35 + 0.65 * size : 0.2 * size);
  }

  private static Color inkOn(double coefficient) {
    return Math.abs(coefficient) > 0.3 ? Palette.PAPER : Palette.INK;
  }

  private static void struck(Graphics2D g, Rectangle2D cell) {
    g.setColor(Palette.wash(Palette.QUIET_INK, 0.5));
    g.setStroke(new BasicStroke(0.9f));
    g.draw(
        new Line2D.Double(
            cell.getMinX() + 2, cell.getMaxY() - 2, cell.getMaxX() - 2, cell.getMinY() + 2));
  }

  private void legend(Graphics2D g, double y) {
    double x = 0;
    x = swatch(g, x, y, colour(0.6, true), "move together, q ≤ 0.05");
    x = swatch(g, x, y, colour(-0.6, true), "move against each other, q ≤ 0.05");
    x = swatch(g, x, y, colour(0.9, false), "could be chance");
    Rectangle2D box = new Rectangle2D.Double(x, y - 10, 22, 13);
    struck(g, box);
    x = words(g, x + 28, y, "by construction: arithmetic, never called");
    words(g, x, y, "empty: too few, or one never changes");
    if (left > 0) {
      words(g, 0, y + 18, left + " more variables are in correlations.csv");
    }
  }

  private static double swatch(Graphics2D g, double x, double y, Color colour, String text) {
    g.setColor(colour);
    g.fill(new Rectangle2D.Double(x, y - 10, 22, 13));
    return words(g, x + 28, y, text);
  }

  private static double words(Graphics2D g, double x, double y, String text) {
    g.setFont(ChartFont.of(11));
    g.setColor(Palette.QUIET_INK);
    g.drawString(text, (float) x, (float) y);
    return x + g.getFontMetrics().stringWidth(text) + 16;
  }
}
