package org.kappatrail.report.table;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Numbers of the pack: six significant digits, decimal point, no exponent, unknown is empty. */
public final class SixDigits {
  private static final MathContext SIX = new MathContext(6, RoundingMode.HALF_EVEN);

  private static final int LEAST_POWER = -15;
  private static final double[] POWERS = powers(LEAST_POWER, 15);
  private static final double[] SCALES = powers(0, 20);
  private static final int DIGITS = 6;

  /** Nearer to the middle between two texts than this, only exact arithmetic tells them apart. */
  private static final double UNSURE = 1e-6;

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
    double size = Math.abs(value);
    if (size >= POWERS[0] && size < POWERS[POWERS.length - 1]) {
      String quick = quick(size);
      if (!quick.isEmpty()) {
        return value < 0 ? "-" + quick : quick;
      }
    }
    return exact(value);
  }

  /** The definition of the text. */
  static String exact(double value) {
    BigDecimal rounded = new BigDecimal(value).round(SIX).stripTrailingZeros();
    return rounded.toPlainString();
  }

  /** The text by floating-point arithmetic, for the many numbers; empty where it is unsure. */
  private static String quick(double size) {
    int power = LEAST_POWER;
    while (size >= POWERS[power + 1 - LEAST_POWER]) {
      power++;
    }
    int decimals = DIGITS - 1 - power;
    double scaled = decimals >= 0 ? size * SCALES[decimals] : size / SCALES[-decimals];
    long whole = (long) scaled;
    double rest = scaled - whole;
    if (Math.abs(rest - 0.5) < UNSURE) {
      return "";
    }
    long digits = rest > 0.5 ? whole + 1 : whole;
    while (decimals > 0 && digits % 10 == 0) {
      digits /= 10;
      decimals--;
    }
    if (decimals <= 0) {
      return Long.toString(digits * (long) SCALES[-decimals]);
    }
    String text = Long.toString(digits);
    return text.length() > decimals
        ? text.substring(0, text.length() - decimals)
            + "."
            + text.substring(text.length() - decimals)
        : "0." + "0".repeat(decimals - text.length()) + text;
  }

  /** Powers of ten, each the number next to it. */
  private static double[] powers(int from, int to) {
    double[] powers = new double[to - from + 1];
    for (int power = from; power <= to; power++) {
      powers[power - from] = Double.parseDouble("1e" + power);
    }
    return powers;
  }
}
