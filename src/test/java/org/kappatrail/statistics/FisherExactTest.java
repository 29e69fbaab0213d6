package org.kappatrail.statistics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FisherExactTest {
  private static final Published.Values SCIPY = Published.values("tied_pairs_scipy.csv");

  /** Fisher, The Design of Experiments (1935), ch. 2: eight cups, four of each; from memory. */
  @Test
  void theLadyWhoTellsAllFourCupsDoesSoOnceInSeventyTimes() {
    assertThat(FisherExact.atLeast(8, 4, 4, 4)).isCloseTo(1 / 70.0, within(1e-14));
    assertThat(FisherExact.atLeast(8, 4, 4, 3)).isCloseTo(17 / 70.0, within(1e-14));
  }

  @ParameterizedTest
  @CsvSource({"8,4,4,3", "30,4,4,3", "60,6,10,4", "30,1,1,1"})
  void agreesWithTheStatisticsPackage(int n, int first, int second, int together) {
    String name = "fisher_" + n + "_" + first + "_" + second + "_" + together;
    assertThat(FisherExact.atLeast(n, first, second, together))
        .isCloseTo(SCIPY.get(name), within(1e-12));
  }

  @Test
  void nothingTogetherIsCertain() {
    assertThat(FisherExact.atLeast(0, 0, 0, 0)).isEqualTo(1);
    assertThat(FisherExact.atLeast(9, 3, 0, 0)).isEqualTo(1);
    assertThat(FisherExact.atLeast(9, 9, 9, 9)).isCloseTo(1, within(1e-12));
  }

  @Test
  void marksThatCannotBeAreRefused() {
    assertThatIllegalArgumentException().isThrownBy(() -> FisherExact.atLeast(5, 6, 1, 1));
    assertThatIllegalArgumentException().isThrownBy(() -> FisherExact.atLeast(5, 2, 1, 2));
    assertThatIllegalArgumentException().isThrownBy(() -> FisherExact.atLeast(5, 2, -1, 0));
  }
}
