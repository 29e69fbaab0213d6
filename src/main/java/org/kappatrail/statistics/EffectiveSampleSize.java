package org.kappatrail.statistics;

/**
 * How many independent pairs two serially correlated series are worth. Where both carry over from
 * sample to sample, their correlation scatters more than n suggests.
 *
 * <p>Values go in as the coefficient uses them: average ranks for Spearman's, since its coefficient
 * is the product-moment coefficient of the ranks and their autocorrelations govern its scatter; the
 * values themselves for Pearson's. Series are in order of time at even steps; what to do with gaps
 * is the caller's policy.
 */
public final class EffectiveSampleSize {

  /** Lags up to a fifth of the series, as Pyper and Peterman advise. */
  private static final int LAG_SHARE = 5;

  private static final double LEAST = 3;

  private EffectiveSampleSize() {}

  /**
   * N* from 1/N* = 1/N + (2/N) Σ ((N − j)/N) r_xx(j) r_yy(j) over lags j = 1 to N/5 (Pyper and
   * Peterman, Can. J. Fish. Aquat. Sci. 55 (1998) 2127–2140, eq. 1), kept to 3…N. Up to three pairs
   * are worth their number; a constant series leaves N as it is. NaN is refused.
   */
  public static double pyperPeterman(double[] x, double[] y) {
    Inputs.requireFinitePairs(x, y);
    int n = x.length;
    int lags = n / LAG_SHARE;
    return within(n, inflation(n, Autocorrelation.upTo(x, lags), Autocorrelation.upTo(y, lags)));
  }

  /** N/N*: 1 for independent series. */
  private static double inflation(int n, double[] ofX, double[] ofY) {
    double sum = 0;
    for (int lag = 1; lag <= ofX.length; lag++) {
      sum += (n - lag) / (double) n * ofX[lag - 1] * ofY[lag - 1];
    }
    return 1 + 2 * sum;
  }

  private static double within(int n, double inflation) {
    if (n <= LEAST || inflation <= 1) {
      return n;
    }
    return Math.max(LEAST, n / inflation);
  }
}
