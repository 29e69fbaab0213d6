package org.kappatrail.report.chart;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * A vertical axis with round ticks.
 *
 * @param low lowest value
 * @param high highest value, above the lowest
 * @param logarithmic true for a log axis, whose values are above 0
 * @param ticks values that get a tick
 */
record Axis(double low, double high, boolean logarithmic, List<Double> ticks) {
  private static final double[] LOG_STEPS = {1, 2, 5};
  private static final double[] CLOSE_LOG_STEPS = {1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 7, 8, 9};
  private static final double[] WIDE_LOG_STEPS = {1, 1.5, 2, 3, 4, 5, 7};
  private static final double SHORT_LOG = 4;
  private static final double WIDE_LOG = 60;
  private static final double MARGIN = 1.12;

  Axis {
    ticks = List.copyOf(ticks);
  }

  /** A linear axis that holds all values, with three to six ticks. */
  static Axis linear(double least, double most) {
    double spread = most - least;
    double margin = spread > 0 ? spread * 0.08 : Math.max(1, Math.abs(most) * 0.1);
    double step = roundStep((spread + 2 * margin) / 4);
    double low = Math.floor((least - margin) / step) * step;
    if (least >= 0 && low < 0) {
      low = 0;
    }
    double high = Math.ceil((most + margin) / step) * step;
    List<Double> ticks = new ArrayList<>();
    for (int i = 0; low + i * step <= high + step * 1e-6; i++) {
      ticks.add(low + i * step);
    }
    return new Axis(low, high, false, ticks);
  }

  /**
   * A log axis that holds all values, with ticks at 1, 2 and 5 of every decade, closer on a short
   * one.
   */
  static Axis log(double least, double most) {
    return log(
        least, most, most / least * MARGIN * MARGIN < SHORT_LOG ? CLOSE_LOG_STEPS : LOG_STEPS);
  }

  /** A wide log axis: room for ticks at 1, 1.5, 2, 3, 4, 5 and 7 of every decade. */
  static Axis wideLog(double least, double most) {
    return log(least, most, most / least < WIDE_LOG ? WIDE_LOG_STEPS : LOG_STEPS);
  }

  private static Axis log(double least, double most, double[] steps) {
    double low = least / MARGIN;
    double high = most * MARGIN;
    List<Double> ticks = new ArrayList<>();
    for (int decade = -4; decade <= 7; decade++) {
      for (double step : steps) {
        double tick = step * Math.pow(10, decade);
        if (tick >= low && tick <= high) {
          ticks.add(tick);
        }
      }
    }
    return new Axis(low, high, true, ticks);
  }

  /** An axis over whole numbers, such as scale numbers. */
  static Axis whole(int least, int most) {
    int step = Math.max(1, (most - least + 3) / 4);
    List<Double> ticks = new ArrayList<>();
    for (int tick = least; tick <= most; tick += step) {
      ticks.add((double) tick);
    }
    return new Axis(least - 0.6, most + 0.6, false, ticks);
  }

  /** Share of the axis below a value: 0 at the lowest, 1 at the highest. */
  double share(double value) {
    return logarithmic
        ? Math.log(value / low) / Math.log(high / low)
        : (value - low) / (high - low);
  }

  String text(double tick) {
    BigDecimal number = new BigDecimal(tick).round(new MathContext(6));
    String text = number.stripTrailingZeros().toPlainString();
    return text.equals("0") || text.startsWith("0E") ? "0" : text;
  }

  private static double roundStep(double raw) {
    double decade = Math.pow(10, Math.floor(Math.log10(raw)));
    return Arrays.stream(new double[] {1, 2, 2.5, 5, 10})
            .filter(step -> step * decade >= raw * 0.999)
            .findFirst()
            .orElse(10)
        * decade;
  }
}
