package org.kappatrail.review;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.history.Asset;
import org.kappatrail.history.Charge;
import org.kappatrail.history.Measurement;
import org.kappatrail.history.Oil;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.history.Settings;
import org.kappatrail.tribology.AstmD445Precision;
import org.kappatrail.tribology.CleanlinessCode;
import org.kappatrail.tribology.Iso3448;

/** Findings about the samples of one asset: what is odd in them, and the site's own limits. */
final class SampleFindings {
  /** So near to the range of the precision study its figures still serve (tool convention). */
  private static final double NEAR = 1.1;

  private final Asset asset;
  private final List<Charge> charges;
  private final PlantHistory history;
  private final Settings settings;
  private final List<Finding> findings = new ArrayList<>();

  private SampleFindings(
      Asset asset, List<Charge> charges, PlantHistory history, Settings settings) {
    this.asset = asset;
    this.charges = charges;
    this.history = history;
    this.settings = settings;
  }

  static List<Finding> of(
      Asset asset, List<Charge> charges, PlantHistory history, Settings settings) {
    SampleFindings search = new SampleFindings(asset, charges, history, settings);
    search.everySample();
    search.latestSample();
    search.inferredCharges();
    return search.findings;
  }

  private void everySample() {
    Optional<Sample> previous = Optional.empty();
    for (Charge charge : charges) {
      Oil oil = history.getOil(charge.oil());
      for (Sample sample : charge.samples()) {
        coincident(previous, sample);
        noViscosity(sample);
        UnitSuspicion.of(sample, oil)
            .ifPresent(text -> add(sample, Level.ALERT, FindingKind.UNIT_SUSPICION, text));
        previous = Optional.of(sample);
      }
    }
  }

  private void coincident(Optional<Sample> previous, Sample sample) {
    LocalDateTime moment = sample.sampledAt();
    if (previous.isPresent() && previous.get().sampledAt().equals(moment)) {
      add(
          sample,
          Level.CLEAR,
          FindingKind.COINCIDENT_SAMPLES,
          "drawn at the same time as "
              + previous.get().id()
              + " ("
              + sample.sampledAtText()
              + "); both are used");
    }
  }

  private void noViscosity(Sample sample) {
    Optional<Measurement> v40 = sample.find(SampleColumns.VISCOSITY_40C);
    if (v40.isEmpty()) {
      add(
          sample,
          Level.ALERT,
          FindingKind.NO_VISCOSITY,
          "no κ on " + sample.day() + ": the viscosity at 40 °C was not reported");
    } else if (v40.get().censored()) {
      add(
          sample,
          Level.ALERT,
          FindingKind.NO_VISCOSITY,
          "no κ on "
              + sample.day()
              + ": the viscosity at 40 °C is outside the laboratory's range ("
              + v40.get()
              + " mm²/s)");
    }
  }

  private void latestSample() {
    Optional<Charge> present =
        charges.stream().filter(charge -> !charge.samples().isEmpty()).reduce((a, b) -> b);
    if (present.isEmpty()) {
      return;
    }
    List<Sample> samples = present.get().samples();
    Sample latest = samples.get(samples.size() - 1);
    Oil oil = history.getOil(present.get().oil());
    OptionalDouble v40 = latest.exact(SampleColumns.VISCOSITY_40C);
    if (v40.isPresent()) {
      offGrade(latest, oil, v40.getAsDouble());
      outsidePrecision(latest, v40.getAsDouble());
    }
    water(latest);
    cleanliness(latest);
    acid(latest, samples);
  }

  private void offGrade(Sample latest, Oil oil, double v40) {
    if (oil.gradeVg().isEmpty()) {
      return;
    }
    Iso3448.find(oil.gradeVg().getAsInt())
        .filter(grade -> !grade.contains(v40))
        .ifPresent(
            grade ->
                add(
                    latest,
                    Level.ALERT,
                    FindingKind.OFF_GRADE,
                    Say.text(
                        "%s mm²/s at 40 °C is outside ISO VG %d (%s to %s); the register's oil has"
                            + " %s when fresh",
                        Say.viscosity(v40),
                        grade.vg(),
                        Say.viscosity(grade.minCst()),
                        Say.viscosity(grade.maxCst()),
                        Say.viscosity(oil.viscosity().viscosity40Cst()))));
  }

