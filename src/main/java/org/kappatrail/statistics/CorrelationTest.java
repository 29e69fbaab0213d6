package org.kappatrail.statistics;

import org.apache.commons.math3.distribution.NormalDistribution;
import org.apache.commons.math3.distribution.TDistribution;
import org.apache.commons.math3.special.Gamma;

/**
 * A correlation coefficient judged at an effective sample size.
 *
 * @param coefficient −1 to 1
 * @param nEffective independent pairs the series are worth
 * @param p two-sided probability of so large a coefficient when there is none
 * @param low lower 95 % limit
 * @param high upper 95 % limit
 */
public record CorrelationTest(
    double coefficient, double nEffective, double p, double low, double high) {

  private static final double CONFIDENCE = 0.95;

  public CorrelationTest {
    if (!(coefficient >= -1 && coefficient <= 1)) {
      throw new IllegalArgumentException("coefficient " + coefficient + " is outside -1 to 1");
    }
    if (!(nEffective >= 0) || Double.isInfinite(nEffective)) {
      throw new IllegalArgumentException("effective sample size is " + nEffective);
    }
    if (!(p >= 0 && p <= 1)) {
      throw new IllegalArgumentException("p is " + p + "; it must lie within 0 and 1");
    }
    if (!(low >= -1 && low <= coefficient && high >= coefficient && high <= 1)) {
      throw new IllegalArgumentException("limits " + low + " and " + high);
    }
  }

  /**
   * p from Student's t = r √((N* − 2)/(1 − r²)) with N* − 2 degrees of freedom, which need not be
   * whole; 1 for N* of 2 or less, else 0 for a coefficient of −1 or 1. Limits from Fisher's z with
   * standard error 1/√(N* − 3); −1 to 1 for N* of 3 or less, the coefficient itself where that is
   * −1 or 1. (Fisher, Metron 1 (1921) 3–32; Pyper and Peterman 1998.)
   */
  public static CorrelationTest of(double coefficient, double nEffective) {
    return withDegrees(coefficient, nEffective, nEffective - 2);
  }

  /**
   * As {@link #of}, for a rank correlation: p is never below 2/N*!, the share of the orders of N*
   * ranks that agree perfectly, up or down (Γ(N* + 1) for N* between whole numbers). For N* = n it
   * is the least p that n ranks without ties can give; taking it at N* is this tool's convention.
   * Without it every perfect order would have p = 0, also that of two series which merely both fall
   * and are worth four pairs however many samples they have.
   */
  public static CorrelationTest ofRanks(double coefficient, double nEffective) {
    return notBelow(leastOfRanks(nEffective), of(coefficient, nEffective));
  }

  /**
   * As {@link #ofRanks}, for residuals from each one's fitted line: the slope has spent one pair,
   * so p is never below 2/(N* − 1)! (this tool's convention, after Fisher's rule that a correlation
   * with one variable taken out counts as one of a pair fewer). Residuals of five points or fewer
   * agree perfectly far too often to be called.
   */
  public static CorrelationTest ofDetrendedRanks(double coefficient, double nEffective) {
    return notBelow(leastOfRanks(Math.max(0, nEffective - 1)), of(coefficient, nEffective));
  }

  /** The same with a p that is no smaller than another bound on it, from 0 to 1. */
  public CorrelationTest withLeastP(double least) {
    return notBelow(least, this);
  }

  private static double leastOfRanks(double pairs) {
    return Math.min(1, 2 * Math.exp(-Gamma.logGamma(pairs + 1)));
  }

  private static CorrelationTest notBelow(double least, CorrelationTest plain) {
    return new CorrelationTest(
        plain.coefficient, plain.nEffective, Math.max(least, plain.p), plain.low, plain.high);
  }

  /**
   * The same with the degrees of freedom named: p from t on df, limits from Fisher's z, 1/√(df −
   * 1).
   */
  static CorrelationTest withDegrees(double coefficient, double nEffective, double df) {
    double fisherDegrees = df - 1;
    if (fisherDegrees <= 0) {
      return new CorrelationTest(coefficient, nEffective, p(coefficient, df), -1, 1);
    }
    double z = 0.5 * Math.log((1 + coefficient) / (1 - coefficient));
    double reach =
        new NormalDistribution(null, 0, 1).inverseCumulativeProbability((1 + CONFIDENCE) / 2)
            / Math.sqrt(fisherDegrees);
    double low = Math.min(coefficient, Math.tanh(z - reach));
    double high = Math.max(coefficient, Math.tanh(z + reach));
    return new CorrelationTest(coefficient, nEffective, p(coefficient, df), low, high);
  }

  private static double p(double coefficient, double df) {
    if (df <= 0) {
      return 1;
    }
    double unexplained = (1 - coefficient) * (1 + coefficient);
    if (unexplained <= 0) {
      return 0;
    }
    double t = Math.abs(coefficient) * Math.sqrt(df / unexplained);
    return Math.min(1, 2 * new TDistribution(null, df).cumulativeProbability(-t));
  }
}
