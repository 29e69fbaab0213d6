package org.kappatrail.report.slides;

import java.awt.Color;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.Map;
import org.apache.poi.sl.usermodel.ShapeType;
import org.apache.poi.sl.usermodel.TextParagraph.TextAlign;
import org.apache.poi.xslf.usermodel.XSLFAutoShape;
import org.apache.poi.xslf.usermodel.XSLFConnectorShape;
import org.apache.poi.xslf.usermodel.XSLFSlide;
import org.kappatrail.report.chart.FleetRow;
import org.kappatrail.report.chart.Palette;
import org.kappatrail.report.page.Numbers;
import org.kappatrail.tribology.LubricationRegime;

/**
 * Where every bearing stands, in the slide's own shapes: worst first on a logarithmic κ axis, from
 * fresh oil over the step that the oil took and the step that temperature and speed took to the
 * present κ with its interval.
 */
final class FleetPicture {
  private static final double TEXT = 14;
  private static final double MOST_LABEL_WIDTH = 315;
  private static final double LABEL_SHARE = 0.38;
  private static final double VALUE_WIDTH = 56;
  private static final double AXIS_HEIGHT = 22;
  private static final double NAMES_HEIGHT = 20;
  private static final double LEGEND_HEIGHT = 24;
  private static final double LEGEND_TEXT = 13;
  private static final double MARK_GAP = 14;
  private static final double LEAST_ROW = 19;
  private static final double MOST_ROW = 44;
  private static final double STEP = 5;
  private static final double DOT = 9;

  private final Leaf leaf;
  private final XSLFSlide slide;
  private final List<FleetRow> rows;
  private final Map<String, String> names;
  private final int shown;
  private final double labelWidth;
  private final double rowHeight;
  private final LogScale scale;
  private final Rectangle2D plot;

  /**
   * A picture to be drawn.
   *
   * @param rows the bearings, worst first
   * @param names names of the assets by id
   */
  FleetPicture(Leaf leaf, List<FleetRow> rows, Map<String, String> names) {
    this.leaf = leaf;
    this.slide = leaf.slide();
    this.rows = List.copyOf(rows);
    this.names = Map.copyOf(names);
    Rectangle2D room = leaf.room();
    labelWidth = Math.min(MOST_LABEL_WIDTH, LABEL_SHARE * room.getWidth());
    double height =
        room.getHeight() - NAMES_HEIGHT - AXIS_HEIGHT - legendLines() * LEGEND_HEIGHT - 4;
    int most = (int) Math.max(1, Math.floor(height / LEAST_ROW));
    shown = rows.size() <= most ? rows.size() : most - 1;
    int lines = Math.min(rows.size(), most);
    rowHeight = Math.min(MOST_ROW, height / Math.max(1, lines));
    plot =
        new Rectangle2D.Double(
            room.getX() + labelWidth,
            room.getY() + NAMES_HEIGHT,
            room.getWidth() - labelWidth - VALUE_WIDTH,
            rowHeight * lines);
    double low = rows.stream().mapToDouble(row -> row.film().uncertainty().low()).min().orElse(0.5);
    double high =
        rows.stream()
            .mapToDouble(row -> Math.max(row.fresh(), row.film().uncertainty().high()))
            .max()
            .orElse(2);
    scale =
        new LogScale(
            Math.max(0.02, Math.min(0.5, low * 0.9)),
            Math.min(50, Math.max(2, high * 1.1)),
            plot.getMinX(),
            plot.getMaxX());
  }

  void draw() {
    bands();
    axis();
    for (int i = 0; i < shown; i++) {
      row(rows.get(i), plot.getMinY() + (i + 0.5) * rowHeight);
    }
    if (shown < rows.size()) {
      others(rows.subList(shown, rows.size()), plot.getMinY() + (shown + 0.5) * rowHeight);
    }
    legend();
  }

