package org.kappatrail.tribology;

/**
 * Fatigue load limit Cu from the static rating, ISO 281:2007 Annex B (simple form): C0/22 for ball,
 * C0/8.2 for roller bearings, times (100/Dpw)^0.5 above a pitch diameter of 100 mm.
 */
public final class Iso281FatigueLimit {
  private Iso281FatigueLimit() {}

  /**
   * Fatigue load limit.
   *
   * @param type bearing family
   * @param staticRatingKn basic static load rating C0, kN
   * @param pitchMm pitch diameter, mm
   * @return kN
   */
  public static double fatigueLoadLimitKn(BearingType type, double staticRatingKn, double pitchMm) {
    Require.positive("static load rating", staticRatingKn, "kN");
    Require.positive("pitch diameter", pitchMm, "mm");
    double small = staticRatingKn / (type.isBall() ? 22 : 8.2);
    return pitchMm > 100 ? small * Math.sqrt(100 / pitchMm) : small;
  }
}
