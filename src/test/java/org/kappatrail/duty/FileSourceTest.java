package org.kappatrail.duty;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.Statement;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.BearingKey;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Settings;

/**
 * Cells against loops over the raw readings; no outside source, the method's text is the measure.
 */
class FileSourceTest {
  private static final List<Bearing> BEARINGS =
      List.of(
          Plant.bearing("Winder", "DE", 1480),
          Plant.bearing("Press 2", "front", 88.5),
          Plant.bearing("Press 2", "back", 415));

  @TempDir Path folder;

  @ParameterizedTest
  @CsvSource({
    "1, Europe/London, 2025-03-28T00:00, LOCAL",
    "2, Europe/London, 2025-10-24T12:00, LOCAL",
    "3, Europe/London, 2025-10-24T12:00, UTC",
    "4, America/New_York, 2025-03-07T00:00, LOCAL",
    "5, America/New_York, 2025-10-31T06:30, OFFSET",
    "6, Australia/Lord_Howe, 2025-04-03T00:00, LOCAL",
    "7, Australia/Lord_Howe, 2025-10-03T00:00, LOCAL",
    "8, Australia/Lord_Howe, 2025-10-03T00:00, OFFSET",
    "9, Asia/Kolkata, 2024-12-30T00:00, UTC",
    "10, UTC, 2024-02-27T00:00, LOCAL"
  })
  void agreesWithLoopsOverTheReadings(
      long seed, ZoneId zone, LocalDateTime start, SeededLog.Clock clock) {
    List<RawReading> rows = SeededLog.of(seed, BEARINGS, zone, start, 5, clock);
    LocalDate asOf = start.toLocalDate().plusDays(3);
    SeededLog.write(folder.resolve("temperatures/a.csv"), rows.subList(0, rows.size() / 2));
    SeededLog.write(
        folder.resolve("temperatures/b.csv.gz"), rows.subList(rows.size() / 2, rows.size()));

    Map<BearingKey, List<String>> found = read(settings(zone), asOf, 2);

    assertThat(found).isEqualTo(new BruteForce(zone, asOf, 60, 10).all(BEARINGS, rows));
  }

  @Test
  void doesNotDependOnTheFormatOfTheFile() throws Exception {
    ZoneId zone = ZoneId.of("Europe/London");
    List<RawReading> rows =
        SeededLog.of(
            11, BEARINGS, zone, LocalDateTime.of(2025, 3, 28, 0, 0), 4, SeededLog.Clock.LOCAL);
    LocalDate asOf = LocalDate.of(2025, 4, 30);
    Path csv = folder.resolve("temperatures/log.csv");
    SeededLog.write(csv, rows);
    Map<BearingKey, List<String>> fromCsv = read(settings(zone), asOf, 2);

    Path parquet = folder.resolve("temperatures/log.parquet");
    try (Connection duck = DriverManager.getConnection("jdbc:duckdb:");
        Statement statement = duck.createStatement()) {
      statement.execute(
          "COPY (SELECT * FROM read_csv('" + csv + "', all_varchar = true)) TO '" + parquet + "'");
    }
    Files.delete(csv);
    Map<BearingKey, List<String>> fromParquet = read(settings(zone), asOf, 2);
    Files.delete(parquet);
    SeededLog.write(folder.resolve("temperatures/log.csv.gz"), rows);
    Map<BearingKey, List<String>> fromGzip = read(settings(zone), asOf, 2);

    assertThat(fromParquet).isEqualTo(fromCsv);
    assertThat(fromGzip).isEqualTo(fromCsv);
  }

  @Test
  void doesNotDependOnThreadsNorOnTheOrderOfRowsAndFiles() {
    ZoneId zone = ZoneId.of("America/New_York");
    List<RawReading> rows =
        SeededLog.of(
            12, BEARINGS, zone, LocalDateTime.of(2025, 1, 1, 0, 0), 30, SeededLog.Clock.UTC);
    LocalDate asOf = LocalDate.of(2025, 2, 28);
    SeededLog.write(folder.resolve("temperatures/log.csv"), rows);
    Map<BearingKey, List<String>> one = read(settings(zone), asOf, 1);
    Map<BearingKey, List<String>> four = read(settings(zone), asOf, 4);
    SeededLog.write(folder.resolve("temperatures/log.csv"), rows.subList(0, 1000));
    SeededLog.write(folder.resolve("temperatures/a.csv"), rows.subList(1000, rows.size()));

    assertThat(four).isEqualTo(one);
    assertThat(read(settings(zone), asOf, 3)).isEqualTo(one);
  }

