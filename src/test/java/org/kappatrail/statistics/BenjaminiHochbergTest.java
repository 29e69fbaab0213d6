package org.kappatrail.statistics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class BenjaminiHochbergTest {

  private static final Published TABLE = Published.table("benjamini_hochberg_1995.csv");

  /** Benjamini and Hochberg 1995, section 4; adjusted values to six decimals. */
  @Test
  void fourOfTheFifteenPublishedTestsAreCalled() {
    double[] q = BenjaminiHochberg.adjust(TABLE.column("p"));
    assertThat(q).containsExactly(TABLE.column("adj_p"), within(5e-7));
    assertThat(Arrays.stream(q).filter(value -> value <= 0.05)).hasSize(4);
  }

  @Test
  void adjustedValuesKeepTheOrderGiven() {
    double[] p = TABLE.column("p");
    double[] q = BenjaminiHochberg.adjust(p);
    assertThat(BenjaminiHochberg.adjust(reversed(p))).containsExactly(reversed(q));
  }

  @Test
  void aLowerAdjustedValueAboveCarriesDown() {
    assertThat(BenjaminiHochberg.adjust(new double[] {0.03, 0.02, 0.03}))
        .containsExactly(0.03, 0.03, 0.03);
  }

  @Test
  void noTestsOneTestAndAllEqual() {
    assertThat(BenjaminiHochberg.adjust(new double[0])).isEmpty();
    assertThat(BenjaminiHochberg.adjust(new double[] {0.04})).containsExactly(0.04);
    assertThat(BenjaminiHochberg.adjust(new double[] {0.5, 0.5, 0.5}))
        .containsExactly(0.5, 0.5, 0.5);
  }

  @ParameterizedTest
  @ValueSource(doubles = {-0.01, 1.01, Double.NaN})
  void whatIsNoProbabilityIsRefused(double p) {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> BenjaminiHochberg.adjust(new double[] {0.5, p}))
        .withMessageContaining("p is " + p);
  }

  private static double[] reversed(double[] values) {
    double[] reversed = new double[values.length];
    Arrays.setAll(reversed, i -> values[values.length - 1 - i]);
    return reversed;
  }
}
