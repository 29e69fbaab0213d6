package org.kappatrail.review;

import java.time.LocalDate;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Problem;
import org.kappatrail.history.Settings;
import org.kappatrail.review.correlation.CorrelationResults;

/**
 * The whole review of a site; everything that is reported is in it.
 *
 * @param asOf last day that counts
 * @param settings settings in force
 * @param assets assets in the order of the register
 * @param since what changed since an earlier day, where that was asked for
 * @param correlations what goes with what in their samples
 * @param problems inputs that could not be used
 * @param files what became of every input file
 */
public record Review(
    LocalDate asOf,
    Settings settings,
    List<AssetReview> assets,
    Optional<Since> since,
    CorrelationResults correlations,
    List<Problem> problems,
    List<FileAccount> files) {

  private static final Comparator<AssetReview> WORST_FIRST =
      Comparator.comparingInt((AssetReview asset) -> -asset.level().map(Level::ordinal).orElse(-1))
          .thenComparingDouble(Review::kappaOverFloor)
          .thenComparing(asset -> asset.asset().id());

  public Review {
    assets = List.copyOf(assets);
    problems = problems.stream().sorted().toList();
    files = List.copyOf(files);
  }

  /** Assets by level, then by κ over floor of the governing bearing. */
  public List<AssetReview> worstFirst() {
    return assets.stream().sorted(WORST_FIRST).toList();
  }

  /** Every finding in {@link Finding#ORDER}. */
  public List<Finding> findings() {
    return assets.stream()
        .flatMap(asset -> asset.findings().stream())
        .sorted(Finding.ORDER)
        .toList();
  }

  private static double kappaOverFloor(AssetReview asset) {
    return asset
        .governing()
        .flatMap(
            bearing ->
                bearing
                    .latestFilm()
                    .flatMap(KappaPoint::film)
                    .map(film -> film.kappa() / bearing.floor()))
        .orElse(Double.POSITIVE_INFINITY);
  }
}
