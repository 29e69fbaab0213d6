package org.kappatrail.review;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.history.Charge;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.history.Settings;
import org.kappatrail.review.trend.ViscosityChange;
import org.kappatrail.tribology.AstmD445Precision;

/**
 * The last change of viscosity within the present charge, held against the scatter of measuring.
 */
final class LastChange {
  private LastChange() {}

  static Optional<ViscosityChange> of(List<Charge> charges, Settings.Laboratory laboratory) {
    if (charges.isEmpty()) {
      return Optional.empty();
    }
    List<Sample> samples =
        charges.get(charges.size() - 1).samples().stream()
            .filter(sample -> sample.exact(SampleColumns.VISCOSITY_40C).isPresent())
            .toList();
    int n = samples.size();
    return n < 2
        ? Optional.empty()
        : Optional.of(between(samples.get(n - 2), samples.get(n - 1), laboratory));
  }

  private static ViscosityChange between(Sample a, Sample b, Settings.Laboratory laboratory) {
    double before = a.exact(SampleColumns.VISCOSITY_40C).getAsDouble();
    double after = b.exact(SampleColumns.VISCOSITY_40C).getAsDouble();
    double mean = (before + after) / 2;
    boolean same = !a.laboratory().isEmpty() && a.laboratory().equals(b.laboratory());
    OptionalDouble within = laboratory.sameLaboratoryPercent();
    OptionalDouble between = laboratory.reproducibilityPercent();
    double percent;
    String basis;
    if (same && within.isPresent()) {
      percent = within.getAsDouble();
      basis = "the site's limit within one laboratory";
    } else if (between.isPresent()) {
      percent = between.getAsDouble();
      basis = "the site's limit between laboratories";
    } else {
      percent = AstmD445Precision.reproducibilityPercent(mean);
      basis = "reproducibility of ASTM D445";
    }
    return new ViscosityChange(a.day(), b.day(), before, after, percent / 100 * mean, basis);
  }
}
