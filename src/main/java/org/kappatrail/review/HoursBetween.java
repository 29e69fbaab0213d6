package org.kappatrail.review;

import java.time.LocalDate;
import java.util.List;
import java.util.OptionalDouble;

/** Adds up running and mixed-regime hours from one sample to the next; called in order of time. */
final class HoursBetween {
  private final List<DayKappa> days;
  private final boolean logged;
  private int next;

  /** Hours of one stretch; empty for a bearing without a log, mixed where a day has no κ. */
  record Hours(OptionalDouble running, OptionalDouble mixed) {}

  HoursBetween(List<DayKappa> days, boolean logged) {
    this.days = days;
    this.logged = logged;
  }

  /** Hours after the previous call's day up to and with this day. */
  Hours upTo(LocalDate day) {
    if (!logged) {
      return new Hours(OptionalDouble.empty(), OptionalDouble.empty());
    }
    double running = 0;
    double mixed = 0;
    boolean known = true;
    while (next < days.size() && !days.get(next).date().isAfter(day)) {
      running += days.get(next).runningHours();
      OptionalDouble ofDay = days.get(next).mixedHours();
      known &= ofDay.isPresent();
      mixed += ofDay.orElse(0);
      next++;
    }
    return new Hours(
        OptionalDouble.of(running), known ? OptionalDouble.of(mixed) : OptionalDouble.empty());
  }
}
