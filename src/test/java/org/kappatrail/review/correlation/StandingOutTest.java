package org.kappatrail.review.correlation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.kappatrail.statistics.AverageRanks;
import org.kappatrail.statistics.CorrelationTest;
import org.kappatrail.statistics.Pearson;

class StandingOutTest {
  private static final int SHUFFLES = 20_000;

  /** One sample in thirty that stands out in both: by chance it happens once in thirty times. */
  @Test
  void oneSampleThatStandsOutInBothIsNoCertainty() {
    double[] x = new double[30];
    double[] y = new double[30];
    x[7] = 40;
    y[7] = 3;
    assertThat(StandingOut.leastP(x, y, 1)).isCloseTo(1 / 30.0, within(1e-12));
    y[7] = -3;
    assertThat(StandingOut.leastP(x, y, -1)).isCloseTo(1 / 30.0, within(1e-12));
    y[7] = 0;
    y[8] = 3;
    assertThat(StandingOut.leastP(x, y, -0.03)).isCloseTo(29 / 30.0, within(1e-12));
  }

  @Test
  void variablesThatMostlyDifferAreNotBound() {
    double[] x = {1, 2, 3, 4, 5, 5};
    double[] most = {0, 0, 0, 0, 0, 1};
    assertThat(StandingOut.leastP(x, x, 1)).isZero();
    assertThat(StandingOut.leastP(x, most, 0.5)).isZero();
    assertThat(StandingOut.leastP(new double[0], new double[0], 0)).isZero();
  }

  static List<List<String>> cases() {
    return CheckValues.rows("/studies/standing_out.csv");
  }

  /** False calls at 0.1 % of pairs with nothing in common, with Student's t alone and as judged. */
  @Tag("slow")
  @ParameterizedTest(name = "n, standing out, rates {0}")
  @MethodSource("cases")
  void falseCallsOfFewThatStandOutStayRare(List<String> row) {
    int n = Integer.parseInt(row.get(0));
    int out = Integer.parseInt(row.get(1));
    Random random = new Random(n * 100L + out);
    double[] x = new double[n];
    for (int i = 0; i < out; i++) {
      x[i] = i + 1;
    }
    double[] y = x.clone();
    double[] ranksX = AverageRanks.rank(x);
    int plain = 0;
    int judged = 0;
    for (int shuffle = 0; shuffle < SHUFFLES; shuffle++) {
      for (int i = n - 1; i > 0; i--) {
        int j = random.nextInt(i + 1);
        double swap = y[i];
        y[i] = y[j];
        y[j] = swap;
      }
      double[] ranksY = AverageRanks.rank(y);
      double rho = Pearson.r(ranksX, ranksY).orElseThrow();
      CorrelationTest test = CorrelationTest.ofRanks(rho, n);
      plain += test.p() <= 0.001 ? 1 : 0;
      judged += test.withLeastP(StandingOut.leastP(x, y, rho)).p() <= 0.001 ? 1 : 0;
    }
    double[] found = {100.0 * plain / SHUFFLES, 100.0 * judged / SHUFFLES};
    double[] stated = row.stream().skip(2).mapToDouble(Double::parseDouble).toArray();
    assertThat(found).containsExactly(stated, within(0.0005));
    assertThat(found[1]).isLessThan(0.15);
  }
}
