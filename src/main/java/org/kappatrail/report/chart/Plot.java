package org.kappatrail.report.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.AffineTransform;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.Locale;
import java.util.TimeZone;
import java.util.function.Consumer;
import org.knowm.xchart.XYChart;
import org.knowm.xchart.XYChartBuilder;
import org.knowm.xchart.XYSeries;
import org.knowm.xchart.style.Styler.ChartTheme;
import org.knowm.xchart.style.markers.Marker;

/** One quantity against another that is not time: an XChart plot with the house's own axes. */
final class Plot {
  static final int LEFT = 62;

  private static final int TOP = 42;
  private static final int BOTTOM = 40;
  private static final int RIGHT = 14;
  private static final Color CLEAR = new Color(0, 0, 0, 0);

  private final String title;
  private final String xLabel;
  private final int width;
  private final int height;
  private final Axis x;
  private final Axis y;
  private final XYChart chart;
  private Consumer<Canvas> under = canvas -> {};
  private Consumer<Canvas> over = canvas -> {};

  /**
   * An empty plot.
   *
   * @param title vertical quantity and what it is set against
   * @param xLabel horizontal quantity
   * @param width px with labels
   * @param height px with labels
   * @param x horizontal axis
   * @param y vertical axis
   */
  Plot(String title, String xLabel, int width, int height, Axis x, Axis y) {
    this.title = title;
    this.xLabel = xLabel;
    this.width = width;
    this.height = height;
    this.x = x;
    this.y = y;
    chart = new XYChartBuilder().width(width).height(height).theme(ChartTheme.XChart).build();
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
    style.setXAxisMin(x.low());
    style.setXAxisMax(x.high());
    style.setXAxisLogarithmic(x.logarithmic());
    style.setYAxisMin(y.low());
    style.setYAxisMax(y.high());
    style.setYAxisLogarithmic(y.logarithmic());
    style.setMarkerSize(7);
  }

  XYChart chart() {
    return chart;
  }

  Plot under(Consumer<Canvas> painter) {
    under = under.andThen(painter);
    return this;
  }

  Plot over(Consumer<Canvas> painter) {
    over = over.andThen(painter);
    return this;
  }

  /** Adds points, joined in their order where the width is above 0. */
  Plot series(String name, double[] xs, double[] ys, Color ink, float width, Marker marker) {
    return series(name, xs, ys, ink, ink, width, marker);
  }

  Plot series(
      String name,
      double[] xs,
      double[] ys,
      Color markers,
      Color line,
      float width,
      Marker marker) {
    if (xs.length == 0) {
      return this;
    }
    XYSeries series = chart.addSeries(name, xs, ys);
    series.setMarkerColor(markers);
    series.setMarker(marker);
    series.setLineColor(width > 0 ? line : CLEAR);
    series.setLineStyle(
        new BasicStroke(Math.max(0, width), BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
    return this;
  }

  /** Paints the plot with its upper left corner at the origin. */
  void paint(Graphics2D g) {
    AffineTransform before = g.getTransform();
    g.translate(LEFT, TOP);
    int plotWidth = width - LEFT - RIGHT;
    int plotHeight = height - TOP - BOTTOM;
    Rectangle2D area = layOut(plotWidth, plotHeight);
    Canvas canvas =
        new Canvas(
            g,
            area,
            value -> area.getMinX() + x.share(value) * area.getWidth(),
            value -> area.getMaxY() - y.share(value) * area.getHeight());
    rules(canvas);
    under.accept(canvas);
    AffineTransform placed = g.getTransform();
    chart.paint(g, plotWidth, plotHeight);
    g.setTransform(placed);
    g.setClip(null);
    over.accept(canvas);
    labels(g, canvas);
    g.setTransform(before);
  }

  /** Paints once onto nothing, so that the plot's place is known before anything is drawn. */
  private Rectangle2D layOut(int plotWidth, int plotHeight) {
    Graphics2D nowhere = new BufferedImage(1, 1, BufferedImage.TYPE_INT_ARGB).createGraphics();
    chart.paint(nowhere, plotWidth, plotHeight);
    nowhere.dispose();
    double left = chart.getScreenXFromChart(x.low());
    double right = chart.getScreenXFromChart(x.high());
    double top = chart.getScreenYFromChart(y.high());
    double bottom = chart.getScreenYFromChart(y.low());
    return new Rectangle2D.Double(left, top, right - left, bottom - top);
  }

  private void rules(Canvas canvas) {
    BasicStroke hair = new BasicStroke(0.6f);
    Rectangle2D area = canvas.plot();
    for (double tick : y.ticks()) {
      canvas.horizontal(tick, Palette.RULE, hair);
    }
    for (double tick : x.ticks()) {
      double at = canvas.x(tick);
      canvas.line(at, area.getMinY(), at, area.getMaxY(), Palette.RULE, hair);
    }
  }

  private void labels(Graphics2D g, Canvas canvas) {
    Rectangle2D area = canvas.plot();
    for (double tick : y.ticks()) {
      canvas.textLeftOf(
          minus(y.text(tick)), area.getMinX() - 7, canvas.y(tick) + 4, Palette.QUIET_INK, 11.5f);
    }
    for (double tick : x.ticks()) {
      canvas.textCentred(
          minus(x.text(tick)), canvas.x(tick), area.getMaxY() + 16, Palette.QUIET_INK, 11.5f);
    }
    canvas.textCentred(xLabel, area.getCenterX(), area.getMaxY() + 33, Palette.INK, 11.5f);
    canvas.line(
        area.getMinX(),
        area.getMaxY(),
        area.getMaxX(),
        area.getMaxY(),
        Palette.QUIET_INK,
        new BasicStroke(0.8f));
    g.setFont(ChartFont.bold(12.5f));
    g.setColor(Palette.INK);
    g.drawString(Fitted.to(g, title, width - 4.0), (float) area.getMinX() - LEFT + 4, -TOP + 14);
  }

  private static String minus(String number) {
    return number.replace('-', '−');
  }
}
