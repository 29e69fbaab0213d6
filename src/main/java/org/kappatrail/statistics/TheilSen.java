package org.kappatrail.statistics;

import java.util.Arrays;
import java.util.Optional;
import java.util.OptionalDouble;
import org.apache.commons.math3.distribution.NormalDistribution;

/**
 * Theil–Sen line: the median of the slopes of all pairs of points, with Gilbert's limits. Up to 29
 * % of the points may be wild without carrying the slope away.
 *
 * <p>Limits: with N′ slopes in order and C = z·√Var(S) of the tie-corrected Mann–Kendall score, the
 * slopes of rank M1 = (N′ − C)/2 and M2 + 1 = (N′ + C)/2 + 1, interpolated linearly between ranks.
 * Sources: Sen, JASA 63 (1968) 1379–1389; Gilbert, Statistical Methods for Environmental Pollution
 * Monitoring (1987) 16.5; US EPA Unified Guidance (2009) 17.3, example 17-6.
 */
public final class TheilSen {

  private TheilSen() {}

  /**
   * A fitted line. The slope and its limits are in units of y per unit of x, the intercept in units
   * of y. A limit is absent where its rank lies outside the slopes there are, so up to five points
   * without ties have none at 95 %.
   *
   * @param n points the line was fitted to
   */
  public record Line(
      double slope, double intercept, OptionalDouble slopeLow, OptionalDouble slopeHigh, int n) {

    public Line {
      if (!Double.isFinite(slope) || !Double.isFinite(intercept)) {
        throw new IllegalArgumentException(
            "slope " + slope + " and intercept " + intercept + " must be finite");
      }
    }

    /** Height of the line at x. */
    public double at(double x) {
      return intercept + slope * x;
    }
  }

  /**
   * Fits the line; the intercept is median(y) − slope · median(x). Pairs at equal x are left out.
   * Empty for fewer than two distinct x; slope 0 where all y are equal. NaN is refused. Takes time
   * and memory in proportion to n² (500 points: 125,000 slopes).
   *
   * @param confidence two-sided confidence of the slope's limits, between 0 and 1
   */
  public static Optional<Line> fit(double[] x, double[] y, double confidence) {
    Inputs.requireFinitePairs(x, y);
    Inputs.requireShare(confidence, "confidence");
    double[] slopes = pairwiseSlopes(x, y);
    if (slopes.length == 0) {
      return Optional.empty();
    }
    double slope = Quantiles.atRank(slopes, (slopes.length + 1) / 2.0);
    double intercept =
        Quantiles.median(y).orElseThrow() - slope * Quantiles.median(x).orElseThrow();
    double z =
        new NormalDistribution(null, 0, 1).inverseCumulativeProbability((1 + confidence) / 2);
    double width = z * Math.sqrt(KendallScore.of(x, y).variance());
    return Optional.of(
        new Line(
            slope,
            intercept,
            limit(slopes, (slopes.length - width) / 2),
            limit(slopes, (slopes.length + width) / 2 + 1),
            x.length));
  }

  private static OptionalDouble limit(double[] sortedSlopes, double rank) {
    return rank < 1 || rank > sortedSlopes.length
        ? OptionalDouble.empty()
        : OptionalDouble.of(Quantiles.atRank(sortedSlopes, rank));
  }

  private static double[] pairwiseSlopes(double[] x, double[] y) {
    int n = x.length;
    double[] slopes = new double[n * (n - 1) / 2];
    int count = 0;
    for (int i = 0; i < n; i++) {
      for (int j = i + 1; j < n; j++) {
        if (x[i] != x[j]) {
          slopes[count++] = (y[j] - y[i]) / (x[j] - x[i]) + 0.0;
        }
      }
    }
    double[] sorted = Arrays.copyOf(slopes, count);
    Arrays.sort(sorted);
    return sorted;
  }
}
