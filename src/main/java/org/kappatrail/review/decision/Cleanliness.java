package org.kappatrail.review.decision;

import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.tribology.CleanlinessCode;
import org.kappatrail.tribology.ContaminationFactor;
import org.kappatrail.tribology.Iso281ContaminationFactor;
import org.kappatrail.tribology.OilSupply;

/**
 * What the contamination factor rests on.
 *
 * @param fixed e_C by hand; replaces the one from the code
 * @param code cleanliness code
 * @param supply how the oil reaches the bearing
 */
public record Cleanliness(OptionalDouble fixed, Optional<CleanlinessCode> code, OilSupply supply) {

  /** e_C at a κ; empty where neither a value nor a code is known. */
  public OptionalDouble factor(double kappa, double pitchMm) {
    if (fixed.isPresent()) {
      return fixed;
    }
    return code.flatMap(known -> Iso281ContaminationFactor.factor(known, supply, kappa, pitchMm))
        .map(ContaminationFactor::value)
        .map(OptionalDouble::of)
        .orElse(OptionalDouble.empty());
  }

  /** The same with a code cleaner by some classes; empty where there is no code or e_C is fixed. */
  public Optional<Cleanliness> cleanerBy(int classes) {
    return fixed.isPresent()
        ? Optional.empty()
        : code.map(known -> new Cleanliness(fixed, Optional.of(known.cleanerBy(classes)), supply));
  }
}
