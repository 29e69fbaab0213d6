package org.kappatrail.review.trend;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Where the trail leads.
 *
 * @param atPresentPoint crossing of the floor at the operating point of the latest sample
 * @param withLastYear crossing with last year's temperatures and speeds, day by day; empty where
 *     the log is shorter than a year
 * @param dip what the season alone does with the present oil
 * @param fan κ by week up to the horizon at the present operating point
 * @param nextSample day by which the next sample is asked for
 * @param yearAgoC temperature a year before the latest sample, °C; empty where the log does not
 *     reach back
 */
public record Outlook(
    Crossing atPresentPoint,
    Optional<Crossing> withLastYear,
    Optional<SeasonalDip> dip,
    List<FanPoint> fan,
    LocalDate nextSample,
    OptionalDouble yearAgoC) {
  public Outlook {
    fan = List.copyOf(fan);
  }

  /** The earliest day at which the floor may be reached, by either view. */
  public Optional<LocalDate> firstCrossing() {
    return earlier(atPresentPoint, withLastYear);
  }

  static Optional<LocalDate> earlier(Crossing atPresentPoint, Optional<Crossing> withLastYear) {
    Optional<LocalDate> present = atPresentPoint.first();
    Optional<LocalDate> seasonal = withLastYear.flatMap(Crossing::first);
    if (present.isEmpty() || seasonal.isEmpty()) {
      return present.isPresent() ? present : seasonal;
    }
    return present.get().isBefore(seasonal.get()) ? present : seasonal;
  }
}
