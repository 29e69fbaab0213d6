package org.kappatrail.statistics;

import java.util.Arrays;

/**
 * Kendall's score S = Σ sign(xj − xi) sign(yj − yi) over all pairs and its variance under
 * independence, with ties in either variable (Kendall, Rank Correlation Methods, 4th ed. 1970, ch.
 * 4; for ties in y alone it is the Mann–Kendall variance of Gilbert 1987, 16.4).
 */
record KendallScore(long s, double variance, boolean tied) {

  static KendallScore of(double[] x, double[] y) {
    int n = x.length;
    long s = 0;
    for (int i = 0; i < n; i++) {
      for (int j = i + 1; j < n; j++) {
        s += (long) (Math.signum(x[j] - x[i]) * Math.signum(y[j] - y[i]));
      }
    }
    TieSums ofX = TieSums.of(x);
    TieSums ofY = TieSums.of(y);
    double pairs = n * (n - 1.0);
    double variance = (pairs * (2.0 * n + 5) - ofX.variance - ofY.variance) / 18;
    if (n > 1) {
      variance += ofX.pairs * ofY.pairs / (2 * pairs);
    }
    if (n > 2) {
      variance += ofX.triples * ofY.triples / (9 * pairs * (n - 2.0));
    }
    boolean nothingToOrder = Inputs.constant(x) || Inputs.constant(y);
    return new KendallScore(s, nothingToOrder ? 0 : variance, ofX.pairs + ofY.pairs > 0);
  }

  /** Sums over the groups of t equal values: t(t−1)(2t+5), t(t−1) and t(t−1)(t−2). */
  private record TieSums(double variance, double pairs, double triples) {

    static TieSums of(double[] values) {
      double[] sorted = values.clone();
      Arrays.sort(sorted);
      double variance = 0;
      double pairs = 0;
      double triples = 0;
      int start = 0;
      while (start < sorted.length) {
        int end = start;
        while (end < sorted.length && sorted[end] == sorted[start]) {
          end++;
        }
        double t = end - start;
        variance += t * (t - 1) * (2 * t + 5);
        pairs += t * (t - 1);
        triples += t * (t - 1) * (t - 2);
        start = end;
      }
      return new TieSums(variance, pairs, triples);
    }
  }
}
