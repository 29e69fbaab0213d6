package org.kappatrail.review.trend;

import java.time.LocalDate;
import java.util.Optional;

/**
 * When κ reaches the floor; a date is empty where it does not within ten years.
 *
 * @param earliest by the steeper limit of the slope
 * @param likely by the slope
 * @param latest by the flatter limit
 */
public record Crossing(
    Optional<LocalDate> earliest, Optional<LocalDate> likely, Optional<LocalDate> latest) {
  /** No crossing foreseen. */
  public static final Crossing NONE =
      new Crossing(Optional.empty(), Optional.empty(), Optional.empty());

  /** The first day that has to be reckoned with. */
  public Optional<LocalDate> first() {
    return earliest.isPresent() ? earliest : likely;
  }
}
