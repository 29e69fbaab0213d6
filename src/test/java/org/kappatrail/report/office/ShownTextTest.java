package org.kappatrail.report.office;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class ShownTextTest {
  @Test
  void plainTextStaysAsItIs() {
    for (String text :
        new String[] {"", "Stock pump 3", "κ 0.59 (0.51…0.67) ≥ 6 µm", "5\u202F526", "😀 hall"}) {
      assertThat(ShownText.of(text)).isEqualTo(text);
    }
  }

  @Test
  void lineBreaksAndRunsOfBlanksBecomeOneBlank() {
    assertThat(ShownText.of(" a\r\n\tb \u00A0 c ")).isEqualTo("a b c");
  }

  @Test
  void whatXmlForbidsAndWhatTurnsTheWritingAroundGoes() {
    assertThat(ShownText.of("a\u0000\u0007\u001Bb\uFFFFc")).isEqualTo("abc");
    assertThat(ShownText.of("x\u202Egnp.exe\u2066y\u2069")).isEqualTo("xgnp.exey");
    assertThat(ShownText.of("a\uD83Db")).isEqualTo("a\uFFFDb");
  }

  @Test
  void leftwardTextKeepsWhatFollowsInItsPlace() {
    assertThat(ShownText.of("מכונה")).isEqualTo("מכונה\u200E");
    assertThat(ShownText.of("ضخ")).isEqualTo("ضخ\u200E");
  }
}
