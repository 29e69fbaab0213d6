package org.kappatrail.report.slides;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.Function;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.report.chart.Palette;
import org.kappatrail.review.AssetReview;
import org.kappatrail.tribology.CleanlinessCode;

/** Water on the left axis, particles (ISO 4406 scale numbers) on the right one. */
final class ContaminationTrend {
  private ContaminationTrend() {}

  /** The chart; empty where neither was measured. */
  static Optional<NativeChart> of(AssetReview asset) {
    Optional<ChartSpan> found = ChartSpan.of(asset);
    if (found.isEmpty()) {
      return Optional.empty();
    }
    ChartSpan span = found.get();
    List<Sample> samples =
        asset.samples().stream().filter(sample -> span.covers(sample.day())).toList();
    SortedMap<LocalDate, Double> water = new TreeMap<>();
    for (Sample sample : samples) {
      sample.arithmetic(SampleColumns.WATER).ifPresent(value -> water.put(sample.day(), value));
    }
    SortedMap<LocalDate, Double> fine = numbers(samples, CleanlinessCode::c6);
    SortedMap<LocalDate, Double> coarse = numbers(samples, CleanlinessCode::c14);
    boolean particles = !fine.isEmpty() || !coarse.isEmpty();
    if (water.isEmpty() && !particles) {
      return Optional.empty();
    }
    return Optional.of(chart(span, water, fine, coarse));
  }

  private static NativeChart chart(
      ChartSpan span,
      SortedMap<LocalDate, Double> water,
      SortedMap<LocalDate, Double> fine,
      SortedMap<LocalDate, Double> coarse) {
    ChartSheet sheet = new ChartSheet();
    List<ChartSeries> series = new ArrayList<>();
    if (!water.isEmpty()) {
      series.add(
          ChartSeries.line(sheet.add("water, mg/kg", water), Palette.WATER, 2).marked("circle"));
    }
    boolean right = !water.isEmpty();
    particles(sheet, series, "code ≥ 6 µm", fine, "diamond", right);
    particles(sheet, series, "code ≥ 14 µm", coarse, "square", right);
    List<Double> codes = new ArrayList<>(fine.values());
    codes.addAll(coarse.values());
    Optional<ValueAxis> axis =
        codes.isEmpty()
            ? Optional.empty()
            : Optional.of(
                ValueAxis.whole(
                    codes.stream().mapToDouble(code -> code).min().orElseThrow(),
                    codes.stream().mapToDouble(code -> code).max().orElseThrow(),
                    Palette.PARTICLES));
    Optional<ValueAxis> waterAxis =
        water.values().stream()
            .max(Double::compare)
            .map(most -> ValueAxis.fromZero(Math.max(most, 1), Palette.WATER));
    // Days of both charts, so that their axes are one.
    sheet.add("calendar", new TreeMap<>(Map.of(span.from(), 0.0, span.to(), 0.0)));
    return new NativeChart(
        "Contamination",
        "Water and cleanliness code (ISO 4406) of the same samples against time; the numbers are in the chart's data"
            + " sheet",
        sheet,
        series,
        span,
        waterAxis.or(() -> axis).orElseThrow(),
        right ? axis : Optional.empty());
  }

  private static void particles(
      ChartSheet sheet,
      List<ChartSeries> series,
      String name,
      SortedMap<LocalDate, Double> codes,
      String marker,
      boolean right) {
    if (codes.isEmpty()) {
      return;
    }
    ChartSeries line =
        ChartSeries.line(sheet.add(name, codes), Palette.PARTICLES, 1.25).marked(marker);
    series.add(right ? line.onRight() : line);
  }

  private static SortedMap<LocalDate, Double> numbers(
      List<Sample> samples, Function<CleanlinessCode, CleanlinessCode.Part> part) {
    SortedMap<LocalDate, Double> numbers = new TreeMap<>();
    for (Sample sample : samples) {
      OptionalInt number =
          sample
              .cleanliness()
              .map(part)
              .map(CleanlinessCode.Part::effectiveNumber)
              .orElse(OptionalInt.empty());
      number.ifPresent(value -> numbers.put(sample.day(), (double) value));
    }
    return numbers;
  }
}
