package org.kappatrail.report.page;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Locale;
import java.util.OptionalDouble;

/** Numbers as people read them; unknown is empty. */
public final class Numbers {
  private Numbers() {}

  /** A number with a number of significant digits and no exponent. */
  public static String significant(double value, int digits) {
    if (value == 0) {
      return "0";
    }
    BigDecimal rounded =
        new BigDecimal(value).round(new MathContext(digits, RoundingMode.HALF_EVEN));
    return rounded.scale() < 0 ? rounded.setScale(0).toPlainString() : rounded.toPlainString();
  }

  public static String significant(OptionalDouble value, int digits) {
    return value.isPresent() ? significant(value.getAsDouble(), digits) : "";
  }

  /** A number with a number of decimals. */
  public static String fixed(double value, int decimals) {
    return String.format(Locale.ROOT, "%." + decimals + "f", value);
  }

  public static String fixed(OptionalDouble value, int decimals) {
    return value.isPresent() ? fixed(value.getAsDouble(), decimals) : "";
  }

  /** A probability: two digits, and "below 0.001" or "above 0.999" at the ends. */
  public static String probability(double probability) {
    if (probability < 0.001) {
      return "below 0.001";
    }
    return probability > 0.999 ? "above 0.999" : significant(probability, 2);
  }

  /** A relative change in percent with its sign; the minus is U+2212. */
  public static String percent(double fraction) {
    String number = fixed(Math.abs(fraction) * 100, 0);
    String sign = number.equals("0") ? "" : fraction < 0 ? "−" : "+";
    return sign + number + " %";
  }

  /** A whole number with thin spaces between thousands. */
  public static String grouped(double value) {
    String digits = fixed(value, 0);
    StringBuilder text = new StringBuilder();
    for (int i = 0; i < digits.length(); i++) {
      int left = digits.length() - i;
      if (i > 0 && left % 3 == 0 && digits.charAt(i - 1) != '-') {
        text.append('\u202F');
      }
      text.append(digits.charAt(i));
    }
    return text.toString();
  }

  public static String grouped(OptionalDouble value) {
    return value.isPresent() ? grouped(value.getAsDouble()) : "";
  }
}
