package org.kappatrail.report.chart;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PlainTextTest {

  @ParameterizedTest
  @CsvSource({
    "Pump 7, Pump 7",
    "\u0645\u0636\u062E\u0629 7, \u0645\u0636\u062E\u0629 7",
    "a\u202Egnp.elif, agnp.elif",
    "a\u2066b\u2069c, abc",
    "a\u0000b\u001Bc\u0085d, a\uFFFDb\uFFFDc\uFFFDd",
    "a\uD800b, a\uFFFDb",
    "\uD83D\uDD27 fitter, \uD83D\uDD27 fitter"
  })
  void onlyWhatCannotBeShownGoes(String text, String shown) {
    assertThat(PlainText.of(text)).isEqualTo(shown);
  }
}
