package org.kappatrail.tribology;

import java.util.Locale;

/** Range checks; each message carries name, value, unit and limit. */
final class Require {
  private Require() {}

  static double within(String name, double value, String unit, double low, double high) {
    if (!(value >= low && value <= high)) {
      throw new IllegalArgumentException(
          String.format(
              Locale.ROOT, "%s is %s %s, must be from %s to %s", name, value, unit, low, high));
    }
    return value;
  }

  static double positive(String name, double value, String unit) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(
          String.format(Locale.ROOT, "%s is %s %s, must be a number above 0", name, value, unit));
    }
    return value;
  }
}
