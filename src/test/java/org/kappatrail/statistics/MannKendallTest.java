package org.kappatrail.statistics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class MannKendallTest {

  static List<List<String>> exactTails() {
    return Published.table("mann_kendall_exact_upper_tail.csv").rows();
  }

  /** Table of all orders, n 3 to 10, six significant digits. */
  @ParameterizedTest
  @MethodSource("exactTails")
  void exactProbabilitiesAgreeWithTheTable(List<String> row) {
    int n = Integer.parseInt(row.get(0));
    int s = Integer.parseInt(row.get(1));
    double p = Double.parseDouble(row.get(2));
    MannKendall.Result rising = MannKendall.test(orderWithScore(n, s)).orElseThrow();
    assertThat(rising.s()).isEqualTo(s);
    assertThat(rising.exact()).isTrue();
    assertThat(rising.pRising()).isCloseTo(p, within(Published.halfUnit(p, 6)));
    assertThat(rising.pTwoSided()).isEqualTo(Math.min(1, 2 * rising.pRising()));
    MannKendall.Result falling = MannKendall.test(orderWithScore(n, -s)).orElseThrow();
    assertThat(falling.pFalling()).isEqualTo(rising.pRising());
  }

  /** US EPA Unified Guidance 2009, example 17-6: seven digits printed. */
  @Test
  void tiedScoreAgreesWithSulfateExample() {
    MannKendall.Result result =
        MannKendall.test(Published.table("epa2009_ex17_6_sulfate.csv").column("sulfate_ppm"))
            .orElseThrow();
    assertThat(result.s()).isEqualTo(194);
    assertThat(result.z()).isCloseTo(5.107322, within(5e-7));
    assertThat(result.exact()).isFalse();
  }

  /** US EPA Unified Guidance 2009, example 17-7 (recomputed), and the exact table at n 10, S 25. */
  @Test
  void scoreAgreesWithSodiumExample() {
    MannKendall.Result result =
        MannKendall.test(Published.table("epa2009_ex17_7_sodium.csv").column("sodium_ppm"))
            .orElseThrow();
    assertThat(result.s()).isEqualTo(25);
    assertThat(result.variance()).isEqualTo(125);
    assertThat(result.pRising()).isCloseTo(0.0143047, within(5e-8));
  }

  /** Kendall's test with ties in both variables by R, version beside the values. */
  @Test
  void tiesInTimeAndValueAgreeWithTheStatisticsPackage() {
    Published pairs = Published.table("tied_pairs.csv");
    Published.Values expected = Published.values("tied_pairs_values.csv");
    MannKendall.Result result =
        MannKendall.test(pairs.column("x"), pairs.column("y")).orElseThrow();
    assertThat(result.z()).isCloseTo(expected.get("kendall_z"), within(1e-12));
    assertThat(result.pTwoSided()).isCloseTo(expected.get("kendall_p"), within(1e-15));
  }

  @Test
  void exactTwoSidedProbabilityAgreesWithTheStatisticsPackage() {
    double expected = Published.values("tied_pairs_values.csv").get("kendall_exact_p");
    assertThat(MannKendall.test(new double[] {3, 1, 4, 2, 7, 5, 9, 6, 8}).orElseThrow().pTwoSided())
        .isCloseTo(expected, within(1e-14));
  }

  @Test
  void nothingOneValueOrOneTimeHasNoTest() {
    assertThat(MannKendall.test(new double[0])).isEmpty();
    assertThat(MannKendall.test(new double[] {1})).isEmpty();
    assertThat(MannKendall.test(new double[] {4, 4, 4}, new double[] {1, 2, 3})).isEmpty();
  }

  @Test
  void allEqualShowNoTrend() {
    MannKendall.Result result = MannKendall.test(new double[] {7, 7, 7, 7}).orElseThrow();
    assertThat(result).isEqualTo(new MannKendall.Result(0, 0, 0, 1, 1, 1, false, 4));
  }

  @Test
  void pairsAtEqualTimesDoNotCount() {
    double[] times = {1, 1, 2, 3};
    double[] y = {5, 1, 6, 7};
    assertThat(MannKendall.test(times, y).orElseThrow().s()).isEqualTo(5);
    assertThat(MannKendall.test(y).orElseThrow().s()).isEqualTo(4);
  }

  @Test
  void elevenValuesTakeTheNormalForm() {
    double[] y = new double[11];
    Arrays.setAll(y, i -> -i);
    MannKendall.Result result = MannKendall.test(y).orElseThrow();
    assertThat(result.exact()).isFalse();
    assertThat(result.s()).isEqualTo(-55);
    assertThat(result.z()).as("-54 / sqrt(11·10·27/18)").isCloseTo(-4.20389, within(5e-6));
    assertThat(result.pFalling()).isLessThan(2e-5);
    assertThat(result.pRising()).isGreaterThan(0.9999);
  }

  /** Sorts bubble by bubble until the order has the score wanted. */
  private static double[] orderWithScore(int n, int s) {
    double[] order = new double[n];
    Arrays.setAll(order, i -> n - i);
    int score = -n * (n - 1) / 2;
    while (score < s) {
      for (int i = 0; i + 1 < n && score < s; i++) {
        if (order[i] > order[i + 1]) {
          double greater = order[i];
          order[i] = order[i + 1];
          order[i + 1] = greater;
          score += 2;
        }
      }
    }
    return order;
  }
}