  private void bands() {
    band(1e-3, LubricationRegime.MIXED_FROM, Palette.BOUNDARY_WASH, "boundary");
    band(
        LubricationRegime.MIXED_FROM,
        LubricationRegime.FULL_FILM_FROM,
        Palette.MIXED_WASH,
        LubricationRegime.MIXED.label());
    band(
        LubricationRegime.FULL_FILM_FROM,
        1e3,
        Palette.FILM_WASH,
        LubricationRegime.FULL_FILM.label());
  }

  private void band(double low, double high, Color wash, String name) {
    double from = scale.x(low);
    double to = scale.x(high);
    if (to - from < 1) {
      return;
    }
    rect(from, plot.getMinY() - NAMES_HEIGHT, to - from, plot.getHeight() + NAMES_HEIGHT, wash);
    if (to - from > 70) {
      leaf.box(from + 6, plot.getMinY() - NAMES_HEIGHT + 2, to - from - 12, 17)
          .ink(Palette.QUIET_INK)
          .line(name, 13, false);
    }
  }

  private void axis() {
    for (double tick : scale.ticks()) {
      double x = scale.x(tick);
      line(x, plot.getMinY(), x, plot.getMaxY(), Palette.RULE, tick == 1 ? 1.5 : 0.75);
      leaf.box(x - 25, plot.getMaxY() + 3, 50, 17)
          .align(TextAlign.CENTER)
          .line(Numbers.significant(tick, 1), 13, false);
    }
    leaf.box(plot.getMaxX() + 6, plot.getMinY() - NAMES_HEIGHT + 2, VALUE_WIDTH - 6, 17)
        .line("κ now", 13, true);
  }

  private void row(FleetRow row, double y) {
    LevelShape.draw(slide, row.film().level(), plot.getMinX() - labelWidth + 7, y, 10);
    String label =
        Words.name(row.asset())
            + " "
            + Words.name(row.bearing())
            + " · "
            + Words.name(names.getOrDefault(row.asset(), row.asset()));
    leaf.box(plot.getMinX() - labelWidth + 20, y - 9, labelWidth - 28, TEXT * TextFit.LINE + 1)
        .line(label, TEXT, false);
    double floor = scale.x(row.floor());
    line(floor, y - rowHeight / 2 + 2, floor, y + rowHeight / 2 - 2, Palette.INK, 1);
    step(row.fresh(), row.afterOil(), y - STEP, true);
    step(row.afterOil(), row.film().kappa(), y, false);
    double now = scale.x(row.film().kappa());
    whisker(row, y);
    dot(scale.x(row.fresh()), y, Palette.PAPER);
    dot(now, y, Palette.KAPPA);
    leaf.box(plot.getMaxX() + 6, y - 9, VALUE_WIDTH - 6, TEXT * TextFit.LINE + 1)
        .line(Words.kappa(row.film().kappa()), TEXT, true);
  }

  private void whisker(FleetRow row, double y) {
    line(
        scale.x(row.film().uncertainty().low()),
        y,
        scale.x(row.film().uncertainty().high()),
        y,
        Palette.KAPPA,
        1.5);
  }

  /** A step from one κ to another: the oil's solid in the upper half, the rest hatched below. */
  private void step(double from, double to, double top, boolean oil) {
    double left = Math.min(scale.x(from), scale.x(to));
    double width = Math.abs(scale.x(from) - scale.x(to));
    if (width >= 0.5) {
      XSLFAutoShape bar = rect(left, top, width, STEP, Palette.wash(Palette.KAPPA, 0.7));
      if (!oil) {
        hatch(bar);
      }
    }
  }

  /** The bearings for which there is no row: their present κ alone, on one line. */
  private void others(List<FleetRow> rest, double y) {
    leaf.box(plot.getMinX() - labelWidth + 20, y - 9, labelWidth - 28, TEXT * TextFit.LINE + 1)
        .line(rest.size() + " more, κ now", TEXT, false);
    for (FleetRow row : rest) {
      dot(scale.x(row.film().kappa()), y, Palette.wash(Palette.KAPPA, 0.7));
    }
  }

