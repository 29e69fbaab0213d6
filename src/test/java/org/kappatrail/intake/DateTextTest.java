package org.kappatrail.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DateTextTest {
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "dd/MM/yyyy | 5/3/2024 | 2024-03-05T00:00",
        "dd/MM/yyyy | 05/03/2024 | 2024-03-05T00:00",
        "dd.MM.yy | 05.03.24 | 2024-03-05T00:00",
        "dd.MM.yy | 05.03.98 | 1998-03-05T00:00",
        "dd.MM.yy | 05.03.2024 | 2024-03-05T00:00",
        "ddMMyy | 050324 | 2024-03-05T00:00",
        "yyyyMMdd | 20240305 | 2024-03-05T00:00",
        "d-MMM-yy | 5-mar-24 | 2024-03-05T00:00",
        "d MMM yyyy | 5 SEPT 2024 | 2024-09-05T00:00",
        "MMMM d, yyyy | September 5, 2024 | 2024-09-05T00:00",
        "dd/MM/yyyy HH:mm | 05/03/2024 14:30 | 2024-03-05T14:30",
        "MM/dd/yyyy h:mm a | 3/5/2024  2:30 pm | 2024-03-05T14:30",
        "dd.MM.yyyy[ HH:mm] | 05.03.2024 | 2024-03-05T00:00",
        "yyyy-MM-dd'T'HH:mm:ssXXX | 2024-03-05T14:30:00+02:00 | 2024-03-05T12:30",
        "epoch-seconds | 1709649000 | 2024-03-05T14:30",
        "epoch-millis | 1709649000000 | 2024-03-05T14:30"
      })
  void aPatternIsReadWhateverTheMachinesLanguage(String pattern, String text, String moment) {
    assertThat(reader(pattern).parse(text, false))
        .hasValueSatisfying(read -> assertThat(read.at()).hasToString(moment));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "dd/MM/yyyy | 31/02/2024",
        "dd/MM/yyyy | 29/02/2023",
        "dd/MM/yyyy | 12/31/2023",
        "dd/MM/yyyy | 2024-03-05",
        "d-MMM-yy | 5-Mai-24",
        "dd/MM/yyyy HH:mm | 05/03/2024 24:30",
        "epoch-seconds | soon"
      })
  void aDayThatDoesNotExistIsNone(String pattern, String text) {
    assertThat(reader(pattern).parse(text, false)).isEmpty();
  }

  @ParameterizedTest
  @CsvSource({
    "2024-03-05,2024-03-05T00:00",
    "2024-03-05T14:30,2024-03-05T14:30",
    "2024-03-05 14:30:15,2024-03-05T14:30:15",
    "2024-03-05T14:30:15.250Z,2024-03-05T15:30:15.250",
    "2024-07-05T14:30:00+00:00,2024-07-05T16:30",
    "2024-03-05 14:30 -0500,2024-03-05T20:30"
  })
  void isoTimesWithAnOffsetBecomeSiteTime(String text, String moment) {
    DateText dates = DateText.iso(ZoneId.of("Europe/Berlin"));
    assertThat(dates.parse(text, false))
        .hasValueSatisfying(read -> assertThat(read.at()).hasToString(moment));
  }

  @Test
  void aDayAloneIsNotTimed() {
    DateText dates = DateText.iso(ZoneOffset.UTC);
    assertThat(dates.parse("2024-03-05", false).map(DateText.Moment::timed)).contains(false);
    assertThat(dates.parse("2024-03-05T00:00", false).map(DateText.Moment::timed)).contains(true);
    assertThat(dates.parse("2024-3-5", false)).isEmpty();
    assertThat(dates.parse("", false)).isEmpty();
  }

  private static DateText reader(String pattern) {
    return new DateText(Optional.of(pattern), ZoneOffset.UTC, ZoneOffset.UTC, false);
  }
}
