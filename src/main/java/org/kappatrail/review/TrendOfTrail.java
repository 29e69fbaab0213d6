package org.kappatrail.review;

import java.time.YearMonth;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.apache.commons.math3.stat.descriptive.rank.Median;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.Charge;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Settings;
import org.kappatrail.review.trend.Attribution;
import org.kappatrail.review.trend.ChargeDrift;
import org.kappatrail.review.trend.DayPoint;
import org.kappatrail.review.trend.Drift;
import org.kappatrail.review.trend.FilmState;
import org.kappatrail.review.trend.Forecast;
import org.kappatrail.review.trend.OilShift;
import org.kappatrail.review.trend.Outlook;
import org.kappatrail.review.trend.SampleAttribution;
import org.kappatrail.review.trend.SeasonMonth;
import org.kappatrail.review.trend.Trend;
import org.kappatrail.tribology.OilViscosity;

/** Reads drift, attribution and outlook off the trail of one bearing. */
final class TrendOfTrail {
  private final Bearing bearing;
  private final Films films;
  private final Optional<Reference> reference;
  private final List<KappaPoint> known;
  private final List<DayKappa> days;
  private final PlantHistory history;
  private final Settings settings;

  TrendOfTrail(
      Bearing bearing,
      Films films,
      Optional<Reference> reference,
      List<KappaPoint> trail,
      List<DayKappa> days,
      PlantHistory history,
      Settings settings) {
    this.bearing = bearing;
    this.films = films;
    this.reference = reference;
    this.known = trail.stream().filter(point -> point.film().isPresent()).toList();
    this.days = days;
    this.history = history;
    this.settings = settings;
  }

  Trend trend(int usualIntervalDays) {
    List<ChargeDrift> drifts = new ArrayList<>();
    Map<Integer, List<KappaPoint>> byCharge = new TreeMap<>();
    known.forEach(
        point ->
            byCharge
                .computeIfAbsent(point.charge().number(), number -> new ArrayList<>())
                .add(point));
    byCharge.forEach((number, points) -> drifts.add(drift(number, points)));
    return new Trend(attributions(), drifts, outlook(drifts, usualIntervalDays), season());
  }

  static FilmState state(KappaPoint point) {
    return new FilmState(
        point.viscosity().orElseThrow(),
        point.point().temperatureC().getAsDouble(),
        point.point().speedRpm());
  }

  private List<SampleAttribution> attributions() {
    List<SampleAttribution> found = new ArrayList<>();
    Optional<KappaPoint> previous = Optional.empty();
    Optional<KappaPoint> first = Optional.empty();
    for (KappaPoint point : known) {
      if (first.isEmpty() || first.get().charge().number() != point.charge().number()) {
        first = Optional.of(point);
      }
      FilmState now = state(point);
      String id = point.sample().id();
      previous.ifPresent(
          before ->
              found.add(
                  new SampleAttribution(
                      id, before.sample().id(), Attribution.between(state(before), now))));
      FilmState start = state(first.get());
      if (!id.equals(first.get().sample().id())) {
        found.add(
            new SampleAttribution(
                id, SampleAttribution.CHARGE_START, Attribution.between(start, now)));
      }
      freshAt(start, point.charge())
          .ifPresent(
              fresh ->
                  found.add(
                      new SampleAttribution(
                          id, SampleAttribution.FRESH_OIL, Attribution.between(fresh, now))));
      previous = Optional.of(point);
    }
    return found;
  }

  private Optional<FilmState> freshAt(FilmState start, Charge charge) {
    FilmState fresh = start.with(history.getOil(charge.oil()).viscosity());
    try {
      fresh.lnKappa(bearing.pitchMm());
      return Optional.of(fresh);
    } catch (IllegalArgumentException outsideTheLaw) {
      return Optional.empty();
    }
  }

  private ChargeDrift drift(int charge, List<KappaPoint> points) {
    double[] times = points.stream().mapToDouble(TrendOfTrail::time).toArray();
    double[] achieved =
        points.stream().mapToDouble(point -> Math.log(film(point).kappa())).toArray();
    double scatter =
        points.stream().mapToDouble(point -> film(point).uncertainty().sigmaLn()).max().orElse(0);
    List<KappaPoint> compared =
        points.stream().filter(point -> point.kappaReference().isPresent()).toList();
    double[] atReference =
        compared.stream()
            .mapToDouble(point -> Math.log(point.kappaReference().getAsDouble()))
            .toArray();
    double sigma = compared.stream().mapToDouble(this::sigmaAtReference).max().orElse(0);
    return new ChargeDrift(
        charge,
        Drift.of(times, achieved, scatter),
        Drift.of(compared.stream().mapToDouble(TrendOfTrail::time).toArray(), atReference, sigma),
        oilShift(compared, atReference));
  }

