package org.kappatrail.tribology;

/**
 * Rated kinematic viscosity ν1: the one that a rolling bearing needs at its operating temperature
 * for an adequate film.
 *
 * <p>ν1 = 45000 n^−0.83 Dpw^−0.5 below 1000 r/min, 4500 n^−0.5 Dpw^−0.5 from there up. Units:
 * mm²/s, r/min, mm. Range: any speed and diameter above 0; others are refused. The published
 * branches do not quite meet: at 1000 r/min the slow one lies 2.33 % above the fast one.
 *
 * <p>Source: ISO 281:2007, 9.3.3.3.
 */
public final class Iso281RatedViscosity {
  private static final double BRANCH_RPM = 1000;

  private Iso281RatedViscosity() {}

  /** The rated viscosity at a speed and pitch diameter. */
  public static double ratedViscosityCst(double speedRpm, double pitchMm) {
    Require.positive("speed", speedRpm, "r/min");
    Require.positive("pitch diameter", pitchMm, "mm");
    double speedTerm =
        speedRpm < BRANCH_RPM ? 45000 * Math.pow(speedRpm, -0.83) : 4500 / Math.sqrt(speedRpm);
    return speedTerm / Math.sqrt(pitchMm);
  }

  /** The mean of bore and outside diameter, which stands for a pitch diameter that is not given. */
  public static double pitchMm(double boreMm, double outsideMm) {
    Require.positive("bore", boreMm, "mm");
    Require.positive("outside diameter", outsideMm, "mm");
    if (outsideMm <= boreMm) {
      throw new IllegalArgumentException(
          "outside diameter " + outsideMm + " mm: must be above the bore, " + boreMm + " mm");
    }
    return (boreMm + outsideMm) / 2;
  }
}
