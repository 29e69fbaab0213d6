package org.kappatrail.statistics;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * How often the rank correlation test at 5 % calls a link between two AR(1) series that have none,
 * and between two whose innovations correlate at 0.6. Seeded; the standard error of a rate of 5 %
 * is 0.2 points. Percent called, no link / linked:
 *
 * <pre>
 *                 all pairs     N* as         N* of residuals  N* of residuals
 *   n   φ        independent   measured      without + 2/N    with + 2/N
 *   8   0         5.8 / 32.3    3.7 / 24.0    5.1 / 22.4       6.3 / 27.2
 *   8   0.5       8.6 / 35.6    4.8 / 25.7    8.8 / 29.5       6.7 / 26.8
 *   8   0.8      13.9 / 38.8    5.3 / 24.6    9.9 / 31.2       6.4 / 25.8
 *  12   0         5.1 / 50.8    3.6 / 42.6    4.2 / 39.2       5.1 / 43.3
 *  12   0.5       9.7 / 51.1    5.2 / 39.8    6.9 / 42.8       5.5 / 39.7
 *  12   0.8      18.7 / 53.8    5.3 / 34.5    9.6 / 42.6       5.7 / 36.3
 *  24   0         4.9 / 85.6    3.9 / 82.8    4.4 / 80.6       4.7 / 81.7
 *  24   0.5      10.7 / 81.0    5.0 / 71.8    6.4 / 73.1       5.3 / 71.6
 *  24   0.8      26.4 / 74.4    5.6 / 51.3    9.8 / 62.0       6.4 / 56.2
 *  60   0         5.2 / 99.8    4.5 / 99.8    4.6 / 99.8       4.7 / 99.8
 *  60   0.5      11.5 / 99.2    5.1 / 97.9    5.4 / 97.9       5.0 / 97.8
 *  60   0.8      32.9 / 94.6    5.6 / 79.0    7.3 / 82.7       6.0 / 81.3
 * </pre>
 */
@Tag("slow")
class SerialCorrelationStudyTest {

  private static final int PAIRS = 10_000;
  private static final double LINK = 0.6;

  @ParameterizedTest
  @CsvSource({
    "0.0, 8", "0.5, 8", "0.8, 8", "0.0, 12", "0.5, 12", "0.8, 12", "0.0, 24", "0.5, 24", "0.8, 24",
    "0.0, 60", "0.5, 60", "0.8, 60"
  })
  void falseCallsStayNearFivePercentAsMeasuredAndDetrended(double phi, int n) {
    Rates none = Rates.of(phi, n, 0);
    Rates linked = Rates.of(phi, n, LINK);
    assertThat(none.measured).isBetween(3.0, 8.0);
    assertThat(none.detrended).isBetween(3.0, 8.0);
    assertThat(linked.detrended)
        .as("power lost by detrending, of %s against %s", linked, none)
        .isGreaterThan(linked.measured - 4);
    if (phi >= 0.5) {
      assertThat(none.naive).as("all pairs taken as independent").isGreaterThan(8);
    }
  }

  /** What the correction for the fitted line is for. */
  @ParameterizedTest
  @CsvSource({"0.8, 12", "0.8, 24"})
  void plainEffectiveSizeOfResidualsCallsTooOften(double phi, int n) {
    assertThat(Rates.of(phi, n, 0).detrendedPlain).isGreaterThan(8);
  }

  /** Residuals of four or five points agree perfectly by chance; no such pair may be called. */
  @ParameterizedTest
  @CsvSource({"0.0, 4", "0.8, 4", "0.0, 5", "0.8, 5", "0.0, 6", "0.8, 6"})
  void fewPointsAreNotCalledMoreOftenThanMany(double phi, int n) {
    Rates none = Rates.of(phi, n, 0);
    assertThat(none.measured).isLessThan(8);
    assertThat(none.detrended).isLessThan(8);
  }

  /** Called at p ≤ 0.05, percent of pairs. */
  private record Rates(double naive, double measured, double detrendedPlain, double detrended) {

    static Rates of(double phi, int n, double link) {
      Random random = new Random(1998L * n + Math.round(100 * phi) + Math.round(1e6 * link));
      double[] t = new double[n];
      Arrays.setAll(t, i -> i);
      int[] called = new int[4];
      for (int pair = 0; pair < PAIRS; pair++) {
        double[][] xy = autoregressivePair(random, phi, n, link);
        double[] rankX = AverageRanks.rank(xy[0]);
        double[] rankY = AverageRanks.rank(xy[1]);
        double rho = Spearman.rho(xy[0], xy[1]).orElseThrow();
        double[] leftX = AverageRanks.rank(Detrend.residuals(t, xy[0]).orElseThrow());
        double[] leftY = AverageRanks.rank(Detrend.residuals(t, xy[1]).orElseThrow());
        double left = Spearman.rho(leftX, leftY).orElseThrow();
        CorrelationTest[] tests = {
          CorrelationTest.ofRanks(rho, n, n),
          CorrelationTest.ofRanks(rho, EffectiveSampleSize.pyperPeterman(rankX, rankY), n),
          CorrelationTest.ofDetrendedRanks(
              left, EffectiveSampleSize.pyperPeterman(leftX, leftY), n),
          CorrelationTest.ofDetrendedRanks(left, EffectiveSampleSize.detrended(leftX, leftY), n)
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
