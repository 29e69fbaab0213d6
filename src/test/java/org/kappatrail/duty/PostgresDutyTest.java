package org.kappatrail.duty;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.util.List;
import java.util.Objects;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicReference;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledIfEnvironmentVariable;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.UnusableInputException;

/**
 * PostgreSQL gives the cells that DuckDB gives of the same readings, row for row. The variable
 * holds a JDBC address with {@code user} and {@code password}.
 */
@EnabledIfEnvironmentVariable(named = "KAPPATRAIL_TEST_POSTGRES", matches = ".+")
class PostgresDutyTest {
  private static final List<Bearing> BEARINGS =
      List.of(
          Plant.bearing("Mill 7", "DE", 1480),
          Plant.bearing("Mill 7", "NDE", 1480),
          Plant.bearing("Couch's roll", "front", 88.5));

  @TempDir Path folder;

  @ParameterizedTest
  @CsvSource({
    "51, Europe/London, 2025-03-28T00:00, TIMESTAMP, NUMERIC",
    "52, Europe/London, 2025-10-24T12:00, TIMESTAMP, DOUBLE PRECISION",
    "53, Europe/London, 2025-10-24T12:00, TIMESTAMPTZ, DOUBLE PRECISION",
    "54, America/New_York, 2025-03-07T00:00, TIMESTAMP, REAL",
    "55, America/New_York, 2025-10-31T06:30, TIMESTAMPTZ, NUMERIC",
    "56, Australia/Lord_Howe, 2025-04-03T00:00, TIMESTAMP, DOUBLE PRECISION",
    "57, Australia/Lord_Howe, 2025-10-03T00:00, TIMESTAMPTZ, DOUBLE PRECISION"
  })
  void agreesWithDuckDbRowForRow(
      long seed, ZoneId zone, LocalDateTime start, String timestamp, String number)
      throws SQLException {
    SeededLog.Clock clock =
        timestamp.equals("TIMESTAMP") ? SeededLog.Clock.LOCAL : SeededLog.Clock.UTC;
    List<RawReading> rows = DatabaseRows.typed(SeededLog.of(seed, BEARINGS, zone, start, 6, clock));
    SeededLog.write(folder.resolve("temperatures/log.csv"), rows);
    LocalDate asOf = start.toLocalDate().plusDays(4);
    ReadLog duckDb = ReadLog.of(folder, zone, BEARINGS, asOf);
    try (Connection connection = connect();
        Statement statement = connection.createStatement()) {
      statement.execute("DROP TABLE IF EXISTS readings");
      statement.execute(DatabaseRows.createTable("readings", timestamp, number));
      DatabaseRows.insert(connection, "readings", rows);
    }

    ReadLog postgres = read("readings", address(), zone, asOf);

    assertThat(duckDb.only()).hasSizeGreaterThan(50);
    assertThat(postgres.lines()).isEqualTo(duckDb.lines());
    assertThat(postgres.fates().get(0).used()).isEqualTo(duckDb.fates().get(0).used());
    assertThat(postgres.fates().get(0).total()).isEqualTo(duckDb.fates().get(0).total());
  }

  @Test
  void tellsAWrongPasswordInOneSentenceWithoutIt() {
    String wrong = address().replaceAll("password=[^&]*", "password=wr0ng");

    assertThatThrownBy(() -> read("readings", wrong, ZoneId.of("UTC"), LocalDate.of(2025, 1, 1)))
        .isInstanceOf(UnusableInputException.class)
        .hasMessageEndingWith(
            " readings: user or password is refused; set KAPPATRAIL_DB_USER and"
                + " KAPPATRAIL_DB_PASSWORD")
        .hasMessageNotContainingAny("wr0ng", "user=", "password=")
        .hasNoCause();
  }

  @Test
  void tellsAMissingTable() {
    assertThatThrownBy(
            () -> read("no_such_table", address(), ZoneId.of("UTC"), LocalDate.of(2025, 1, 1)))
        .isInstanceOf(UnusableInputException.class)
        .hasMessageEndingWith(" no_such_table: there is no such table or view; correct table:");
  }

  @Test
  void tellsALostConnectionInOneSentence() throws Exception {
    createSlowView();
    AtomicReference<Throwable> end = new AtomicReference<>();
    Thread reader = reader(end);
    try (Connection other = connect();
        Statement statement = other.createStatement()) {
      waitForQuery(statement);
      statement.execute(
          "SELECT pg_terminate_backend(pid) FROM pg_stat_activity WHERE pid <> pg_backend_pid() AND"
              + " query LIKE 'WITH register%'");
    }
    reader.join(20_000);

    assertThat(end.get())
        .isInstanceOf(UnusableInputException.class)
        .hasMessageContaining("the connection was lost")
        .hasMessageNotContaining("password=");
  }

  @Test
  void cancelsTheQueryWhenItsThreadIsInterrupted() throws Exception {
    createSlowView();
    AtomicReference<Throwable> end = new AtomicReference<>();
    Thread reader = reader(end);
    try (Connection other = connect();
        Statement statement = other.createStatement()) {
      waitForQuery(statement);
      reader.interrupt();
      reader.join(20_000);

      assertThat(end.get()).isInstanceOf(CancellationException.class);
      assertThat(running(statement)).isZero();
    }
  }

  /** A view whose reading takes minutes. */
  private static void createSlowView() throws SQLException {
    try (Connection connection = connect();
        Statement statement = connection.createStatement()) {
      statement.execute(
          "CREATE OR REPLACE VIEW slow_readings AS SELECT TIMESTAMP '2025-01-01' + n * INTERVAL '1"
              + " minute' AS time, 'Mill 7' AS asset, 'DE' AS bearing, 50.0 + 0 *"
              + " length(pg_sleep(1)::text) AS temperature_c FROM generate_series(1, 600) n");
    }
  }

  private Thread reader(AtomicReference<Throwable> end) {
    Thread reader =
        new Thread(
            () -> {
              try {
                read("slow_readings", address(), ZoneId.of("UTC"), LocalDate.of(2025, 1, 31));
              } catch (UnusableInputException | CancellationException e) {
                end.set(e);
              }
            });
    reader.setDaemon(true);
    reader.start();
    return reader;
  }

  private static void waitForQuery(Statement statement) throws Exception {
    for (int attempt = 0; attempt < 200 && running(statement) == 0; attempt++) {
      Thread.sleep(50);
    }
    assertThat(running(statement)).isPositive();
  }

  private static int running(Statement statement) throws SQLException {
    try (ResultSet rows =
        statement.executeQuery(
            "SELECT COUNT(*) FROM pg_stat_activity WHERE state = 'active' AND pid <>"
                + " pg_backend_pid() AND query LIKE 'WITH register%'")) {
      rows.next();
      return rows.getInt(1);
    }
  }

  private ReadLog read(String table, String address, ZoneId zone, LocalDate asOf) {
    return ReadLog.of(
        folder.resolve("none"),
        zone,
        BEARINGS,
        asOf,
        Block.of("").with("table", table).with("jdbc", address).build());
  }

  private static Connection connect() throws SQLException {
    return DriverManager.getConnection(address());
  }

  private static String address() {
    return Objects.requireNonNull(System.getenv("KAPPATRAIL_TEST_POSTGRES"));
  }
}
