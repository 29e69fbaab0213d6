package org.kappatrail.demo;

import java.time.Duration;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.time.temporal.ChronoUnit;

/** The thirty months of the history, hour by hour in universal time. */
final class Timeline {
  static final ZoneId ZONE = ZoneId.of("Europe/London");
  static final LocalDate FIRST = LocalDate.of(2024, 5, 1);
  static final LocalDate LAST = LocalDate.of(2026, 10, 31);
  static final int MONTHS = 30;
  static final int DAYS = (int) ChronoUnit.DAYS.between(FIRST, LAST) + 1;
  static final int HOURS = hour(LAST.plusDays(1));

  private Timeline() {}

  /** Hour at which a local day begins. */
  static int hour(LocalDate day) {
    return (int) Duration.between(start(), day.atStartOfDay(ZONE).toInstant()).toHours();
  }

  static int hour(String day) {
    return hour(LocalDate.parse(day));
  }

  static Instant instant(int hour) {
    return start().plus(Duration.ofHours(hour));
  }

  /** Local day to which an hour belongs. */
  static LocalDate day(int hour) {
    return instant(hour).atZone(ZONE).toLocalDate();
  }

  /** How much of a span has passed, 0 to 1. */
  static double passed(LocalDate day, LocalDate from, LocalDate until) {
    double share =
        (double) ChronoUnit.DAYS.between(from, day) / ChronoUnit.DAYS.between(from, until);
    return Math.max(0, Math.min(1, share));
  }

  private static Instant start() {
    return FIRST.atStartOfDay(ZONE).toInstant();
  }
}
