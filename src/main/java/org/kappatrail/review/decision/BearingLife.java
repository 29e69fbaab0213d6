package org.kappatrail.review.decision;

import java.util.OptionalDouble;
import org.kappatrail.history.Bearing;
import org.kappatrail.tribology.BearingType;
import org.kappatrail.tribology.Iso281LifeModification;
import org.kappatrail.tribology.Iso281RatedViscosity;
import org.kappatrail.tribology.Iso281RatingLife;
import org.kappatrail.tribology.Iso281Reliability;
import org.kappatrail.tribology.OilViscosity;
import org.kappatrail.tribology.PalmgrenMiner;
import org.kappatrail.tribology.ViscosityRatio;

/**
 * Life of one bearing over a duty: a_ISO and L10mh cell by cell, put together by Palmgren–Miner,
 * and the failure probability of ISO/TR 1281-2. Below κ 0.1, where ISO 281 refuses, the life at 0.1
 * stands as an upper bound (tool convention).
 */
public final class BearingLife {
  private final Bearing bearing;

  public BearingLife(Bearing bearing) {
    this.bearing = bearing;
  }

  /** a_ISO; empty without loads or contamination factor. */
  public OptionalDouble modification(double kappa, Cleanliness cleanliness) {
    if (!bearing.hasLoads()) {
      return OptionalDouble.empty();
    }
    double within = Math.max(kappa, ViscosityRatio.LOWEST_FOR_LIFE);
    OptionalDouble factor = cleanliness.factor(within, bearing.pitchMm());
    return factor.isEmpty()
        ? factor
        : Iso281LifeModification.factor(
            bearing.type().orElseThrow(),
            within,
            factor.getAsDouble(),
            bearing.fatigueLimitKn().getAsDouble(),
            bearing.equivalentLoadKn().getAsDouble());
  }

  /** L10mh at one κ and speed, hours; empty without loads or contamination factor. */
  public OptionalDouble ratingLifeH(double kappa, double speedRpm, Cleanliness cleanliness) {
    OptionalDouble modification = modification(kappa, cleanliness);
    if (modification.isEmpty()) {
      return modification;
    }
    BearingType type = bearing.type().orElseThrow();
    double basic =
        Iso281RatingLife.basicHours(
            type,
            bearing.dynamicRatingKn().getAsDouble(),
            bearing.equivalentLoadKn().getAsDouble(),
            speedRpm);
    return OptionalDouble.of(Iso281RatingLife.modifiedHours(modification.getAsDouble(), basic));
  }

  /**
   * L10mh over a duty, hours.
   *
   * @param oil the oil
   * @param warmerC added to every temperature of the duty, °C
   */
  public OptionalDouble ratingLifeH(
      OilViscosity oil, DutyYear duty, double warmerC, Cleanliness cleanliness) {
    PalmgrenMiner sum = new PalmgrenMiner();
    for (DutyYear.Cell cell : duty.cells()) {
      double kappa =
          ViscosityRatio.kappa(
              oil.viscosityCst(cell.temperatureC() + warmerC),
              Iso281RatedViscosity.ratedViscosityCst(cell.speedRpm(), bearing.pitchMm()));
      OptionalDouble life = ratingLifeH(kappa, cell.speedRpm(), cleanliness);
      if (life.isEmpty()) {
        return life;
      }
      sum.add(cell.hours(), life.getAsDouble());
    }
    return sum.equivalentLifeHours();
  }

  /** Probability of failing within the horizon, for a life of which a fraction is used up. */
  public static double failureProbability(
      double usedFraction, DutyYear duty, int horizonDays, double ratingLifeH) {
    double hours = duty.hours() * horizonDays / DutyYear.DAYS;
    return Iso281Reliability.failureProbabilityOfAddedLife(usedFraction, hours / ratingLifeH);
  }
}
