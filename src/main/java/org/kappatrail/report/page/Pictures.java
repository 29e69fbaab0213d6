package org.kappatrail.report.page;

import java.util.Map;
import java.util.Optional;

/**
 * Charts for the page; where one is missing, the page does without it.
 *
 * @param assets charts over time by asset
 * @param correlations pictures of correlations by asset
 * @param fleet where every bearing stands
 * @param fleetCorrelation the fleet's correlations
 */
public record Pictures(
    Map<String, Picture> assets,
    Map<String, Picture> correlations,
    Optional<Picture> fleet,
    Optional<Picture> fleetCorrelation) {

  public Pictures {
    assets = Map.copyOf(assets);
    correlations = Map.copyOf(correlations);
  }

  /** A page without pictures. */
  public static Pictures none() {
    return new Pictures(Map.of(), Map.of(), Optional.empty(), Optional.empty());
  }

  Optional<Picture> asset(String id) {
    return Optional.ofNullable(assets.get(id));
  }

  Optional<Picture> correlation(String id) {
    return Optional.ofNullable(correlations.get(id));
  }
}
