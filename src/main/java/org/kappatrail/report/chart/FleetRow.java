package org.kappatrail.report.chart;

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
import org.kappatrail.review.trend.SampleAttribution;

/**
 * One bearing of the fleet picture.
 *
 * @param asset its asset
 * @param bearing its id
 * @param floor its least κ
 * @param film its film at the latest sample that has one
 * @param moved what moved κ since the registered oil when fresh, at the operating point the charge
 *     began with; empty where that is unknown
 */
public record FleetRow(
    String asset, String bearing, double floor, Film film, Optional<Attribution> moved) {
  private static final Comparator<FleetRow> WORST_FIRST =
      Comparator.comparingDouble((FleetRow row) -> row.film().kappa() / row.floor())
          .thenComparing(FleetRow::asset)
          .thenComparing(FleetRow::bearing);

  /** Every bearing that has a κ, worst first. */
  public static List<FleetRow> of(Review review) {
    List<FleetRow> rows = new ArrayList<>();
    for (AssetReview asset : review.assets()) {
      for (BearingReview bearing : asset.bearings()) {
        bearing.latestFilm().ifPresent(point -> rows.add(of(asset, bearing, point)));
      }
    }
    rows.sort(WORST_FIRST);
    return List.copyOf(rows);
  }

  private static FleetRow of(AssetReview asset, BearingReview bearing, KappaPoint point) {
    return new FleetRow(
        asset.asset().id(),
        bearing.bearing().id(),
        bearing.floor(),
        point.film().orElseThrow(),
        bearing.trend().attribution(point.sample().id(), SampleAttribution.FRESH_OIL));
  }

  /** κ of the fresh oil; the present κ where that is unknown. */
  public double fresh() {
    return moved.map(parts -> film.kappa() / Math.exp(parts.total())).orElse(film.kappa());
  }

  /** κ after the step that the oil took. */
  public double afterOil() {
    return moved.map(parts -> fresh() * Math.exp(parts.oil())).orElse(film.kappa());
  }
}
