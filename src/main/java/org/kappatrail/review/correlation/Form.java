package org.kappatrail.review.correlation;

import java.util.Locale;

/** What of the values is compared. */
public enum Form {
  /** The values as they are. */
  MEASURED,
  /** What is left of them when each one's own Theil–Sen line is taken out. */
  DETRENDED;

  /** The word used in files. */
  public String label() {
    return name().toLowerCase(Locale.ROOT);
  }
}
