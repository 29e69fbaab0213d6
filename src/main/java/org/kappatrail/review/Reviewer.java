package org.kappatrail.review;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.kappatrail.duty.BearingDuty;
import org.kappatrail.duty.DutyLog;
import org.kappatrail.history.Asset;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.BearingKey;
import org.kappatrail.history.Charge;
import org.kappatrail.history.Charges;
import org.kappatrail.history.Event;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Sample;
import org.kappatrail.history.Settings;
import org.kappatrail.review.decision.Decision;
import org.kappatrail.review.decision.OilCause;
import org.kappatrail.review.decision.Weighing;

/** Makes the review: one pass over the logs, bearing by bearing, then asset by asset. */
public final class Reviewer {
  private final PlantHistory history;
  private final Settings settings;
  private final LocalDate asOf;
  private final Progress progress;
  private final Map<String, AssetInputs> inputs = new HashMap<>();
  private final Map<String, List<Finding>> swapped;

  private record AssetInputs(
      Asset asset,
      List<Charge> charges,
      List<Sample> samples,
      List<Event> events,
      OilTimeline oil) {}

  /**
   * Prepares a review.
   *
   * @param history the records of the assets to review
   * @param fleet the records of the whole site, for what only shows between assets
   * @param settings settings in force
   * @param asOf last day that counts: later samples, events and readings are left out
   * @param progress told how far it has come
   */
  public Reviewer(
      PlantHistory history,
      PlantHistory fleet,
      Settings settings,
      LocalDate asOf,
      Progress progress) {
    this.history = history;
    this.settings = settings;
    this.asOf = asOf;
    this.progress = progress;
    for (Asset asset : history.assets()) {
      List<Sample> samples =
          history.samplesOf(asset.id()).stream()
              .filter(sample -> !sample.day().isAfter(asOf))
              .toList();
      List<Event> events =
          history.eventsOf(asset.id()).stream()
              .filter(event -> !event.date().isAfter(asOf))
              .toList();
      List<Charge> charges = Charges.of(asset, samples, events);
      inputs.put(
          asset.id(),
          new AssetInputs(asset, charges, samples, events, new OilTimeline(charges, history)));
    }
    swapped = SwappedSamples.in(charges(fleet, asOf), fleet);
  }

  /** Latest sampling day of a history; empty where there is no sample. */
  public static Optional<LocalDate> latestSampling(PlantHistory history) {
    return history.samples().stream().map(Sample::day).max(LocalDate::compareTo);
  }

  /** The history as it was known on a day: results that came in later are left out. */
  public static PlantHistory knownOn(PlantHistory history, LocalDate day) {
    return new PlantHistory(
        history.oils(),
        history.assets(),
        history.bearings(),
        history.samples().stream()
            .filter(sample -> !sample.receivedOn().orElse(sample.day()).isAfter(day))
            .toList(),
        history.assets().stream().flatMap(asset -> history.eventsOf(asset.id()).stream()).toList());
  }

  /** What changed from an earlier review to this one. */
  public static Since compare(LocalDate day, List<AssetReview> before, List<AssetReview> now) {
    return Since.of(day, before, now);
  }

  /** Reads the logs once and reviews every asset of the history; logs of others are passed over. */
  public List<AssetReview> review(DutyLog log) {
    Map<BearingKey, BearingReview> bearings = new HashMap<>();
    Map<BearingKey, List<Finding>> logFindings = new HashMap<>();
    int total = history.bearings().size();
    log.forEachBearing(
        duty -> {
          if (inputs.containsKey(duty.bearing().asset())) {
            Reviewed reviewed = reviewed(duty);
            bearings.put(duty.bearing(), reviewed.bearing());
            logFindings.put(duty.bearing(), reviewed.logFindings());
          }
          progress.at("bearings", bearings.size(), total);
        },
        (rows, ofRows) -> progress.at("log rows", rows, ofRows));
    List<Reviewed> withoutLog =
        history.bearings().parallelStream()
            .filter(bearing -> !bearings.containsKey(bearing.key()))
            .map(bearing -> reviewed(BearingDuty.none(bearing.key())))
            .toList();
    for (Reviewed each : withoutLog) {
      bearings.put(each.bearing().bearing().key(), each.bearing());
      logFindings.put(each.bearing().bearing().key(), each.logFindings());
    }
    progress.at("bearings", total, total);
    return history.assets().parallelStream()
        .map(asset -> review(inputs(asset.id()), bearings, logFindings))
        .toList();
  }

  private record Reviewed(BearingReview bearing, List<Finding> logFindings) {}

