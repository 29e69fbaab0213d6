package org.kappatrail.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Optional;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class NumberTextTest {
  @ParameterizedTest
  @CsvSource({"1,1", "-1.5,-1.5", "+.5,0.5", "2.,2", "1e3,1000", "1.2E-2,0.012", "−3,-3", "007,7"})
  void plainNumbersHaveADecimalPoint(String text, double value) {
    assertThat(NumberText.PLAIN.parse(text)).hasValue(value);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "1,5",
        "1 000",
        "1.2.3",
        "abc",
        "1f",
        "1d",
        "0x1F",
        "NaN",
        "Infinity",
        "1e999",
        "1e",
        "--1",
        ".",
        "٣",
        "1_000",
        "1.5 "
      })
  void anythingElseIsNone(String text) {
    assertThat(NumberText.PLAIN.parse(text)).isEmpty();
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "1,5 | 1.5",
        "1.148,5 | 1148.5",
        "12.345.678 | 12345678",
        "-1.000 | -1000",
        "1000,25 | 1000.25"
      })
  void commasAndGroupsAreReadAsTheSettingsSay(String text, double value) {
    assertThat(new NumberText(true, Optional.of(".")).parse(text)).hasValue(value);
  }

  @ParameterizedTest
  @ValueSource(strings = {"1.5", "1.14,5", "1148.5", "1.148,5.0", ".500", "1,148.5"})
  void groupsThatAreNotOfThreeDigitsAreNone(String text) {
    assertThat(new NumberText(true, Optional.of(".")).parse(text)).isEmpty();
  }

  @ParameterizedTest
  @ValueSource(strings = {"1 148.5", "1\u00A0148.5", "1\u202F148.5"})
  void everyBlankSeparatesGroups(String text) {
    assertThat(new NumberText(false, Optional.of(" ")).parse(text)).hasValue(1148.5);
  }
}
