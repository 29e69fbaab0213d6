package org.kappatrail.tribology;

/**
 * Reference kinematic viscosity ν1 of ISO 281:2007, 9.3.3.3: the viscosity at operating temperature
 * that just separates the surfaces of a bearing.
 *
 * <p>ν1 = 45000 n^−0.83 Dpw^−0.5 below 1000 r/min, ν1 = 4500 n^−0.5 Dpw^−0.5 from 1000 r/min; the
 * second lies 2.33 % below the first at 1000 r/min.
 */
public final class Iso281RatedViscosity {
  private static final double FAST_FROM_RPM = 1000;

  private Iso281RatedViscosity() {}

  /**
   * Rated viscosity.
   *
   * @param speedRpm speed, r/min, above 0
   * @param pitchMm pitch diameter Dpw, mm, above 0
   * @return mm²/s
   */
  public static double ratedViscosityCst(double speedRpm, double pitchMm) {
    Require.positive("speed", speedRpm, "r/min");
    Require.positive("pitch diameter", pitchMm, "mm");
    return speedRpm < FAST_FROM_RPM
        ? 45000 * Math.pow(speedRpm, -0.83) / Math.sqrt(pitchMm)
        : 4500 / Math.sqrt(speedRpm) / Math.sqrt(pitchMm);
  }

  /** Mean of bore and outside diameter, which stands for Dpw where that is not given, mm. */
  public static double pitchMm(double boreMm, double outsideMm) {
    Require.positive("bore diameter", boreMm, "mm");
    if (!(outsideMm > boreMm)) {
      throw new IllegalArgumentException(
          "outside diameter " + outsideMm + " mm must be above the bore " + boreMm + " mm");
    }
    return (boreMm + outsideMm) / 2;
  }
}
