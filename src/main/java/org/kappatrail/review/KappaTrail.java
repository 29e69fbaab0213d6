package org.kappatrail.review;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import org.apache.commons.math3.stat.descriptive.rank.Median;
import org.kappatrail.duty.BearingDuty;
import org.kappatrail.history.Asset;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.Charge;
import org.kappatrail.history.Event;
import org.kappatrail.history.Oil;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Sample;
import org.kappatrail.history.Settings;
import org.kappatrail.review.trend.Trend;

/** Builds the trail of κ of one bearing: a point per sample, and the days between. */
final class KappaTrail {
  private final Bearing bearing;
  private final List<Charge> charges;
  private final List<Event> events;
  private final OilTimeline oil;
  private final PlantHistory history;
  private final Films films;
  private final Lives lives;
  private final OperatingPoints points;
  private final BearingDuty duty;
  private final Asset asset;
  private final Settings settings;

  KappaTrail(
      Asset asset,
      Bearing bearing,
      List<Charge> charges,
      List<Event> events,
      OilTimeline oil,
      PlantHistory history,
      BearingDuty duty,
      Settings settings) {
    this.bearing = bearing;
    this.charges = charges;
    this.events = events;
    this.oil = oil;
    this.history = history;
    this.films = new Films(bearing, settings);
    this.lives = new Lives(asset, bearing);
    this.points = new OperatingPoints(bearing, duty.cells(), settings.duty());
    this.duty = duty;
    this.asset = asset;
    this.settings = settings;
  }

  private record Drawn(Sample sample, Charge charge, OperatingPoint point) {}

  BearingReview review() {
    List<Drawn> drawn = new ArrayList<>();
    for (Charge charge : charges) {
      charge.samples().forEach(sample -> drawn.add(new Drawn(sample, charge, points.of(sample))));
    }
    Optional<Reference> reference = reference(drawn.stream().map(Drawn::point).toList());
    List<DayKappa> days = DailyKappa.of(bearing, duty.cells(), oil);
    HoursBetween hours = new HoursBetween(days, duty.cells().size() > 0);
    List<KappaPoint> trail = drawn.stream().map(item -> point(item, reference, hours)).toList();
    Trend trend =
        new TrendOfTrail(bearing, films, reference, trail, days, history, settings)
            .trend(asset.samplingDays());
    Optional<KappaPoint> latest =
        trail.stream().filter(point -> point.film().isPresent()).reduce((a, b) -> b);
    Optional<LifeSoFar> life =
        new LivesSoFar(
                asset,
                bearing,
                duty.cells(),
                days,
                events,
                drawn.stream().map(Drawn::sample).toList(),
                settings.duty().uncertaintyC())
            .at(latest, trend.outlook());
    return new BearingReview(
        bearing, films.floor(), reference, trail, days, trend, life, duty.dropped());
  }

  private KappaPoint point(Drawn drawn, Optional<Reference> reference, HoursBetween hours) {
    Sample sample = drawn.sample();
    OperatingPoint point = drawn.point();
    Oil fresh = history.getOil(drawn.charge().oil());
    var viscosity = oil.ofSample(sample);
    Optional<Film> film = viscosity.flatMap(known -> films.film(known, point));
    OptionalDouble kappa =
        film.isPresent() ? OptionalDouble.of(film.get().kappa()) : OptionalDouble.empty();
    OptionalDouble kappaReference =
        viscosity.isPresent() && reference.isPresent()
            ? films.kappa(viscosity.get(), reference.get())
            : OptionalDouble.empty();
    HoursBetween.Hours since = hours.upTo(sample.day());
    return new KappaPoint(
        sample,
        drawn.charge(),
        viscosity,
        point,
        film,
        kappaReference,
        lives.of(sample, kappa, point.speedRpm(), fresh.effectiveEp()),
        since.running(),
        since.mixed());
  }

  private static Optional<Reference> reference(List<OperatingPoint> points) {
    List<OperatingPoint> known =
        points.stream().filter(point -> point.temperatureC().isPresent()).toList();
    if (known.isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(
        new Reference(
            median(known, point -> point.temperatureC().getAsDouble()),
            median(known, OperatingPoint::speedRpm)));
  }

  private static double median(
      List<OperatingPoint> points, ToDoubleFunction<OperatingPoint> quantity) {
    return new Median().evaluate(points.stream().mapToDouble(quantity).toArray());
  }
}
