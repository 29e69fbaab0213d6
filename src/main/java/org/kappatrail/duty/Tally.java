package org.kappatrail.duty;

import java.time.LocalDate;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import org.kappatrail.history.FileAccount;

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
    if (state.isReading()) {
      firstDay[source] = Math.min(firstDay[source], epochDay);
      lastDay[source] = Math.max(lastDay[source], epochDay);
    }
  }

  int sources() {
    return counts.length;
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

  /** True where a file has cells that are to be reported. */
  boolean hasOddCells(int source) {
    boolean odd = flaws[source] > 0;
    for (CellFault fault : CellFault.values()) {
      odd |= !fault.state().isReading() && count(source, fault.state()) > 0;
    }
    return odd;
  }

  /** Rows that are reported one by one. */
  long unreadable(int source) {
    return count(source, ReadingState.TIME_UNREADABLE)
        + count(source, ReadingState.TOO_MANY_CELLS)
        + count(source, ReadingState.TEMPERATURE_UNREADABLE);
  }

  /**
   * The account of a file.
   *
   * @param fileRows its rows, where what is counted are cells
   */
  FileAccount account(
      int source, ReadingFates fate, OptionalLong fileRows, List<String> unusedColumns) {
    return new FileAccount(
        fate.file(),
        FileAccount.Kind.TEMPERATURES,
        fileRows,
        fate.used(),
        fate.rejected(),
        day(firstDay[source]),
        day(lastDay[source]),
        unusedColumns);
  }

  private static Optional<LocalDate> day(long epochDay) {
    return epochDay == Long.MAX_VALUE || epochDay == Long.MIN_VALUE
        ? Optional.empty()
        : Optional.of(LocalDate.ofEpochDay(epochDay));
  }
}
