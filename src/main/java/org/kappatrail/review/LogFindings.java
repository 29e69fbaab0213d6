package org.kappatrail.review;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.kappatrail.duty.BearingDuty;
import org.kappatrail.duty.DroppedReadings;
import org.kappatrail.duty.DutyCells;

/**
 * Findings about a bearing's log: a temperature that does not move over 24 running hours in a log
 * that resolves 0.1 °C, days without any reading, readings dropped. Whole days are looked at, so
 * that a stuck stretch shows once it holds a whole day.
 */
final class LogFindings {
  private static final double MS_PER_HOUR = 3_600_000.0;
  private static final double STUCK_HOURS = 24;
  private static final double COARSE_STEP_C = 0.5;

  /** A single day without readings is passed over (tool convention). */
  private static final int SHORTEST_GAP_DAYS = 2;

  private LogFindings() {}

  static List<Finding> of(BearingDuty duty, LocalDate lastSample) {
    List<Finding> findings = new ArrayList<>();
    stuck(duty, findings);
    gaps(duty, lastSample, findings);
    dropped(duty, findings);
    return findings;
  }

  private static void stuck(BearingDuty duty, List<Finding> findings) {
    DutyCells cells = duty.cells();
    if (!resolvesTenths(cells)) {
      return;
    }
    double value = Double.NaN;
    int firstDay = 0;
    int lastDay = 0;
    double hours = 0;
    for (int row = 0; row < cells.size(); ) {
      int end = DayRows.endOfDay(cells, row);
      double only = onlyTemperature(cells, row, end);
      double running = runningHours(cells, row, end);
      if (running > 0) {
        if (only == value) {
          lastDay = cells.epochDay(row);
          hours += running;
        } else {
          report(duty, value, firstDay, lastDay, hours, findings);
          value = only;
          firstDay = cells.epochDay(row);
          lastDay = firstDay;
          hours = running;
        }
      }
      row = end;
    }
    report(duty, value, firstDay, lastDay, hours, findings);
  }

  private static void report(
      BearingDuty duty,
      double value,
      int firstDay,
      int lastDay,
      double hours,
      List<Finding> findings) {
    if (Double.isNaN(value) || hours < STUCK_HOURS - 1e-9) {
      return;
    }
    findings.add(
        finding(
            duty,
            Level.ALERT,
            FindingKind.STUCK_SENSOR,
            Say.text(
                "temperature stands at %s °C from %s to %s, %s running hours without a change",
                Say.oneDecimal(value),
                LocalDate.ofEpochDay(firstDay),
                LocalDate.ofEpochDay(lastDay),
                Say.whole(hours))));
  }

  /** The one temperature of a day's running cells; NaN where there is more than one or none. */
  private static double onlyTemperature(DutyCells cells, int from, int to) {
    double only = Double.NaN;
    for (int row = from; row < to; row++) {
      if (cells.running(row)) {
        boolean moved = cells.lowestC(row) != cells.highestC(row);
        if (moved || (!Double.isNaN(only) && cells.lowestC(row) != only)) {
          return Double.NaN;
        }
        only = cells.lowestC(row);
      }
    }
    return only;
  }

  private static double runningHours(DutyCells cells, int from, int to) {
    double millis = 0;
    for (int row = from; row < to; row++) {
      millis += cells.running(row) ? cells.millis(row) : 0;
    }
    return millis / MS_PER_HOUR;
  }

  private static boolean resolvesTenths(DutyCells cells) {
    for (int row = 0; row < cells.size(); row++) {
      double steps = cells.lowestC(row) / COARSE_STEP_C;
      if (cells.running(row) && Math.abs(steps - Math.rint(steps)) > 1e-6) {
        return true;
      }
    }
    return false;
  }

  private static void gaps(BearingDuty duty, LocalDate lastSample, List<Finding> findings) {
    DutyCells cells = duty.cells();
    if (cells.size() == 0) {
      return;
    }
    int count = 0;
    long days = 0;
    long longest = 0;
    int longestFrom = 0;
    int day = cells.epochDay(0);
    for (int row = 0; row <= cells.size(); ) {
      boolean ended = row == cells.size();
      long next = ended ? Math.max(lastSample.toEpochDay() + 1, day + 1) : cells.epochDay(row);
      long missing = next - day - 1;
      if (missing >= SHORTEST_GAP_DAYS) {
        count++;
        days += missing;
        if (missing > longest) {
          longest = missing;
          longestFrom = day + 1;
        }
      }
      if (ended) {
        break;
      }
      day = cells.epochDay(row);
      row = DayRows.endOfDay(cells, row);
    }
    if (count > 0) {
      LocalDate from = LocalDate.ofEpochDay(longestFrom);
      findings.add(
          finding(
              duty,
              Level.CLEAR,
              FindingKind.LOG_GAP,
              Say.text(
                  "%d gap%s of two days or more in the log, %d days in all; longest %s to %s",
                  count, count == 1 ? "" : "s", days, from, from.plusDays(longest - 1))));
    }
  }

  private static void dropped(BearingDuty duty, List<Finding> findings) {
    DroppedReadings dropped = duty.dropped();
    if (dropped.total() > 0) {
      findings.add(
          finding(
              duty,
              Level.CLEAR,
              FindingKind.DROPPED_READINGS,
              Say.text(
                  "%d readings dropped: %d without a temperature, %d marked bad, %d outside −40 to"
                      + " 200 °C, %d with a negative speed",
                  dropped.total(),
                  dropped.noTemperature(),
                  dropped.badQuality(),
                  dropped.implausible(),
                  dropped.negativeSpeed())));
    }
  }

  private static Finding finding(BearingDuty duty, Level level, FindingKind kind, String message) {
    return new Finding(
        duty.bearing().asset(),
        Optional.of(duty.bearing().bearing()),
        Optional.empty(),
        level,
        kind,
        message);
  }
}
