package org.kappatrail.report.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.util.Arrays;

/** A line from day to day that breaks where days are missing. */
final class DayLine {
  private static final double LONGEST_STEP_DAYS = 4;

  private DayLine() {}

  static void draw(Canvas canvas, double[] days, double[] values, Color colour, float width) {
    forEachRun(
        days,
        (from, to) ->
            canvas.polyline(
                Arrays.copyOfRange(days, from, to),
                Arrays.copyOfRange(values, from, to),
                colour,
                new BasicStroke(width, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND)));
  }

  static void ribbon(Canvas canvas, double[] days, double[] low, double[] high, Color colour) {
    forEachRun(
        days,
        (from, to) ->
            canvas.ribbon(
                Arrays.copyOfRange(days, from, to),
                Arrays.copyOfRange(low, from, to),
                Arrays.copyOfRange(high, from, to),
                colour));
  }

  private interface Run {
    void at(int from, int to);
  }

  private static void forEachRun(double[] days, Run run) {
    int from = 0;
    for (int i = 1; i <= days.length; i++) {
      if (i == days.length || days[i] - days[i - 1] > LONGEST_STEP_DAYS) {
        run.at(from, i);
        from = i;
      }
    }
  }
}
