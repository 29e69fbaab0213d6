package org.kappatrail.report.table;

import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import org.kappatrail.history.Problem;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.DayKappa;
import org.kappatrail.review.Film;
import org.kappatrail.review.Finding;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.Level;
import org.kappatrail.review.Review;
import org.kappatrail.tribology.ContaminationFactor;
import org.kappatrail.tribology.LubricationRegime;
import org.kappatrail.tribology.OilViscosity;
import tech.tablesaw.api.Table;

/** The tables of a review as the pack carries them; names and order of columns are fixed. */
public final class ReviewTables {
  private ReviewTables() {}

  /** Every table of the pack but that of the days; a table's name is its file's. */
  public static List<Table> all(Review review) {
    return List.of(
        kappaHistory(review),
        TrendTables.attribution(review),
        TrendTables.drift(review),
        CorrelationTable.of(review),
        DecisionTables.verdicts(review),
        DecisionTables.remedies(review),
        findings(review),
        problems(review));
  }

  /** A sample seen from a bearing. */
  private record Row(BearingReview bearing, KappaPoint point) {
    OptionalDouble film(ToDoubleFunction<Film> quantity) {
      return point.film().isPresent()
          ? OptionalDouble.of(quantity.applyAsDouble(point.film().get()))
          : OptionalDouble.empty();
    }

    OptionalDouble oil(ToDoubleFunction<OilViscosity> quantity) {
      return point.viscosity().isPresent()
          ? OptionalDouble.of(quantity.applyAsDouble(point.viscosity().get()))
          : OptionalDouble.empty();
    }
  }

  private record DayRow(BearingReview bearing, DayKappa day) {}

  /** A row per sample and bearing. */
  public static Table kappaHistory(Review review) {
    List<Row> rows =
        bearings(review)
            .flatMap(bearing -> bearing.trail().stream().map(point -> new Row(bearing, point)))
            .toList();
    return new TableOf<Row>("kappa-history")
        .text("asset", row -> row.bearing().bearing().asset())
        .text("bearing", row -> row.bearing().bearing().id())
        .text("sample", row -> row.point().sample().id())
        .text("sampled_at", row -> row.point().sample().sampledAtText())
        .whole("charge", row -> row.point().charge().number())
        .text("oil", row -> row.point().charge().oil())
        .number("oil_hours", row -> row.point().sample().exact(SampleColumns.OIL_HOURS))
        .number("viscosity_40c_cst", row -> row.oil(OilViscosity::viscosity40Cst))
        .number("viscosity_100c_cst", row -> row.oil(OilViscosity::viscosity100Cst))
        .optionalText(
            "viscosity_100c_source",
            row ->
                row.point().viscosity().map(OilViscosity::source).map(OilViscosity.Source::label))
        .number("temperature_c", row -> row.point().point().temperatureC())
        .text("temperature_source", row -> row.point().point().temperatureSource().label())
        .number("speed_rpm", row -> OptionalDouble.of(row.point().point().speedRpm()))
        .text("speed_source", row -> row.point().point().speedSource().label())
        .number("operating_viscosity_cst", row -> row.film(Film::operatingCst))
        .number("rated_viscosity_cst", row -> row.film(Film::ratedCst))
        .number("kappa", row -> row.film(Film::kappa))
        .number("kappa_low", row -> row.film(film -> film.uncertainty().low()))
        .number("kappa_high", row -> row.film(film -> film.uncertainty().high()))
        .number("probability_below_floor", row -> row.film(Film::probabilityBelowFloor))
        .number("kappa_reference", row -> row.point().kappaReference())
        .optionalText(
            "regime", row -> row.point().film().map(Film::regime).map(LubricationRegime::label))
        .optionalText("level", row -> row.point().film().map(Film::level).map(Level::label))
        .number("running_hours", row -> row.point().runningHours())
        .number("mixed_hours", row -> row.point().mixedHours())
        .number("contamination_factor", row -> contamination(row.point()))
        .number("life_modification", row -> row.point().life().lifeModification())
        .number("rating_life_h", row -> row.point().life().ratingLifeH())
        .number("water_life_factor", row -> row.point().life().waterLifeFactor())
        .from(rows);
  }

  /**
   * A row per running day and bearing, a table for each asset after one without rows: a site has
   * too many days to hold them all twice.
   */
  public static Stream<Table> kappaDaily(Review review) {
    TableOf<DayRow> table = daily();
    return Stream.concat(Stream.of(List.<AssetReview>of()), review.assets().stream().map(List::of))
        .map(assets -> table.from(assets.stream().flatMap(ReviewTables::days).toList()));
  }

  private static Stream<DayRow> days(AssetReview asset) {
    return asset.bearings().stream()
        .flatMap(bearing -> bearing.days().stream().map(day -> new DayRow(bearing, day)));
  }

  private static TableOf<DayRow> daily() {
    return new TableOf<DayRow>("kappa-daily")
        .text("asset", row -> row.bearing().bearing().asset())
        .text("bearing", row -> row.bearing().bearing().id())
        .text("date", row -> row.day().date().toString())
        .number("running_hours", row -> OptionalDouble.of(row.day().runningHours()))
        .number("temperature_c", row -> OptionalDouble.of(row.day().temperatureC()))
        .number("speed_rpm", row -> OptionalDouble.of(row.day().speedRpm()))
        .number("kappa", row -> row.day().kappa())
        .number("kappa_p05", row -> row.day().kappaP05())
        .number("kappa_p95", row -> row.day().kappaP95())
        .number("mixed_hours", row -> row.day().mixedHours());
  }

  public static Table findings(Review review) {
    return new TableOf<Finding>("findings")
        .text("asset", Finding::asset)
        .optionalText("bearing", Finding::bearing)
        .optionalText("sample", Finding::sample)
        .text("level", finding -> finding.level().label())
        .text("finding", finding -> finding.kind().label())
        .text("message", Finding::message)
        .from(review.findings());
  }

  public static Table problems(Review review) {
    Function<Problem, String> line =
        problem -> problem.source().line() > 0 ? Long.toString(problem.source().line()) : "";
    return new TableOf<Problem>("problems")
        .text("file", problem -> problem.source().file())
        .text("line", line)
        .text("column", Problem::column)
        .text("value", Problem::value)
        .text("problem", Problem::text)
        .from(review.problems());
  }

  private static OptionalDouble contamination(KappaPoint point) {
    return point
        .life()
        .contamination()
        .map(ContaminationFactor::value)
        .map(OptionalDouble::of)
        .orElse(OptionalDouble.empty());
  }

  private static Stream<BearingReview> bearings(Review review) {
    return review.assets().stream().flatMap(asset -> asset.bearings().stream());
  }
}
