package org.kappatrail.tribology;

/**
 * The contamination factor e_C of ISO 281 and what it rests on.
 *
 * @param value 0 (heavily contaminated) to 1 (clean)
 * @param upperBound whether the oil is dirtier than every class, so that the true factor is lower
 * @param basis the class that gave the value, for the reader
 */
public record ContaminationFactor(double value, boolean upperBound, String basis) {
  public ContaminationFactor {
    Require.within("contamination factor", value, 0, 1, "");
  }
}
