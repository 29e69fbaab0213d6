package org.kappatrail.tribology;

/**
 * Reliability other than 90 %: the three-parameter Weibull distribution of ISO/TR 1281-2:2008 with
 * slope 1.5 and Cγ 0.05, S = exp(ln 0.9 [((t/L10) − 0.05)/0.95]^1.5), S = 1 up to 0.05 L10. It
 * reproduces the a1 values of ISO 281:2007 Table 12.
 */
public final class Iso281Reliability {
  private static final double SLOPE = 1.5;
  private static final double FAILURE_FREE = 0.05;
  private static final double LN_RATED = Math.log(0.9);

  private Iso281Reliability() {}

  /**
   * Probability to survive.
   *
   * @param lifeFraction life used, as a fraction of L10mh, at least 0
   */
  public static double survival(double lifeFraction) {
    Require.within("life fraction", lifeFraction, "", 0, Double.MAX_VALUE);
    if (lifeFraction <= FAILURE_FREE) {
      return 1;
    }
    double beyond = (lifeFraction - FAILURE_FREE) / (1 - FAILURE_FREE);
    return Math.exp(LN_RATED * Math.pow(beyond, SLOPE));
  }

  /**
   * Probability that a bearing that has survived so far fails while it uses up more life.
   *
   * @param usedFraction life used so far, as a fraction of L10mh
   * @param addedFraction life to be used, as a fraction of L10mh
   */
  public static double failureProbability(double usedFraction, double addedFraction) {
    double before = hazard(usedFraction);
    double after = hazard(usedFraction + addedFraction);
    return -Math.expm1(-(after - before));
  }

  /**
   * Life adjustment factor a1.
   *
   * @param reliabilityPercent reliability, at least 0 and below 100 %
   * @return life at that reliability over L10mh
   */
  public static double lifeAdjustment(double reliabilityPercent) {
    Require.within("reliability", reliabilityPercent, "%", 0.0001, 99.9999999);
    double beyond = Math.pow(Math.log(reliabilityPercent / 100) / LN_RATED, 1 / SLOPE);
    return FAILURE_FREE + (1 - FAILURE_FREE) * beyond;
  }

  private static double hazard(double lifeFraction) {
    return -Math.log(survival(lifeFraction));
  }
}
