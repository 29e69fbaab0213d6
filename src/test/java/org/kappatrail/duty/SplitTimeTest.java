package org.kappatrail.duty;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.UnusableInputException;

/** Times in two columns, or with a part that is not always there. */
class SplitTimeTest {
  private static final LocalDate AS_OF = LocalDate.of(2025, 6, 30);
  private static final List<Bearing> BEARINGS = List.of(Plant.bearing("Fan 1", "DE", 1480));
  private static final String PLAIN =
      """
      time,asset,bearing,temperature_c
      2025-06-01T00:00:00,Fan 1,DE,60
      2025-06-01T14:05:00,Fan 1,DE,61
      """;

  @TempDir Path folder;

  @Test
  void dayAndTimeOfDayMakeOneTime() {
    ReadLog expected = read(PLAIN, Block.of("temperatures/*"));
    ReadLog iso =
        read(
            """
            Day,Clock,asset,bearing,temperature_c
            2025-06-01,00:00:00,Fan 1,DE,60
            2025-06-01, 14:05 ,Fan 1,DE,61
            """,
            split());
    ReadLog patterned =
        read(
            """
            Day,Clock,asset,bearing,temperature_c
            01/06/2025,12:00 AM,Fan 1,DE,60
            01/06/2025,2:05 PM,Fan 1,DE,61
            """,
            split().with("date-format", "dd/MM/yyyy h:mm a"));
    assertThat(iso.lines()).isEqualTo(expected.lines());
    assertThat(patterned.lines()).isEqualTo(expected.lines());
  }

  @Test
  void aRowWithoutATimeOfDayIsNotTakenForMidnight() {
    ReadLog log =
        read(
            """
            Day,Clock,asset,bearing,temperature_c
            2025-06-01,00:00,Fan 1,DE,60
            2025-06-02,,Fan 1,DE,61
            2025-06-02,noon,Fan 1,DE,61
            """,
            split());
    assertThat(log.accounts().get(0).rowsUsed()).isEqualTo(1);
    assertThat(log.messages())
        .hasSize(2)
        .anyMatch(
            message -> message.startsWith("temperatures/log.csv:3 time '2025-06-02 ?': not a"))
        .anyMatch(message -> message.startsWith("temperatures/log.csv:4 time '2025-06-02 noon': "));
  }

  @Test
  void aColumnOfThatNameAloneMeansNothing() {
    ReadLog log =
        read(
            """
            time,time_of_day,asset,bearing,temperature_c
            2025-06-01T00:00:00,13:00,Fan 1,DE,60
            2025-06-01T14:05:00,13:00,Fan 1,DE,61
            """,
            Block.of("temperatures/*"));
    assertThat(log.lines()).isEqualTo(read(PLAIN, Block.of("temperatures/*")).lines());
    assertThat(log.accounts().get(0).unusedColumns()).contains("time_of_day");
  }

  @Test
  void aPartInSquareBracketsMayBeMissing() {
    ReadLog expected = read(PLAIN, Block.of("temperatures/*"));
    for (String pattern : List.of("dd.MM.yyyy[ HH:mm[:ss]]", "dd.MM.yyyy[ HH:mm][:ss]")) {
      Block block = Block.of("temperatures/*").with("date-format", pattern);
      if (pattern.endsWith("]]")) {
        assertThatThrownBy(() -> read(PLAIN, block))
            .isInstanceOf(UnusableInputException.class)
            .hasMessageContaining("brackets close and do not nest");
        continue;
      }
      ReadLog log =
          read(
              """
              time,asset,bearing,temperature_c
              01.06.2025,Fan 1,DE,60
              01.06.2025 14:05,Fan 1,DE,61
              """,
              block);
      assertThat(log.lines()).isEqualTo(expected.lines());
    }
  }

  @Test
  void thousandsAreTakenOutOfGroupsOfThreeOnly() {
    String text =
        """
        time;asset;bearing;temperature_c;speed_rpm
        2025-06-01T00:00:00;Fan 1;DE;60,5;1.480,5
        2025-06-01T00:10:00;Fan 1;DE;60.5;1.480
        2025-06-01T00:20:00;Fan 1;DE;60,5;14.80
        """;
    ReadLog log = read(text, Block.of("temperatures/*").decimalComma().with("thousands", "."));
    assertThat(log.messages())
        .anyMatch(message -> message.startsWith("temperatures/log.csv:3 temperature_c '60.5': "))
        .anyMatch(message -> message.startsWith("temperatures/log.csv:4 speed_rpm '14.80': "))
        .hasSize(2);
    ReadLog narrow =
        read(
            text.replace("1.480", "1\u202F480").replace("60.5", "60,5").replace("14.80", "1480"),
            Block.of("temperatures/*").decimalComma().with("thousands", " "));
    assertThat(narrow.problems()).isEmpty();
    assertThat(narrow.accounts().get(0).rowsUsed()).isEqualTo(3);
  }

  private static Block split() {
    return Block.of("temperatures/*").column("Day", "time").column("Clock", "time_of_day");
  }

  private ReadLog read(String text, Block block) {
    SeededLog.write(folder.resolve("temperatures/log.csv"), text);
    return ReadLog.of(folder, ZoneOffset.UTC, BEARINGS, AS_OF, block.build());
  }
}
