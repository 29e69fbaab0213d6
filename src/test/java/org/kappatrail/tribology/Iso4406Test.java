package org.kappatrail.tribology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class Iso4406Test {
  /** ISO 4406, Table 1: upper limits of scale numbers 0 to 28, particles per ml. */
  private static final double[] UPPER = {
    0.01, 0.02, 0.04, 0.08, 0.16, 0.32, 0.64, 1.3, 2.5, 5, 10, 20, 40, 80, 160, 320, 640, 1300,
    2500, 5000, 10000, 20000, 40000, 80000, 160000, 320000, 640000, 1300000, 2500000
  };

  @Test
  void everyLimitBelongsToTheNumberBelowIt() {
    for (int number = 0; number < UPPER.length; number++) {
      double limit = UPPER[number];
      assertThat(Iso4406.scaleNumber(Math.nextDown(limit))).isEqualTo(number);
      assertThat(Iso4406.scaleNumber(limit)).isEqualTo(number);
      assertThat(Iso4406.scaleNumber(Math.nextUp(limit))).isEqualTo(number + 1);
      assertThat(Iso4406.upperLimitPerMl(number)).isEqualTo(limit);
      assertThat(Iso4406.lowerLimitPerMl(number)).isEqualTo(number == 0 ? 0 : UPPER[number - 1]);
    }
    assertThat(Iso4406.scaleNumber(0)).isZero();
    assertThat(Iso4406.scaleNumber(1e12)).isEqualTo(Iso4406.ABOVE_HIGHEST);
  }

  @Test
  void middleLiesBetweenTheLimitsAsARatio() {
    for (int number = 1; number <= Iso4406.HIGHEST; number++) {
      double middle = Iso4406.classMiddlePerMl(number);
      assertThat(middle / Iso4406.lowerLimitPerMl(number))
          .isCloseTo(Iso4406.upperLimitPerMl(number) / middle, withinPercentage(1e-9));
      assertThat(Iso4406.scaleNumber(middle)).isEqualTo(number);
    }
    assertThat(Iso4406.classMiddlePerMl(0)).isBetween(0.005, 0.01);
  }

  @Test
  void countsBecomeACode() {
    assertThat(code(2000, 500, 60)).hasToString("18/16/13");
    assertThat(code(3e6, 500, 0)).hasToString(">28/16/0");
    assertThat(Iso4406.code(OptionalDouble.empty(), OptionalDouble.of(500), OptionalDouble.empty()))
        .hasToString("*/16/*");
  }

  @ParameterizedTest
  @ValueSource(doubles = {-0.001, Double.NaN, Double.POSITIVE_INFINITY})
  void impossibleCountsAreRefused(double countPerMl) {
    assertThatThrownBy(() -> Iso4406.scaleNumber(countPerMl))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("particle count");
  }

  @ParameterizedTest
  @ValueSource(ints = {-1, 29})
  void numbersOutsideTheScaleHaveNoLimits(int number) {
    assertThatThrownBy(() -> Iso4406.classMiddlePerMl(number))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("28");
    assertThatThrownBy(() -> Iso4406.upperLimitPerMl(number))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> Iso4406.lowerLimitPerMl(number))
        .isInstanceOf(IllegalArgumentException.class);
  }

  private static CleanlinessCode code(double c4, double c6, double c14) {
    return Iso4406.code(OptionalDouble.of(c4), OptionalDouble.of(c6), OptionalDouble.of(c14));
  }
}
