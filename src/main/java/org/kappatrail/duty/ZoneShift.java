package org.kappatrail.duty;

import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.zone.ZoneOffsetTransition;
import java.time.zone.ZoneRules;
import java.util.ArrayList;
import java.util.List;

/**
 * A zone's offsets as an SQL expression over whole numbers, so that every engine counts a reading
 * to the same calendar day whatever time zone data it carries. Offsets are those of {@link
 * ZoneRules} from 1970 to the end of the span; later instants keep the last one.
 */
final class ZoneShift {
  /** Transitions of about four years. */
  private static final int RECENT = 8;

  private record Step(long fromMs, long offsetMs) {}

  private final ZoneRules rules;
  private final List<ZoneOffsetTransition> transitions = new ArrayList<>();

  ZoneShift(ZoneId zone, Instant spanEnd) {
    rules = zone.getRules();
    ZoneOffsetTransition next = rules.nextTransition(Instant.EPOCH);
    while (next != null && !next.getInstant().isAfter(spanEnd)) {
      transitions.add(next);
      next = rules.nextTransition(next.getInstant());
    }
  }

  /** Offset of the zone at a UTC instant, ms; {@code column} is the instant in ms since 1970. */
  String atInstant(String column) {
    List<Step> steps = new ArrayList<>();
    for (ZoneOffsetTransition transition : transitions) {
      steps.add(
          new Step(transition.getInstant().toEpochMilli(), millis(transition.getOffsetAfter())));
    }
    return recentFirst(column, first(), steps);
  }

  /**
   * Offset that turns a local clock reading into UTC, ms; {@code column} is the clock reading as ms
   * since 1970-01-01T00:00 of the same clock. As in {@link LocalDateTime#atZone}: of two offsets
   * the earlier one, and a time that the clock skipped counts as if it had not been put forward
   * yet.
   */
  String atLocalTime(String column) {
    List<Step> steps = new ArrayList<>();
    for (ZoneOffsetTransition transition : transitions) {
      LocalDateTime from =
          transition.isGap() ? transition.getDateTimeAfter() : transition.getDateTimeBefore();
      steps.add(
          new Step(
              from.toInstant(ZoneOffset.UTC).toEpochMilli(), millis(transition.getOffsetAfter())));
    }
    return recentFirst(column, first(), steps);
  }

  private long first() {
    return millis(rules.getOffset(Instant.EPOCH));
  }

  private static long millis(ZoneOffset offset) {
    return offset.getTotalSeconds() * 1000L;
  }

  /**
   * A tree of comparisons, halved at every step, but for the first one: most readings are of the
   * last years, which therefore have a shallow tree of their own.
   */
  private static String recentFirst(String column, long before, List<Step> steps) {
    int older = steps.size() - RECENT;
    return older <= 0
        ? tree(column, before, steps, steps.size() / 2)
        : tree(column, before, steps, older);
  }

  private static String tree(String column, long before, List<Step> steps, int middle) {
    if (steps.isEmpty()) {
      return Long.toString(before);
    }
    Step step = steps.get(middle);
    return "CASE WHEN "
        + column
        + " < "
        + step.fromMs()
        + " THEN "
        + tree(column, before, steps.subList(0, middle), middle / 2)
        + " ELSE "
        + tree(
            column,
            step.offsetMs(),
            steps.subList(middle + 1, steps.size()),
            (steps.size() - middle - 1) / 2)
        + " END";
  }
}
