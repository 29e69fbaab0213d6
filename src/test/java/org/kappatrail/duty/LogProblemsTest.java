package org.kappatrail.duty;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.history.Bearing;

/** What is told of cells that cannot be used; the contract's text is the measure. */
class LogProblemsTest {
  private static final LocalDate AS_OF = LocalDate.of(2025, 1, 31);
  private static final List<Bearing> FAN = List.of(Plant.bearing("Fan 3", "DE", 990));

  @TempDir Path folder;

  @Test
  void namesLineColumnValueAndRemedyOfEveryCellThatIsNoNumberOrTime() {
    ReadLog log =
        read(
            "time,asset,bearing,temperature_c,speed_rpm",
            "2025-01-01T00:00:00,Fan 3,DE,\"61,5\",990",
            "",
            "2025-01-01T00:01:00,Fan 3,DE,61.5,99O",
            "31.01.2025 00:02,Fan 3,DE,61.5,990",
            "2025-01-01T00:03:00,Fan 3,DE,6l.5,990",
            "2025-01-01T00:04:00,Fan 3,DE,61.5,990,7");

    assertThat(log.messages())
        .containsExactly(
            "temperatures/log.csv:2 temperature_c '61,5': not a number with a decimal point; set"
                + " decimal: comma or thousands for this file",
            "temperatures/log.csv:4 speed_rpm '99O': not a number; correct the cell",
            "temperatures/log.csv:5 time '31.01.2025 00:02': not a time such as"
                + " 2026-03-31T14:05:00; set date-format for this file",
            "temperatures/log.csv:6 temperature_c '6l.5': not a number; correct the cell",
            "temperatures/log.csv:7: the row has more cells than the header; quote a cell that holds"
                + " a delimiter");
    assertThat(log.accounts().get(0).rowsRead()).isEqualTo(5);
    assertThat(log.accounts().get(0).rowsUsed()).isEqualTo(1);
  }

  @Test
  void sumsUpStatusTextsAndUnknownMarks() {
    ReadLog log =
        read(
            "time,asset,bearing,temperature_c,speed_rpm,quality",
            "2025-01-01T00:00:00,Fan 3,DE,I/O Timeout,990,Good",
            "2025-01-01T00:01:00,Fan 3,DE,I/O Timeout,990,Good",
            "2025-01-01T00:02:00,Fan 3,DE,60,Bad,Good",
            "2025-01-01T00:03:00,Fan 3,DE,60,990,Manual",
            "2025-01-01T00:04:00,Fan 3,DE,60,990,Bad",
            "2025-01-01T00:05:00,Fan 3,DE,,990,Good");

    assertThat(log.messages())
        .containsExactly(
            "temperatures/log.csv:2 temperature_c 'I/O Timeout': 2 rows carry this text and no"
                + " temperature, the first one here; left out",
            "temperatures/log.csv:4 speed_rpm 'Bad': 1 row carries this text and no speed, the first"
                + " one here; taken as not logged",
            "temperatures/log.csv:5 quality 'Manual': 1 row carries this mark, the first one here;"
                + " only good, 192 and nothing count");
    assertThat(log.only()).last().isEqualTo("dropped [3, 2, 0, 0]");
  }

  @Test
  void namesTheNearestBearingOfTheRegister() {
    ReadLog log =
        read(
            "time,asset,bearing,temperature_c",
            "2025-01-01T00:00:00,Fan 3,DE,60",
            "2025-01-01T00:00:00,fan3,DE,60",
            "2025-01-01T00:01:00,fan3,DE,60");

    assertThat(log.messages())
        .containsExactly(
            "temperatures/log.csv:3 bearing 'fan3/DE': 2 readings of a bearing that the register"
                + " does not have; the nearest name there is 'Fan 3/DE'; correct bearings.csv or"
                + " the log");
    assertThat(log.accounts().get(0).rowsRejected()).isEqualTo(2);
  }

  @Test
  void listsAtMostAThousandCellsOfAFileAndCountsTheRest() {
    StringBuilder text = new StringBuilder("time,asset,bearing,temperature_c\n");
    for (int row = 0; row < 2500; row++) {
      text.append("day ").append(row).append(",Fan 3,DE,60\n");
    }
    SeededLog.write(folder.resolve("temperatures/log.csv"), text.toString());

    List<String> messages = ReadLog.of(folder, ZoneOffset.UTC, FAN, AS_OF).messages();

    assertThat(messages).hasSize(1001);
    assertThat(messages)
        .contains(
            "temperatures/log.csv: further cells of this file that cannot be read: 1,500",
            "temperatures/log.csv:1001 time 'day 999': not a time such as 2026-03-31T14:05:00; set"
                + " date-format for this file");
  }

  @Test
  void tellsOfAQuotationMarkThatIsNotClosed() {
    ReadLog log =
        read(
            "time,asset,bearing,temperature_c",
            "2025-01-01T00:00:00,Fan 3,DE,60",
            "\"2025-01-01T00:01:00,Fan 3,DE,60",
            "2025-01-01T00:02:00,Fan 3,DE,60");

    assertThat(log.messages()).hasSize(1);
    assertThat(log.messages().get(0))
        .startsWith("temperatures/log.csv:3 time")
        .endsWith("a quotation mark opens here and the cell runs over 2 lines; close it");
  }

  @Test
  void countsRepeatedAndLaterRowsWithoutCallingThemProblems() {
    ReadLog log =
        read(
            "time,asset,bearing,temperature_c",
            "2025-01-31T23:00:00,Fan 3,DE,60",
            "2025-01-31T23:00:00,Fan 3,DE,61",
            "2025-02-01T00:00:00,Fan 3,DE,62");

    assertThat(log.messages()).isEmpty();
    assertThat(log.fates().get(0).counts())
        .isEqualTo(
            Map.of(ReadingState.RUNNING, 1L, ReadingState.REPEATED, 1L, ReadingState.LATER, 1L));
    assertThat(log.only().get(0)).contains("3600000 ms 1 readings 61.0");
  }

  @Test
  void tellsOfFilesThatItDoesNotRead() {
    SeededLog.write(folder.resolve("temperatures/notes.txt"), "hello");
    SeededLog.write(folder.resolve("temperatures/.hidden"), "hello");

    ReadLog log = ReadLog.of(folder, ZoneOffset.UTC, FAN, AS_OF, Block.of("logs/*.csv").build());

    assertThat(log.messages())
        .containsExactly(
            "kappatrail.yaml temperatures 'logs/*.csv': no file has such a name; correct files: or"
                + " take the block out",
            "temperatures/notes.txt: not read; readings are taken from .csv, .csv.gz and .parquet"
                + " files");
  }

  private ReadLog read(String... lines) {
    SeededLog.write(folder.resolve("temperatures/log.csv"), String.join("\n", lines) + "\n");
    return ReadLog.of(folder, ZoneOffset.UTC, FAN, AS_OF);
  }
}
