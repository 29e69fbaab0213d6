package org.kappatrail.statistics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/** Values by R's autocorrelation function, version and script beside them. */
class EffectiveSampleSizeTest {

  private static final double[] X = Published.table("tied_pairs.csv").column("x");
  private static final double[] Y = Published.table("tied_pairs.csv").column("y");
  private static final Published.Values EXPECTED = Published.values("tied_pairs_values.csv");

  @Test
  void autocorrelationsAgreeWithTheStatisticsPackage() {
    double[] correlations = Autocorrelation.upTo(X, 4);
    assertThat(correlations).hasSize(4);
    assertThat(correlations[0]).isCloseTo(EXPECTED.get("autocorrelation_1"), within(1e-13));
    assertThat(correlations[3]).isCloseTo(EXPECTED.get("autocorrelation_4"), within(1e-13));
  }

  @Test
  void autocorrelationsOfNothingOneAndAllEqual() {
    assertThat(Autocorrelation.upTo(new double[0], 0)).isEmpty();
    assertThat(Autocorrelation.upTo(new double[] {1}, 0)).isEmpty();
    assertThat(Autocorrelation.upTo(new double[] {0.1, 0.1, 0.1}, 2)).containsExactly(0, 0);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> Autocorrelation.upTo(new double[] {1, 2}, 2))
        .withMessageContaining("lags is 2 for 2 values");
  }

  @Test
  void effectiveSizeAgreesWithTheStatisticsPackage() {
    assertThat(EffectiveSampleSize.pyperPeterman(X, Y))
        .isCloseTo(EXPECTED.get("n_star_values"), within(1e-11));
    assertThat(EffectiveSampleSize.pyperPeterman(AverageRanks.rank(X), AverageRanks.rank(Y)))
        .isCloseTo(EXPECTED.get("n_star_ranks"), within(1e-11));
  }

  @Test
  void effectiveSizeOfResidualsAgreesWithTheStatisticsPackage() {
    double[] residualX = residuals("residual_x_");
    double[] residualY = residuals("residual_y_");
    double size = EffectiveSampleSize.detrended(residualX, residualY);
    assertThat(size).isCloseTo(EXPECTED.get("n_star_residuals"), within(1e-10));
  }

  @Test
  void aPatternThatRepeatsThroughoutIsWorthNoLessThanThreePairs() {
    double[] saw = IntStream.range(0, 30).mapToDouble(i -> i % 2).toArray();
    assertThat(EffectiveSampleSize.pyperPeterman(saw, saw)).isEqualTo(3);
    assertThat(EffectiveSampleSize.detrended(saw, saw)).isEqualTo(3);
  }

  @Test
  void alternatingAgainstSteadyIsWorthNoMoreThanAllPairs() {
    double[] rise = IntStream.range(0, 30).asDoubleStream().toArray();
    double[] saw = Arrays.stream(rise).map(i -> i % 2).toArray();
    assertThat(EffectiveSampleSize.pyperPeterman(rise, saw)).isEqualTo(30);
  }

  @Test
  void nothingOneFewAndAllEqualAreWorthTheirNumber() {
    for (int n = 0; n <= 4; n++) {
      double[] few = IntStream.range(0, n).asDoubleStream().toArray();
      assertThat(EffectiveSampleSize.pyperPeterman(few, few)).isEqualTo(n);
      assertThat(EffectiveSampleSize.detrended(few, few)).isEqualTo(n);
    }
    double[] constant = new double[12];
    assertThat(EffectiveSampleSize.pyperPeterman(constant, Arrays.copyOf(X, 12))).isEqualTo(12);
  }

  private static double[] residuals(String prefix) {
    return IntStream.rangeClosed(1, X.length).mapToDouble(i -> EXPECTED.get(prefix + i)).toArray();
  }
}
