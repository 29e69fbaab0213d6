package org.kappatrail.duty;

import java.time.LocalDate;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;

/** Counts what became of the readings, source by source. */
final class Tally {
  private final long[][] counts;
  private final long[] flaws;
  private final long[] firstDay;
  private final long[] lastDay;

  Tally(int sources) {
    counts = new long[sources][ReadingState.values().length];
    flaws = new long[sources];
    firstDay = new long[sources];
    lastDay = new long[sources];
    java.util.Arrays.fill(firstDay, Long.MAX_VALUE);
    java.util.Arrays.fill(lastDay, Long.MIN_VALUE);
  }

  void add(int source, ReadingState state, long epochDay, long readings, long flawed) {
    counts[source][state.code()] += readings;
    flaws[source] += flawed;
    if (state.isUsed()) {
      firstDay[source] = Math.min(firstDay[source], epochDay);
      lastDay[source] = Math.max(lastDay[source], epochDay);
    }
  }

  long count(int source, ReadingState state) {
    return counts[source][state.code()];
  }

  /** Readings whose speed is a text. */
  long flaws(int source) {
    return flaws[source];
  }

  Map<ReadingState, Long> counts(int source) {
    Map<ReadingState, Long> byState = new EnumMap<>(ReadingState.class);
    for (ReadingState state : ReadingState.values()) {
      if (count(source, state) > 0) {
        byState.put(state, count(source, state));
      }
    }
    return byState;
  }

  Optional<LocalDate> from(int source) {
    return firstDay[source] == Long.MAX_VALUE
        ? Optional.empty()
        : Optional.of(LocalDate.ofEpochDay(firstDay[source]));
  }

  Optional<LocalDate> to(int source) {
    return lastDay[source] == Long.MIN_VALUE
        ? Optional.empty()
        : Optional.of(LocalDate.ofEpochDay(lastDay[source]));
  }
}
