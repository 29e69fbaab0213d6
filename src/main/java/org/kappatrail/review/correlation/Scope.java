package org.kappatrail.review.correlation;

import java.util.Locale;

/** What a correlation speaks of. */
public enum Scope {
  ASSET,
  FLEET;

  /** The word used in files. */
  public String label() {
    return name().toLowerCase(Locale.ROOT);
  }
}
