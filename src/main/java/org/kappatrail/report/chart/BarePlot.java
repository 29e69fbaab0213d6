package org.kappatrail.report.chart;

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
import org.knowm.xchart.style.lines.SeriesLines;
import org.knowm.xchart.style.markers.Marker;

/** An XChart plot without anything around it, between a layer under it and one over it. */
final class BarePlot {
  private static final Color CLEAR = new Color(0, 0, 0, 0);

  private final Axis across;
  private final Axis up;
  private final XYChart chart;

  BarePlot(Axis across, Axis up) {
    this.across = across;
    this.up = up;
    chart = new XYChartBuilder().theme(ChartTheme.XChart).build();
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
    style.setXAxisMin(across.low());
    style.setXAxisMax(across.high());
    style.setXAxisLogarithmic(across.logarithmic());
    style.setYAxisMin(up.low());
    style.setYAxisMax(up.high());
    style.setMarkerSize(7);
  }

  Axis across() {
    return across;
  }

  XYChart chart() {
    return chart;
  }

  /** Adds points that no line joins. */
  void points(String name, double[] xs, double[] ys, Color ink, Marker marker) {
    if (xs.length == 0) {
      return;
    }
    XYSeries series = chart.addSeries(name, xs, ys);
    series.setMarkerColor(ink);
    series.setMarker(marker);
    series.setLineStyle(SeriesLines.NONE);
  }

  /** Paints the plot with its upper left corner at the origin. */
  void paint(Graphics2D g, int width, int height, Consumer<Canvas> under, Consumer<Canvas> over) {
    Rectangle2D area = layOut(width, height);
    Canvas canvas =
        new Canvas(
            g,
            area,
            value -> area.getMinX() + across.share(value) * area.getWidth(),
            value -> area.getMaxY() - up.share(value) * area.getHeight());
    under.accept(canvas);
    over.accept(canvas);
    AffineTransform placed = g.getTransform();
    chart.paint(g, width, height);
    g.setTransform(placed);
    g.setClip(null);
  }

  /** Paints once onto nothing, so that the plot's place is known before anything is drawn. */
  private Rectangle2D layOut(int width, int height) {
    Graphics2D nowhere = new BufferedImage(1, 1, BufferedImage.TYPE_INT_ARGB).createGraphics();
    chart.paint(nowhere, width, height);
    nowhere.dispose();
    double left = chart.getScreenXFromChart(across.low());
    double right = chart.getScreenXFromChart(across.high());
    double top = chart.getScreenYFromChart(up.high());
    double bottom = chart.getScreenYFromChart(up.low());
    return new Rectangle2D.Double(left, top, right - left, bottom - top);
  }
}
