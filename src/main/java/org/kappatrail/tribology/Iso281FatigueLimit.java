package org.kappatrail.tribology;

/**
 * Estimate of the fatigue load limit Cu from the static load rating: C0/22 for ball bearings,
 * C0/8.2 for roller bearings, times (100/Dpw)^0.5 above 100 mm.
 *
 * <p>Units: kN and mm. Range: anything above 0; others are refused. The maker's own figure is
 * better where there is one.
 *
 * <p>Source: ISO 281:2007, Annex B, simplified estimate.
 */
public final class Iso281FatigueLimit {
  private static final double REDUCED_ABOVE_MM = 100;

  private Iso281FatigueLimit() {}

  public static double fatigueLoadLimitKn(BearingType type, double staticRatingKn, double pitchMm) {
    Require.positive("static load rating", staticRatingKn, "kN");
    Require.positive("pitch diameter", pitchMm, "mm");
    double plain = staticRatingKn / (type.isBall() ? 22 : 8.2);
    return pitchMm > REDUCED_ABOVE_MM ? plain * Math.sqrt(REDUCED_ABOVE_MM / pitchMm) : plain;
  }
}
