package org.kappatrail.statistics;

import java.util.OptionalDouble;
import org.apache.commons.math3.stat.correlation.PearsonsCorrelation;

/** Product-moment correlation coefficient. */
public final class Pearson {

  /** Below three pairs a coefficient says nothing: two points always lie on a line. */
  static final int LEAST_PAIRS = 3;

  private Pearson() {}

  /**
   * Coefficient within −1 and 1. Empty for fewer than three pairs and where either variable is
   * constant. NaN is refused.
   */
  public static OptionalDouble r(double[] x, double[] y) {
    Inputs.requireFinitePairs(x, y);
    if (x.length < LEAST_PAIRS || Inputs.constant(x) || Inputs.constant(y)) {
      return OptionalDouble.empty();
    }
    double r = new PearsonsCorrelation().correlation(x, y);
    return Double.isNaN(r)
        ? OptionalDouble.empty()
        : OptionalDouble.of(Math.max(-1, Math.min(1, r)));
  }
}
