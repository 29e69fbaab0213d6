package org.kappatrail.report.slides;

import java.awt.Color;

/**
 * A chart's axis of values.
 *
 * @param low least value
 * @param high greatest value
 * @param step distance of ticks; the base of the logarithm where it is logarithmic
 * @param logarithmic whether it is
 * @param ink colour of its numbers, which is the quantity's
 */
record ValueAxis(double low, double high, double step, boolean logarithmic, Color ink) {
  private static final int MOST_TICKS = 5;

  /** A logarithmic axis between powers of two, so that every tick is a round number. */
  static ValueAxis log(double least, double most, Color ink) {
    double low = Math.pow(2, Math.floor(Math.log(least * 0.98) / Math.log(2)));
    double high = Math.pow(2, Math.ceil(Math.log(most * 1.02) / Math.log(2)));
    return new ValueAxis(low, Math.max(high, 2 * low), 2, true, ink);
  }

  /** A linear axis from zero with few round ticks. */
  static ValueAxis fromZero(double most, Color ink) {
    double step = 1;
    for (int decade = -3; decade <= 9; decade++) {
      for (double digit : new double[] {1, 2, 5}) {
        step = digit * Math.pow(10, decade);
        if (most <= MOST_TICKS * step) {
          return new ValueAxis(0, step * Math.max(1, Math.ceil(most / step)), step, false, ink);
        }
      }
    }
    return new ValueAxis(0, most, most, false, ink);
  }

  /** A linear axis over whole numbers. */
  static ValueAxis whole(double least, double most, Color ink) {
    double step = Math.max(1, Math.ceil((most - least + 1) / (MOST_TICKS - 1)));
    double low = Math.max(0, Math.floor(least / step) * step);
    double high = Math.max(low + step, Math.ceil((most + 0.5) / step) * step);
    return new ValueAxis(low, high, step, false, ink);
  }
}
