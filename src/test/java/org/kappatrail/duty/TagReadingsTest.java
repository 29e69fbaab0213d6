package org.kappatrail.duty;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.ExportMapping.Tag;
import org.kappatrail.history.UnusableInputException;

/** Logs of tags against loops that hold the last value, and the two forms against each other. */
class TagReadingsTest {
  private static final LocalDate AS_OF = LocalDate.of(2025, 6, 30);
  private static final Bearing DRIVE = Plant.bearing("Refiner", "DE", 600);
  private static final Bearing FREE = Plant.bearing("Refiner", "NDE", 600);
  private static final List<Bearing> BEARINGS = List.of(DRIVE, FREE);
  private static final long GAP_S = 3600;

  @TempDir Path folder;

  /** A row of a wide log: temperatures of both bearings and the speed of the one shaft. */
  private record Row(Instant at, String drive, String free, String speed) {}

  static LongStream seeds() {
    return LongStream.range(31, 39);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void holdsTheLastValueOfAnEmptyCellUpToTheGapLimit(long seed) {
    List<Row> rows = rows(seed);
    writeWide(rows);

    ReadLog log = ReadLog.of(folder, ZoneOffset.UTC, BEARINGS, AS_OF, wide().build());

    BruteForce loops = new BruteForce(ZoneOffset.UTC, AS_OF, 60, 10);
    assertThat(log.lines()).isEqualTo(loops.all(BEARINGS, held(rows)));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void readsTheSameFromARowPerValue(long seed) {
    List<Row> rows = rows(seed);
    writeWide(rows);
    ReadLog wide = ReadLog.of(folder, ZoneOffset.UTC, BEARINGS, AS_OF, wide().build());
    StringBuilder text = new StringBuilder("Stamp,Name,Reading\n");
    int values = 0;
    for (Row row : rows) {
      values += value(text, row, "TI-1", row.drive());
      values += value(text, row, "TI-2", row.free());
      values += value(text, row, "SI-1", row.speed());
      values += value(text, row, "SI-2", row.speed());
    }
    SeededLog.write(folder.resolve("temperatures/log.csv"), text.toString());

    ReadLog tagged = ReadLog.of(folder, ZoneOffset.UTC, BEARINGS, AS_OF, tagged().build());

    assertThat(tagged.lines()).isEqualTo(wide.lines());
    assertThat(tagged.accounts().get(0).rowsRead()).isEqualTo(values);
  }

  @Test
  void keepsOnlyTheRowsOfTagsThatTheSettingsName() {
    SeededLog.write(
        folder.resolve("temperatures/log.csv"),
        """
        Stamp,Name,Reading
        2025-06-01T00:00:00,TI-1,60
        2025-06-01T00:00:00,PI-7,1.2
        2025-06-01T00:05:00,PI-7,1.3
        2025-06-01T00:05:00,LI-9,40
        """);

    ReadLog log = ReadLog.of(folder, ZoneOffset.UTC, BEARINGS, AS_OF, tagged().build());

    assertThat(log.messages())
        .containsExactly(
            "temperatures/log.csv tag 'LI-9, PI-7': 3 values of 2 tags that the settings do not"
                + " name; add to tags: what is wanted");
    assertThat(log.accounts().get(0).rowsUsed()).isEqualTo(1);
  }

  @Test
  void dropsWhatATagOfQualityMarksUntilItIsGoodAgain() {
    SeededLog.write(
        folder.resolve("temperatures/log.csv"),
        """
        Stamp,TI-1,Q-1
        2025-06-01T00:00:00,60,Good
        2025-06-01T01:00:00,61,
        2025-06-01T02:00:00,62,Bad
        2025-06-01T08:00:00,63,
        2025-06-01T09:00:00,64,Good
        """);
    Block block =
        Block.of("temperatures/*")
            .column("Stamp", "time")
            .tag("TI-1", DRIVE.key(), Tag.Quantity.TEMPERATURE)
            .tag("Q-1", DRIVE.key(), Tag.Quantity.QUALITY);

    ReadLog log = ReadLog.of(folder, ZoneOffset.UTC, BEARINGS, AS_OF, block.build());

    assertThat(log.only())
        .extracting(line -> line.replaceAll("\\.0+ .*", ""))
        .containsExactly(
            "2025-06-01 running 3600000 ms 1 readings 60",
            "2025-06-01 running 3600000 ms 1 readings 61",
            "2025-06-01 running 3600000 ms 1 readings 64",
            "dropped [0, 2, 0, 0]");
  }

  @Test
  void namesTheTagOfACellThatIsNoNumber() {
    SeededLog.write(
        folder.resolve("temperatures/log.csv"),
        """
        Stamp,TI-1,TI-2,SI-1,Other
        2025-06-01T00:00:00,60,6O,Comm Fail,5
        yesterday,60,60,600,5
        2025-06-01T00:02:00,60,60,600,5
        """);

    ReadLog log = ReadLog.of(folder, ZoneOffset.UTC, BEARINGS, AS_OF, wide().build());

    assertThat(log.messages())
        .containsExactly(
            "temperatures/log.csv:2 SI-1 'Comm Fail': 1 row carries this text and no speed, the"
                + " first one here; taken as not logged",
            "temperatures/log.csv:2 TI-2 '6O': not a number; correct the cell",
            "temperatures/log.csv:3 time 'yesterday': not a time such as 2026-03-31T14:05:00; set"
                + " date-format for this file");
    assertThat(log.accounts().get(0).unusedColumns()).containsExactly("Other");
  }

  @Test
  void refusesTagsThatNothingStandsBehind() {
    SeededLog.write(folder.resolve("temperatures/log.csv"), "Stamp,TI-1,A,B\n");

    assertThatThrownBy(
            () ->
                read(
                    Block.of("temperatures/*")
                        .column("Stamp", "time")
                        .tag("TI-9", DRIVE.key(), Tag.Quantity.TEMPERATURE)))
        .isInstanceOf(UnusableInputException.class)
        .hasMessage(
            "temperatures/log.csv: no column is a temperature tag of the settings; it has Stamp,"
                + " TI-1, A, B; correct tags: in kappatrail.yaml");
    assertThatThrownBy(
            () ->
                read(
                    wide()
                        .tag(
                            "A",
                            new org.kappatrail.history.BearingKey("Refiner", "DR"),
                            Tag.Quantity.TEMPERATURE)))
        .isInstanceOf(UnusableInputException.class)
        .hasMessage(
            "kappatrail.yaml: temperatures: tags: the register has no bearing 'Refiner/DR'; the"
                + " nearest name is 'Refiner/DE'");
    assertThatThrownBy(() -> read(wide().tag("A", DRIVE.key(), Tag.Quantity.TEMPERATURE)))
        .isInstanceOf(UnusableInputException.class)
        .hasMessage(
            "temperatures/log.csv: two tags carry temperature_c of Refiner/DE; name one of them in"
                + " tags: only");
  }

  private void read(Block block) {
    ReadLog.of(folder, ZoneOffset.UTC, BEARINGS, AS_OF, block.build());
  }

  private static Block wide() {
    return Block.of("temperatures/*")
        .column("Stamp", "time")
        .tag("TI-1", DRIVE.key(), Tag.Quantity.TEMPERATURE)
        .tag("TI-2", FREE.key(), Tag.Quantity.TEMPERATURE)
        .tag("SI-1", DRIVE.key(), Tag.Quantity.SPEED)
        .tag("SI-2", FREE.key(), Tag.Quantity.SPEED);
  }

  private static Block tagged() {
    return wide().column("Name", "tag").column("Reading", "value");
  }

  private static List<Row> rows(long seed) {
    Random random = new Random(seed);
    List<Row> rows = new ArrayList<>();
    Instant now = Instant.parse("2025-06-01T00:00:00Z");
    while (rows.size() < 600) {
      rows.add(new Row(now, cell(random, 60, 5), cell(random, 55, 5), cell(random, 580, 20)));
      now = now.plusSeconds(random.nextInt(15) == 0 ? random.nextInt(9000) + 1 : 300);
    }
    java.util.Collections.shuffle(rows, random);
    return rows;
  }

  private static String cell(Random random, double mean, double spread) {
    return switch (random.nextInt(14)) {
      case 0 -> "Bad";
      case 1 -> "9999";
      case 2 -> "-50";
      case 3, 4, 5, 6, 7 -> "";
      default -> String.format(Locale.ROOT, "%.1f", mean + spread * random.nextGaussian());
    };
  }

  /** Readings as the last values make them; the rule in plain loops. */
  private static List<RawReading> held(List<Row> rows) {
    List<Row> inTime = rows.stream().sorted(java.util.Comparator.comparing(Row::at)).toList();
    List<RawReading> readings = new ArrayList<>();
    for (Bearing bearing : BEARINGS) {
      Held temperature = new Held();
      Held speed = new Held();
      for (Row row : inTime) {
        String cell = bearing.equals(DRIVE) ? row.drive() : row.free();
        if (cell.isEmpty() && row.speed().isEmpty()) {
          continue;
        }
        boolean bad = cell.equals("Bad") || cell.equals("9999") || cell.equals("-50");
        String t = temperature.at(row.at(), cell, bad);
        String s = speed.at(row.at(), row.speed(), row.speed().matches("Bad|-50"));
        readings.add(
            new RawReading(
                row.at().toString(),
                bearing.key(),
                cell.isEmpty() ? t : cell,
                row.speed().equals("-50") ? "-50" : s,
                ""));
      }
    }
    return readings;
  }

  /** The last value of a column. */
  private static final class Held {
    private String value = "";
    private Instant since = Instant.EPOCH;

    String at(Instant now, String cell, boolean bad) {
      if (!cell.isEmpty()) {
        value = bad ? "" : cell;
        since = now;
      }
      return now.getEpochSecond() - since.getEpochSecond() <= GAP_S ? value : "";
    }
  }

  private static int value(StringBuilder text, Row row, String tag, String value) {
    if (value.isEmpty()) {
      return 0;
    }
    text.append(row.at()).append(',').append(tag).append(',').append(value).append('\n');
    return 1;
  }

  private void writeWide(List<Row> rows) {
    StringBuilder text = new StringBuilder("Stamp,TI-1,TI-2,SI-1,SI-2\n");
    for (Row row : rows) {
      text.append(
          String.join(",", row.at().toString(), row.drive(), row.free(), row.speed(), row.speed()));
      text.append('\n');
    }
    SeededLog.write(folder.resolve("temperatures/log.csv"), text.toString());
  }
}
