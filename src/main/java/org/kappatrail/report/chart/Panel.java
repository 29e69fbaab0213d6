package org.kappatrail.report.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.AffineTransform;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.List;
import java.util.Locale;
import java.util.TimeZone;
import java.util.function.Consumer;
import org.knowm.xchart.XYChart;
import org.knowm.xchart.XYChartBuilder;
import org.knowm.xchart.XYSeries;
import org.knowm.xchart.style.Styler.ChartTheme;
import org.knowm.xchart.style.lines.SeriesLines;
import org.knowm.xchart.style.markers.Marker;
import org.knowm.xchart.style.markers.SeriesMarkers;

/** One panel of a chart over time: an XChart plot with washes under it and marks over it. */
final class Panel {
  static final int LEFT = 78;
  static final int RIGHT = 104;

  private static final int TOP = 20;
  private static final int BOTTOM = 6;
  private static final Color CLEAR = new Color(0, 0, 0, 0);

  private final String label;
  private final Color colour;
  private final int height;
  private final Axis axis;
  private final XYChart chart;
  private final TimeSpan span;
  private int seriesCount;
  private String note = "";
  private Consumer<Canvas> under = canvas -> {};
  private Consumer<Canvas> over = canvas -> {};

  /**
   * An empty panel.
   *
   * @param label quantity and unit
   * @param colour colour of the quantity
   * @param height px
   * @param span shared stretch of time
   * @param axis vertical axis
   */
  Panel(String label, Color colour, int height, TimeSpan span, Axis axis) {
    this.label = label;
    this.colour = colour;
    this.height = height;
    this.axis = axis;
    this.span = span;
    chart = new XYChartBuilder().width(600).height(height).theme(ChartTheme.XChart).build();
    var style = chart.getStyler();
    style.setLocale(Locale.ROOT);
    style.setTimezone(TimeZone.getTimeZone("UTC"));
    style.setChartTitleVisible(false);
    style.setLegendVisible(false);
    style.setAxisTitlesVisible(false);
    style.setAxisTicksVisible(false);
    style.setPlotGridLinesVisible(false);
    style.setPlotBorderVisible(false);
    style.setPlotBackgroundColor(CLEAR);
    style.setChartBackgroundColor(CLEAR);
    style.setChartPadding(0);
    style.setPlotMargin(0);
    style.setPlotContentSize(1.0);
    style.setXAxisMin(span.fromX());
    style.setXAxisMax(span.toX());
    style.setYAxisMin(axis.low());
    style.setYAxisMax(axis.high());
    style.setYAxisLogarithmic(axis.logarithmic());
    style.setMarkerSize(6);
    style.setErrorBarsColorSeriesColor(true);
  }

  int height() {
    return height;
  }

  XYChart chart() {
    return chart;
  }

  Panel under(Consumer<Canvas> painter) {
    under = under.andThen(painter);
    return this;
  }

  Panel over(Consumer<Canvas> painter) {
    over = over.andThen(painter);
    return this;
  }

  /** Adds a series; days are days since 1970-01-01. */
  Panel series(String name, double[] days, double[] values, Color ink, float width, Marker marker) {
    if (days.length == 0) {
      return this;
    }
    seriesCount++;
    XYSeries series = chart.addSeries(name, days, values);
    series.setLineColor(ink);
    series.setMarkerColor(ink);
    series.setMarker(marker);
    series.setLineStyle(
        width > 0
            ? new BasicStroke(width, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND)
            : SeriesLines.NONE);
    return this;
  }

  /** Says something at the right of the panel's title. */
  Panel note(String text) {
    note = text;
    return this;
  }

  boolean empty() {
    return seriesCount == 0;
  }

