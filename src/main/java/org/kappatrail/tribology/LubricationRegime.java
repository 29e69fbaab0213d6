package org.kappatrail.tribology;

/**
 * Lubrication regime by κ: boundary below 0.1, mixed from 0.1, full film from 1 (common practice,
 * no source; ISO 281:2007 keeps its formulas to 0.1 ≤ κ ≤ 4).
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

  /** The word used in files and on charts. */
  public String label() {
    return label;
  }

  /** Regime at a κ above 0. */
  public static LubricationRegime of(double kappa) {
    Require.positive("κ", kappa, "");
    if (kappa < MIXED_FROM) {
      return BOUNDARY;
    }
    return kappa < FULL_FILM_FROM ? MIXED : FULL_FILM;
  }
}
