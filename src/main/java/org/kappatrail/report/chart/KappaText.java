package org.kappatrail.report.chart;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** κ as a picture writes it: three significant digits. */
final class KappaText {
  private KappaText() {}

  static String of(double kappa) {
    BigDecimal rounded = new BigDecimal(kappa).round(new MathContext(3, RoundingMode.HALF_EVEN));
    return rounded.scale() < 0 ? rounded.setScale(0).toPlainString() : rounded.toPlainString();
  }
}
