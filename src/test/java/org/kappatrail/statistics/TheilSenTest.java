package org.kappatrail.statistics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class TheilSenTest {

  /** US EPA Unified Guidance 2009, example 17-6: seven digits printed. */
  @Test
  void slopeAndLimitsAgreeWithSulfateExample() {
    Published table = Published.table("epa2009_ex17_6_sulfate.csv");
    TheilSen.Line line =
        TheilSen.fit(table.column("sampling_date"), table.column("sulfate_ppm"), 0.95)
            .orElseThrow();
    assertThat(line.slope()).isCloseTo(26.66667, within(5e-6));
    assertThat(line.slopeLow().orElseThrow()).isCloseTo(20.00000, within(5e-6));
    assertThat(line.slopeHigh().orElseThrow()).isCloseTo(35.71182, within(5e-6));
    assertThat(line.n()).isEqualTo(23);
    double middleDate = 92.6;
    assertThat(line.at(middleDate)).as("median concentration").isCloseTo(560, within(1e-9));
  }

  /** US EPA Unified Guidance 2009, example 17-7 (slope recomputed). */
  @Test
  void slopeAgreesWithSodiumExample() {
    Published table = Published.table("epa2009_ex17_7_sodium.csv");
    double slope =
        TheilSen.fit(table.column("year"), table.column("sodium_ppm"), 0.95).orElseThrow().slope();
    assertThat(slope).isCloseTo(1.33333, within(5e-6));
  }

  /** US EPA Unified Guidance 2009, example 17-5 (slope recomputed). */
  @Test
  void slopeAgreesWithChlorideExample() {
    Published table = Published.table("epa2009_ex17_5_chloride.csv");
    double slope =
        TheilSen.fit(table.column("elapsed_days"), table.column("chloride_ppm"), 0.95)
            .orElseThrow()
            .slope();
    assertThat(slope).isCloseTo(0.003281853, within(5e-10));
  }

  @Test
  void nothingOnePointOrOneTimeHasNoLine() {
    assertThat(TheilSen.fit(new double[0], new double[0], 0.95)).isEmpty();
    assertThat(TheilSen.fit(new double[] {1}, new double[] {2}, 0.95)).isEmpty();
    assertThat(TheilSen.fit(new double[] {3, 3, 3}, new double[] {1, 2, 4}, 0.95)).isEmpty();
  }

  @Test
  void allEqualGiveAFlatLineWithLimitsOnIt() {
    double[] y = new double[6];
    Arrays.fill(y, 0.1);
    TheilSen.Line line = TheilSen.fit(new double[] {1, 2, 3, 4, 5, 6}, y, 0.95).orElseThrow();
    assertThat(line.slope()).isZero();
    assertThat(line.intercept()).isEqualTo(0.1);
    assertThat(line.slopeLow()).hasValue(0);
    assertThat(line.slopeHigh()).hasValue(0);
  }

  @Test
  void twoPointsGiveTheirSlopeWithoutLimits() {
    TheilSen.Line line = TheilSen.fit(new double[] {2, 4}, new double[] {1, 2}, 0.95).orElseThrow();
    assertThat(line.slope()).isEqualTo(0.5);
    assertThat(line.intercept()).isZero();
    assertThat(line.slopeLow()).isEmpty();
    assertThat(line.slopeHigh()).isEmpty();
  }

  @Test
  void limitsAppearWithTheSixthPoint() {
    double[] x = {1, 2, 3, 4, 5, 6};
    double[] y = {1, 3, 2, 5, 4, 6};
    assertThat(TheilSen.fit(Arrays.copyOf(x, 5), Arrays.copyOf(y, 5), 0.95).orElseThrow())
        .satisfies(line -> assertThat(line.slopeLow()).isEmpty());
    assertThat(TheilSen.fit(x, y, 0.95).orElseThrow())
        .satisfies(line -> assertThat(line.slopeLow()).isPresent());
  }

  @Test
  void pairsAtEqualTimesAreLeftOut() {
    double[] x = {0, 0, 1, 2};
    double[] y = {0, 100, 1, 2};
    assertThat(TheilSen.fit(x, y, 0.95).orElseThrow().slope())
        .as("slopes 1, 1, -99, 1, -49")
        .isEqualTo(1);
  }

  @Test
  void orderOfThePointsDoesNotMatter() {
    double[] x = {5, 1, 4, 2, 3, 7, 6};
    double[] y = {9, 1, 7, 4, 4, 11, 16};
    double[] sortedX = {1, 2, 3, 4, 5, 6, 7};
    double[] sortedY = {1, 4, 4, 7, 9, 16, 11};
    assertThat(TheilSen.fit(x, y, 0.95)).isEqualTo(TheilSen.fit(sortedX, sortedY, 0.95));
  }

  @Test
  void oneWildPointDoesNotCarryTheSlopeAway() {
    double[] x = {0, 1, 2, 3, 4, 5, 6, 7, 8, 9};
    double[] y = x.clone();
    y[9] = -1000;
    assertThat(TheilSen.fit(x, y, 0.95).orElseThrow().slope()).isEqualTo(1);
  }

  @ParameterizedTest
  @ValueSource(doubles = {0, 1, 95, Double.NaN})
  void confidenceOutsideZeroToOneIsRefused(double confidence) {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> TheilSen.fit(new double[] {1, 2}, new double[] {1, 2}, confidence))
        .withMessageContaining("confidence is " + confidence);
  }

  /** What a 95 % limit means: 20,000 seeded lines with normal noise for each length. */
  @ParameterizedTest
  @ValueSource(ints = {8, 12, 16, 24})
  @Tag("slow")
  void limitsCoverTheTrueSlopeNineteenTimesInTwenty(int n) {
    Random random = new Random(20_170_000L + n);
    double[] x = new double[n];
    Arrays.setAll(x, i -> i);
    int lines = 20_000;
    int covered = 0;
    for (int run = 0; run < lines; run++) {
      double[] y = new double[n];
      Arrays.setAll(y, i -> 3 - 0.2 * i + random.nextGaussian());
      TheilSen.Line line = TheilSen.fit(x, y, 0.95).orElseThrow();
      if (line.slopeLow().orElseThrow() <= -0.2 && -0.2 <= line.slopeHigh().orElseThrow()) {
        covered++;
      }
    }
    assertThat(100.0 * covered / lines).isBetween(93.0, 97.0);
  }
}
