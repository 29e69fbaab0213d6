package org.kappatrail.duty;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.SparkSession;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.Settings;

/** Spark gives the rows that DuckDB gives of the same statement over the same Parquet file. */
@Tag("slow")
class SparkDayCellsTest {
  private static final List<Bearing> BEARINGS =
      List.of(Plant.bearing("Couch's \\roll", "front", 88.5), Plant.bearing("Mill 7", "DE", 1480));

  private static SparkSession session;

  @TempDir Path folder;

  @BeforeAll
  static void start() {
    session =
        SparkSession.builder()
            .master("local[2]")
            .appName("test")
            .config("spark.ui.enabled", false)
            .config("spark.sql.shuffle.partitions", 4)
            .getOrCreate();
  }

  @AfterAll
  static void stop() {
    session.stop();
  }

  @ParameterizedTest
  @CsvSource({
    "61, Europe/London, 2025-10-24T12:00, TIMESTAMP",
    "62, Europe/London, 2025-03-28T00:00, TIMESTAMPTZ",
    "63, America/New_York, 2025-10-31T06:30, TIMESTAMP",
    "64, Australia/Lord_Howe, 2025-10-03T00:00, TIMESTAMPTZ"
  })
  void agreesWithDuckDbRowForRow(long seed, ZoneId zone, LocalDateTime start, String type)
      throws SQLException {
    Path parquet = parquet(seed, zone, start, type);
    Settings settings = ReadLog.settings(zone);
    LocalDate asOf = start.toLocalDate().plusDays(4);

    List<String> spark =
        SparkDayCells.of(
                session,
                session.read().parquet(parquet.toString()),
                ExportMapping.canonical("*"),
                BEARINGS,
                settings,
                asOf)
            .collectAsList()
            .stream()
            .map(SparkDayCellsTest::line)
            .toList();

    assertThat(spark).hasSizeGreaterThan(100).isEqualTo(duckDb(parquet, settings, asOf));
  }

  @Test
  void writesCellsFromTheCommandLine() throws SQLException, IOException {
    ZoneId zone = ZoneId.of("Europe/London");
    Path parquet = parquet(65, zone, LocalDateTime.of(2025, 3, 28, 0, 0), "TIMESTAMP");
    Path register = folder.resolve("bearings.csv");
    Files.writeString(register, "asset,bearing,pitch_mm,speed_rpm\nMill 7,DE,120,1480\n");
    LocalDate asOf = LocalDate.of(2025, 3, 31);

    SparkDayCellsMain.write(
        session,
        "--readings",
        parquet.toString(),
        "--bearings",
        register.toString(),
        "--as-of",
        asOf.toString(),
        "--timezone",
        "Europe/London",
        "--out",
        folder.resolve("cells").toString());

    assertThat(
            session
                .read()
                .parquet(folder.resolve("cells").toString())
                .filter("asset = 'Mill 7'")
                .count())
        .isGreaterThan(50);
  }

  private Path parquet(long seed, ZoneId zone, LocalDateTime start, String type)
      throws SQLException {
    SeededLog.Clock clock = type.equals("TIMESTAMP") ? SeededLog.Clock.LOCAL : SeededLog.Clock.UTC;
    Path csv = folder.resolve("log.csv");
    SeededLog.write(csv, DatabaseRows.typed(SeededLog.of(seed, BEARINGS, zone, start, 6, clock)));
    Path parquet = folder.resolve("log.parquet");
    try (Connection duck = DriverManager.getConnection("jdbc:duckdb:");
        Statement statement = duck.createStatement()) {
      statement.execute(
          "COPY (SELECT CAST(time AS "
              + type
              + ") AS time, asset, bearing, CAST(temperature_c AS DOUBLE) AS temperature_c,"
              + " CAST(speed_rpm AS DOUBLE) AS speed_rpm, quality FROM read_csv('"
              + csv
              + "', all_varchar = true)) TO '"
              + parquet
              + "'");
    }
    return parquet;
  }

  private static String line(Row row) {
    List<String> cells = new ArrayList<>();
    for (String column :
        List.of(
            "bearing",
            "day_ms",
            "state",
            "temperature_cell",
            "speed_cell",
            "readings",
            "ms",
            "temperature_ms",
            "lowest",
            "highest",
            "speed_ms")) {
      cells.add(String.valueOf(row.<Object>getAs(column)));
    }
    return String.join(" ", cells);
  }

  private static List<String> duckDb(Path parquet, Settings settings, LocalDate asOf)
      throws SQLException {
    List<String> lines = new ArrayList<>();
    try (Connection duck = DriverManager.getConnection("jdbc:duckdb:");
        Statement statement = duck.createStatement()) {
      statement.execute("SET TimeZone = 'UTC'");
      statement.execute("CREATE VIEW readings AS SELECT * FROM '" + parquet + "'");
      List<TableReadings.Column> columns = new ArrayList<>();
      try (ResultSet rows = statement.executeQuery("DESCRIBE readings")) {
        while (rows.next()) {
          columns.add(
              new TableReadings.Column(
                  rows.getString(1), SqlText.identifier(rows.getString(1)), rows.getString(2)));
        }
      }
      TableReadings readings =
          new TableReadings(
              SqlEngine.DUCKDB,
              "readings",
              columns,
              ExportMapping.canonical("*"),
              TableReadings.namesOf(BEARINGS));
      String sql =
          DayCellsStatement.over(
              readings.sql(DayCellsStatement.shift(settings.zone(), asOf)),
              BEARINGS,
              settings,
              asOf);
      try (ResultSet rows = statement.executeQuery(sql)) {
        while (rows.next()) {
          lines.add(
              List.of(1, 2, 3, 4, 5, 7, 8, 9, 10, 11, 12).stream()
                  .map(index -> text(rows, index))
                  .collect(Collectors.joining(" ")));
        }
      }
    }
    return lines;
  }

  private static String text(ResultSet rows, int index) {
    try {
      return String.valueOf(rows.getObject(index));
    } catch (SQLException e) {
      throw new IllegalStateException(e);
    }
  }
}
