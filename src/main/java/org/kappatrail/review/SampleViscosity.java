package org.kappatrail.review;

import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.tribology.OilViscosity;

/** Viscosity of a sampled oil: as measured at 100 °C, else by the index of the charge's oil. */
final class SampleViscosity {
  private SampleViscosity() {}

  /**
   * Viscosity of a sample.
   *
   * @param sample the sample
   * @param registered the charge's oil when fresh
   * @return empty where ν40 was not measured, or lies outside what ASTM D341 covers
   */
  static Optional<OilViscosity> of(Sample sample, OilViscosity registered) {
    OptionalDouble v40 = sample.exact(SampleColumns.VISCOSITY_40C);
    if (v40.isEmpty()) {
      return Optional.empty();
    }
    OptionalDouble v100 = sample.exact(SampleColumns.VISCOSITY_100C);
    if (v100.isPresent() && v100.getAsDouble() < v40.getAsDouble()) {
      return guarded(() -> OilViscosity.measured(v40.getAsDouble(), v100.getAsDouble()));
    }
    return guarded(() -> OilViscosity.withIndexOf(v40.getAsDouble(), registered));
  }

  private static Optional<OilViscosity> guarded(java.util.function.Supplier<OilViscosity> law) {
    try {
      return Optional.of(law.get());
    } catch (IllegalArgumentException outsideTheLaw) {
      return Optional.empty();
    }
  }
}
