package org.kappatrail.tribology;

/**
 * Survival of a bearing against its running time, by the three-parameter Weibull distribution S =
 * exp(ln 0.9 [((t/L10) − 0.05)/0.95]^1.5), with S = 1 up to 5 % of L10.
 *
 * <p>Units: h, or fractions of L10mh where the duty changes and life is used up at changing rates;
 * probabilities 0…1. Range: times not below 0, lives above 0; others are refused.
 *
 * <p>Source: ISO/TR 1281-2 (slope 1.5, Cγ 0.05), on which the factor a1 of ISO 281:2007, Table 12,
 * rests.
 */
public final class Iso281Reliability {
  private static final double SLOPE = 1.5;
  private static final double FAILURE_FREE = 0.05;
  private static final double LN_SURVIVAL_AT_L10 = Math.log(0.9);

  private Iso281Reliability() {}

  /** Probability of running for some hours. */
  public static double survival(double hours, double l10mhHours) {
    return survivalAtLifeFraction(fraction(hours, l10mhHours));
  }

  /** Probability of failing within some hours. */
  public static double failureProbability(double hours, double l10mhHours) {
    return failureProbabilityOfAddedLife(0, fraction(hours, l10mhHours));
  }

  /** Probability of failing within a horizon, for a bearing that has run so far. */
  public static double conditionalFailureProbability(
      double hoursBefore, double horizonHours, double l10mhHours) {
    return failureProbabilityOfAddedLife(
        fraction(hoursBefore, l10mhHours), fraction(horizonHours, l10mhHours));
  }

  /** Probability of surviving a used fraction of L10mh. */
  public static double survivalAtLifeFraction(double fractionOfL10) {
    return Math.exp(lnSurvival(Require.notNegative("life fraction", fractionOfL10, "")));
  }

  /**
   * Probability that a bearing which has survived a used fraction of L10mh fails while it uses up
   * an added one.
   */
  public static double failureProbabilityOfAddedLife(double usedFraction, double addedFraction) {
    Require.notNegative("used life fraction", usedFraction, "");
    Require.notNegative("added life fraction", addedFraction, "");
    return -Math.expm1(lnSurvival(usedFraction + addedFraction) - lnSurvival(usedFraction));
  }

  /** The factor a1 for a reliability of 90 % up to, not including, 100 %. */
  public static double lifeAdjustment(double reliabilityPercent) {
    Require.within("reliability", reliabilityPercent, 90, Math.nextDown(100.0), "%");
    double ratio = Math.log(reliabilityPercent / 100) / LN_SURVIVAL_AT_L10;
    return FAILURE_FREE + (1 - FAILURE_FREE) * Math.pow(ratio, 1 / SLOPE);
  }

  private static double lnSurvival(double fractionOfL10) {
    double past = Math.max(0, fractionOfL10 - FAILURE_FREE) / (1 - FAILURE_FREE);
    return LN_SURVIVAL_AT_L10 * Math.pow(past, SLOPE);
  }

  private static double fraction(double hours, double l10mhHours) {
    Require.notNegative("running time", hours, "h");
    Require.positive("rating life", l10mhHours, "h");
    return hours / l10mhHours;
  }
}
