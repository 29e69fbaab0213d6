package org.kappatrail.review;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Locale;

/** Puts numbers into sentences, the same under every locale. */
final class Say {
  private Say() {}

  /** A number with a number of significant digits, never in exponent form. */
  static String significant(double value, int digits) {
    if (value == 0 || !Double.isFinite(value)) {
      return value == 0 ? "0" : String.valueOf(value);
    }
    BigDecimal rounded =
        BigDecimal.valueOf(value).round(new MathContext(digits, RoundingMode.HALF_EVEN));
    return rounded.scale() < 0 ? rounded.setScale(0).toPlainString() : rounded.toPlainString();
  }

  /** A sentence from a pattern of {@link java.util.Formatter}. */
  static String text(String pattern, Object... values) {
    return String.format(Locale.ROOT, pattern, values);
  }

  /** κ with three significant digits. */
  static String kappa(double kappa) {
    return significant(kappa, 3);
  }

  /** Viscosity in mm²/s with four significant digits. */
  static String viscosity(double cst) {
    return significant(cst, 4);
  }

  /** A number with one decimal. */
  static String oneDecimal(double value) {
    return String.format(Locale.ROOT, "%.1f", value);
  }

  /** A whole number. */
  static String whole(double value) {
    return String.format(Locale.ROOT, "%.0f", value);
  }

  /** A relative change as a signed percentage: the minus sign is U+2212. */
  static String percent(double fraction) {
    String text = String.format(Locale.ROOT, "%.0f", Math.abs(fraction) * 100);
    if (text.equals("0")) {
      return "0 %";
    }
    return (fraction < 0 ? "−" : "+") + text + " %";
  }

  /** A relative change as a signed percentage with some decimals. */
  static String signedPercent(double fraction, int decimals) {
    String text = String.format(Locale.ROOT, "%." + decimals + "f", Math.abs(fraction) * 100);
    boolean zero = text.chars().noneMatch(c -> c >= '1' && c <= '9');
    return (zero ? "" : fraction < 0 ? "−" : "+") + text + " %";
  }
}
