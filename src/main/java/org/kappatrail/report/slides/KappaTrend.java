package org.kappatrail.report.slides;

import java.awt.Color;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.ToDoubleFunction;
import org.kappatrail.history.Charge;
import org.kappatrail.report.chart.Palette;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Film;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.trend.FanPoint;
import org.kappatrail.tribology.LubricationRegime;

/**
 * κ of the governing bearing at its samples with intervals, floor, outlook and oil changes; the
 * other bearings thin.
 */
final class KappaTrend {
  /** More lines than this cannot be told apart. */
  private static final int MOST_OTHERS = 2;

  /** Half the height of a name in the plot, as a share of the plot's. */
  private static final double NAME_SHARE = 0.06;

  /** Share of the span from which there is no room for a name at the right. */
  private static final double LATE = 0.7;

  private static final int LONGEST_NAME = 14;

  private final AssetReview asset;
  private final BearingReview shown;
  private final ChartSpan span;
  private final ChartSheet sheet = new ChartSheet();
  private final List<ChartSeries> series = new ArrayList<>();

  private KappaTrend(AssetReview asset, BearingReview shown, ChartSpan span) {
    this.asset = asset;
    this.shown = shown;
    this.span = span;
  }

  /** The chart; empty where no κ is known. */
  static Optional<NativeChart> of(AssetReview asset) {
    Optional<ChartSpan> span = ChartSpan.of(asset);
    Optional<BearingReview> governing = asset.governing();
    return span.isEmpty() || governing.isEmpty()
        ? Optional.empty()
        : Optional.of(new KappaTrend(asset, governing.get(), span.get()).chart());
  }

  private NativeChart chart() {
    SortedMap<LocalDate, Double> kappa = films(shown, Film::kappa);
    SortedMap<LocalDate, Double> low = films(shown, film -> film.uncertainty().low());
    SortedMap<LocalDate, Double> high = films(shown, film -> film.uncertainty().high());
    List<FanPoint> fan = shown.trend().outlook().map(outlook -> outlook.fan()).orElse(List.of());
    ValueAxis axis = axis(low, high, fan);
    bands(axis);
    String name = shortened(shown.bearing().id());
    int line = sheet.add(name, kappa);
    int up = sheet.add("up to 97.5 %", difference(high, kappa));
    int down = sheet.add("down to 2.5 %", difference(kappa, low));
    thinLines();
    int floor =
        sheet.add(
            "floor " + Words.floor(shown.floor()),
            new TreeMap<>(Map.of(span.from(), shown.floor(), span.to(), shown.floor())));
    series.add(ChartSeries.line(floor, Palette.INK, 1.25).dashed("dash"));
    outlook(fan);
    changes(axis);
    series.add(
        ChartSeries.line(line, Palette.KAPPA, 2)
            .marked("circle")
            .whiskers(up, down, Palette.KAPPA));
    return new NativeChart(
        "κ = ν/ν1",
        "κ of "
            + name
            + " against time on a logarithmic axis, with its 95 % intervals, floor and outlook;"
            + " the numbers are in the chart's data sheet",
        sheet,
        series,
        span,
        axis,
        Optional.empty());
  }

  private ValueAxis axis(
      SortedMap<LocalDate, Double> low, SortedMap<LocalDate, Double> high, List<FanPoint> fan) {
    List<Double> values = new ArrayList<>(List.of(shown.floor(), 1.0));
    values.addAll(low.values());
    values.addAll(high.values());
    fan.forEach(point -> values.add(point.likely()));
    others().forEach(other -> values.addAll(films(other, Film::kappa).values()));
    double least = values.stream().mapToDouble(value -> value).min().orElseThrow();
    double most = values.stream().mapToDouble(value -> value).max().orElseThrow();
    return ValueAxis.log(Math.max(least, 0.03), Math.min(most, 60), Palette.KAPPA);
  }

  /**
   * Regimes as washes on top of one another, named at the right, away from where the trail begins.
   */
  private void bands(ValueAxis axis) {
    band(axis, "boundary", 0, LubricationRegime.MIXED_FROM, Palette.BOUNDARY_WASH);
    band(
        axis,
        "mixed",
        LubricationRegime.MIXED_FROM,
        LubricationRegime.FULL_FILM_FROM,
        Palette.MIXED_WASH);
    band(axis, "full film", LubricationRegime.FULL_FILM_FROM, axis.high(), Palette.FILM_WASH);
  }

