package org.kappatrail.history;

import java.time.LocalDate;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.TreeMap;

/**
 * What became of one input file: rows used and rejected add up to the rows read.
 *
 * @param file path within the history folder, or the table of a database
 * @param kind what it was read as
 * @param fileRows rows of a file in which a row holds readings of several bearings; what is counted
 *     otherwise are its readings. Empty where a row is one reading or record.
 * @param rowsUsed rows that made it into the review
 * @param rejected rows left out, by reason
 * @param from first day covered
 * @param to last day covered
 * @param unusedColumns columns that were not used
 */
public record FileAccount(
    String file,
    Kind kind,
    OptionalLong fileRows,
    long rowsUsed,
    Map<String, Long> rejected,
    Optional<LocalDate> from,
    Optional<LocalDate> to,
    List<String> unusedColumns) {

  /** What a file is read as. */
  public enum Kind {
    SETTINGS,
    ASSETS,
    BEARINGS,
    OILS,
    EVENTS,
    SAMPLES,
    TEMPERATURES
  }

  /** Reason of rows whose day comes after the last day of a review. */
  public static final String LATER = "later than the review";

  public FileAccount {
    rejected = Collections.unmodifiableMap(new TreeMap<>(rejected));
    unusedColumns = List.copyOf(unusedColumns);
    if (rowsUsed < 0 || rejected.values().stream().anyMatch(rows -> rows <= 0)) {
      throw new IllegalArgumentException(file + ": " + rowsUsed + " used, rejected " + rejected);
    }
  }

  /** Rows left out. */
  public long rowsRejected() {
    return rejected.values().stream().mapToLong(Long::longValue).sum();
  }

  /** Rows below the header. */
  public long rowsRead() {
    return rowsUsed + rowsRejected();
  }

  /** The account after rows taken for used turned out not to be. */
  public FileAccount without(long rows, String reason) {
    if (rows == 0) {
      return this;
    }
    TreeMap<String, Long> more = new TreeMap<>(rejected);
    more.merge(reason, rows, Long::sum);
    return new FileAccount(file, kind, fileRows, rowsUsed - rows, more, from, to, unusedColumns);
  }

  /** The account with the days that its rows cover. */
  public FileAccount over(Optional<LocalDate> first, Optional<LocalDate> last) {
    return new FileAccount(file, kind, fileRows, rowsUsed, rejected, first, last, unusedColumns);
  }
}
