package org.kappatrail.tribology;

/**
 * The viscosity ratio κ = ν/ν1 of the oil's viscosity at operating temperature to the rated one.
 *
 * <p>No unit; both viscosities in mm²/s, above 0, others are refused. Not clipped.
 *
 * <p>Source: ISO 281:2007, 9.3.3.3.
 */
public final class ViscosityRatio {
  /** Lowest ratio for which the life formulas hold. */
  public static final double LOWEST_FOR_LIFE = 0.1;

  /** Ratio above which the life formulas stay at their value: more viscosity buys no more life. */
  public static final double HIGHEST_FOR_LIFE = 4;

  private ViscosityRatio() {}

  public static double kappa(double operatingCst, double ratedCst) {
    Require.positive("operating viscosity", operatingCst, "mm²/s");
    Require.positive("rated viscosity", ratedCst, "mm²/s");
    return operatingCst / ratedCst;
  }
}
