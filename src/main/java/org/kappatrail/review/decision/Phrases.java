package org.kappatrail.review.decision;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Locale;

/** Puts figures of a decision into words, the same under every locale. */
final class Phrases {
  private Phrases() {}

  static String text(String pattern, Object... values) {
    return String.format(Locale.ROOT, pattern, values);
  }

  static String kappa(double kappa) {
    return digits(kappa, 3);
  }

  /** Two significant digits. */
  static String significant(double value) {
    return digits(value, 2);
  }

  private static String digits(double value, int digits) {
    if (value == 0) {
      return "0";
    }
    BigDecimal rounded =
        BigDecimal.valueOf(value).round(new MathContext(digits, RoundingMode.HALF_EVEN));
    return rounded.scale() < 0 ? rounded.setScale(0).toPlainString() : rounded.toPlainString();
  }

  /** A signed percentage; the minus sign is U+2212. */
  static String percent(double fraction, int decimals) {
    String number = text("%." + decimals + "f", Math.abs(fraction) * 100);
    boolean zero = number.chars().noneMatch(c -> c >= '1' && c <= '9');
    return (zero ? "" : fraction < 0 ? "−" : "+") + number + " %";
  }

  /** What an act is worth, in words. */
  static String worth(Remedy act, AssetCase asset) {
    if (act.worth().isEmpty()) {
      return act.pays() ? "lifts κ clear of the floor" : "does not change that";
    }
    if (act.breakEvenRatio().isEmpty()) {
      return "worth nothing";
    }
    String thing =
        switch (act.kind()) {
          case FRESH_OIL, OTHER_OIL, GRADE -> "oil changes";
          default -> "times the price of the act";
        };
    String ratio =
        text(
            "pays if a failure costs more than %s %s",
            digits(act.breakEvenRatio().getAsDouble(), 2), thing);
    if (act.netSaving().isPresent()) {
      return text("%s; net saving %s", ratio, money(act.netSaving().getAsDouble()));
    }
    return ratio
        + text(", and the site counts on %s", digits(asset.settings().failureCostRatio(), 3));
  }

  /** A whole amount in the site's currency. */
  static String money(double amount) {
    long whole = Math.round(amount);
    return (whole < 0 ? "−" : "") + text("%,d", Math.abs(whole)).replace(',', '\u202F');
  }
}
