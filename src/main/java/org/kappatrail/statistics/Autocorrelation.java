package org.kappatrail.statistics;

/** Correlation of a series with itself some steps earlier. */
public final class Autocorrelation {

  private Autocorrelation() {}

  /**
   * Autocorrelations at lags 1 to {@code lags}, the first at index 0: products over the n − j pairs
   * against squares over all n, times n/(n − j) (Pyper and Peterman, Can. J. Fish. Aquat. Sci. 55
   * (1998) 2127–2140). All 0 for a constant series, which has none. NaN is refused.
   *
   * @param lags 0 to one less than the number of values
   */
  public static double[] upTo(double[] values, int lags) {
    Inputs.requireFinite(values, "values");
    int n = values.length;
    if (lags < 0 || lags > Math.max(0, n - 1)) {
      throw new IllegalArgumentException("lags is " + lags + " for " + n + " values");
    }
    double[] correlations = new double[lags];
    if (Inputs.constant(values)) {
      return correlations;
    }
    double mean = 0;
    for (double value : values) {
      mean += value / n;
    }
    double squares = 0;
    for (double value : values) {
      squares += (value - mean) * (value - mean);
    }
    for (int lag = 1; lag <= lags; lag++) {
      double products = 0;
      for (int i = lag; i < n; i++) {
        products += (values[i] - mean) * (values[i - lag] - mean);
      }
      correlations[lag - 1] = products / squares * n / (n - lag);
    }
    return correlations;
  }
}
