package org.kappatrail.review.correlation;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/**
 * Every test of a review.
 *
 * @param assets tests within one asset: asset by asset, pair by pair, lag by lag, as measured first
 * @param fleet tests over all assets, pair by pair
 */
public record CorrelationResults(List<PairCorrelation> assets, List<PairCorrelation> fleet) {

  public CorrelationResults {
    assets = List.copyOf(assets);
    fleet = List.copyOf(fleet);
  }

  /** No test at all. */
  public static CorrelationResults none() {
    return new CorrelationResults(List.of(), List.of());
  }

  /** The tests within assets by asset, in the same order; an asset without any has no entry. */
  public Map<String, List<PairCorrelation>> byAsset() {
    return Collections.unmodifiableMap(
        assets.stream()
            .collect(
                Collectors.groupingBy(
                    test -> test.asset().orElseThrow(), LinkedHashMap::new, Collectors.toList())));
  }

  /** Number of tests that the false discovery rate is kept over. */
  public long tests() {
    return assets.stream().filter(test -> !test.byConstruction()).count()
        + fleet.stream().filter(test -> !test.byConstruction()).count();
  }
}
