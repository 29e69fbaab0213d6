package org.kappatrail.statistics;

import java.util.Arrays;
import java.util.Comparator;
import java.util.OptionalDouble;
import java.util.stream.IntStream;

/**
 * Quantiles, each by a named definition. All are empty for no values; the only value for one value;
 * the common value where all are equal. NaN is refused.
 */
public final class Quantiles {

  /** Share of the total weight that rounding of the running sum may cost. */
  private static final double WEIGHT_ROUNDING = 1e-12;

  private Quantiles() {}

  /** Middle value, or the mean of the two middle values. */
  public static OptionalDouble median(double[] values) {
    return quantileType7(values, 0.5);
  }

  /**
   * Sample quantile by linear interpolation of the order statistics at 1 + (n − 1)p: definition 7
   * of Hyndman and Fan, The American Statistician 50 (1996) 361–365.
   *
   * @param p 0 (least value) to 1 (greatest value)
   */
  public static OptionalDouble quantileType7(double[] values, double p) {
    Inputs.requireFinite(values, "values");
    requireProbability(p);
    if (values.length == 0) {
      return OptionalDouble.empty();
    }
    double[] sorted = values.clone();
    Arrays.sort(sorted);
    return OptionalDouble.of(atRank(sorted, 1 + (sorted.length - 1) * p));
  }

  /** Lower weighted median: {@link #weightedQuantile} at one half. */
  public static OptionalDouble weightedMedian(double[] values, double[] weights) {
    return weightedQuantile(values, weights, 0.5);
  }

  /**
   * Lower weighted quantile: the smallest value whose cumulative weight reaches p times the total
   * weight. It is always one of the values. A value of weight zero is never the answer; empty where
   * no weight is above zero.
   *
   * @param weights zero or more each, in any one unit
   * @param p 0 to 1
   */
  public static OptionalDouble weightedQuantile(double[] values, double[] weights, double p) {
    Inputs.requireFinitePairs(values, weights);
    requireProbability(p);
    int[] order =
        IntStream.range(0, values.length)
            .filter(i -> requireNotNegative(weights[i]) > 0)
            .boxed()
            .sorted(
                Comparator.<Integer>comparingDouble(i -> values[i])
                    .thenComparingDouble(i -> weights[i]))
            .mapToInt(Integer::intValue)
            .toArray();
    if (order.length == 0) {
      return OptionalDouble.empty();
    }
    double total = 0;
    for (int i : order) {
      total += weights[i];
    }
    double wanted = (p - WEIGHT_ROUNDING) * total;
    double reached = 0;
    for (int i : order) {
      reached += weights[i];
      if (reached >= wanted) {
        return OptionalDouble.of(values[i]);
      }
    }
    return OptionalDouble.of(values[order[order.length - 1]]);
  }

  /** Order statistic at a rank from 1 to n, interpolated linearly between whole ranks. */
  static double atRank(double[] sorted, double rank) {
    int below = (int) Math.floor(rank);
    double share = rank - below;
    double lower = sorted[below - 1];
    return share == 0 ? lower : lower + share * (sorted[below] - lower);
  }

  private static void requireProbability(double p) {
    if (!(p >= 0 && p <= 1)) {
      throw new IllegalArgumentException("p is " + p + "; it must lie within 0 and 1");
    }
  }

  private static double requireNotNegative(double weight) {
    if (weight < 0) {
      throw new IllegalArgumentException("a weight is " + weight + "; it must not be negative");
    }
    return weight;
  }
}