  private Reviewed reviewed(BearingDuty duty) {
    BearingKey key = duty.bearing();
    AssetInputs asset = inputs(key.asset());
    Bearing bearing =
        history.bearingsOf(key.asset()).stream()
            .filter(known -> known.id().equals(key.bearing()))
            .findFirst()
            .orElseThrow(() -> new IllegalStateException("log of an unknown bearing " + key));
    KappaTrail trail =
        new KappaTrail(
            asset.asset(),
            bearing,
            asset.charges(),
            asset.events(),
            asset.oil(),
            history,
            duty,
            settings);
    return new Reviewed(trail.review(), LogFindings.of(duty, lastSample(asset).orElse(asOf)));
  }

  private static Optional<LocalDate> lastSample(AssetInputs asset) {
    return asset.samples().stream().map(Sample::day).max(LocalDate::compareTo);
  }

  private AssetReview review(
      AssetInputs asset,
      Map<BearingKey, BearingReview> bearings,
      Map<BearingKey, List<Finding>> logFindings) {
    List<BearingReview> own =
        history.bearingsOf(asset.asset().id()).stream()
            .map(bearing -> found(bearings, bearing.key()))
            .toList();
    List<Finding> findings =
        new ArrayList<>(SampleFindings.of(asset.asset(), asset.charges(), history, settings));
    for (Charge charge : asset.charges()) {
      findings.addAll(UnrecordedChange.in(charge, history.getOil(charge.oil()), asset.events()));
    }
    findings.addAll(swapped.getOrDefault(asset.asset().id(), List.of()));
    Set<Integer> untrusted = chargesWithUnrecordedChange(asset, findings);
    for (BearingReview bearing : own) {
      findings.addAll(FilmFindings.of(bearing));
      boolean trusted =
          bearing
              .latestFilm()
              .filter(point -> !untrusted.contains(point.charge().number()))
              .isPresent();
      findings.addAll(TrendFindings.of(bearing, settings, trusted));
      findings.addAll(found(logFindings, bearing.bearing().key()));
    }
    findings.sort(Finding.ORDER);
    Optional<Decision> decision =
        DecisionOfAsset.of(asset.asset(), asset.charges(), own, findings, history, settings)
            .map(Weighing::of);
    Optional<BearingReview> governing =
        decision.flatMap(
            found ->
                own.stream()
                    .filter(item -> item.bearing().id().equals(found.bearing()))
                    .findFirst());
    boolean trusted =
        governing
            .flatMap(BearingReview::latestFilm)
            .filter(point -> !untrusted.contains(point.charge().number()))
            .isPresent();
    return new AssetReview(
        asset.asset(),
        history.getOil(asset.asset().oil()),
        asset.charges(),
        asset.samples(),
        asset.events(),
        own,
        LastChange.of(asset.charges(), settings.laboratory()),
        decision,
        oilCauses(asset, decision),
        FollowUps.of(asset.events(), asset.samples(), own),
        Story.of(own, governing, decision, trusted),
        findings);
  }

  private List<OilCause> oilCauses(AssetInputs asset, Optional<Decision> decision) {
    boolean suspect =
        decision.filter(found -> !found.basis().record().suspect().isEmpty()).isPresent();
    if (asset.charges().isEmpty() || suspect) {
      return List.of();
    }
    Charge present = asset.charges().get(asset.charges().size() - 1);
    return OilCauses.of(
        present,
        history.getOil(present.oil()),
        history.oils(),
        asset.events(),
        asset.asset().oilVolumeL());
  }

  private static List<Charge> charges(PlantHistory fleet, LocalDate asOf) {
    List<Charge> charges = new ArrayList<>();
    for (Asset asset : fleet.assets()) {
      charges.addAll(
          Charges.of(
              asset,
              fleet.samplesOf(asset.id()).stream().filter(s -> !s.day().isAfter(asOf)).toList(),
              fleet.eventsOf(asset.id()).stream().filter(e -> !e.date().isAfter(asOf)).toList()));
    }
    return charges;
  }

  private static Set<Integer> chargesWithUnrecordedChange(
      AssetInputs asset, List<Finding> findings) {
    Set<String> samples =
        findings.stream()
            .filter(finding -> finding.kind() == FindingKind.UNRECORDED_OIL_CHANGE)
            .flatMap(finding -> finding.sample().stream())
            .collect(Collectors.toSet());
    return asset.charges().stream()
        .filter(charge -> charge.samples().stream().anyMatch(s -> samples.contains(s.id())))
        .map(Charge::number)
        .collect(Collectors.toSet());
  }

  private AssetInputs inputs(String asset) {
    return found(inputs, asset);
  }

  private static <K, V> V found(Map<K, V> map, K key) {
    V value = map.get(key);
    if (value == null) {
      throw new IllegalStateException("nothing known of " + key);
    }
    return value;
  }
}