  /** Paints the panel with its upper left corner at the origin. */
  void paint(Graphics2D g, int width, List<TimeSpan.Tick> ticks) {
    int plotWidth = width - LEFT - RIGHT;
    int plotHeight = height - TOP - BOTTOM;
    // the vector writer does not undo a copied graphics' transform, so it is put back by hand
    AffineTransform before = g.getTransform();
    g.translate(LEFT, TOP);
    Rectangle2D plot = layOut(plotWidth, plotHeight);
    Canvas canvas =
        new Canvas(
            g,
            plot,
            day ->
                plot.getMinX()
                    + (day - span.fromX()) / (span.toX() - span.fromX()) * plot.getWidth(),
            value -> plot.getMaxY() - axis.share(value) * plot.getHeight());
    under.accept(canvas);
    rules(canvas, ticks);
    AffineTransform placed = g.getTransform();
    chart.paint(g, plotWidth, plotHeight);
    g.setTransform(placed);
    g.setClip(null);
    over.accept(canvas);
    labels(canvas);
    g.setTransform(before);
  }

  /** Paints once onto nothing, so that the plot's place is known before anything is drawn. */
  private Rectangle2D layOut(int plotWidth, int plotHeight) {
    Graphics2D nowhere = new BufferedImage(1, 1, BufferedImage.TYPE_INT_ARGB).createGraphics();
    chart.paint(nowhere, plotWidth, plotHeight);
    nowhere.dispose();
    double left = chart.getScreenXFromChart(span.fromX());
    double right = chart.getScreenXFromChart(span.toX());
    double top = chart.getScreenYFromChart(axis.high());
    double bottom = chart.getScreenYFromChart(axis.low());
    return new Rectangle2D.Double(left, top, right - left, bottom - top);
  }

  private void rules(Canvas canvas, List<TimeSpan.Tick> ticks) {
    BasicStroke hair = new BasicStroke(0.6f);
    for (double tick : axis.ticks()) {
      canvas.horizontal(tick, Palette.RULE, hair);
    }
    Rectangle2D plot = canvas.plot();
    for (TimeSpan.Tick tick : ticks) {
      double x = canvas.x((double) tick.day().toEpochDay());
      canvas.line(
          x,
          plot.getMinY(),
          x,
          plot.getMaxY(),
          Palette.RULE,
          tick.year() ? new BasicStroke(1.2f) : hair);
    }
  }

  private void labels(Canvas canvas) {
    Rectangle2D plot = canvas.plot();
    for (double tick : axis.ticks()) {
      canvas.textLeftOf(
          axis.text(tick), plot.getMinX() - 7, canvas.y(tick) + 4, Palette.QUIET_INK, 11.5f);
    }
    canvas.line(
        plot.getMinX(),
        plot.getMaxY(),
        plot.getMaxX(),
        plot.getMaxY(),
        Palette.QUIET_INK,
        new BasicStroke(0.8f));
  }

  /** Writes the panel's title on paper, over whatever runs through; the origin as for painting. */
  void paintTitle(Graphics2D g, int panelWidth) {
    g.setFont(ChartFont.bold(12.5f));
    String shown = Fitted.to(g, label, 420);
    double width = g.getFontMetrics().stringWidth(shown);
    g.setColor(Palette.PAPER);
    g.fill(new Rectangle2D.Double(LEFT, 1, width + 4, TOP - 3));
    g.setColor(colour);
    g.drawString(shown, LEFT, TOP - 6);
    if (!note.isEmpty()) {
      paintNote(g, panelWidth - RIGHT, panelWidth - RIGHT - LEFT - width - 24);
    }
  }

  private void paintNote(Graphics2D g, double right, double room) {
    g.setFont(ChartFont.of(11f));
    String text = Fitted.to(g, note, room);
    double width = g.getFontMetrics().stringWidth(text);
    g.setColor(Palette.PAPER);
    g.fill(new Rectangle2D.Double(right - width - 2, 1, width + 4, TOP - 3));
    g.setColor(Palette.QUIET_INK);
    g.drawString(text, (float) (right - width), TOP - 6);
  }

  /** No marker. */
  static Marker none() {
    return SeriesMarkers.NONE;
  }
}
