package org.kappatrail.report.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.DayKappa;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.Review;
import org.kappatrail.tribology.Iso3448;
import org.kappatrail.tribology.OilViscosity;
import org.knowm.xchart.style.markers.SeriesMarkers;

/** The chart of one asset: κ beside what moves it and what goes with it, on one time axis. */
public final class AssetChart {
  private static final int SMALL = 118;

  private final AssetReview asset;
  private final TimeSpan span;

  private AssetChart(AssetReview asset, TimeSpan span) {
    this.asset = asset;
    this.span = span;
  }

  /** The chart; empty for an asset with neither sample nor log. */
  public static Optional<Drawing> of(Review review, AssetReview asset) {
    Optional<TimeSpan> span = span(asset);
    return span.map(known -> new AssetChart(asset, known).stack(review))
        .filter(stack -> !stack.panels().isEmpty())
        .map(stack -> stack);
  }

  private static Optional<TimeSpan> span(AssetReview asset) {
    List<LocalDate> days =
        Stream.concat(
                asset.samples().stream().map(Sample::day),
                asset.bearings().stream()
                    .flatMap(bearing -> bearing.days().stream())
                    .map(DayKappa::date))
            .sorted()
            .toList();
    if (days.isEmpty()) {
      return Optional.empty();
    }
    LocalDate last = days.get(days.size() - 1).plusDays(6);
    LocalDate foreseen =
        shown(asset)
            .flatMap(TrendOnPanel::lastDay)
            .map(day -> LocalDate.ofEpochDay(day).plusDays(2))
            .orElse(last);
    return Optional.of(
        new TimeSpan(days.get(0).minusDays(6), foreseen.isAfter(last) ? foreseen : last));
  }

  private PanelStack stack(Review review) {
    String site = review.settings().site();
    PanelStack stack =
        new PanelStack(
            asset.asset().id() + " · " + asset.asset().name(),
            subtitle(),
            (site.isEmpty() ? "" : site + "; ")
                + "samples and logs up to "
                + review.asOf()
                + "; κ by ISO 281, viscosity by ASTM D341; whiskers: 95 %; fan: the oil's own drift where it runs",
            span,
            EventMark.of(asset));
    stack.samples(asset.samples());
    Optional<BearingReview> shown = shown(asset);
    shown.ifPresent(bearing -> KappaPanel.of(asset, bearing, span).ifPresent(stack::add));
    stack.add(viscosity());
    shown.ifPresent(bearing -> stack.add(temperature(bearing)));
    stack.add(measured("Water, mg/kg", SampleColumns.WATER, Palette.WATER));
    stack.add(ParticlePanel.of(asset.samples(), span));
    stack.add(measured("Iron, mg/kg", SampleColumns.IRON, Palette.IRON));
    return stack;
  }

  private String subtitle() {
    String bearing =
        asset
            .governing()
            .map(governing -> "κ of bearing " + governing.bearing().id())
            .orElse("no κ known");
    int others = asset.bearings().size() - (asset.governing().isPresent() ? 1 : 0);
    String rest =
        others > 0 && asset.governing().isPresent() ? ", the worst of " + (others + 1) : "";
    return bearing + rest + "; oil " + asset.oil().id();
  }

  private static Optional<BearingReview> shown(AssetReview asset) {
    Optional<BearingReview> governing = asset.governing();
    return governing.isPresent() ? governing : asset.bearings().stream().findFirst();
  }

