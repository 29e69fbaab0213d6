package org.kappatrail.tribology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.kappatrail.tribology.CleanlinessCode.Part;

class CleanlinessCodeTest {
  /** Notation of ISO 4406; the lower-bound sign before any number is common laboratory practice. */
  @ParameterizedTest
  @CsvSource({
    "18/16/13, 18/16/13",
    "' 18 / 16/ 13 ', 18/16/13",
    "018/16/09, 18/16/9",
    "16/13, -/16/13",
    ">28/20/15, >28/20/15",
    "> 28 / 20 / 15, >28/20/15",
    "≥18/16/13, ≥18/16/13",
    ">=18/≥16/>13, ≥18/≥16/≥13",
    "*/19/14, */19/14",
    "-/19/14, -/19/14",
    "22/*/-, 22/*/-",
    "*/*/*, */*/*",
    "0/0/0, 0/0/0",
    "28/28/28, 28/28/28",
    "*/13, -/*/13"
  })
  void everyNotationIsReadAndWrittenInOneForm(String text, String canonical) {
    CleanlinessCode code = CleanlinessCode.parse(text);
    assertThat(code).hasToString(canonical);
    assertThat(CleanlinessCode.parse(canonical)).isEqualTo(code);
    assertThat(CleanlinessCode.find(text)).contains(code);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "18",
        "18/16/13/10",
        "18-16-13",
        "29/20/15",
        "18//13",
        "18/16/x",
        "18/-1/5",
        "1.8/1/1",
        "<18/16/13",
        "/",
        "18/16/13,",
        "9999/1/1"
      })
  void otherTextIsRefusedAndQuoted(String text) {
    assertThatThrownBy(() -> CleanlinessCode.parse(text))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("cleanliness code '" + text + "'");
    assertThat(CleanlinessCode.find(text)).isEmpty();
  }

  @Test
  void largerParticlesCannotOutnumberSmallerOnes() {
    assertThatThrownBy(() -> CleanlinessCode.parse("13/16/18"))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("16 for ≥6 µm is above 13 for ≥4 µm");
    assertThatThrownBy(() -> CleanlinessCode.parse("13/*/18"))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("≥14 µm");
    assertThat(CleanlinessCode.parse("≥13/16/12").c6()).isEqualTo(Part.of(16));
  }

  @Test
  void notMeasuredAndNotRequiredAreTwoThings() {
    CleanlinessCode code = CleanlinessCode.parse("*/-/13");
    assertThat(code.c4()).isEqualTo(Part.NOT_MEASURED).isNotEqualTo(code.c6());
    assertThat(code.c4().stated()).isTrue();
    assertThat(code.c6().stated()).isFalse();
    assertThat(code.c4().effectiveNumber()).isEmpty();
  }

  @Test
  void lowerBoundReckonsAsOneDirtier() {
    assertThat(Part.atLeast(28).effectiveNumber()).hasValue(29);
    assertThat(Part.of(28).effectiveNumber()).hasValue(28);
  }

  @Test
  void cleanerCodesStopAtZeroAndKeepWhatIsNotANumber() {
    assertThat(CleanlinessCode.parse("18/16/1").cleanerBy(2)).hasToString("16/14/0");
    assertThat(CleanlinessCode.parse(">28/*/-").cleanerBy(2)).hasToString("≥26/*/-");
    assertThatThrownBy(() -> CleanlinessCode.parse("18/16/13").cleanerBy(-1))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void contradictoryPartsAreRefused() {
    assertThatThrownBy(() -> new Part(OptionalInt.empty(), true, true))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new Part(OptionalInt.of(3), false, false))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> Part.of(-1)).isInstanceOf(IllegalArgumentException.class);
  }
}
