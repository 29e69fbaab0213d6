package org.kappatrail.demo;

import java.time.DayOfWeek;
import java.time.LocalDate;
import java.util.Arrays;

/** When an asset runs: the summer stops, Christmas, maintenance days, and trips of its own. */
final class Running {
  private static final double DAYS_BETWEEN_TRIPS = 26;
  private static final int MAINTENANCE_EVERY_DAYS = 28;

  private final boolean[] stopped = new boolean[Timeline.HOURS];

  Running(String asset) {
    if (!asset.equals("UT-WP1")) {
      siteStops();
    }
    if (asset.startsWith("PM-")) {
      maintenance();
    }
    Noise noise = Noise.named("trips", asset);
    double hour = noise.exponential(DAYS_BETWEEN_TRIPS * 24);
    while (hour < Timeline.HOURS) {
      int length = 2 + (int) noise.exponential(5);
      stop((int) hour, (int) hour + length);
      hour += length + noise.exponential(DAYS_BETWEEN_TRIPS * 24);
    }
  }

  boolean at(int hour) {
    return !stopped[hour];
  }

  /** Hours at work from one day's start to another's. */
  double hours(LocalDate from, LocalDate until) {
    int count = 0;
    for (int hour = Timeline.hour(from); hour < Timeline.hour(until); hour++) {
      count += stopped[hour] ? 0 : 1;
    }
    return count;
  }

  private void siteStops() {
    for (String start : new String[] {"2024-08-03", "2025-08-02", "2026-08-01"}) {
      int hour = Timeline.hour(start) + 6;
      stop(hour, hour + 14 * 24);
    }
    for (String start : new String[] {"2024-12-24", "2025-12-24"}) {
      int hour = Timeline.hour(start) + 14;
      stop(hour, hour + 64);
    }
  }

  private void maintenance() {
    LocalDate day = LocalDate.of(2024, 5, 15);
    while (day.isBefore(Timeline.LAST)) {
      if (day.getDayOfWeek() != DayOfWeek.WEDNESDAY) {
        throw new IllegalStateException(day + " is no maintenance day");
      }
      stop(Timeline.hour(day) + 7, Timeline.hour(day) + 17);
      day = day.plusDays(MAINTENANCE_EVERY_DAYS);
    }
  }

  private void stop(int from, int until) {
    Arrays.fill(stopped, Math.min(from, stopped.length), Math.min(until, stopped.length), true);
  }
}
