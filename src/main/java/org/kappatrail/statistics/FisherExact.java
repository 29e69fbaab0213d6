package org.kappatrail.statistics;

import org.apache.commons.math3.distribution.HypergeometricDistribution;

/**
 * Fisher's exact test of a two-by-two table (Fisher, J. R. Statist. Soc. 98 (1935) 39–54): whether
 * two marks stand at the same things more often than chance puts them there.
 */
public final class FisherExact {

  private FisherExact() {}

  /**
   * One-sided probability that at least so many of n things carry both marks, the marks being put
   * on at random. 1 for none together.
   *
   * @param n things, 0 or more
   * @param first things with the first mark, 0 to n
   * @param second things with the second mark, 0 to n
   * @param together things with both, no more than either
   */
  public static double atLeast(int n, int first, int second, int together) {
    if (first < 0 || first > n || second < 0 || second > n) {
      throw new IllegalArgumentException("marks " + first + " and " + second + " on " + n);
    }
    if (together < 0 || together > Math.min(first, second)) {
      throw new IllegalArgumentException(
          together + " together of " + first + " and " + second + " marks");
    }
    if (together == 0) {
      return 1;
    }
    return Math.min(
        1,
        new HypergeometricDistribution(null, n, first, second)
            .upperCumulativeProbability(together));
  }
}
