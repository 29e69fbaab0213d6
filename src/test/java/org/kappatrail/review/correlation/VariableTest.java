package org.kappatrail.review.correlation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.assertThatIllegalStateException;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class VariableTest {

  @Test
  void valuesBelowALimitAreTiedBelowAllMeasuredOnesAndThoseAboveOneAreTiedAboveThem() {
    Variable water =
        Variable.of(
            "water_ppm",
            List.of(
                Optional.of(new Value(10, Value.Range.BELOW)),
                Optional.of(Value.measured(3)),
                Optional.of(new Value(5000, Value.Range.ABOVE)),
                Optional.of(Value.measured(9000)),
                Optional.of(new Value(25, Value.Range.BELOW)),
                Optional.of(new Value(8000, Value.Range.ABOVE))));
    assertThat(water.order(0)).isEqualTo(water.order(4)).isLessThan(water.order(1));
    assertThat(water.order(1)).isLessThan(water.order(3));
    assertThat(water.order(2)).isEqualTo(water.order(5)).isGreaterThan(water.order(3));
    assertThat(water.arithmetic(0)).isEqualTo(10);
  }

  @Test
  void zeroAndMinusZeroAreEqual() {
    Variable variable = CheckValues.variable("x", 0.0, -0.0);
    assertThat(variable.order(0)).isEqualTo(variable.order(1));
  }

  @Test
  void aMissingValueIsNoNumber() {
    Variable variable = Variable.of("x", List.of(Optional.empty()));
    assertThat(variable.has(0)).isFalse();
    assertThatIllegalStateException().isThrownBy(() -> variable.arithmetic(0));
    assertThatIllegalStateException().isThrownBy(() -> variable.order(0));
  }

  @Test
  void numbersThatAreNoneAreRefused() {
    assertThatIllegalArgumentException().isThrownBy(() -> Value.measured(Double.NaN));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new Value(Double.POSITIVE_INFINITY, Value.Range.ABOVE));
  }

  @Test
  void anAssetsVariablesHaveDistinctNamesAndAPlacePerSample() {
    Variable two = CheckValues.variable("x", 1, 2);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new AssetSeries("A", List.of(0.0), List.of(two)))
        .withMessageContaining("2 places for 1");
    assertThatIllegalArgumentException().isThrownBy(() -> CheckValues.asset("A", two, two));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new AssetSeries("A", List.of(1.0, 0.0), List.of(two)))
        .withMessageContaining("out of order");
  }
}
