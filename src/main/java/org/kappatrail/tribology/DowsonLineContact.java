package org.kappatrail.tribology;

/**
 * Minimum film of an elastohydrodynamic line contact, Dowson 1968: H = 2.65 U^0.70 G^0.54 W^−0.13
 * with the dimensionless speed U, material G and load W.
 */
public final class DowsonLineContact {
  private DowsonLineContact() {}

  /** Minimum film over the equivalent radius, dimensionless. */
  public static double minimumFilm(double speed, double material, double load) {
    Require.positive("speed parameter", speed, "");
    Require.positive("material parameter", material, "");
    Require.positive("load parameter", load, "");
    return 2.65 * Math.pow(speed, 0.70) * Math.pow(material, 0.54) * Math.pow(load, -0.13);
  }
}
