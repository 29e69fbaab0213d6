package org.kappatrail.duty;

import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.ResultSetMetaData;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalLong;
import java.util.Properties;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Problem;
import org.kappatrail.history.Settings;
import org.kappatrail.history.SourceLine;
import org.kappatrail.history.UnusableInputException;

/** Readings in a table of the site's own database; the statement runs there. */
final class DatabaseSource implements DutySource {
  private static final int ROWS_AT_A_TIME = 10_000;
  private static final int MOST_UNKNOWN = 1000;

  private final DatabaseLogin login;
  private final DatabaseFailure failure;
  private final String name;
  private final List<Bearing> bearings;
  private final Connection connection;
  private final TableReadings readings;
  private final ZoneShift zone;
  private final String sql;
  private Tally tally = new Tally(1);
  private @Nullable RunningStatement running;

  private List<FileAccount> accounts = List.of();
  private List<ReadingFates> fates = List.of();
  private List<Problem> problems = List.of();
  private Map<String, Long> unknown = Map.of();

  /**
   * Connects and looks at the columns.
   *
   * @param mapping block with {@code jdbc} and {@code table}
   * @param bearings the register in the order of the keys
   */
  DatabaseSource(
      ExportMapping mapping,
      DatabaseLogin login,
      Settings settings,
      List<Bearing> bearings,
      LocalDate asOf) {
    String address = mapping.jdbc().orElseThrow();
    this.login = login;
    this.bearings = List.copyOf(bearings);
    this.name =
        mapping
            .table()
            .orElseThrow(
                () ->
                    new UnusableInputException(
                        "kappatrail.yaml: temperatures: jdbc: needs table: beside it"));
    this.failure = new DatabaseFailure(login, address, name);
    this.zone = DayCellsStatement.shift(ZoneNames.of(mapping, settings), asOf);
    this.connection = connect(address);
    try {
      String product = connection.getMetaData().getDatabaseProductName();
      SqlEngine engine =
          SqlEngine.of(product)
              .orElseThrow(
                  () ->
                      new UnusableInputException(
                          name + ": " + product + " is not known; PostgreSQL and DuckDB are"));
      connection.setAutoCommit(false);
      readings =
          new TableReadings(
              engine, quotedTable(), columns(), mapping, TableReadings.namesOf(bearings));
      sql = DayCellsStatement.over(readings.sql(zone), bearings, settings, asOf);
    } catch (SQLException e) {
      close();
      throw explain(e);
    } catch (RuntimeException e) {
      close();
      throw e;
    }
  }

  @Override
  public void start(RowsRead progress) throws SQLException {
    stop();
    tally = new Tally(1);
    Statement statement = connection.createStatement();
    statement.setFetchSize(ROWS_AT_A_TIME);
    running = new RunningStatement(statement, sql, bearings, tally, share -> {});
  }

  @Override
  public @Nullable BearingDuty next() throws SQLException {
    return running == null ? null : running.next();
  }

  @Override
  public void finish() throws SQLException {
    stop();
    ReadingFates fate = new ReadingFates(name, tally.counts(0));
    fates = List.of(fate);
    accounts = List.of(tally.account(0, fate, OptionalLong.empty(), readings.layout().unused()));
    UnknownBearings found = unknown();
    unknown = found.readings();
    problems = found.problems();
  }

  @Override
  public List<FileAccount> accounts() {
    return accounts;
  }

  @Override
  public List<ReadingFates> fates() {
    return fates;
  }

  @Override
  public Map<String, Long> unknownBearings() {
    return unknown;
  }

  @Override
  public List<Problem> problems() {
    return problems;
  }

  @Override
  public RuntimeException explain(SQLException cause) {
    return failure.explain(cause);
  }

  @Override
  public void close() {
    try {
      stop();
      connection.rollback();
      connection.close();
    } catch (SQLException e) {
      // A lost connection is reported where it was lost; there is nothing left to give back.
      return;
    }
  }

  private Connection connect(String address) {
    Properties properties = login.properties();
    if (address.startsWith("jdbc:duckdb:")) {
      properties.setProperty("duckdb.read_only", "true");
      properties.setProperty("jdbc_stream_results", "true");
    }
    try {
      return DriverManager.getConnection(address, properties);
    } catch (SQLException e) {
      throw explain(e);
    }
  }

  private List<TableReadings.Column> columns() throws SQLException {
    String quote = connection.getMetaData().getIdentifierQuoteString();
    List<TableReadings.Column> columns = new ArrayList<>();
    try (Statement statement = connection.createStatement();
        ResultSet none =
            statement.executeQuery("SELECT * FROM " + quotedTable() + " WHERE 1 = 0")) {
      ResultSetMetaData meta = none.getMetaData();
      for (int index = 1; index <= meta.getColumnCount(); index++) {
        String column = meta.getColumnName(index);
        columns.add(
            new TableReadings.Column(
                column,
                quote + column.replace(quote, quote + quote) + quote,
                meta.getColumnTypeName(index)));
      }
    }
    return columns;
  }

  /** Plain names as they are, so that the engine folds their case; all others in quotes. */
  private String quotedTable() {
    List<String> parts = new ArrayList<>();
    for (String part : name.split("\\.", -1)) {
      parts.add(part.matches("[A-Za-z_][A-Za-z0-9_]*") ? part : SqlText.identifier(part));
    }
    return String.join(".", parts);
  }

  private UnknownBearings unknown() throws SQLException {
    UnknownBearings unknown = new UnknownBearings(bearings.stream().map(Bearing::key).toList());
    if (tally.count(0, ReadingState.UNKNOWN_BEARING) == 0) {
      return unknown;
    }
    String query =
        "SELECT asset_text, bearing_text, COUNT(*) FROM ("
            + readings.sql(zone)
            + ") r WHERE fault = 6 GROUP BY asset_text, bearing_text"
            + " ORDER BY asset_text, bearing_text";
    try (Statement statement = connection.createStatement()) {
      statement.setMaxRows(MOST_UNKNOWN);
      try (ResultSet rows = statement.executeQuery(query)) {
        while (rows.next()) {
          unknown.add(
              rows.getString(1) + "/" + rows.getString(2),
              new SourceLine(name, 0),
              rows.getLong(3));
        }
      }
    }
    return unknown;
  }

  private void stop() throws SQLException {
    if (running != null) {
      running.close();
      running = null;
    }
  }
}
