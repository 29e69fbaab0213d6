package org.kappatrail.duty;

import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Problem;

/** The temperature and speed logs of a site, read bearing by bearing. */
public interface DutyLog extends AutoCloseable {

  /**
   * Hands over every registered bearing that has readings, in the order of {@link
   * org.kappatrail.history.BearingKey}; only one bearing's cells are held at a time.
   */
  void forEachBearing(Consumer<BearingDuty> use);

  /** The same, telling how far it has come where that is known. */
  default void forEachBearing(Consumer<BearingDuty> use, RowsRead progress) {
    forEachBearing(use);
  }

  /** What became of every file; complete after {@link #forEachBearing}. */
  List<FileAccount> accounts();

  /** Rows that could not be used; complete after {@link #forEachBearing}. */
  List<Problem> problems();

  /**
   * Readings of bearings that the register does not have, by asset and bearing as the logs name
   * them; complete after {@link #forEachBearing}.
   */
  default Map<String, Long> unknownBearings() {
    return Map.of();
  }

  /** Why readings were left out, file by file; complete after {@link #forEachBearing}. */
  default List<ReadingFates> fates() {
    return List.of();
  }

  @Override
  void close();
}
