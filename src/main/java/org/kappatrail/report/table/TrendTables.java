package org.kappatrail.report.table;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Review;
import org.kappatrail.review.trend.ChargeDrift;
import org.kappatrail.review.trend.Crossing;
import org.kappatrail.review.trend.Drift;
import org.kappatrail.review.trend.OilShift;
import org.kappatrail.review.trend.Outlook;
import org.kappatrail.review.trend.SampleAttribution;
import tech.tablesaw.api.Table;

/** What moved κ, and how it drifts. */
final class TrendTables {
  private TrendTables() {}

  private record Moved(BearingReview bearing, SampleAttribution item) {}

  private record Row(
      BearingReview bearing,
      ChargeDrift drift,
      String trail,
      Drift found,
      Optional<LocalDate> oilShift,
      Crossing crossing) {}

  /** A row per sample and place from which the change is taken; ln units. */
  static Table attribution(Review review) {
    List<Moved> rows =
        bearings(review).stream()
            .flatMap(
                bearing ->
                    bearing.trend().attributions().stream().map(item -> new Moved(bearing, item)))
            .toList();
    return new TableOf<Moved>("attribution")
        .text("asset", row -> row.bearing().bearing().asset())
        .text("bearing", row -> row.bearing().bearing().id())
        .text("sample", row -> row.item().sample())
        .text("from", row -> row.item().from())
        .number("oil", row -> OptionalDouble.of(row.item().parts().oil()))
        .number("temperature", row -> OptionalDouble.of(row.item().parts().temperature()))
        .number("speed", row -> OptionalDouble.of(row.item().parts().speed()))
        .number("total", row -> OptionalDouble.of(row.item().parts().total()))
        .from(rows);
  }

  /** Two rows per bearing and charge: the trail as achieved and at reference conditions. */
  static Table drift(Review review) {
    List<Row> rows = new ArrayList<>();
    for (BearingReview bearing : bearings(review)) {
      List<ChargeDrift> drifts = bearing.trend().drifts();
      for (int i = 0; i < drifts.size(); i++) {
        ChargeDrift drift = drifts.get(i);
        Optional<Outlook> outlook =
            i == drifts.size() - 1 ? bearing.trend().outlook() : Optional.empty();
        rows.add(
            new Row(
                bearing,
                drift,
                "achieved",
                drift.achieved(),
                Optional.empty(),
                outlook.flatMap(Outlook::withLastYear).orElse(Crossing.NONE)));
        rows.add(
            new Row(
                bearing,
                drift,
                "reference",
                drift.reference(),
                drift.oilShift().map(OilShift::day),
                outlook.map(Outlook::atPresentPoint).orElse(Crossing.NONE)));
      }
    }
    return new TableOf<Row>("drift")
        .text("asset", row -> row.bearing().bearing().asset())
        .text("bearing", row -> row.bearing().bearing().id())
        .whole("charge", row -> row.drift().charge())
        .text("trail", Row::trail)
        .whole("samples", row -> row.found().samples())
        .number("slope_per_30d", row -> row.found().slopePer30Days())
        .number("slope_low", row -> row.found().slopeLowPer30Days())
        .number("slope_high", row -> row.found().slopeHighPer30Days())
        .number("mann_kendall_s", row -> score(row.found()))
        .number("p", row -> row.found().p())
        .text("direction", row -> row.found().direction().label())
        .optionalText("cusum_signal", row -> row.oilShift().map(LocalDate::toString))
        .optionalText(
            "crossing_earliest", row -> row.crossing().earliest().map(LocalDate::toString))
        .optionalText("crossing_likely", row -> row.crossing().likely().map(LocalDate::toString))
        .optionalText("crossing_latest", row -> row.crossing().latest().map(LocalDate::toString))
        .from(rows);
  }

  private static OptionalDouble score(Drift drift) {
    return drift.score().isPresent()
        ? OptionalDouble.of((double) drift.score().getAsLong())
        : OptionalDouble.empty();
  }

  private static List<BearingReview> bearings(Review review) {
    return review.assets().stream().flatMap(asset -> asset.bearings().stream()).toList();
  }
}
