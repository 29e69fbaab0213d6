package org.kappatrail.report.chart;

import java.awt.BasicStroke;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.trend.ChargeDrift;
import org.kappatrail.review.trend.Drift;
import org.kappatrail.review.trend.FanPoint;
import org.kappatrail.review.trend.Outlook;
import org.kappatrail.review.trend.SeasonalDip;

/**
 * Draws on the κ panel where the present charge is going: the line of the achieved trail with its
 * limits, which turn about the middle of the charge, the outlook's fan to the horizon, and the dip
 * that the season brings.
 */
final class TrendOnPanel {
  private static final int STEPS = 24;

  private final BearingReview bearing;

  TrendOnPanel(BearingReview bearing) {
    this.bearing = bearing;
  }

  /** Day up to which the fan reaches; empty without one. */
  static Optional<Long> lastDay(BearingReview bearing) {
    List<FanPoint> fan = fan(bearing);
    return fan.isEmpty()
        ? Optional.empty()
        : Optional.of(fan.get(fan.size() - 1).date().toEpochDay());
  }

  /** Values that the axis must hold. */
  static List<Double> values(BearingReview bearing) {
    return fan(bearing).stream().map(FanPoint::likely).toList();
  }

  private static List<FanPoint> fan(BearingReview bearing) {
    return bearing.trend().outlook().map(Outlook::fan).orElse(List.of());
  }

  void under(Canvas canvas) {
    fanWash(canvas);
    limits(canvas);
  }

  void over(Canvas canvas) {
    line(canvas);
    List<FanPoint> fan = fan(bearing);
    canvas.polyline(
        fan.stream().mapToDouble(point -> point.date().toEpochDay()).toArray(),
        fan.stream().mapToDouble(FanPoint::likely).toArray(),
        Palette.KAPPA,
        AssetChart.dashed(1.3f));
    bearing.trend().outlook().flatMap(Outlook::dip).ifPresent(dip -> dip(canvas, dip));
  }

  private void fanWash(Canvas canvas) {
    List<FanPoint> fan =
        fan(bearing).stream()
            .filter(point -> point.low().isPresent() && point.high().isPresent())
            .toList();
    canvas.ribbon(
        fan.stream().mapToDouble(point -> point.date().toEpochDay()).toArray(),
        fan.stream().mapToDouble(point -> point.low().getAsDouble()).toArray(),
        fan.stream().mapToDouble(point -> point.high().getAsDouble()).toArray(),
        Palette.wash(Palette.KAPPA, 0.2));
  }

  private record Charge(Drift drift, double from, double to) {}

  private Optional<Charge> charge() {
    Optional<KappaPoint> latest = bearing.latestFilm();
    if (latest.isEmpty()) {
      return Optional.empty();
    }
    int number = latest.get().charge().number();
    double from =
        bearing.trail().stream()
            .filter(point -> point.film().isPresent() && point.charge().number() == number)
            .mapToDouble(point -> point.sample().day().toEpochDay())
            .min()
            .orElseThrow();
    double to = latest.get().sample().day().toEpochDay();
    return bearing
        .trend()
        .drift(number)
        .map(ChargeDrift::achieved)
        .filter(drift -> drift.line().isPresent())
        .map(drift -> new Charge(drift, from, to));
  }

  private void limits(Canvas canvas) {
    Optional<Charge> found = charge();
    if (found.isEmpty()) {
      return;
    }
    Charge charge = found.get();
    var line = charge.drift().line().orElseThrow();
    OptionalDouble low = line.slopeLow();
    OptionalDouble high = line.slopeHigh();
    if (low.isEmpty() || high.isEmpty()) {
      return;
    }
    double middle = (charge.from() + charge.to()) / 2;
    double[] days = new double[STEPS + 1];
    double[] bottom = new double[STEPS + 1];
    double[] top = new double[STEPS + 1];
    for (int i = 0; i <= STEPS; i++) {
      days[i] = charge.from() + i * (charge.to() - charge.from()) / STEPS;
      double steep = line.at(middle) + low.getAsDouble() * (days[i] - middle);
      double flat = line.at(middle) + high.getAsDouble() * (days[i] - middle);
      bottom[i] = Math.exp(Math.min(steep, flat));
      top[i] = Math.exp(Math.max(steep, flat));
    }
    canvas.ribbon(days, bottom, top, Palette.wash(Palette.KAPPA, 0.14));
  }

  private void line(Canvas canvas) {
    charge()
        .ifPresent(
            charge -> {
              var line = charge.drift().line().orElseThrow();
              canvas.polyline(
                  new double[] {charge.from(), charge.to()},
                  new double[] {
                    Math.exp(line.at(charge.from())), Math.exp(line.at(charge.to()))
                  },
                  Palette.wash(Palette.KAPPA, 0.8),
                  new BasicStroke(1f));
            });
  }

  /** The dip as a bar at the floor, where it falls within the time shown. */
  private void dip(Canvas canvas, SeasonalDip dip) {
    double from = canvas.x((double) dip.from().toEpochDay());
    double to = Math.min(canvas.x((double) dip.to().toEpochDay()), canvas.plot().getMaxX());
    if (from >= canvas.plot().getMaxX()) {
      return;
    }
    double y = canvas.y(bearing.floor());
    canvas.line(from, y, to, y, Palette.TEMPERATURE, new BasicStroke(4f));
    canvas.textCentred("season", (from + to) / 2, y - 7, Palette.TEMPERATURE, 11f);
  }
}