  private void outsidePrecision(Sample latest, double v40) {
    boolean inside =
        v40 >= AstmD445Precision.LOWEST_CST / NEAR && v40 <= AstmD445Precision.HIGHEST_CST * NEAR;
    if (inside || settings.laboratory().reproducibilityPercent().isPresent()) {
      return;
    }
    add(
        latest,
        Level.CLEAR,
        FindingKind.OUTSIDE_PRECISION_RANGE,
        Say.text(
            "%s mm²/s at 40 °C is outside 25 to 150, where ASTM D445 states its precision for used"
                + " oil; %s %% is assumed, set laboratory.viscosity-reproducibility-percent if the"
                + " laboratory's is known",
            Say.viscosity(v40), Say.significant(AstmD445Precision.reproducibilityPercent(v40), 2)));
  }

  private void water(Sample latest) {
    OptionalDouble limit = settings.limits().waterPpm();
    OptionalDouble water = latest.arithmetic(SampleColumns.WATER);
    if (limit.isPresent() && water.isPresent() && water.getAsDouble() > limit.getAsDouble()) {
      add(
          latest,
          Level.ALERT,
          FindingKind.WATER_HIGH,
          Say.text(
              "water %s mg/kg is above the site's limit %s",
              Say.significant(water.getAsDouble(), 3), Say.significant(limit.getAsDouble(), 3)));
    }
  }

  private void cleanliness(Sample latest) {
    Optional<CleanlinessCode> limit = settings.limits().cleanliness();
    Optional<CleanlinessCode> code = latest.cleanliness();
    if (limit.isPresent() && code.isPresent() && code.get().dirtierThan(limit.get())) {
      add(
          latest,
          Level.ALERT,
          FindingKind.DIRTY,
          "cleanliness " + code.get() + " is dirtier than the site's limit " + limit.get());
    }
  }

  private void acid(Sample latest, List<Sample> samples) {
    OptionalDouble limit = settings.limits().acidNumberRise();
    OptionalDouble now = latest.arithmetic(SampleColumns.ACID_NUMBER);
    Optional<Sample> first =
        samples.stream()
            .filter(sample -> sample.arithmetic(SampleColumns.ACID_NUMBER).isPresent())
            .findFirst();
    if (limit.isEmpty() || now.isEmpty() || first.isEmpty()) {
      return;
    }
    double before = first.get().arithmetic(SampleColumns.ACID_NUMBER).getAsDouble();
    if (now.getAsDouble() - before > limit.getAsDouble()) {
      add(
          latest,
          Level.ALERT,
          FindingKind.ACID_HIGH,
          Say.text(
              "acid number %s mg KOH/g has risen by %s since %s, more than the site's limit %s",
              Say.significant(now.getAsDouble(), 3),
              Say.significant(now.getAsDouble() - before, 2),
              first.get().day(),
              Say.significant(limit.getAsDouble(), 2)));
    }
  }

  private void inferredCharges() {
    for (int i = 1; i < charges.size(); i++) {
      Charge charge = charges.get(i);
      List<Sample> before = charges.get(i - 1).samples();
      if (charge.origin() == Charge.Origin.INFERRED) {
        Sample first = charge.samples().get(0);
        add(
            first,
            Level.CLEAR,
            FindingKind.INFERRED_CHARGE,
            Say.text(
                "oil hours fell from %s to %s without a recorded oil change; a new charge is"
                    + " assumed from %s, record the change in events.csv",
                Say.whole(lastHours(before)),
                Say.whole(first.exact(SampleColumns.OIL_HOURS).getAsDouble()),
                first.day()));
      }
    }
  }

  private static double lastHours(List<Sample> samples) {
    return samples.stream()
        .map(sample -> sample.exact(SampleColumns.OIL_HOURS))
        .filter(OptionalDouble::isPresent)
        .reduce((earlier, later) -> later)
        .orElseThrow()
        .getAsDouble();
  }

  private void add(Sample sample, Level level, FindingKind kind, String message) {
    findings.add(Finding.ofSample(asset.id(), sample.id(), level, kind, message));
  }
}
