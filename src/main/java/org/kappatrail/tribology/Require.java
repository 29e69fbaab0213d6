package org.kappatrail.tribology;

/** Refusals in one wording: what, value, limit, unit. */
final class Require {
  private Require() {}

  static double finite(String what, double value, String unit) {
    if (!Double.isFinite(value)) {
      throw refused(what, value, "must be a finite number", unit);
    }
    return value;
  }

  static double positive(String what, double value, String unit) {
    finite(what, value, unit);
    if (value <= 0) {
      throw refused(what, value, "must be above 0", unit);
    }
    return value;
  }

  static double notNegative(String what, double value, String unit) {
    finite(what, value, unit);
    if (value < 0) {
      throw refused(what, value, "must not be below 0", unit);
    }
    return value;
  }

  static double atLeast(String what, double value, double limit, String unit) {
    finite(what, value, unit);
    if (value < limit) {
      throw refused(what, value, "must not be below " + limit, unit);
    }
    return value;
  }

  static double within(String what, double value, double low, double high, String unit) {
    finite(what, value, unit);
    if (value < low || value > high) {
      throw refused(what, value, "must lie within " + low + " and " + high, unit);
    }
    return value;
  }

  private static IllegalArgumentException refused(
      String what, double value, String rule, String unit) {
    String suffix = unit.isEmpty() ? "" : " " + unit;
    return new IllegalArgumentException(what + " " + value + suffix + ": " + rule + suffix);
  }
}