  private void band(ValueAxis axis, String name, double from, double to, Color wash) {
    double low = Math.max(from, axis.low());
    double high = Math.min(to, axis.high());
    if (high <= low) {
      return;
    }
    double height = low > axis.low() ? high - low : high;
    SortedMap<LocalDate, Double> band = new TreeMap<>();
    band.put(span.from(), height);
    band.put(span.to(), height);
    series.add(ChartSeries.area(sheet.add(name + ", width of band", band), wash));
    double edge = Math.pow(axis.high() / axis.low(), NAME_SHARE);
    if (high / low > edge * edge) {
      SortedMap<LocalDate, Double> place = new TreeMap<>();
      place.put(span.to(), high == axis.high() ? high / edge : low * edge);
      series.add(ChartSeries.name(sheet.add(name, place), Palette.QUIET_INK, "l"));
    }
  }

  private List<BearingReview> others() {
    return asset.bearings().stream()
        .filter(bearing -> !bearing.bearing().id().equals(shown.bearing().id()))
        .filter(bearing -> !films(bearing, Film::kappa).isEmpty())
        .limit(MOST_OTHERS)
        .toList();
  }

  private void thinLines() {
    for (BearingReview other : others()) {
      int line = sheet.add(shortened(other.bearing().id()), films(other, Film::kappa));
      series.add(ChartSeries.line(line, Palette.wash(Palette.KAPPA, 0.5), 1));
    }
  }

  private void outlook(List<FanPoint> fan) {
    if (fan.isEmpty()) {
      return;
    }
    Color thin = Palette.wash(Palette.KAPPA, 0.6);
    series.add(
        ChartSeries.line(
                sheet.add("outlook", fan(fan, point -> OptionalDouble.of(point.likely()))),
                Palette.KAPPA,
                1.5)
            .dashed("sysDot"));
    for (boolean lower : new boolean[] {true, false}) {
      SortedMap<LocalDate, Double> edge = fan(fan, point -> lower ? point.low() : point.high());
      if (!edge.isEmpty()) {
        series.add(
            ChartSeries.line(
                    sheet.add(lower ? "outlook, lower" : "outlook, upper", edge), thin, 0.75)
                .dashed("sysDot")
                .unnamed());
      }
    }
  }

  /** Oil changes as lines over the whole height, named once. */
  private void changes(ValueAxis axis) {
    SortedMap<LocalDate, Double> at = new TreeMap<>();
    SortedMap<LocalDate, Double> up = new TreeMap<>();
    SortedMap<LocalDate, Double> down = new TreeMap<>();
    double height = axis.high() / Math.pow(axis.high() / axis.low(), NAME_SHARE);
    for (Charge charge : asset.charges()) {
      charge
          .start()
          .filter(span::covers)
          .ifPresent(
              day -> {
                at.put(day, height);
                up.put(day, axis.high() - height);
                down.put(day, height - axis.low());
              });
    }
    if (at.isEmpty()) {
      return;
    }
    LocalDate last = at.lastKey();
    boolean late =
        last.toEpochDay() - span.from().toEpochDay()
            > LATE * (span.to().toEpochDay() - span.from().toEpochDay());
    int lines = sheet.add("oil changes", at);
    series.add(
        ChartSeries.name(lines, Palette.INK, "")
            .whiskers(
                sheet.add("oil changes, up", up),
                sheet.add("oil changes, down", down),
                Palette.QUIET_INK));
    SortedMap<LocalDate, Double> named = new TreeMap<>(at.tailMap(last));
    series.add(
        ChartSeries.name(sheet.add("oil change", named), Palette.QUIET_INK, late ? "l" : "r"));
  }

  private SortedMap<LocalDate, Double> films(
      BearingReview bearing, ToDoubleFunction<Film> quantity) {
    SortedMap<LocalDate, Double> values = new TreeMap<>();
    for (KappaPoint point : bearing.trail()) {
      point
          .film()
          .filter(film -> span.covers(point.sample().day()))
          .ifPresent(film -> values.put(point.sample().day(), quantity.applyAsDouble(film)));
    }
    return values;
  }

  private interface Edge {
    OptionalDouble of(FanPoint point);
  }

  private static SortedMap<LocalDate, Double> fan(List<FanPoint> fan, Edge edge) {
    SortedMap<LocalDate, Double> values = new TreeMap<>();
    for (FanPoint point : fan) {
      edge.of(point).ifPresent(value -> values.put(point.date(), value));
    }
    return values;
  }

  private static SortedMap<LocalDate, Double> difference(
      SortedMap<LocalDate, Double> more, SortedMap<LocalDate, Double> less) {
    SortedMap<LocalDate, Double> values = new TreeMap<>();
    more.forEach((day, value) -> values.put(day, value - less.getOrDefault(day, value)));
    return values;
  }

  private static String shortened(String name) {
    String shown = Words.name(name);
    return shown.codePointCount(0, shown.length()) <= LONGEST_NAME
        ? shown
        : shown.substring(0, shown.offsetByCodePoints(0, LONGEST_NAME - 1)) + "…";
  }
}
