package org.kappatrail.tribology;

/**
 * Rating life of ISO 281:2007: L10h = 10^6/(60 n) (C/P)^p with p = 3 for ball and 10/3 for roller
 * bearings, and L10mh = a_ISO L10h for 90 % reliability.
 */
public final class Iso281RatingLife {
  private Iso281RatingLife() {}

  /**
   * Basic rating life L10h.
   *
   * @param type bearing family
   * @param dynamicRatingKn basic dynamic load rating C, kN
   * @param equivalentLoadKn dynamic equivalent load P, kN
   * @param speedRpm speed, r/min
   * @return hours
   */
  public static double basicHours(
      BearingType type, double dynamicRatingKn, double equivalentLoadKn, double speedRpm) {
    Require.positive("dynamic load rating", dynamicRatingKn, "kN");
    Require.positive("equivalent load", equivalentLoadKn, "kN");
    Require.positive("speed", speedRpm, "r/min");
    double exponent = type.isBall() ? 3 : 10.0 / 3;
    return 1e6 / (60 * speedRpm) * Math.pow(dynamicRatingKn / equivalentLoadKn, exponent);
  }

  /** Modified rating life L10mh, hours. */
  public static double modifiedHours(double lifeModification, double basicHours) {
    return lifeModification * basicHours;
  }
}
