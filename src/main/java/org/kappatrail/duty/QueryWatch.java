package org.kappatrail.duty;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.function.DoubleConsumer;
import org.duckdb.DuckDBPreparedStatement;
import org.duckdb.QueryProgress;

/**
 * Watches a statement while it runs: cancels it when the thread that runs it is interrupted, which
 * engines do not look for by themselves, and tells the share of its work that is done where the
 * engine says so.
 */
final class QueryWatch {
  private static final long LOOK_EVERY_MS = 100;

  private final Thread caller = Thread.currentThread();
  private final Statement statement;
  private final DoubleConsumer progress;
  private double first = Double.NaN;

  /** A query of a statement. */
  interface Query {
    ResultSet run() throws SQLException;
  }

  private QueryWatch(Statement statement, DoubleConsumer progress) {
    this.statement = statement;
    this.progress = progress;
  }

  /** Runs the query of that statement under watch. */
  static ResultSet run(Statement statement, DoubleConsumer progress, Query query)
      throws SQLException {
    Thread watch = new Thread(new QueryWatch(statement, progress)::watch, "query-watch");
    watch.setDaemon(true);
    watch.start();
    try {
      return query.run();
    } finally {
      watch.interrupt();
    }
  }

  private void watch() {
    try {
      while (!caller.isInterrupted()) {
        Thread.sleep(LOOK_EVERY_MS);
        tell();
      }
      statement.cancel();
    } catch (InterruptedException done) {
      Thread.currentThread().interrupt();
    } catch (SQLException alreadyClosed) {
      // What was to be watched has ended.
      return;
    }
  }

  /** The engine counts its preparations too; they are over when it is first asked. */
  private void tell(double share) {
    if (Double.isNaN(first)) {
      first = share;
    }
    if (share < 1) {
      progress.accept(Math.max(0, (share - first) / (1 - first)));
    }
  }

  private void tell() throws SQLException {
    if (statement instanceof DuckDBPreparedStatement running) {
      QueryProgress at = running.getQueryProgress();
      if (at.getTotalRowsToProcess() > 0) {
        tell((double) at.getRowsProcessed() / at.getTotalRowsToProcess());
      }
    }
  }
}
