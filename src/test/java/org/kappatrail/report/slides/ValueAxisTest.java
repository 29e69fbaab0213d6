package org.kappatrail.report.slides;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ValueAxisTest {
  @ParameterizedTest
  @CsvSource({
    "0.6, 1.7, 0.5, 2",
    "0.5, 2, 0.25, 4",
    "0.09, 3.9, 0.0625, 4",
    "1.3, 1.4, 1, 2",
  })
  void aLogarithmicAxisRunsBetweenPowersOfTwo(double least, double most, double low, double high) {
    ValueAxis axis = ValueAxis.log(least, most, Color.BLACK);
    assertThat(axis.low()).isEqualTo(low);
    assertThat(axis.high()).isEqualTo(high);
  }

  @ParameterizedTest
  @CsvSource({"0.4, 0.1, 0.4", "7, 2, 8", "145, 50, 150", "330, 100, 400", "5000, 1000, 5000"})
  void aLinearAxisHasFewRoundTicks(double most, double step, double high) {
    ValueAxis axis = ValueAxis.fromZero(most, Color.BLACK);
    assertThat(axis.low()).isZero();
    assertThat(axis.step()).isEqualTo(step);
    assertThat(axis.high()).isEqualTo(high);
  }

  @ParameterizedTest
  @CsvSource({"12, 16", "0, 28", "15, 15", "11, 13"})
  void anAxisOfScaleNumbersHoldsThemAllWithTicksAtWholeNumbers(double least, double most) {
    ValueAxis axis = ValueAxis.whole(least, most, Color.BLACK);
    assertThat(axis.low()).isBetween(0.0, least);
    assertThat(axis.high()).isGreaterThan(most);
    assertThat(axis.step()).isEqualTo(Math.rint(axis.step()));
    assertThat((axis.high() - axis.low()) / axis.step()).isLessThanOrEqualTo(6);
  }
}
