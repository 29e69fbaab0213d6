package org.kappatrail.report.chart;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;

/**
 * The stretch of calendar that all panels of a chart share.
 *
 * @param from first day
 * @param to last day, after the first
 */
record TimeSpan(LocalDate from, LocalDate to) {
  /** A tick of the calendar. */
  record Tick(LocalDate day, String label, boolean year) {}

  TimeSpan {
    if (!to.isAfter(from)) {
      to = from.plusDays(30);
    }
  }

  double fromX() {
    return from.toEpochDay();
  }

  double toX() {
    return to.toEpochDay() + 1.0;
  }

  /** Ticks at starts of months, so many months apart that at most a dozen labels stand. */
  List<Tick> ticks() {
    long months = Math.max(1, (to.toEpochDay() - from.toEpochDay()) / 30);
    int step = months <= 12 ? 1 : months <= 24 ? 2 : months <= 40 ? 3 : months <= 90 ? 6 : 12;
    List<Tick> ticks = new ArrayList<>();
    LocalDate day = from.withDayOfMonth(1);
    for (; !day.isAfter(to); day = day.plusMonths(1)) {
      boolean onStep = (day.getMonthValue() - 1) % step == 0;
      if (!day.isBefore(from) && onStep) {
        boolean year = day.getMonthValue() == 1;
        ticks.add(new Tick(day, MONTHS[day.getMonthValue() - 1], year));
      }
    }
    return ticks;
  }

  private static final String[] MONTHS = {
    "Jan", "Feb", "Mar", "Apr", "May", "Jun", "Jul", "Aug", "Sep", "Oct", "Nov", "Dec"
  };
}
