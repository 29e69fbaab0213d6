package org.kappatrail.report.slides;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class TextFitTest {
  private static final TextFit FIT = TextFit.in("Arial");
  private static final String SENTENCE =
      "The temperature is to blame, not the oil; back to 61.2\u00A0°C gives κ\u00A01.56.";

  @Test
  void textThatFitsIsLeftAlone() {
    TextFit.Fitted fitted = FIT.fit("Winder", 400, 40, 26, 18, true);
    assertThat(fitted).isEqualTo(new TextFit.Fitted("Winder", 26, 1));
  }

  @ParameterizedTest
  @ValueSource(doubles = {60, 120, 240, 480})
  void everyLineIsAsNarrowAsItsBox(double width) {
    for (String text : new String[] {SENTENCE, "x".repeat(300), "ab ".repeat(100)}) {
      assertThat(FIT.lines(text, width, 14, false))
          .allSatisfy(
              line ->
                  assertThat(FIT.width(line.stripTrailing(), 14, false))
                      .isLessThanOrEqualTo(width));
      assertThat(String.join("", FIT.lines(text, width, 14, false))).isEqualTo(text);
    }
  }

  @Test
  void longTextBecomesSmallerBeforeItIsShortened() {
    TextFit.Fitted smaller = FIT.fit(SENTENCE, 300, 60, 26, 12, false);
    assertThat(smaller.text()).isEqualTo(SENTENCE);
    assertThat(smaller.points()).isBetween(12.0, 25.0);
    assertThat(smaller.height()).isLessThanOrEqualTo(60);
    TextFit.Fitted shortened = FIT.fit(SENTENCE.repeat(5), 300, 60, 26, 14, false);
    assertThat(shortened.points()).isEqualTo(14);
    assertThat(shortened.text()).endsWith("…");
    assertThat(shortened.height()).isLessThanOrEqualTo(60);
  }

  @Test
  void noNumberIsShownInPart() {
    String text = "gives κ\u00A01.5678 and pays";
    for (double width = 40; width < 200; width += 3) {
      String shown = FIT.oneLine(text, width, 14, false);
      assertThat(shown).doesNotMatch(".*\\u00A01(\\.\\d{0,3})?…");
    }
  }

  @Test
  void widthGrowsWithTheSize() {
    assertThat(FIT.width(SENTENCE, 28, false))
        .isCloseTo(2 * FIT.width(SENTENCE, 14, false), within(1e-6));
    assertThat(FIT.width(SENTENCE, 14, true)).isGreaterThan(FIT.width(SENTENCE, 14, false));
  }
}
