package org.kappatrail.report.workbook;

import java.time.LocalDate;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import org.kappatrail.report.table.TableOf;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Film;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.Level;
import org.kappatrail.review.Review;
import org.kappatrail.review.decision.Decision;
import org.kappatrail.review.trend.Outlook;
import tech.tablesaw.api.Table;

/** One row per asset, worst first: where it stands, what is proposed, and why. */
final class FleetTable {
  private FleetTable() {}

  static Table of(Review review) {
    return new TableOf<AssetReview>("fleet")
        .text("asset", asset -> asset.asset().id())
        .text("level", asset -> asset.level().map(Level::label).orElse("no κ"))
        .optionalText("verdict", asset -> asset.decision().map(found -> found.verdict().label()))
        .optionalText("bearing", asset -> asset.governing().map(found -> found.bearing().id()))
        .number("κ", asset -> film(asset, Film::kappa))
        .number("κ low", asset -> film(asset, film -> film.uncertainty().low()))
        .number("κ high", asset -> film(asset, film -> film.uncertainty().high()))
        .number("floor", FleetTable::floor)
        .number("P below floor", asset -> film(asset, Film::probabilityBelowFloor))
        .optionalText(
            "sampled", asset -> latest(asset).map(point -> point.sample().sampledAtText()))
        .number("temperature, °C", FleetTable::temperatureC)
        .optionalText("next sample", FleetTable::nextSample)
        .text("reason", FleetTable::reason)
        .text("name", asset -> asset.asset().name())
        .text("area", asset -> asset.asset().area())
        .text("oil", asset -> asset.oil().id())
        .from(review.worstFirst());
  }

  private static Optional<KappaPoint> latest(AssetReview asset) {
    return asset.governing().flatMap(BearingReview::latestFilm);
  }

  private static OptionalDouble film(AssetReview asset, ToDoubleFunction<Film> quantity) {
    Optional<Film> film = latest(asset).flatMap(KappaPoint::film);
    return film.isPresent()
        ? OptionalDouble.of(quantity.applyAsDouble(film.get()))
        : OptionalDouble.empty();
  }

  private static OptionalDouble floor(AssetReview asset) {
    Optional<BearingReview> governing = asset.governing();
    return governing.isPresent()
        ? OptionalDouble.of(governing.get().floor())
        : OptionalDouble.empty();
  }

  private static OptionalDouble temperatureC(AssetReview asset) {
    return latest(asset).map(point -> point.point().temperatureC()).orElse(OptionalDouble.empty());
  }

  private static Optional<String> nextSample(AssetReview asset) {
    return asset
        .governing()
        .flatMap(found -> found.trend().outlook())
        .map(Outlook::nextSample)
        .map(LocalDate::toString);
  }

  private static String reason(AssetReview asset) {
    return asset
        .decision()
        .map(Decision::reason)
        .orElse(asset.story().isEmpty() ? "" : asset.story().get(0));
  }
}
