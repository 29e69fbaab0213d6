package org.kappatrail.review;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.kappatrail.history.Asset;
import org.kappatrail.history.Charge;
import org.kappatrail.history.Oil;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.history.Settings;
import org.kappatrail.review.decision.AssetCase;
import org.kappatrail.review.decision.BearingCase;
import org.kappatrail.review.decision.OilRecord;
import org.kappatrail.review.trend.ChargeDrift;
import org.kappatrail.review.trend.Direction;
import org.kappatrail.review.trend.Outlook;
import org.kappatrail.tribology.AstmD445Precision;

/** Lays the case of an asset before the decision. */
final class DecisionOfAsset {
  private static final Set<FindingKind> OTHER_GROUNDS =
      Set.of(FindingKind.WATER_HIGH, FindingKind.DIRTY, FindingKind.ACID_HIGH);

  private DecisionOfAsset() {}

  /** The case; empty where no bearing has a κ. */
  static Optional<AssetCase> of(
      Asset asset,
      List<Charge> charges,
      List<BearingReview> bearings,
      List<Finding> findings,
      PlantHistory history,
      Settings settings) {
    List<BearingReview> known =
        bearings.stream()
            .filter(bearing -> bearing.latestFilm().isPresent())
            .filter(bearing -> bearing.life().isPresent())
            .sorted(
                Comparator.comparingDouble(
                        (BearingReview bearing) -> film(bearing).kappa() / bearing.floor())
                    .thenComparing(bearing -> bearing.bearing().id()))
            .toList();
    if (known.isEmpty()) {
      return Optional.empty();
    }
    KappaPoint latest = known.get(0).latestFilm().orElseThrow();
    Charge charge = latest.charge();
    Oil oil = history.getOil(charge.oil());
    return Optional.of(
        new AssetCase(
            asset,
            oil,
            oil,
            history.oils(),
            known.stream().map(bearing -> bearing(asset, bearing, oil)).toList(),
            record(known.get(0), charge, oil, findings, settings),
            latest.sample().id(),
            latest.sample().day(),
            latest.sample().arithmetic(SampleColumns.WATER),
            settings.decision(),
            settings.duty().uncertaintyC(),
            film(known.get(0)).sigmaLnV40(),
            findings.stream()
                .filter(finding -> OTHER_GROUNDS.contains(finding.kind()))
                .map(Finding::message)
                .toList()));
  }

  private static Film film(BearingReview bearing) {
    return bearing.latestFilm().flatMap(KappaPoint::film).orElseThrow();
  }

  private static BearingCase bearing(Asset asset, BearingReview review, Oil oil) {
    KappaPoint latest = review.latestFilm().orElseThrow();
    LifeSoFar life = review.life().orElseThrow();
    Optional<Outlook> outlook = review.trend().outlook();
    KappaPoint first =
        review.trail().stream()
            .filter(point -> point.film().isPresent())
            .filter(point -> point.charge().number() == latest.charge().number())
            .findFirst()
            .orElse(latest);
    return new BearingCase(
        review.bearing(),
        review.floor(),
        TrendOfTrail.state(latest),
        Optional.of(TrendOfTrail.state(first).with(oil.viscosity())),
        outlook.map(Outlook::yearAgoC).orElse(OptionalDouble.empty()),
        life.duty(),
        LivesSoFar.cleanliness(asset, lastCoded(review, latest.sample().day())),
        life.used(),
        life.since(),
        outlook.flatMap(Outlook::firstCrossing));
  }

  private static Optional<Sample> lastCoded(BearingReview review, LocalDate upTo) {
    return review.trail().stream()
        .map(KappaPoint::sample)
        .filter(sample -> sample.cleanliness().isPresent() && !sample.day().isAfter(upTo))
        .reduce((earlier, later) -> later);
  }

  private static OilRecord record(
      BearingReview governing, Charge charge, Oil oil, List<Finding> findings, Settings settings) {
    List<Double> viscosities = new ArrayList<>();
    for (Sample sample : charge.samples()) {
      sample.exact(SampleColumns.VISCOSITY_40C).ifPresent(value -> viscosities.add(value));
    }
    double fresh = oil.viscosity().viscosity40Cst();
    OptionalDouble given = settings.laboratory().reproducibilityPercent();
    String latest = governing.latestFilm().orElseThrow().sample().id();
    String suspect =
        findings.stream()
            .filter(finding -> finding.kind() == FindingKind.SWAPPED_SAMPLES)
            .filter(finding -> finding.sample().filter(latest::equals).isPresent())
            .map(Finding::message)
            .findFirst()
            .orElse("");
    return new OilRecord(
        viscosities,
        fresh,
        given.orElseGet(() -> AstmD445Precision.reproducibilityPercent(fresh)),
        given.isPresent() ? "the site's limit between laboratories" : "ASTM D445 reproducibility",
        trend(governing, charge, findings),
        suspect);
  }

  private static Direction trend(BearingReview governing, Charge charge, List<Finding> findings) {
    Set<String> samples =
        charge.samples().stream().map(Sample::id).collect(java.util.stream.Collectors.toSet());
    boolean mixedUp =
        findings.stream()
            .filter(finding -> finding.kind() == FindingKind.UNRECORDED_OIL_CHANGE)
            .anyMatch(finding -> finding.sample().filter(samples::contains).isPresent());
    return mixedUp
        ? Direction.STEADY
        : governing
            .trend()
            .drift(charge.number())
            .map(ChargeDrift::reference)
            .map(drift -> drift.direction())
            .orElse(Direction.UNKNOWN);
  }
}
