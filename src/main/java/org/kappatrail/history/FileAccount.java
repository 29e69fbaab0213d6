package org.kappatrail.history;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;

/**
 * What became of one input file: rows used and rejected add up to the rows read.
 *
 * @param file path within the history folder, or the table of a database
 * @param kind what it was read as
 * @param rowsRead rows below the header
 * @param rowsUsed rows that made it into the review
 * @param rowsRejected rows left out, each with a reason in the problems or the dropped readings
 * @param from first day covered
 * @param to last day covered
 * @param unusedColumns columns that were not used
 */
public record FileAccount(
    String file,
    Kind kind,
    long rowsRead,
    long rowsUsed,
    long rowsRejected,
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

  public FileAccount {
    unusedColumns = List.copyOf(unusedColumns);
    if (rowsUsed + rowsRejected != rowsRead) {
      throw new IllegalArgumentException(
          file + ": " + rowsUsed + " used and " + rowsRejected + " rejected are not " + rowsRead);
    }
  }
}
