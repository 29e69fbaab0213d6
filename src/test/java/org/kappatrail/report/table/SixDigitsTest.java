package org.kappatrail.report.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SixDigitsTest {
  @ParameterizedTest
  @CsvSource({
    "1, 1",
    "-1.5, -1.5",
    "0.1, 0.1",
    "123456, 123456",
    "1234567, 1234570",
    "999999.5, 1000000",
    "99999.96, 100000",
    "0.000123456789, 0.000123457",
    "0.0000012345678, 0.00000123457",
    "0.99999951, 1",
    "1e12, 1000000000000",
    "-0.0, 0",
    "100.001, 100.001",
    "62.5, 62.5"
  })
  void keepsSixSignificantDigitsWithoutExponent(double value, String text) {
    assertThat(SixDigits.text(value)).isEqualTo(text);
  }

  @Test
  void roundsTheMiddleToTheEvenDigit() {
    assertThat(SixDigits.text(1000005.0)).isEqualTo("1000000");
    assertThat(SixDigits.text(1000015.0)).isEqualTo("1000020");
    assertThat(SixDigits.text(100000.5)).isEqualTo("100000");
    assertThat(SixDigits.text(100001.5)).isEqualTo("100002");
  }

  @Test
  void leavesUnknownEmptyAndRefusesInfinity() {
    assertThat(SixDigits.text(Double.NaN)).isEmpty();
    assertThatThrownBy(() -> SixDigits.text(Double.POSITIVE_INFINITY))
        .isInstanceOf(IllegalArgumentException.class);
  }

  /** Against decimal arithmetic on the exact value of the double, at and beside every border. */
  @Test
  void agreesWithExactArithmetic() {
    Random random = new Random(7);
    for (int i = 0; i < 200_000; i++) {
      double magnitude = Math.pow(10, random.nextInt(18) - 7);
      double value = (random.nextDouble() * 2 - 1) * magnitude;
      double middle = (Math.rint(random.nextDouble() * 1e6) + 0.5) / 1e6 * magnitude;
      hold(value);
      hold(middle);
      hold(Math.nextUp(middle));
      hold(magnitude);
      hold(Math.nextDown(magnitude));
    }
  }

  private static void hold(double value) {
    String exact =
        value == 0
            ? "0"
            : new BigDecimal(value)
                .round(new MathContext(6, RoundingMode.HALF_EVEN))
                .stripTrailingZeros()
                .toPlainString();
    assertThat(SixDigits.text(value)).isEqualTo(exact);
  }
}
