package org.kappatrail.duty;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;

/**
 * Cancels a statement when the thread that runs it is interrupted; engines do not look by
 * themselves.
 */
final class CancelOnInterrupt {
  private static final long LOOK_EVERY_MS = 100;

  /** A query of a statement. */
  interface Query {
    ResultSet run() throws SQLException;
  }

  private CancelOnInterrupt() {}

  /** Runs the query of that statement under watch. */
  static ResultSet run(Statement statement, Query query) throws SQLException {
    Thread caller = Thread.currentThread();
    Thread watch = new Thread(() -> watch(caller, statement), "cancel-on-interrupt");
    watch.setDaemon(true);
    watch.start();
    try {
      return query.run();
    } finally {
      watch.interrupt();
    }
  }

  private static void watch(Thread caller, Statement statement) {
    try {
      while (!caller.isInterrupted()) {
        Thread.sleep(LOOK_EVERY_MS);
      }
      statement.cancel();
    } catch (InterruptedException done) {
      Thread.currentThread().interrupt();
    } catch (SQLException alreadyClosed) {
      // What was to be cancelled has ended.
      return;
    }
  }
}
