package org.kappatrail.tribology;

import java.util.Arrays;
import java.util.Optional;

/** How a bearing gets its oil, as far as contamination is concerned. */
public enum OilSupply {
  /** Oil bath, or circulation without a filter in the feed line. */
  BATH("bath"),
  /** Circulation with a filter in the line just before the bearing. */
  INLINE_FILTER("inline-filter");

  private final String label;

  OilSupply(String label) {
    this.label = label;
  }

  /** The supply of a label; case and blanks at the ends do not matter. */
  public static Optional<OilSupply> parse(String text) {
    return Arrays.stream(values())
        .filter(supply -> supply.label.equalsIgnoreCase(text.strip()))
        .findFirst();
  }

  public String label() {
    return label;
  }
}
