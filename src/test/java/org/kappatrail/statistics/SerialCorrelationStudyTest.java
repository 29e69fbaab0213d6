package org.kappatrail.statistics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * How often the rank correlation test at 5 % calls a link between two AR(1) series that have none,
 * and between two whose innovations correlate at 0.6. Seeded; the standard error of a rate of 5 %
 * is 0.2 points. All figures stand in {@code studies/serial_correlation.csv}.
 */
@Tag("slow")
class SerialCorrelationStudyTest {

  private static final int PAIRS = 10_000;
  private static final double LINK = 0.6;

  static List<List<String>> cases() {
    return Published.study("serial_correlation.csv").rows();
  }

  @ParameterizedTest(name = "n, φ, rates {0}")
  @MethodSource("cases")
  void falseCallsStayNearFivePercentAsMeasuredAndDetrended(List<String> row) {
    int n = Integer.parseInt(row.get(0));
    double phi = Double.parseDouble(row.get(1));
    Rates none = Rates.of(phi, n, 0);
    Rates linked = Rates.of(phi, n, LINK);

    double[] stated = row.stream().skip(2).mapToDouble(Double::parseDouble).toArray();
    double[] found = {
      none.naive, linked.naive,
      none.measured, linked.measured,
      none.residualsPlain, linked.residualsPlain,
      none.residuals, linked.residuals
    };
    assertThat(found).containsExactly(stated, within(0.005));

    assertThat(none.measured).isLessThan(8);
    assertThat(none.residuals).isLessThan(8);
    if (n >= 8) {
      assertThat(none.measured).isGreaterThan(3);
      assertThat(none.residuals).isGreaterThan(3);
      assertThat(linked.residuals)
          .as("power of the residuals against that of the values")
          .isGreaterThan(linked.measured - 4);
    }
  }

  /** What the two corrections are for; the figures are those held above. */
  @Test
  void withoutCorrectionStronglyCarriedOverSeriesAreCalledTooOften() {
    List<List<String>> strong =
        cases().stream()
            .filter(row -> row.get(0).matches("12|24") && Double.parseDouble(row.get(1)) >= 0.8)
            .toList();
    assertThat(strong).hasSize(4);
    for (List<String> row : strong) {
      assertThat(Double.parseDouble(row.get(2))).as("naive, %s", row).isGreaterThan(15);
      assertThat(Double.parseDouble(row.get(6))).as("residuals plain, %s", row).isGreaterThan(8);
    }
  }

  /** Called at p ≤ 0.05, percent of pairs. */
  private record Rates(double naive, double measured, double residualsPlain, double residuals) {

    static Rates of(double phi, int n, double link) {
      Random random = new Random(1998L * n + Math.round(100 * phi) + Math.round(1e6 * link));
      double[] t = new double[n];
      Arrays.setAll(t, i -> i);
      int[] called = new int[4];
      for (int pair = 0; pair < PAIRS; pair++) {
        double[][] xy = autoregressivePair(random, phi, n, link);
        double[] rankX = AverageRanks.rank(xy[0]);
        double[] rankY = AverageRanks.rank(xy[1]);
        double rho = Pearson.r(rankX, rankY).orElseThrow();
        double[] leftX = AverageRanks.rank(Detrend.residuals(t, xy[0]).orElseThrow());
        double[] leftY = AverageRanks.rank(Detrend.residuals(t, xy[1]).orElseThrow());
        double left = Pearson.r(leftX, leftY).orElseThrow();
        CorrelationTest[] tests = {
          CorrelationTest.ofRanks(rho, n),
          CorrelationTest.ofRanks(rho, EffectiveSampleSize.pyperPeterman(rankX, rankY)),
          CorrelationTest.ofDetrendedRanks(left, EffectiveSampleSize.pyperPeterman(leftX, leftY)),
          CorrelationTest.ofDetrendedRanks(left, EffectiveSampleSize.detrended(leftX, leftY))
        };
        for (int i = 0; i < tests.length; i++) {
          called[i] += tests[i].p() <= 0.05 ? 1 : 0;
        }
      }
      double[] percent = Arrays.stream(called).mapToDouble(c -> 100.0 * c / PAIRS).toArray();
      return new Rates(percent[0], percent[1], percent[2], percent[3]);
    }
  }

  /** Stationary from the first value on. */
  private static double[][] autoregressivePair(Random random, double phi, int n, double link) {
    double[][] xy = new double[2][n];
    for (int i = 0; i < n; i++) {
      double innovationX = random.nextGaussian();
      double innovationY = link * innovationX + Math.sqrt(1 - link * link) * random.nextGaussian();
      double start = Math.sqrt(1 - phi * phi);
      xy[0][i] = i == 0 ? innovationX / start : phi * xy[0][i - 1] + innovationX;
      xy[1][i] = i == 0 ? innovationY / start : phi * xy[1][i - 1] + innovationY;
    }
    return xy;
  }
}
