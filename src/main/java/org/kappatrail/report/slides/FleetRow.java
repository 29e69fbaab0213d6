package org.kappatrail.report.slides;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Film;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.Review;
import org.kappatrail.review.trend.Attribution;

/**
 * One bearing of the fleet picture.
 *
 * @param asset its asset
 * @param name the asset's name
 * @param bearing its id
 * @param floor its floor
 * @param film its present film
 * @param fresh κ of the registered oil when fresh at the charge's first operating point; the
 *     present κ where that is unknown
 * @param afterOil κ after the step that the oil took
 */
record FleetRow(
    String asset,
    String name,
    String bearing,
    double floor,
    Film film,
    double fresh,
    double afterOil) {
  private static final Comparator<FleetRow> WORST_FIRST =
      Comparator.comparingDouble((FleetRow row) -> row.film().kappa() / row.floor())
          .thenComparing(FleetRow::asset)
          .thenComparing(FleetRow::bearing);

  /** Every bearing that has a κ, worst first. */
  static List<FleetRow> of(Review review) {
    List<FleetRow> rows = new ArrayList<>();
    for (AssetReview asset : review.assets()) {
      for (BearingReview bearing : asset.bearings()) {
        bearing.latestFilm().ifPresent(point -> rows.add(of(asset, bearing, point)));
      }
    }
    rows.sort(WORST_FIRST);
    return rows;
  }

  private static FleetRow of(AssetReview asset, BearingReview bearing, KappaPoint point) {
    Film film = point.film().orElseThrow();
    Optional<Attribution> moved = Words.sinceFresh(bearing, point);
    double fresh = moved.map(parts -> film.kappa() / Math.exp(parts.total())).orElse(film.kappa());
    double afterOil = moved.map(parts -> fresh * Math.exp(parts.oil())).orElse(film.kappa());
    return new FleetRow(
        asset.asset().id(),
        asset.asset().name(),
        bearing.bearing().id(),
        bearing.floor(),
        film,
        fresh,
        afterOil);
  }
}
