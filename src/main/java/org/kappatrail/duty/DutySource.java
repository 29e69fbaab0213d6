package org.kappatrail.duty;

import java.sql.SQLException;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Problem;

/** One place that readings come from: the files of a history, or a table of a database. */
interface DutySource extends AutoCloseable {
  /** Runs the statement. */
  void start(RowsRead progress) throws SQLException;

  /** The next bearing in the order of the keys; null after the last one. */
  @Nullable BearingDuty next() throws SQLException;

  /** Gathers accounts and problems, after the last bearing. */
  void finish() throws SQLException;

  List<FileAccount> accounts();

  List<ReadingFates> fates();

  /** Readings of bearings that the register does not have, by name. */
  Map<String, Long> unknownBearings();

  List<Problem> problems();

  /** What a failure of this source means for the caller. */
  RuntimeException explain(SQLException failure);

  @Override
  void close();
}
