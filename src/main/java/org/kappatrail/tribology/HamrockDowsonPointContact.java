package org.kappatrail.tribology;

/**
 * Minimum film of an elastohydrodynamic point contact, Hamrock and Dowson 1977: H = 3.63 U^0.68
 * G^0.49 W^−0.073 (1 − e^(−0.68 k)) with the dimensionless speed U, material G, load W and
 * ellipticity k.
 */
public final class HamrockDowsonPointContact {
  private HamrockDowsonPointContact() {}

  /** Minimum film over the equivalent radius in rolling direction, dimensionless. */
  public static double minimumFilm(double speed, double material, double load, double ellipticity) {
    Require.positive("speed parameter", speed, "");
    Require.positive("material parameter", material, "");
    Require.positive("load parameter", load, "");
    Require.positive("ellipticity", ellipticity, "");
    return 3.63
        * Math.pow(speed, 0.68)
        * Math.pow(material, 0.49)
        * Math.pow(load, -0.073)
        * -Math.expm1(-0.68 * ellipticity);
  }
}
