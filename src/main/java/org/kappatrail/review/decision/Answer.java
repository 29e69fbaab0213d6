package org.kappatrail.review.decision;

import java.util.Locale;

/** Answer to one of the five questions. */
public enum Answer {
  YES,
  NO,
  PARTLY,
  UNKNOWN;

  /** The word used in files. */
  public String label() {
    return name().toLowerCase(Locale.ROOT);
  }
}
