package org.kappatrail.statistics;

import java.util.OptionalDouble;

/**
 * Rank correlation coefficient: the product-moment coefficient of average ranks, which is right
 * with ties too (Spearman, Am. J. Psychology 15 (1904) 72–101; Kendall 1970, ch. 3).
 */
public final class Spearman {

  private Spearman() {}

  /**
   * Coefficient within −1 and 1. Empty for fewer than three pairs and where either variable is
   * constant. NaN is refused.
   */
  public static OptionalDouble rho(double[] x, double[] y) {
    Inputs.requireFinitePairs(x, y);
    return Pearson.r(AverageRanks.rank(x), AverageRanks.rank(y));
  }
}
