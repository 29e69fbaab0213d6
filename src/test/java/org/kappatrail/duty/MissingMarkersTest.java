package org.kappatrail.duty;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.ExportMapping.Tag;

/** What {@code missing:} names is read as an empty cell, in every form of a log. */
class MissingMarkersTest {
  private static final LocalDate AS_OF = LocalDate.of(2025, 6, 30);
  private static final Bearing DRIVE = Plant.bearing("Refiner", "DE", 600);
  private static final String LONG =
      """
      time,asset,bearing,temperature_c,speed_rpm
      2025-06-01T00:00:00,Refiner,DE,60,600
      2025-06-01T00:30:00,Refiner,DE,{missing},600
      2025-06-01T01:00:00,Refiner,DE,61,{missing}
      2025-06-01T01:10:00,Refiner,DE, {missing} ,600
      """;
  private static final String WIDE =
      """
      time,TI-1,SI-1
      2025-06-01T00:00:00,60,600
      2025-06-01T00:30:00,{missing},
      2025-06-01T00:40:00,61,{missing}
      2025-06-01T02:00:00,{missing},{missing}
      """;

  @TempDir Path folder;

  @Test
  void theLongFormTakesAMarkerForAnEmptyCell() {
    ReadLog empty = read(LONG, "", longForm());
    for (String marker : List.of("0", "-9999", "out of use", "Bad")) {
      ReadLog marked = read(LONG, marker, longForm().missing("x", marker));
      assertThat(marked.lines()).as(marker).isEqualTo(empty.lines());
      assertThat(marked.problems()).isEmpty();
      assertThat(marked.fates().get(0).count(ReadingState.NO_TEMPERATURE)).isEqualTo(2);
    }
  }

  @Test
  void theUsualTextsNeedNotBeNamed() {
    ReadLog empty = read(LONG, "", longForm());
    ReadLog emptyWide = read(WIDE, "", wideForm());
    for (String marker : List.of("-", "n/a", "N/A", "nd", "NULL", "NaN", "–")) {
      ReadLog marked = read(LONG, marker, longForm());
      assertThat(marked.lines()).as(marker).isEqualTo(empty.lines());
      assertThat(marked.problems()).isEmpty();
      assertThat(read(WIDE, marker, wideForm()).lines()).as(marker).isEqualTo(emptyWide.lines());
    }
  }

  @Test
  void otherTextsAndNumbersStayWhatTheyAre() {
    ReadLog log = read(LONG, "0", longForm().missing("0.0", "-9999"));
    assertThat(log.fates().get(0).count(ReadingState.NO_TEMPERATURE)).isZero();
    ReadLog status = read(LONG, "Bad", longForm().missing("bad", "Ba"));
    assertThat(status.fates().get(0).count(ReadingState.STATUS_TEXT)).isEqualTo(2);
    assertThat(status.messages()).hasSize(2);
  }

  @Test
  void theWideFormHoldsTheValueBeforeAMarkerAsBeforeAnEmptyCell() {
    ReadLog empty = read(WIDE, "", wideForm());
    assertThat(empty.only())
        .extracting(line -> line.replaceAll("\\.0+ .*", ""))
        .contains("2025-06-01 running 2400000 ms 1 readings 60");
    for (String marker : List.of("0", "-9999", "Bad")) {
      ReadLog marked = read(WIDE, marker, wideForm().missing(marker));
      assertThat(marked.lines()).as(marker).isEqualTo(empty.lines());
      assertThat(marked.problems()).isEmpty();
    }
  }

