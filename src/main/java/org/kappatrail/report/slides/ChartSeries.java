package org.kappatrail.report.slides;

import java.awt.Color;
import java.util.OptionalInt;

/**
 * How a column of the chart's sheet is drawn.
 *
 * @param column the column
 * @param kind area, line on the left axis, or line on the right axis
 * @param ink its colour
 * @param points width of the line; 0 for none
 * @param dash pattern of the line, as drawings name it
 * @param marker shape of the markers, as charts name it
 * @param above column of the whisker's length upward
 * @param below column of the whisker's length downward
 * @param whiskerInk colour of the whisker
 * @param label where the series' name stands beside each of its points; empty for none
 * @param inLegend whether the legend names it
 */
record ChartSeries(
    int column,
    Kind kind,
    Color ink,
    double points,
    String dash,
    String marker,
    OptionalInt above,
    OptionalInt below,
    Color whiskerInk,
    String label,
    boolean inLegend) {

  /** What it is drawn as. */
  enum Kind {
    AREA,
    LINE,
    LINE_RIGHT
  }

  static ChartSeries area(int column, Color wash) {
    return of(column, Kind.AREA, wash, 0, "solid", "none", "", false);
  }

  static ChartSeries line(int column, Color ink, double points) {
    return of(column, Kind.LINE, ink, points, "solid", "none", "", true);
  }

  /** Nothing but the name at the column's points. */
  static ChartSeries name(int column, Color ink, String place) {
    return of(column, Kind.LINE, ink, 0, "solid", "none", place, false);
  }

  ChartSeries dashed(String pattern) {
    return new ChartSeries(
        column, kind, ink, points, pattern, marker, above, below, whiskerInk, label, inLegend);
  }

  ChartSeries marked(String shape) {
    return new ChartSeries(
        column, kind, ink, points, dash, shape, above, below, whiskerInk, label, inLegend);
  }

  ChartSeries onRight() {
    return new ChartSeries(
        column,
        Kind.LINE_RIGHT,
        ink,
        points,
        dash,
        marker,
        above,
        below,
        whiskerInk,
        label,
        inLegend);
  }

  ChartSeries unnamed() {
    return new ChartSeries(
        column, kind, ink, points, dash, marker, above, below, whiskerInk, label, false);
  }

  ChartSeries whiskers(int up, int down, Color colour) {
    return new ChartSeries(
        column,
        kind,
        ink,
        points,
        dash,
        marker,
        OptionalInt.of(up),
        OptionalInt.of(down),
        colour,
        label,
        inLegend);
  }

  private static ChartSeries of(
      int column,
      Kind kind,
      Color ink,
      double points,
      String dash,
      String marker,
      String label,
      boolean inLegend) {
    return new ChartSeries(
        column,
        kind,
        ink,
        points,
        dash,
        marker,
        OptionalInt.empty(),
        OptionalInt.empty(),
        ink,
        label,
        inLegend);
  }
}
