package org.kappatrail.report.chart;

import java.awt.BasicStroke;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.trend.ChargeDrift;
import org.kappatrail.review.trend.Crossing;
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
    beginOfOutlook(canvas);
    crossing(canvas);
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

  /** The present charge: its drift, first, median and last day. */
  private record Charge(Drift drift, double from, double middle, double to) {}

  private Optional<Charge> charge() {
    Optional<KappaPoint> latest = bearing.latestFilm();
    if (latest.isEmpty()) {
      return Optional.empty();
    }
    int number = latest.get().charge().number();
    double[] days =
        bearing.trail().stream()
            .filter(point -> point.film().isPresent() && point.charge().number() == number)
            .mapToDouble(point -> point.sample().day().toEpochDay())
            .toArray();
    double from = days[0];
    double middle = (days[(days.length - 1) / 2] + days[days.length / 2]) / 2;
    double to = latest.get().sample().day().toEpochDay();
    return bearing
        .trend()
        .drift(number)
        .map(ChargeDrift::achieved)
        .filter(drift -> drift.slopePer30Days().isPresent())
        .map(drift -> new Charge(drift, from, middle, to));
  }

  private void limits(Canvas canvas) {
    Optional<Charge> found = charge();
    if (found.isEmpty()) {
      return;
    }
    Charge charge = found.get();
    Drift drift = charge.drift();
    OptionalDouble low = drift.slopeLowPer30Days();
    OptionalDouble high = drift.slopeHighPer30Days();
    if (low.isEmpty() || high.isEmpty()) {
      return;
    }
    double middle = charge.middle();
    double[] days = new double[STEPS + 1];
    double[] bottom = new double[STEPS + 1];
    double[] top = new double[STEPS + 1];
    for (int i = 0; i <= STEPS; i++) {
      days[i] = charge.from() + i * (charge.to() - charge.from()) / STEPS;
      double months = (days[i] - middle) / Drift.SLOPE_DAYS;
      double steep = at(drift, middle) + low.getAsDouble() * months;
      double flat = at(drift, middle) + high.getAsDouble() * months;
      bottom[i] = Math.exp(Math.min(steep, flat));
      top[i] = Math.exp(Math.max(steep, flat));
    }
    canvas.ribbon(days, bottom, top, Palette.wash(Palette.KAPPA, 0.12));
    BasicStroke hair = new BasicStroke(0.5f);
    canvas.polyline(days, bottom, Palette.wash(Palette.KAPPA, 0.5), hair);
    canvas.polyline(days, top, Palette.wash(Palette.KAPPA, 0.5), hair);
  }

  private static double at(Drift drift, double day) {
    return drift.lnKappaOn(day).orElseThrow();
  }

  private void line(Canvas canvas) {
    charge()
        .ifPresent(
            charge ->
                canvas.polyline(
                    new double[] {charge.from(), charge.to()},
                    new double[] {
                      Math.exp(at(charge.drift(), charge.from())),
                      Math.exp(at(charge.drift(), charge.to()))
                    },
                    Palette.wash(Palette.KAPPA, 0.8),
                    new BasicStroke(1f)));
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

  /** When the floor is reached: a bar from earliest to latest, a diamond where it is likely. */
  private void crossing(Canvas canvas) {
    Crossing crossing =
        bearing.trend().outlook().map(Outlook::atPresentPoint).orElse(Crossing.NONE);
    LocalDate last = bearing.latestFilm().map(point -> point.sample().day()).orElse(LocalDate.MIN);
    double right = canvas.plot().getMaxX();
    double y = canvas.y(bearing.floor());
    if (crossing.earliest().isPresent() && crossing.earliest().get().isAfter(last)) {
      double from = canvas.x((double) crossing.earliest().get().toEpochDay());
      double to =
          crossing
              .latest()
              .map(day -> Math.min(right, canvas.x((double) day.toEpochDay())))
              .orElse(right);
      if (from < right) {
        canvas.line(from, y, to, y, Palette.KAPPA, new BasicStroke(3f));
      }
    }
    if (crossing.likely().isPresent() && crossing.likely().get().isAfter(last)) {
      double at = canvas.x((double) crossing.likely().get().toEpochDay());
      if (at < right) {
        canvas.diamond(at, y, 4.5, Palette.KAPPA);
      }
    }
  }

  private void beginOfOutlook(Canvas canvas) {
    List<FanPoint> fan = fan(bearing);
    if (fan.isEmpty()) {
      return;
    }
    double x = canvas.x((double) fan.get(0).date().toEpochDay());
    double right = canvas.plot().getMaxX();
    String label = "outlook";
    if (right - x > canvas.widthOf(label, 11.5f) + 12) {
      canvas.text(label, x + 8, canvas.plot().getMaxY() - 5, Palette.QUIET_INK, 11.5f);
    }
    canvas.line(
        x + 3,
        canvas.plot().getMinY(),
        x + 3,
        canvas.plot().getMaxY(),
        Palette.QUIET_INK,
        new BasicStroke(0.8f, 0, 0, 10, new float[] {1.5f, 4}, 0));
  }

  /** The trend in words, and the season's dip where it lies beyond the time shown. */
  String note(TimeSpan span) {
    List<String> parts = new ArrayList<>();
    charge().map(Charge::drift).ifPresent(drift -> parts.add(words(drift)));
    bearing
        .trend()
        .outlook()
        .flatMap(Outlook::dip)
        .filter(dip -> dip.from().isAfter(span.to()))
        .ifPresent(
            dip ->
                parts.add(
                    String.format(
                        Locale.ROOT,
                        "season brings κ %.2f between %s and %s",
                        dip.leastKappa(),
                        dip.from(),
                        dip.to())));
    return String.join("; ", parts);
  }

  private static String words(Drift drift) {
    String slope = "trend of this charge " + percent(drift.slopePer30Days()) + " in 30 days";
    String limits =
        drift.slopeLowPer30Days().isPresent() && drift.slopeHighPer30Days().isPresent()
            ? " ("
                + percent(drift.slopeLowPer30Days())
                + " to "
                + percent(drift.slopeHighPer30Days())
                + ")"
            : "";
    return slope + limits + ", " + drift.direction().label();
  }

  private static String percent(OptionalDouble lnPer30Days) {
    String number =
        String.format(Locale.ROOT, "%+.1f %%", 100 * Math.expm1(lnPer30Days.getAsDouble()));
    return number.matches("[+-]0\\.0 %") ? "0 %" : number.replace('-', '−');
  }
}
