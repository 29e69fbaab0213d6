package org.kappatrail.tribology;

/**
 * How far the film keeps the surfaces apart, by the viscosity ratio: boundary below 0.1, mixed from
 * 0.1 to below 1, full film from 1.
 *
 * <p>Source: common practice; ISO 281 keeps its life formulas to 0.1…4.
 */
public enum LubricationRegime {
  BOUNDARY("boundary"),
  MIXED("mixed"),
  FULL_FILM("full film");

  /** κ from which the regime is mixed. */
  public static final double MIXED_FROM = 0.1;

  /** κ from which the film is full. */
  public static final double FULL_FILM_FROM = 1;

  private final String label;

  LubricationRegime(String label) {
    this.label = label;
  }

  public static LubricationRegime of(double kappa) {
    Require.notNegative("viscosity ratio", kappa, "");
    if (kappa < MIXED_FROM) {
      return BOUNDARY;
    }
    return kappa < FULL_FILM_FROM ? MIXED : FULL_FILM;
  }

  public String label() {
    return label;
  }
}