  @Test
  void aRowPerValueLeavesAMarkedValueOut() {
    String text =
        """
        time,tag,value
        2025-06-01T00:00:00,TI-1,60
        2025-06-01T00:00:00,SI-1,600
        2025-06-01T00:30:00,TI-1,{missing}
        2025-06-01T00:35:00,SI-1,{missing}
        2025-06-01T00:40:00,TI-1,61
        """;
    ReadLog marked = read(text, "-9999", wideForm().missing("-9999"));
    assertThat(marked.lines()).isEqualTo(read(text, "", wideForm()).lines());
    assertThat(marked.problems()).isEmpty();
    assertThat(marked.only().get(0)).startsWith("2025-06-01 running 2400000 ms 1 readings 60");
    assertThat(marked.fates().get(0).count(ReadingState.NO_TEMPERATURE)).isEqualTo(2);
    assertThat(marked.fates().get(0).used()).isEqualTo(3);
  }

  @Test
  void aDecimalCommaMarkerIsTheTextOfTheFile() {
    String text =
        """
        time;asset;bearing;temperature_c
        2025-06-01T00:00:00;Refiner;DE;60,5
        2025-06-01T00:10:00;Refiner;DE;-99,9
        2025-06-01T00:20:00;Refiner;DE;0,0
        """;
    ReadLog log = read(text, "", longForm().decimalComma().missing("0,0", "-99,9"));
    assertThat(log.fates().get(0).count(ReadingState.NO_TEMPERATURE)).isEqualTo(2);
    assertThat(log.fates().get(0).used()).isEqualTo(1);
  }

  @Test
  void columnsOfNumbersTakeAMarkerByItsValue() throws IOException, SQLException {
    Path database = folder.resolve("site.db");
    Path parquet = Files.createDirectory(folder.resolve("temperatures")).resolve("log.parquet");
    try (Connection connection = DriverManager.getConnection("jdbc:duckdb:" + database);
        Statement statement = connection.createStatement()) {
      statement.execute(
          "CREATE TABLE readings (time TIMESTAMP, asset VARCHAR, bearing VARCHAR,"
              + " temperature_c DOUBLE, speed_rpm INTEGER)");
      statement.execute(
          "INSERT INTO readings VALUES ('2025-06-01 00:00:00', 'Refiner', 'DE', 60, 600),"
              + " ('2025-06-01 00:10:00', 'Refiner', 'DE', -9999, 600),"
              + " ('2025-06-01 00:20:00', 'Refiner', 'DE', 61, -9999),"
              + " ('2025-06-01 00:30:00', 'Refiner', 'DE', 0, 0)");
      statement.execute("COPY readings TO '" + parquet + "' (FORMAT parquet)");
    }
    Block fromTable = Block.of("").with("jdbc", "jdbc:duckdb:" + database);
    ReadLog table =
        ReadLog.of(
            folder.resolve("none"),
            ZoneOffset.UTC,
            List.of(DRIVE),
            AS_OF,
            fromTable.with("table", "readings").missing("-9999", "0").build());
    ReadLog file = read(Block.of("temperatures/*").missing("-9999", "0"));

    for (ReadLog log : List.of(table, file)) {
      assertThat(log.fates().get(0).count(ReadingState.NO_TEMPERATURE)).isEqualTo(2);
      assertThat(log.fates().get(0).used()).isEqualTo(2);
      assertThat(log.fates().get(0).total()).isEqualTo(4);
      assertThat(log.problems()).isEmpty();
    }
    assertThat(table.lines()).isEqualTo(file.lines());
  }

  private ReadLog read(String text, String marker, Block block) {
    SeededLog.write(folder.resolve("temperatures/log.csv"), text.replace("{missing}", marker));
    return read(block);
  }

  private ReadLog read(Block block) {
    return ReadLog.of(folder, ZoneOffset.UTC, List.of(DRIVE), AS_OF, block.build());
  }

  private static Block longForm() {
    return Block.of("temperatures/*");
  }

  private static Block wideForm() {
    return Block.of("temperatures/*")
        .tag("TI-1", DRIVE.key(), Tag.Quantity.TEMPERATURE)
        .tag("SI-1", DRIVE.key(), Tag.Quantity.SPEED);
  }
}
