package org.kappatrail.review.trend;

import java.util.Locale;

/** Where a trail goes. */
public enum Direction {
  FALLING,
  RISING,
  STEADY,
  /** Too few samples to say. */
  UNKNOWN;

  /** The word used in files. */
  public String label() {
    return name().toLowerCase(Locale.ROOT);
  }
}
