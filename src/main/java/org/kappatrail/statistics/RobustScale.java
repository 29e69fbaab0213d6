package org.kappatrail.statistics;

import java.util.OptionalDouble;

/** Scale estimates that a few wild values do not move. */
public final class RobustScale {

  /** 1/Φ⁻¹(3/4), rounded as it is customarily used. */
  private static final double NORMAL_CONSISTENCY = 1.4826;

  private RobustScale() {}

  /**
   * Median absolute deviation from the median, times 1.4826 so that it estimates the standard
   * deviation of normal values (Hampel, JASA 69 (1974) 383–393). In the unit of the values. Empty
   * for no values; 0 for one value or where more than half are equal. NaN is refused.
   */
  public static OptionalDouble mad(double[] values) {
    OptionalDouble median = Quantiles.median(values);
    if (median.isEmpty()) {
      return median;
    }
    double[] deviations = new double[values.length];
    for (int i = 0; i < values.length; i++) {
      deviations[i] = Math.abs(values[i] - median.getAsDouble());
    }
    return OptionalDouble.of(NORMAL_CONSISTENCY * Quantiles.median(deviations).orElseThrow());
  }
}
