package org.kappatrail.tribology;

/**
 * Minimum film thickness of elastohydrodynamic contacts in dimensionless form, H = h/R.
 *
 * <p>Speed U = η0 u/(E′ R), material G = α E′, load W = w/(E′ R L) for a line and F/(E′ R²) for a
 * point, ellipticity k = a/b; all without unit and above 0, others are refused. Fully flooded,
 * smooth and isothermal contacts.
 *
 * <p>Sources: Dowson 1968 (line), H = 2.65 U^0.70 G^0.54 W^−0.13; Hamrock &amp; Dowson 1977
 * (point), H = 3.63 U^0.68 G^0.49 W^−0.073 (1 − e^−0.68k).
 */
public final class FilmThickness {
  private static final double MICROMETRES_PER_METRE = 1e6;

  private FilmThickness() {}

  /** Dowson's minimum film of a line contact. */
  public static double lineContactMinimum(double speed, double material, double load) {
    requireParameters(speed, material, load);
    return 2.65 * Math.pow(speed, 0.70) * Math.pow(material, 0.54) * Math.pow(load, -0.13);
  }

  /** Hamrock and Dowson's minimum film of a point contact. */
  public static double pointContactMinimum(
      double speed, double material, double load, double ellipticity) {
    requireParameters(speed, material, load);
    Require.positive("ellipticity", ellipticity, "");
    return 3.63
        * Math.pow(speed, 0.68)
        * Math.pow(material, 0.49)
        * Math.pow(load, -0.073)
        * -Math.expm1(-0.68 * ellipticity);
  }

  /** A dimensionless film as a thickness, for the reduced radius of the contact. */
  public static double micrometres(double dimensionlessFilm, double reducedRadiusM) {
    Require.positive("dimensionless film", dimensionlessFilm, "");
    Require.positive("reduced radius", reducedRadiusM, "m");
    return dimensionlessFilm * reducedRadiusM * MICROMETRES_PER_METRE;
  }

  private static void requireParameters(double speed, double material, double load) {
    Require.positive("speed parameter", speed, "");
    Require.positive("material parameter", material, "");
    Require.positive("load parameter", load, "");
  }
}
