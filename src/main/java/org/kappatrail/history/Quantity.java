package org.kappatrail.history;

import java.util.Locale;
import java.util.OptionalDouble;

/**
 * Range checks of the register's numbers: each message carries the name, the value and the limit.
 */
final class Quantity {
  private Quantity() {}

  static void positive(String name, double value) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(
          String.format(Locale.ROOT, "%s is %s, must be a number above 0", name, value));
    }
  }

  static void positive(String name, OptionalDouble value) {
    if (value.isPresent()) {
      positive(name, value.getAsDouble());
    }
  }

  static void notNegative(String name, OptionalDouble value) {
    if (value.isPresent()) {
      within(name, value.getAsDouble(), 0, Double.MAX_VALUE);
    }
  }

  static void within(String name, double value, double low, double high) {
    if (!(value >= low && value <= high)) {
      String limit = high == Double.MAX_VALUE ? "at least " + low : "from " + low + " to " + high;
      throw new IllegalArgumentException(
          String.format(Locale.ROOT, "%s is %s, must be %s", name, value, limit));
    }
  }
}
