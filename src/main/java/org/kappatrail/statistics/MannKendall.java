package org.kappatrail.statistics;

import java.util.Arrays;
import java.util.Optional;
import org.apache.commons.math3.distribution.NormalDistribution;

/**
 * Mann–Kendall test for a monotonic trend. Exact up to ten values without ties, by counting the
 * orders that give each score; else the normal form with the tie-corrected variance and a
 * continuity correction of one. Sources: Mann, Econometrica 13 (1945) 245–259; Kendall, Rank
 * Correlation Methods (1970); Gilbert (1987) 16.4; US EPA Unified Guidance (2009) 17.3.
 */
public final class MannKendall {

  /** Largest sample with an exact distribution here; the normal form is good above it. */
  private static final int EXACT_UP_TO = 10;

  private MannKendall() {}

  /**
   * Outcome of the test.
   *
   * @param s score: rising pairs less falling pairs
   * @param variance tie-corrected variance of s when there is no trend
   * @param z standardised score with continuity correction, 0 where s or the variance is 0
   * @param pRising probability of a score of s or more when there is no trend
   * @param pFalling probability of a score of s or less when there is no trend
   * @param pTwoSided twice the smaller of the two, at most 1
   * @param exact whether the probabilities come from the exact distribution
   */
  public record Result(
      long s,
      double variance,
      double z,
      double pRising,
      double pFalling,
      double pTwoSided,
      boolean exact,
      int n) {

    public Result {
      if (!(variance >= 0) || Double.isNaN(z)) {
        throw new IllegalArgumentException("variance " + variance + ", z " + z);
      }
    }
  }

  /**
   * Test of values in order of time. Empty for fewer than two values; where all are equal the score
   * is 0 and every p is 1. NaN is refused.
   */
  public static Optional<Result> test(double[] y) {
    double[] order = new double[y.length];
    Arrays.setAll(order, i -> i);
    return test(order, y);
  }

  /**
   * Test of values at given times, in any order; pairs at equal times do not count. Empty for fewer
   * than two distinct times.
   */
  public static Optional<Result> test(double[] times, double[] y) {
    Inputs.requireFinitePairs(times, y);
    int n = y.length;
    if (n < 2 || Inputs.constant(times)) {
      return Optional.empty();
    }
    KendallScore score = KendallScore.of(times, y);
    long s = score.s();
    double variance = score.variance();
    double sd = Math.sqrt(variance);
    double z = variance == 0 ? 0 : (s - Long.signum(s)) / sd;
    boolean exact = n <= EXACT_UP_TO && !score.tied();
    double rising = exact ? exactUpperTail(n, s) : normalUpperTail(s, sd);
    double falling = exact ? exactUpperTail(n, -s) : normalUpperTail(-s, sd);
    double twoSided = Math.min(1, 2 * Math.min(rising, falling));
    return Optional.of(new Result(s, variance, z, rising, falling, twoSided, exact, n));
  }

  private static double normalUpperTail(long s, double sd) {
    return sd == 0 ? 1 : new NormalDistribution(null, 0, 1).cumulativeProbability(-(s - 1) / sd);
  }

  /** P(S ≥ s): a score s belongs to the orders with (n(n−1)/2 − s)/2 inversions. */
  private static double exactUpperTail(int n, long s) {
    long[] orders = {1};
    double all = 1;
    for (int size = 2; size <= n; size++) {
      long[] longer = new long[orders.length + size - 1];
      for (int inversions = 0; inversions < orders.length; inversions++) {
        for (int added = 0; added < size; added++) {
          longer[inversions + added] += orders[inversions];
        }
      }
      orders = longer;
      all *= size;
    }
    long mostInversions = (n * (n - 1L) / 2 - s) / 2;
    long count = 0;
    for (int inversions = 0; inversions <= mostInversions; inversions++) {
      count += orders[inversions];
    }
    return count / all;
  }
}
