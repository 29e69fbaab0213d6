package org.kappatrail.report.page;

import java.util.Map;

/**
 * SVG texts for the page; where one is missing, the page does without it.
 *
 * @param assets charts over time by asset
 * @param correlations pictures of correlations by asset
 * @param fleetCorrelation the fleet's; empty text where there is none
 */
public record Pictures(
    Map<String, String> assets, Map<String, String> correlations, String fleetCorrelation) {

  public Pictures {
    assets = Map.copyOf(assets);
    correlations = Map.copyOf(correlations);
  }

  /** A page without pictures. */
  public static Pictures none() {
    return new Pictures(Map.of(), Map.of(), "");
  }
}
