package org.kappatrail.review;

import java.util.Locale;

/** How urgent something is, mildest first. */
public enum Level {
  CLEAR,
  ALERT,
  ALARM;

  /** The word used in files and on the page. */
  public String label() {
    return name().toLowerCase(Locale.ROOT);
  }
}
