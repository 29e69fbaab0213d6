package org.kappatrail.duty;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.List;
import java.util.function.DoubleConsumer;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.Bearing;

/** The statement while its cells are read. */
final class RunningStatement implements AutoCloseable {
  private final Statement statement;
  private final ResultSet rows;
  private final CellReader cells;

  RunningStatement(
      Statement statement, String sql, List<Bearing> bearings, Tally tally, DoubleConsumer progress)
      throws SQLException {
    this.statement = statement;
    try {
      this.rows = QueryWatch.run(statement, progress, () -> statement.executeQuery(sql));
      this.cells = new CellReader(bearings, tally, rows);
    } catch (SQLException | RuntimeException e) {
      statement.close();
      throw e;
    }
  }

  @Nullable BearingDuty next() throws SQLException {
    if (Thread.currentThread().isInterrupted()) {
      throw new SQLException("interrupted");
    }
    return cells.next();
  }

  @Override
  public void close() throws SQLException {
    rows.close();
    statement.close();
  }
}
