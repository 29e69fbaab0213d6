package org.kappatrail.duty;

import java.sql.SQLException;
import java.util.Locale;
import org.kappatrail.history.UnusableInputException;

/** What a failed query means for the caller. */
final class EngineFailure {
  private EngineFailure() {}

  /** An input or machine that does not suffice, with a remedy; everything else is a bug. */
  static RuntimeException of(SQLException failure) {
    String text = String.valueOf(failure.getMessage()).toLowerCase(Locale.ROOT);
    if (text.contains("out of memory") || text.contains("no space left")) {
      return new UnusableInputException(
          "temperatures: memory or disk does not suffice for these logs; free space in the"
              + " temporary folder or review fewer files",
          failure);
    }
    return new IllegalStateException("the readings cannot be queried", failure);
  }
}
