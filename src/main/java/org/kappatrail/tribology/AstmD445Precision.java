package org.kappatrail.tribology;

/**
 * Precision of the kinematic viscosity at 40 °C of used, in-service formulated oils:
 * reproducibility R = 0.000594 ν^1.722 and repeatability r = 0.000233 ν^1.722 mm²/s at 95 %.
 *
 * <p>Units: mm²/s in, percent of the value out. Range: 25…150 mm²/s; outside, the relative value of
 * the nearer end is held (convention of this tool).
 *
 * <p>Source: ASTM D445, precision clause, in-service formulated oils at 40 °C.
 */
public final class AstmD445Precision {
  private static final double REPRODUCIBILITY = 0.000594;
  private static final double REPEATABILITY = 0.000233;
  private static final double EXPONENT = 1.722;

  /** Least viscosity of the precision study, mm²/s. */
  public static final double LOWEST_CST = 25;

  /** Highest viscosity of the precision study, mm²/s. */
  public static final double HIGHEST_CST = 150;

  /** Ratio of a 95 % limit for the difference of two results to their standard deviation. */
  private static final double LIMIT_PER_SIGMA = 2.77;

  private AstmD445Precision() {}

  /** Reproducibility R in percent of the viscosity. */
  public static double reproducibilityPercent(double v40) {
    return percent(REPRODUCIBILITY, v40);
  }

  /** Repeatability r in percent of the viscosity. */
  public static double repeatabilityPercent(double v40) {
    return percent(REPEATABILITY, v40);
  }

  /** σ(ln ν) of a reproducibility that is given as a fraction (not percent) of the viscosity. */
  public static double sigmaLn(double reproducibilityRelative) {
    return Require.notNegative("relative reproducibility", reproducibilityRelative, "")
        / LIMIT_PER_SIGMA;
  }

  private static double percent(double coefficient, double v40) {
    Require.positive("viscosity at 40 °C", v40, "mm²/s");
    double within = Math.min(HIGHEST_CST, Math.max(LOWEST_CST, v40));
    return 100 * coefficient * Math.pow(within, EXPONENT - 1);
  }
}
