package org.kappatrail.history;

import java.util.Arrays;
import java.util.Optional;

/** What was done to an asset. */
public enum EventKind {
  OIL_CHANGE("oil-change"),
  TOP_UP("top-up"),
  BEARING_REPLACED("bearing-replaced"),
  FILTER_CHANGED("filter-changed"),
  OTHER("other");

  private final String label;

  EventKind(String label) {
    this.label = label;
  }

  /** The word used in files. */
  public String label() {
    return label;
  }

  public static Optional<EventKind> find(String label) {
    return Arrays.stream(values()).filter(kind -> kind.label.equals(label)).findFirst();
  }
}
