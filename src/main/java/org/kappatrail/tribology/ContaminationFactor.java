package org.kappatrail.tribology;

/**
 * Contamination factor e_C and where it comes from.
 *
 * @param value e_C, 0 to 1
 * @param upperBound true where the oil is dirtier than the formula's class, so that e_C is at most
 *     this
 * @param basis what it was taken from, in words
 */
public record ContaminationFactor(double value, boolean upperBound, String basis) {
  public ContaminationFactor {
    Require.within("contamination factor", value, "", 0, 1);
  }
}
