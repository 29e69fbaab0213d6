package org.kappatrail.report.table;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Numbers of the pack: six significant digits, decimal point, no exponent, unknown is empty. */
public final class SixDigits {
  private static final MathContext SIX = new MathContext(6, RoundingMode.HALF_EVEN);

  private SixDigits() {}

  /** Text of a number; empty for NaN, which is how a typed column keeps a missing number. */
  public static String text(double value) {
    if (Double.isNaN(value)) {
      return "";
    }
    if (value == 0) {
      return "0";
    }
    if (Double.isInfinite(value)) {
      throw new IllegalArgumentException("an infinite number cannot be reported");
    }
    BigDecimal rounded = new BigDecimal(value).round(SIX).stripTrailingZeros();
    return rounded.toPlainString();
  }
}
