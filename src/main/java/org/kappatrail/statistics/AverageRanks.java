package org.kappatrail.statistics;

import java.util.Arrays;
import org.apache.commons.math3.stat.ranking.NaNStrategy;
import org.apache.commons.math3.stat.ranking.NaturalRanking;
import org.apache.commons.math3.stat.ranking.TiesStrategy;

/** Ranks from 1 (least) to n, equal values sharing the mean of their ranks. */
public final class AverageRanks {

  private AverageRanks() {}

  /**
   * Ranks in the order of the values. No values give no ranks; all equal give (n + 1)/2 each; 0 and
   * −0 are equal. NaN is refused.
   */
  public static double[] rank(double[] values) {
    Inputs.requireFinite(values, "values");
    if (values.length == 0) {
      return new double[0];
    }
    double[] oneZero = Arrays.stream(values).map(value -> value + 0.0).toArray();
    return new NaturalRanking(NaNStrategy.FAILED, TiesStrategy.AVERAGE).rank(oneZero);
  }
}
