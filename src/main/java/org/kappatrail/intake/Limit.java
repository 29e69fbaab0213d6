package org.kappatrail.intake;

import java.math.BigDecimal;
import java.util.Optional;

/**
 * The range that a number must lie in to be believed; wide, as it is to catch typing errors and
 * wrong units, not odd machines.
 *
 * @param low least value, included
 * @param high greatest value, included
 * @param unit unit, as it stands in messages; empty for a bare number
 */
record Limit(double low, double high, String unit) {

  /** What is wrong with a value; empty where nothing is. */
  Optional<String> complaint(double value) {
    if (value >= low && value <= high) {
      return Optional.empty();
    }
    return Optional.of("out of range; must be " + text());
  }

  /** The range in words. */
  String text() {
    String range = "from " + plain(low) + " to " + plain(high);
    return unit.isEmpty() ? range : range + " " + unit;
  }

  static String plain(double value) {
    return BigDecimal.valueOf(value).stripTrailingZeros().toPlainString();
  }
}
