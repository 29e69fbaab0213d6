package org.kappatrail.statistics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.junit.jupiter.api.Test;

class QuantilesTest {

  private static final double[] X = Published.table("tied_pairs.csv").column("x");
  private static final double[] Y = Published.table("tied_pairs.csv").column("y");
  private static final Published.Values EXPECTED = Published.values("tied_pairs_values.csv");

  /** Values by R, version beside them. */
  @Test
  void quantilesAndScaleAgreeWithTheStatisticsPackage() {
    assertThat(Quantiles.median(Y)).hasValue(EXPECTED.get("median"));
    assertThat(Quantiles.quantileType7(X, 0.05).orElseThrow())
        .isCloseTo(EXPECTED.get("q05"), within(1e-12));
    assertThat(Quantiles.quantileType7(X, 0.90).orElseThrow())
        .isCloseTo(EXPECTED.get("q90"), within(1e-12));
    assertThat(RobustScale.mad(X).orElseThrow()).isCloseTo(EXPECTED.get("mad"), within(1e-12));
  }

  @Test
  void endsOfTheLinearQuantileAreLeastAndGreatest() {
    assertThat(Quantiles.quantileType7(new double[] {3, 1, 2}, 0)).hasValue(1);
    assertThat(Quantiles.quantileType7(new double[] {3, 1, 2}, 1)).hasValue(3);
  }

  @Test
  void nothingOneAndAllEqual() {
    double[] none = {};
    assertThat(Quantiles.median(none)).isEmpty();
    assertThat(RobustScale.mad(none)).isEmpty();
    assertThat(Quantiles.weightedMedian(none, none)).isEmpty();
    double[] one = {4};
    assertThat(Quantiles.quantileType7(one, 0.9)).hasValue(4);
    assertThat(RobustScale.mad(one)).hasValue(0);
    assertThat(Quantiles.weightedQuantile(one, one, 0.9)).hasValue(4);
    double[] equal = {0.1, 0.1, 0.1};
    assertThat(Quantiles.quantileType7(equal, 0.3)).hasValue(0.1);
    assertThat(RobustScale.mad(equal)).hasValue(0);
    assertThat(Quantiles.weightedMedian(equal, new double[] {1, 2, 3})).hasValue(0.1);
  }

  /** Cormen, Leiserson, Rivest and Stein, Introduction to Algorithms, problem 9-2, from memory. */
  @Test
  void lowerWeightedMedianAgreesWithTheTextbookExample() {
    double[] values = {0.1, 0.35, 0.05, 0.1, 0.15, 0.05, 0.2};
    assertThat(Quantiles.weightedMedian(values, values)).hasValue(0.2);
    assertThat(Quantiles.median(values)).hasValue(0.1);
  }

  @Test
  void equalWeightsGiveTheLowerOfTwoMiddleValues() {
    double[] tenths = new double[10];
    Arrays.fill(tenths, 0.1);
    double[] values = {10, 9, 8, 7, 6, 5, 4, 3, 2, 1};
    assertThat(Quantiles.weightedMedian(values, tenths)).hasValue(5);
    assertThat(Quantiles.weightedQuantile(values, tenths, 0.3)).hasValue(3);
    assertThat(Quantiles.weightedQuantile(values, tenths, 0.31)).hasValue(4);
  }

  @Test
  void weightedQuantileEndsAreTheLeastAndGreatestValueWithWeight() {
    double[] values = {1, 2, 3, 4};
    double[] weights = {0, 5, 1, 0};
    assertThat(Quantiles.weightedQuantile(values, weights, 0)).hasValue(2);
    assertThat(Quantiles.weightedQuantile(values, weights, 1)).hasValue(3);
    assertThat(Quantiles.weightedMedian(values, new double[4])).isEmpty();
  }

  @Test
  void negativeWeightsAndSharesOutsideZeroToOneAreRefused() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> Quantiles.weightedMedian(new double[] {1}, new double[] {-1}))
        .withMessageContaining("a weight is -1.0");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> Quantiles.quantileType7(new double[] {1}, 95))
        .withMessageContaining("p is 95.0");
  }
}
