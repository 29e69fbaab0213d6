package org.kappatrail.tribology;

/**
 * Viscosity ratio κ = ν/ν1 of ISO 281:2007, 9.3.3.3. The life formulas hold for 0.1 ≤ κ ≤ 4; a
 * higher ratio counts as 4, a lower one is refused by them.
 */
public final class ViscosityRatio {
  /** Least κ of the life formulas. */
  public static final double LEAST_FOR_LIFE = 0.1;

  /** κ above which more viscosity buys no more life. */
  public static final double MOST_FOR_LIFE = 4;

  private ViscosityRatio() {}

  /** κ, unclipped, from operating and rated viscosity in mm²/s. */
  public static double kappa(double operatingCst, double ratedCst) {
    return Require.positive("operating viscosity", operatingCst, "mm²/s")
        / Require.positive("rated viscosity", ratedCst, "mm²/s");
  }

  /** κ as the life formulas use it: at most 4. */
  static double clipped(double kappa) {
    return Math.min(Require.positive("κ", kappa, ""), MOST_FOR_LIFE);
  }
}
