package org.kappatrail.statistics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.junit.jupiter.api.Test;

/** Ranks, rank correlation and product-moment correlation. Values by R, version beside them. */
class RankCorrelationTest {

  private static final Published PAIRS = Published.table("tied_pairs.csv");
  private static final Published.Values EXPECTED = Published.values("tied_pairs_values.csv");

  @Test
  void equalValuesShareTheMeanOfTheirRanks() {
    assertThat(AverageRanks.rank(new double[] {30, 10, 20, 20, -0.0, 0.0}))
        .containsExactly(6, 3, 4.5, 4.5, 1.5, 1.5);
    double squares = Arrays.stream(AverageRanks.rank(PAIRS.column("y"))).map(r -> r * r).sum();
    assertThat(squares).isEqualTo(EXPECTED.get("rank_sum_squares"));
  }

  @Test
  void ranksOfNothingOneAndAllEqual() {
    assertThat(AverageRanks.rank(new double[0])).isEmpty();
    assertThat(AverageRanks.rank(new double[] {5})).containsExactly(1);
    assertThat(AverageRanks.rank(new double[] {5, 5, 5})).containsExactly(2, 2, 2);
  }

  @Test
  void rankCorrelationWithTiesAgreesWithTheStatisticsPackage() {
    assertThat(Spearman.rho(PAIRS.column("x"), PAIRS.column("y")).orElseThrow())
        .isCloseTo(EXPECTED.get("spearman"), within(1e-14));
  }

  @Test
  void productMomentCorrelationAgreesWithTheStatisticsPackage() {
    assertThat(Pearson.r(PAIRS.column("x"), PAIRS.column("y")).orElseThrow())
        .isCloseTo(EXPECTED.get("pearson"), within(1e-14));
  }

  @Test
  void rankCorrelationSeesOnlyTheOrder() {
    double[] x = {1, 2, 3, 4, 5};
    double[] steep = {1, 10, 100, 1000, 10_000};
    assertThat(Spearman.rho(x, steep)).hasValue(1);
    assertThat(Pearson.r(x, steep).orElseThrow()).isLessThan(0.8);
  }

  @Test
  void nothingOneTwoOrAllEqualHaveNoCorrelation() {
    double[] rising = {1, 2, 3};
    double[] constant = {0.1, 0.1, 0.1};
    for (int n = 0; n < 3; n++) {
      double[] few = Arrays.copyOf(rising, n);
      assertThat(Spearman.rho(few, few)).isEmpty();
      assertThat(Pearson.r(few, few)).isEmpty();
    }
    assertThat(Spearman.rho(rising, constant)).isEmpty();
    assertThat(Spearman.rho(constant, rising)).isEmpty();
    assertThat(Pearson.r(rising, constant)).isEmpty();
    assertThat(Pearson.r(constant, rising)).isEmpty();
  }
}
