package org.kappatrail.statistics;

import java.util.Arrays;

/**
 * False discovery rate over many tests at once (Benjamini and Hochberg, J. R. Statist. Soc. B 57
 * (1995) 289–300): of what is called at q ≤ 0.05, at most 5 % is expected to be false.
 */
public final class BenjaminiHochberg {

  private BenjaminiHochberg() {}

  /**
   * Adjusted p-values (q) in the order given: the least of p·m/rank over that rank and all higher
   * ones, at most 1, so that they rise with p. No tests give none; one test keeps its p; equal p
   * keep theirs.
   *
   * @param p each from 0 to 1; else, and for NaN, refused
   */
  public static double[] adjust(double[] p) {
    for (double value : p) {
      if (!(value >= 0 && value <= 1)) {
        throw new IllegalArgumentException("p is " + value + "; it must lie within 0 and 1");
      }
    }
    double[] sorted = p.clone();
    Arrays.sort(sorted);
    double[] leastFrom = new double[p.length];
    double least = 1;
    for (int place = p.length - 1; place >= 0; place--) {
      least = Math.min(least, sorted[place] * p.length / (place + 1));
      leastFrom[place] = least;
    }
    double[] adjusted = new double[p.length];
    for (int i = 0; i < p.length; i++) {
      adjusted[i] = leastFrom[Arrays.binarySearch(sorted, p[i])];
    }
    return adjusted;
  }
}
