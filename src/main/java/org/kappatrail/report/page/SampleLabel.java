package org.kappatrail.report.page;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Film;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.Moved;
import org.kappatrail.review.OperatingPoint;
import org.kappatrail.review.trend.SampleAttribution;

/** What is told of a sample where a reader points at it on the chart, a line for each matter. */
final class SampleLabel {
  private SampleLabel() {}

  static String of(Sample sample, Optional<BearingReview> bearing) {
    List<String> lines = new ArrayList<>();
    lines.add(sample.id() + " · " + sample.sampledAtText().replace('T', ' '));
    Optional<KappaPoint> point =
        bearing.flatMap(
            found ->
                found.trail().stream()
                    .filter(item -> item.sample().id().equals(sample.id()))
                    .findFirst());
    point.flatMap(KappaPoint::film).ifPresent(film -> lines.add(kappa(film)));
    bearing.flatMap(found -> moved(found, sample)).ifPresent(lines::add);
    join(
        lines,
        value("ν40 ", Measured.text(sample, SampleColumns.VISCOSITY_40C, 4), " mm²/s"),
        value(
            "ν ",
            point
                .flatMap(KappaPoint::film)
                .map(film -> Numbers.significant(film.operatingCst(), 3))
                .orElse(""),
            " mm²/s"));
    point.ifPresent(found -> operating(lines, found.point()));
    join(
        lines,
        value("water ", Measured.text(sample, SampleColumns.WATER, 3), " mg/kg"),
        value("", sample.cleanliness().map(Object::toString).orElse(""), ""),
        value("iron ", Measured.text(sample, SampleColumns.IRON, 3), " mg/kg"));
    return String.join("\n", lines);
  }

  private static String kappa(Film film) {
    return "κ "
        + Numbers.significant(film.kappa(), 3)
        + " ("
        + FleetTable.interval(film)
        + "), "
        + film.regime().label()
        + ", "
        + film.level().label();
  }

  private static void operating(List<String> lines, OperatingPoint at) {
    String temperature = Numbers.fixed(at.temperatureC(), 1);
    if (!temperature.isEmpty()) {
      lines.add(
          temperature
              + " °C ("
              + at.temperatureSource().label()
              + "), "
              + Numbers.fixed(at.speedRpm(), 0)
              + " r/min ("
              + at.speedSource().label()
              + ")");
    }
  }

  /** What moved κ since the sample before. */
  private static Optional<String> moved(BearingReview bearing, Sample sample) {
    return bearing.trend().attributions().stream()
        .filter(item -> item.sample().equals(sample.id()))
        .filter(item -> !item.from().equals(SampleAttribution.CHARGE_START))
        .filter(item -> !item.from().equals(SampleAttribution.FRESH_OIL))
        .findFirst()
        .map(item -> Moved.words(item.parts()) + ", since " + item.from());
  }

  private static String value(String name, String value, String unit) {
    return value.isEmpty() ? "" : name + value + unit;
  }

  private static void join(List<String> lines, String... parts) {
    String line = String.join("; ", List.of(parts).stream().filter(p -> !p.isEmpty()).toList());
    if (!line.isEmpty()) {
      lines.add(line);
    }
  }
}
