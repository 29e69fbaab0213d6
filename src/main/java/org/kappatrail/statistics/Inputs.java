package org.kappatrail.statistics;

/**
 * What every statistic here asks of its arrays: no missing values among them, and equal lengths.
 */
final class Inputs {

  private Inputs() {}

  /**
   * Refuses NaN and infinite values: leaving missing values out, in pairs where there are pairs, is
   * the caller's policy.
   */
  static void requireFinite(double[] values, String name) {
    for (int i = 0; i < values.length; i++) {
      if (!Double.isFinite(values[i])) {
        throw new IllegalArgumentException(
            name + "[" + i + "] is " + values[i] + "; leave missing values out first");
      }
    }
  }

  static void requireFinitePairs(double[] x, double[] y) {
    if (x.length != y.length) {
      throw new IllegalArgumentException(
          "x has " + x.length + " values and y " + y.length + "; they must pair off");
    }
    requireFinite(x, "x");
    requireFinite(y, "y");
  }

  static double requireShare(double value, String name) {
    if (!(value > 0 && value < 1)) {
      throw new IllegalArgumentException(name + " is " + value + "; it must lie between 0 and 1");
    }
    return value;
  }

  static boolean constant(double[] values) {
    for (double value : values) {
      if (value != values[0]) {
        return false;
      }
    }
    return true;
  }
}
