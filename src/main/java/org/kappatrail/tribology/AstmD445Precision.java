package org.kappatrail.tribology;

/**
 * Precision of kinematic viscosity at 40 °C of in-service formulated oils, ASTM D445, precision
 * clause: reproducibility R = 0.000594 ν^1.722, repeatability r = 0.000233 ν^1.722, 95 % limits of
 * the difference of two results. Known between 25 and 150 mm²/s; outside, the relative value of the
 * nearer end is held (tool convention).
 */
public final class AstmD445Precision {
  /** Least viscosity of the precision study, mm²/s. */
  public static final double LEAST_CST = 25;

  /** Highest viscosity of the precision study, mm²/s. */
  public static final double MOST_CST = 150;

  private static final double REPRODUCIBILITY = 0.000594;
  private static final double REPEATABILITY = 0.000233;
  private static final double EXPONENT = 1.722;

  /** 1.96 √2: a 95 % limit of a difference over the standard deviation of one result. */
  private static final double LIMIT_OVER_SIGMA = 2.77;

  private AstmD445Precision() {}

  /** Reproducibility over the value, as a fraction. */
  public static double relativeReproducibility(double viscosity40Cst) {
    return relative(REPRODUCIBILITY, viscosity40Cst);
  }

  /** Repeatability over the value, as a fraction. */
  public static double relativeRepeatability(double viscosity40Cst) {
    return relative(REPEATABILITY, viscosity40Cst);
  }

  /** Standard uncertainty of ln ν from a relative 95 % limit of a difference. */
  public static double sigmaLn(double relativeLimit) {
    return relativeLimit / LIMIT_OVER_SIGMA;
  }

  private static double relative(double coefficient, double viscosity40Cst) {
    Require.positive("viscosity at 40 °C", viscosity40Cst, "mm²/s");
    double held = Math.max(LEAST_CST, Math.min(MOST_CST, viscosity40Cst));
    return coefficient * Math.pow(held, EXPONENT - 1);
  }
}
