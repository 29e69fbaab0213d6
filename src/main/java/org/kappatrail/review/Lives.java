package org.kappatrail.review;

import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.history.Asset;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.tribology.CantleyWaterLife;
import org.kappatrail.tribology.CleanlinessCode;
import org.kappatrail.tribology.ContaminationFactor;
import org.kappatrail.tribology.Iso281ContaminationFactor;
import org.kappatrail.tribology.Iso281LifeModification;
import org.kappatrail.tribology.Iso281RatingLife;

/** Life figures of one bearing at one κ and speed. */
final class Lives {
  private final Asset asset;
  private final Bearing bearing;

  Lives(Asset asset, Bearing bearing) {
    this.asset = asset;
    this.bearing = bearing;
  }

  /** Life at a sample; whatever lacks its inputs stays empty. */
  LifeAtPoint of(Sample sample, OptionalDouble kappa, double speedRpm, boolean effectiveEp) {
    OptionalDouble water = sample.arithmetic(SampleColumns.WATER);
    OptionalDouble waterLife =
        water.isPresent() ? CantleyWaterLife.factor(water.getAsDouble()) : OptionalDouble.empty();
    if (kappa.isEmpty()) {
      return new LifeAtPoint(
          contamination(sample.cleanliness(), OptionalDouble.empty()),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          waterLife);
    }
    Optional<ContaminationFactor> factor = contamination(sample.cleanliness(), kappa);
    OptionalDouble modification = modification(kappa.getAsDouble(), factor);
    OptionalDouble ep =
        effectiveEp && bearing.hasLoads() && factor.isPresent()
            ? Iso281LifeModification.factorWithEffectiveEp(
                bearing.type().orElseThrow(),
                kappa.getAsDouble(),
                factor.get().value(),
                bearing.fatigueLimitKn().getAsDouble(),
                bearing.equivalentLoadKn().getAsDouble())
            : OptionalDouble.empty();
    return new LifeAtPoint(
        factor, modification, ep, ratingLifeH(modification, speedRpm), waterLife);
  }

  /** e_C by hand where the register gives it, else by code and supply. */
  Optional<ContaminationFactor> contamination(
      Optional<CleanlinessCode> code, OptionalDouble kappa) {
    if (asset.contaminationFactor().isPresent()) {
      return Optional.of(
          new ContaminationFactor(
              asset.contaminationFactor().getAsDouble(), false, "from the register"));
    }
    if (kappa.isEmpty()) {
      return Optional.empty();
    }
    return code.flatMap(
        known ->
            Iso281ContaminationFactor.factor(
                known, asset.supply(), kappa.getAsDouble(), bearing.pitchMm()));
  }

  /** a_ISO; empty without loads, e_C or below κ 0.1. */
  OptionalDouble modification(double kappa, Optional<ContaminationFactor> factor) {
    if (!bearing.hasLoads() || factor.isEmpty()) {
      return OptionalDouble.empty();
    }
    return Iso281LifeModification.factor(
        bearing.type().orElseThrow(),
        kappa,
        factor.get().value(),
        bearing.fatigueLimitKn().getAsDouble(),
        bearing.equivalentLoadKn().getAsDouble());
  }

  private OptionalDouble ratingLifeH(OptionalDouble modification, double speedRpm) {
    if (modification.isEmpty() || !(speedRpm > 0)) {
      return OptionalDouble.empty();
    }
    double basic =
        Iso281RatingLife.basicHours(
            bearing.type().orElseThrow(),
            bearing.dynamicRatingKn().getAsDouble(),
            bearing.equivalentLoadKn().getAsDouble(),
            speedRpm);
    return OptionalDouble.of(Iso281RatingLife.modifiedHours(modification.getAsDouble(), basic));
  }
}
