package org.kappatrail.duty;

import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.List;
import java.util.Properties;

/**
 * An embedded DuckDB in memory that spills to a private folder and never reaches for the network.
 */
final class DuckEngine implements AutoCloseable {
  private final WorkFolder work;
  private final DutyOptions options;
  private final Connection streaming;

  DuckEngine(DutyOptions options) throws SQLException {
    this.options = options;
    this.work = new WorkFolder(options.temporaryFolder());
    try {
      this.streaming = connect(true);
      UnpackedLibrary.remove();
    } catch (SQLException | RuntimeException e) {
      work.close();
      throw e;
    }
  }

  WorkFolder work() {
    return work;
  }

  /** A statement whose rows are handed over as they are read. */
  Statement statement() throws SQLException {
    return streaming.createStatement();
  }

  /**
   * Runs a query for its error: a streamed result loses the engine's words.
   *
   * @return what the engine says; empty where the query goes through
   */
  String complaint(String sql) {
    try (Connection plain = connect(false);
        Statement statement = plain.createStatement();
        ResultSet rows = statement.executeQuery(sql)) {
      while (rows.next()) {
        rows.getObject(1);
      }
      return "";
    } catch (SQLException e) {
      return String.valueOf(e.getMessage());
    }
  }

  /** Names and types of a query's columns, alternating. */
  List<String> describe(String sql) throws SQLException {
    List<String> columns = new ArrayList<>();
    try (Connection plain = connect(false);
        Statement statement = plain.createStatement();
        ResultSet rows = statement.executeQuery("DESCRIBE " + sql)) {
      while (rows.next()) {
        columns.add(rows.getString(1));
        columns.add(rows.getString(2));
      }
    }
    return columns;
  }

  /** The one number of a query; 0 where there is none. */
  long number(String sql) {
    try (Connection plain = connect(false);
        Statement statement = plain.createStatement();
        ResultSet rows = statement.executeQuery(sql)) {
      return rows.next() ? rows.getLong(1) : 0;
    } catch (SQLException e) {
      return 0;
    }
  }

  private Connection connect(boolean stream) throws SQLException {
    Properties properties = new Properties();
    properties.setProperty("jdbc_stream_results", Boolean.toString(stream));
    Connection connection = DriverManager.getConnection("jdbc:duckdb:", properties);
    try (Statement statement = connection.createStatement()) {
      for (String setting : settings()) {
        statement.execute("SET " + setting);
      }
    } catch (SQLException e) {
      connection.close();
      throw e;
    }
    return connection;
  }

  private List<String> settings() {
    return List.of(
        "threads = " + options.threads(),
        "memory_limit = '" + options.memoryMib() + "MiB'",
        "temp_directory = " + SqlText.literal(work.path().toString()),
        "preserve_insertion_order = false",
        // Nothing is known of the number of rows in a CSV file: left to itself the planner takes it
        // for small and holds all readings in memory, to look the register up in them.
        "disabled_optimizers = 'join_order,build_side_probe_side,in_clause'",
        "autoinstall_known_extensions = false",
        "autoload_known_extensions = false",
        "enable_progress_bar = true",
        "enable_progress_bar_print = false",
        "TimeZone = 'UTC'");
  }

  @Override
  public void close() {
    try {
      streaming.close();
    } catch (SQLException e) {
      throw new IllegalStateException("the query engine does not close", e);
    } finally {
      work.close();
    }
  }
}