  private Panel viscosity() {
    record At(double day, double cst) {}
    List<At> known = new ArrayList<>();
    for (Sample sample : asset.samples()) {
      OptionalDouble v40 = sample.exact(SampleColumns.VISCOSITY_40C);
      if (v40.isPresent()) {
        known.add(new At(sample.day().toEpochDay(), v40.getAsDouble()));
      }
    }
    OilViscosity fresh = asset.oil().viscosity();
    Optional<Iso3448.Grade> grade =
        asset.oil().gradeVg().isPresent()
            ? Iso3448.find(asset.oil().gradeVg().getAsInt())
            : Optional.empty();
    double least = known.stream().mapToDouble(At::cst).min().orElse(fresh.viscosity40Cst());
    double most = known.stream().mapToDouble(At::cst).max().orElse(fresh.viscosity40Cst());
    Axis axis =
        Axis.linear(
            Math.min(least, grade.map(Iso3448.Grade::minCst).orElse(fresh.viscosity40Cst())),
            Math.max(most, grade.map(Iso3448.Grade::maxCst).orElse(fresh.viscosity40Cst())));
    Panel panel =
        new Panel("Viscosity at 40 °C, mm²/s", Palette.VISCOSITY, SMALL, span, axis)
            .series(
                "viscosity at 40 °C",
                known.stream().mapToDouble(At::day).toArray(),
                known.stream().mapToDouble(At::cst).toArray(),
                Palette.VISCOSITY,
                1.4f,
                SeriesMarkers.CIRCLE);
    Color wash = Palette.wash(Palette.VISCOSITY, 0.13);
    grade.ifPresent(
        found ->
            panel
                .under(canvas -> canvas.band(found.minCst(), found.maxCst(), wash))
                .over(
                    canvas ->
                        canvas.text(
                            "ISO VG " + found.vg(),
                            canvas.plot().getMaxX() + 6,
                            canvas.y(found.midpointCst()) + 4,
                            Palette.VISCOSITY,
                            11.5f)));
    return panel;
  }

  private Panel temperature(BearingReview bearing) {
    List<DayKappa> days = bearing.days();
    double[] x = days.stream().mapToDouble(day -> day.date().toEpochDay() + 0.5).toArray();
    double[] y = days.stream().mapToDouble(DayKappa::temperatureC).toArray();
    Points samples =
        Points.of(
            bearing.trail(),
            point -> point.sample().day().toEpochDay(),
            point -> point.point().temperatureC());
    if (samples.isEmpty() && y.length == 0) {
      return new Panel("", Palette.TEMPERATURE, SMALL, span, Axis.linear(0, 1));
    }
    double least = Math.min(least(y), samples.isEmpty() ? least(y) : samples.least());
    double most = Math.max(most(y), samples.isEmpty() ? most(y) : samples.most());
    return new Panel(
            "Operating temperature, °C (" + bearing.bearing().id() + ")",
            Palette.TEMPERATURE,
            SMALL,
            span,
            Axis.linear(least, most))
        .under(canvas -> DayLine.draw(canvas, x, y, Palette.wash(Palette.TEMPERATURE, 0.5), 1f))
        .series(
            "temperature at samples",
            samples.days(),
            samples.values(),
            Palette.TEMPERATURE,
            0,
            SeriesMarkers.CIRCLE)
        .series("temperature by day", x, y, new Color(0, 0, 0, 0), 0, SeriesMarkers.NONE);
  }

  private Panel measured(String label, String column, Color colour) {
    Points points =
        Points.of(
            asset.samples(),
            sample -> sample.day().toEpochDay(),
            sample -> sample.arithmetic(column));
    Axis axis =
        points.isEmpty()
            ? Axis.linear(0, 1)
            : Axis.linear(Math.min(0, points.least()), points.most());
    Panel panel =
        new Panel(label, colour, SMALL, span, axis)
            .series(
                label.toLowerCase(Locale.ROOT),
                points.days(),
                points.values(),
                colour,
                1.4f,
                SeriesMarkers.CIRCLE);
    List<Sample> censored =
        asset.samples().stream()
            .filter(sample -> sample.find(column).filter(value -> value.censored()).isPresent())
            .toList();
    return panel.over(
        canvas -> {
          for (Sample sample : censored) {
            double value = sample.arithmetic(column).getAsDouble();
            canvas.ring((double) sample.day().toEpochDay(), value, colour);
          }
        });
  }

  private static double least(double[] values) {
    return java.util.Arrays.stream(values).min().orElse(Double.POSITIVE_INFINITY);
  }

  private static double most(double[] values) {
    return java.util.Arrays.stream(values).max().orElse(Double.NEGATIVE_INFINITY);
  }

  /** Line of one bearing's κ at its samples. */
  static Points kappaPoints(BearingReview bearing) {
    return Points.of(
        bearing.trail(), point -> point.sample().day().toEpochDay(), AssetChart::kappa);
  }

  private static OptionalDouble kappa(KappaPoint point) {
    return point.film().isPresent()
        ? OptionalDouble.of(point.film().get().kappa())
        : OptionalDouble.empty();
  }

  static BasicStroke dashed(float width) {
    return new BasicStroke(width, 0, 0, 10, new float[] {7, 4}, 0);
  }
}
