package org.kappatrail.review.correlation;

import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.statistics.CorrelationTest;

/**
 * One test of one pair of variables.
 *
 * @param scope one asset or the fleet
 * @param asset name of the asset; empty for the fleet
 * @param x first variable
 * @param y second variable
 * @param lag samples by which y comes after x: at lag k, x of a sample is paired with y of the k-th
 *     sample after it, so that above 0 y follows x, and below 0 y comes first
 * @param form as measured or without each one's drift
 * @param n pairs
 * @param assets assets behind it; 1 for an asset's own
 * @param test coefficient, effective sample size, p and 95 % limits
 * @param q p adjusted for all tests of the review; empty for a pair tied by construction, which is
 *     never called and does not count among them
 * @param byConstruction true where one is calculated from the other, or both from one measurement
 */
public record PairCorrelation(
    Scope scope,
    Optional<String> asset,
    String x,
    String y,
    int lag,
    Form form,
    int n,
    int assets,
    CorrelationTest test,
    OptionalDouble q,
    boolean byConstruction) {

  public PairCorrelation {
    if (asset.isPresent() != (scope == Scope.ASSET)) {
      throw new IllegalArgumentException("scope " + scope + " with asset " + asset);
    }
    if (n < Correlations.LEAST_PAIRS || assets < 1) {
      throw new IllegalArgumentException(n + " pairs of " + assets + " assets");
    }
    if (byConstruction && q.isPresent()) {
      throw new IllegalArgumentException(x + " and " + y + " are tied by construction: no q");
    }
  }

  /** Coefficient, −1 to 1. */
  public double coefficient() {
    return test.coefficient();
  }

  /** Independent pairs the samples are worth, N*. */
  public double nEffective() {
    return test.nEffective();
  }

  /** Lower 95 % limit of the coefficient. */
  public double low() {
    return test.low();
  }

  /** Upper 95 % limit of the coefficient. */
  public double high() {
    return test.high();
  }

  /** Two-sided probability of so large a coefficient when there is none. */
  public double p() {
    return test.p();
  }

  PairCorrelation withQ(double adjusted) {
    return new PairCorrelation(
        scope,
        asset,
        x,
        y,
        lag,
        form,
        n,
        assets,
        test,
        OptionalDouble.of(adjusted),
        byConstruction);
  }
}