  private Optional<OilShift> oilShift(List<KappaPoint> points, double[] lnKappa) {
    if (points.isEmpty() || reference.isEmpty()) {
      return Optional.empty();
    }
    OilViscosity fresh = history.getOil(points.get(0).charge().oil()).viscosity();
    OptionalDouble target = films.kappa(fresh, reference.get());
    double sigma =
        fresh.sensitivityToV40(reference.get().temperatureC())
            * films.sigmaLnV40(fresh.viscosity40Cst());
    if (target.isEmpty() || !(sigma > 0)) {
      return Optional.empty();
    }
    return OilShift.find(
        points.stream().map(point -> point.sample().day()).toList(),
        lnKappa,
        Math.log(target.getAsDouble()),
        sigma);
  }

  private double sigmaAtReference(KappaPoint point) {
    return film(point).sigmaLnV40()
        * point.viscosity().orElseThrow().sensitivityToV40(reference.orElseThrow().temperatureC());
  }

  private Optional<Outlook> outlook(List<ChargeDrift> drifts, int usualIntervalDays) {
    if (known.isEmpty() || reference.isEmpty()) {
      return Optional.empty();
    }
    KappaPoint latest = known.get(known.size() - 1);
    if (latest.kappaReference().isEmpty()) {
      return Optional.empty();
    }
    FilmState present = state(latest);
    Forecast forecast =
        new Forecast(
            bearing.pitchMm(),
            films.floor(),
            latest.sample().day(),
            present,
            present.at(reference.get().temperatureC(), reference.get().speedRpm()),
            drifts.get(drifts.size() - 1).reference(),
            history.getOil(latest.charge().oil()).viscosity(),
            days.stream()
                .filter(day -> !day.date().isAfter(latest.sample().day()))
                .map(
                    day ->
                        new DayPoint(day.date().toEpochDay(), day.temperatureC(), day.speedRpm()))
                .toList(),
            settings.duty().uncertaintyC());
    try {
      return Optional.of(forecast.outlook(settings.outlookDays(), usualIntervalDays));
    } catch (IllegalArgumentException outsideTheLaw) {
      return Optional.empty();
    }
  }

  private List<SeasonMonth> season() {
    Map<YearMonth, List<DayKappa>> byMonth = new TreeMap<>();
    days.forEach(
        day ->
            byMonth.computeIfAbsent(YearMonth.from(day.date()), m -> new ArrayList<>()).add(day));
    List<SeasonMonth> months = new ArrayList<>();
    byMonth.forEach((month, ofMonth) -> months.add(month(month, ofMonth)));
    return months;
  }

  private SeasonMonth month(YearMonth month, List<DayKappa> ofMonth) {
    double[] kappas =
        ofMonth.stream()
            .filter(day -> day.kappa().isPresent())
            .mapToDouble(day -> day.kappa().getAsDouble())
            .toArray();
    double temperatureC = median(ofMonth.stream().mapToDouble(DayKappa::temperatureC).toArray());
    double speedRpm = median(ofMonth.stream().mapToDouble(DayKappa::speedRpm).toArray());
    return new SeasonMonth(
        month,
        ofMonth.size(),
        kappas.length == 0 ? OptionalDouble.empty() : OptionalDouble.of(median(kappas)),
        temperatureC,
        withPresentOil(temperatureC, speedRpm));
  }

  private OptionalDouble withPresentOil(double temperatureC, double speedRpm) {
    if (known.isEmpty() || !(speedRpm > 0)) {
      return OptionalDouble.empty();
    }
    OilViscosity oil = known.get(known.size() - 1).viscosity().orElseThrow();
    return films.kappa(oil, new Reference(temperatureC, speedRpm));
  }

  private static double median(double[] values) {
    return new Median().evaluate(values);
  }

  private static Film film(KappaPoint point) {
    return point.film().orElseThrow();
  }

  /** Days since 1970-01-01 with the time of day as a fraction. */
  private static double time(KappaPoint point) {
    var moment = point.sample().sampledAt();
    return moment.toLocalDate().toEpochDay() + moment.toLocalTime().toSecondOfDay() / 86_400.0;
  }
}
