package org.kappatrail.history;

import java.io.Serial;

/**
 * An input without which nothing can be reviewed; the message says file, place, value and remedy.
 */
public final class UnusableInputException extends RuntimeException {
  @Serial private static final long serialVersionUID = 1L;

  public UnusableInputException(String message) {
    super(message);
  }

  public UnusableInputException(Problem problem) {
    super(problem.toString());
  }

  public UnusableInputException(String message, Throwable cause) {
    super(message, cause);
  }
}
