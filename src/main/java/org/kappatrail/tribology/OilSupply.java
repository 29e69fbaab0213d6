package org.kappatrail.tribology;

import java.util.Arrays;
import java.util.Optional;

/** How oil reaches the bearings, which decides the formula of the contamination factor. */
public enum OilSupply {
  /** Oil bath, or circulation without a filter of known ratio in line. */
  BATH("bath"),
  /** Circulation through a filter in line before the bearings. */
  INLINE_FILTER("inline-filter");

  private final String label;

  OilSupply(String label) {
    this.label = label;
  }

  /** The word used in files. */
  public String label() {
    return label;
  }

  public static Optional<OilSupply> parse(String label) {
    return Arrays.stream(values()).filter(supply -> supply.label.equals(label)).findFirst();
  }
}
