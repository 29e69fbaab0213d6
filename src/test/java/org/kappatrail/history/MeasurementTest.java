package org.kappatrail.history;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.function.DoubleFunction;
import org.junit.jupiter.api.Test;

class MeasurementTest {
  @Test
  void aBoundIsStatedAsItsLimitAndCalculatedWithAsTheMethodSays() {
    assertThat(new Measurement.Below(20).stated()).isEqualTo(20);
    assertThat(new Measurement.Below(20).forArithmetic()).isEqualTo(10);
    assertThat(new Measurement.Above(5000).forArithmetic()).isEqualTo(5000);
    assertThat(Measurement.of(3).forArithmetic()).isEqualTo(3);
  }

  @Test
  void onlyBoundsAreCensored() {
    assertThat(new Measurement.Below(20).censored()).isTrue();
    assertThat(new Measurement.Above(20).censored()).isTrue();
    assertThat(Measurement.of(20).censored()).isFalse();
    assertThat(Measurement.of(20)).isNotEqualTo(new Measurement.Below(20));
  }

  @Test
  void theTextCarriesTheBound() {
    assertThat(new Measurement.Below(20)).hasToString("<20.0");
    assertThat(new Measurement.Above(20)).hasToString(">20.0");
    assertThat(Measurement.of(20)).hasToString("20.0");
  }

  @Test
  void whatIsNotFiniteIsRefusedInEveryKind() {
    List<DoubleFunction<Measurement>> kinds =
        List.of(Measurement.Exact::new, Measurement.Below::new, Measurement.Above::new);
    for (DoubleFunction<Measurement> kind : kinds) {
      for (double value : new double[] {Double.NaN, Double.POSITIVE_INFINITY}) {
        assertThatThrownBy(() -> kind.apply(value))
            .isInstanceOf(IllegalArgumentException.class)
            .hasMessageContaining("finite");
      }
    }
  }
}
