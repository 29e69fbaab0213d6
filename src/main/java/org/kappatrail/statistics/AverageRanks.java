package org.kappatrail.statistics;

import java.util.Arrays;

/** Ranks from 1 (least) to n, equal values sharing the mean of their ranks. */
public final class AverageRanks {

  private AverageRanks() {}

  /**
   * Ranks in the order of the values. No values give no ranks; all equal give (n + 1)/2 each; 0 and
   * −0 are equal. NaN is refused.
   */
  public static double[] rank(double[] values) {
    Inputs.requireFinite(values, "values");
    double[] sorted = new double[values.length];
    for (int i = 0; i < values.length; i++) {
      sorted[i] = values[i] + 0.0;
    }
    Arrays.sort(sorted);
    double[] distinct = new double[values.length];
    double[] ranks = new double[values.length];
    int groups = 0;
    for (int from = 0; from < sorted.length; ) {
      int to = from;
      while (to < sorted.length && sorted[to] == sorted[from]) {
        to++;
      }
      distinct[groups] = sorted[from];
      ranks[groups++] = (from + 1 + to) / 2.0;
      from = to;
    }
    double[] inOrder = new double[values.length];
    for (int i = 0; i < values.length; i++) {
      inOrder[i] = ranks[Arrays.binarySearch(distinct, 0, groups, values[i] + 0.0)];
    }
    return inOrder;
  }
}