  @Test
  void countsOverlappingFilesOnce() {
    ZoneId zone = ZoneId.of("UTC");
    List<RawReading> rows =
        SeededLog.of(
            13, BEARINGS, zone, LocalDateTime.of(2025, 1, 1, 0, 0), 3, SeededLog.Clock.UTC);
    List<RawReading> good =
        rows.stream()
            .filter(
                row -> row.quality().equals("Good") && row.temperature().matches("\\d\\d\\.\\d\\d"))
            .filter(row -> row.speed().matches("\\d+\\.\\d|"))
            .toList();
    LocalDate asOf = LocalDate.of(2025, 1, 31);
    SeededLog.write(folder.resolve("temperatures/a.csv"), good);
    Map<BearingKey, List<String>> once = read(settings(zone), asOf, 2);
    SeededLog.write(folder.resolve("temperatures/b.csv"), good);

    assertThat(read(settings(zone), asOf, 2)).isEqualTo(once);
  }

  @Test
  void accountsForEveryRow() {
    ZoneId zone = ZoneId.of("UTC");
    List<RawReading> rows =
        SeededLog.of(
            14, BEARINGS, zone, LocalDateTime.of(2025, 1, 1, 0, 0), 6, SeededLog.Clock.UTC);
    SeededLog.write(folder.resolve("temperatures/a.csv"), rows.subList(0, 500));
    SeededLog.write(folder.resolve("temperatures/b.csv"), rows.subList(500, rows.size()));
    try (DutyLog log = open(settings(zone), LocalDate.of(2025, 1, 4), 2)) {
      long[] used = {0};
      log.forEachBearing(
          duty -> {
            for (int row = 0; row < duty.cells().size(); row++) {
              used[0] += duty.cells().readings(row);
            }
          });

      assertThat(log.accounts())
          .extracting(FileAccount::file)
          .containsExactly("temperatures/a.csv", "temperatures/b.csv");
      assertThat(log.accounts())
          .extracting(FileAccount::rowsRead)
          .containsExactly(500L, rows.size() - 500L);
      assertThat(log.accounts().stream().mapToLong(FileAccount::rowsUsed).sum()).isEqualTo(used[0]);
      assertThat(log.accounts().get(0).from()).contains(LocalDate.of(2025, 1, 1));
      assertThat(log.accounts().get(0).to()).contains(LocalDate.of(2025, 1, 4));
    }
  }

  @Test
  void leavesOutWhatCameAfterTheReviewAsIfItWereNotThere() {
    ZoneId zone = ZoneId.of("Europe/London");
    LocalDate asOf = LocalDate.of(2025, 3, 30);
    List<RawReading> rows =
        SeededLog.of(
            15, BEARINGS, zone, LocalDateTime.of(2025, 3, 28, 0, 0), 6, SeededLog.Clock.LOCAL);
    SeededLog.write(folder.resolve("temperatures/a.csv"), rows);
    Map<BearingKey, List<String>> withLater = read(settings(zone), asOf, 2);
    SeededLog.write(
        folder.resolve("temperatures/a.csv"),
        rows.stream().filter(row -> row.time().compareTo("2025-03-31") < 0).toList());

    assertThat(read(settings(zone), asOf, 2)).isEqualTo(withLater);
  }

  private Map<BearingKey, List<String>> read(Settings settings, LocalDate asOf, int threads) {
    Map<BearingKey, List<String>> found = new TreeMap<>();
    try (DutyLog log = open(settings, asOf, threads)) {
      log.forEachBearing(duty -> found.put(duty.bearing(), BruteForce.lines(duty)));
    }
    return found;
  }

  private DutyLog open(Settings settings, LocalDate asOf, int threads) {
    PlantHistory history = Plant.of(BEARINGS.toArray(new Bearing[0]));
    DutyOptions options = new DutyOptions(threads, 256, folder);
    return DutyLogs.open(folder, settings, history, asOf, options);
  }

  private static Settings settings(ZoneId zone) {
    Settings defaults = Settings.defaults();
    return new Settings(
        defaults.site(),
        zone,
        defaults.limits(),
        defaults.outlookDays(),
        defaults.decision(),
        defaults.duty(),
        defaults.laboratory(),
        defaults.sampleExports(),
        defaults.logExports());
  }
}
