package org.kappatrail.tribology;

/**
 * Rating life in hours: L10h = 10^6/(60 n) (C/P)^p with p = 3 for ball and 10/3 for roller
 * bearings, and L10mh = a_ISO L10h.
 *
 * <p>Units: kN, r/min, h. Range: loads and speed above 0; others are refused.
 *
 * <p>Source: ISO 281:2007, 5 to 7 (basic rating life) and 9.1 (modified rating life).
 */
public final class Iso281RatingLife {
  private Iso281RatingLife() {}

  /** Basic rating life L10h. */
  public static double basicHours(
      BearingType type, double dynamicRatingKn, double equivalentLoadKn, double speedRpm) {
    Require.positive("dynamic load rating", dynamicRatingKn, "kN");
    Require.positive("equivalent load", equivalentLoadKn, "kN");
    Require.positive("speed", speedRpm, "r/min");
    double exponent = type.isBall() ? 3 : 10.0 / 3;
    return 1e6 / (60 * speedRpm) * Math.pow(dynamicRatingKn / equivalentLoadKn, exponent);
  }

  /** Modified rating life L10mh. */
  public static double modifiedHours(double lifeModification, double basicHours) {
    Require.positive("life modification factor", lifeModification, "");
    Require.positive("basic rating life", basicHours, "h");
    return lifeModification * basicHours;
  }
}
