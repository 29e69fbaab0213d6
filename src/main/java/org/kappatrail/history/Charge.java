package org.kappatrail.history;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;

/**
 * One filling of an asset's oil system, from one oil change to the next.
 *
 * @param asset the asset
 * @param number 1, 2, 3… per asset
 * @param oil id of the oil that went in
 * @param origin how its start is known
 * @param start first day of the charge; empty for the charge that was in when the history began
 * @param end day of the next charge's start; empty for the present charge
 * @param samples its samples in time
 */
public record Charge(
    String asset,
    int number,
    String oil,
    Origin origin,
    Optional<LocalDate> start,
    Optional<LocalDate> end,
    List<Sample> samples) {

  /** How the start of a charge is known. */
  public enum Origin {
    /** It was in before the history began. */
    BEFORE_HISTORY,
    /** An oil change was recorded. */
    RECORDED,
    /** Oil hours fell back without a recorded change. */
    INFERRED
  }

  public Charge {
    samples = List.copyOf(samples);
  }

  /** True where the day falls into this charge; the day of a change belongs to the new charge. */
  public boolean covers(LocalDate day) {
    return (start.isEmpty() || !day.isBefore(start.get()))
        && (end.isEmpty() || day.isBefore(end.get()));
  }
}