  /** What a mark of the picture means. */
  private enum Mark {
    FRESH("fresh oil, as the charge began", 16),
    OIL("what the oil took", 30),
    HEAT("what temperature and speed took", 30),
    NOW("κ now, 95 %", 32),
    FLOOR("floor", 10);

    private final String words;
    private final double width;

    Mark(String words, double width) {
      this.words = words;
      this.width = width;
    }
  }

  private int legendLines() {
    int lines = 1;
    double x = 0;
    for (Mark mark : Mark.values()) {
      double width = width(mark);
      if (x > 0 && x + width > leaf.room().getWidth()) {
        lines++;
        x = 0;
      }
      x += width + MARK_GAP;
    }
    return lines;
  }

  private double width(Mark mark) {
    return mark.width + leaf.fit().width(mark.words, LEGEND_TEXT, false) + 2;
  }

  private void legend() {
    double left = leaf.room().getX();
    double y = plot.getMaxY() + AXIS_HEIGHT + LEGEND_HEIGHT / 2 + 3;
    double x = left;
    rect(
        left - 4,
        plot.getMaxY() + AXIS_HEIGHT + 2,
        leaf.room().getWidth() + 8,
        legendLines() * LEGEND_HEIGHT,
        Palette.PAPER);
    for (Mark mark : Mark.values()) {
      double width = width(mark);
      if (x > left && x + width > leaf.room().getMaxX()) {
        x = left;
        y += LEGEND_HEIGHT;
      }
      draw(mark, x, y);
      leaf.box(x + mark.width, y - 8, width - mark.width + MARK_GAP - 3, 17)
          .ink(Palette.INK)
          .line(mark.words, LEGEND_TEXT, false);
      x += width + MARK_GAP;
    }
  }

  private void draw(Mark mark, double x, double y) {
    switch (mark) {
      case FRESH -> dot(x + 6, y, Palette.PAPER);
      case OIL -> rect(x, y - STEP / 2, 24, STEP, Palette.wash(Palette.KAPPA, 0.7));
      case HEAT -> hatch(rect(x, y - STEP / 2, 24, STEP, Palette.KAPPA));
      case NOW -> {
        line(x, y, x + 26, y, Palette.KAPPA, 1.5);
        dot(x + 13, y, Palette.KAPPA);
      }
      case FLOOR -> line(x + 3, y - 7, x + 3, y + 7, Palette.INK, 1);
    }
  }

  private static void hatch(XSLFAutoShape bar) {
    Hatch.fill(bar, Palette.KAPPA, Palette.PAPER);
    bar.setLineColor(Palette.KAPPA);
    bar.setLineWidth(0.5);
  }

  private void dot(double x, double y, Color fill) {
    XSLFAutoShape dot = slide.createAutoShape();
    dot.setShapeType(ShapeType.ELLIPSE);
    dot.setAnchor(new Rectangle2D.Double(x - DOT / 2, y - DOT / 2, DOT, DOT));
    dot.setFillColor(fill);
    dot.setLineColor(Palette.KAPPA);
    dot.setLineWidth(1.25);
  }

  private XSLFAutoShape rect(double x, double y, double width, double height, Color fill) {
    XSLFAutoShape rect = slide.createAutoShape();
    rect.setShapeType(ShapeType.RECT);
    rect.setAnchor(new Rectangle2D.Double(x, y, width, height));
    rect.setFillColor(fill);
    rect.setLineColor(null);
    return rect;
  }

  private void line(double x1, double y1, double x2, double y2, Color ink, double width) {
    XSLFConnectorShape line = slide.createConnector();
    line.setAnchor(
        new Rectangle2D.Double(
            Math.min(x1, x2), Math.min(y1, y2), Math.abs(x2 - x1), Math.abs(y2 - y1)));
    line.setLineColor(ink);
    line.setLineWidth(width);
  }
}
