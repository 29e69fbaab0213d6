package org.kappatrail.duty;

import java.sql.ResultSet;
import java.sql.ResultSetMetaData;
import java.sql.SQLException;
import java.sql.Types;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.Bearing;

/** Turns the rows of the statement into cells, one bearing after the other. */
final class CellReader {
  private static final long DAY_MS = 86_400_000;

  private final List<Bearing> bearings;
  private final Tally tally;
  private final ResultSet rows;
  private final boolean[] narrow;

  private boolean ahead;
  private int bearing;
  private final DutyCells.Builder cells = new DutyCells.Builder();
  private long[] dropped = new long[ReadingState.values().length];

  private boolean cellOpen;
  private long dayMs;
  private int state;
  private long temperatureCell;
  private long speedCell;
  private long readings;
  private long ms;
  private long temperatureMs;
  private long lowest;
  private long highest;
  private long speedMs;

  CellReader(List<Bearing> bearings, Tally tally, ResultSet rows) throws SQLException {
    this.bearings = bearings;
    this.tally = tally;
    this.rows = rows;
    this.narrow = narrow(rows.getMetaData());
    this.ahead = rows.next();
  }

  /** The next bearing that has readings; null after the last one. */
  @Nullable BearingDuty next() throws SQLException {
    while (ahead) {
      bearing = rows.getInt(1);
      while (ahead && rows.getInt(1) == bearing) {
        add();
        ahead = rows.next();
      }
      Optional<BearingDuty> duty = finishBearing();
      if (duty.isPresent()) {
        return duty.get();
      }
    }
    return null;
  }

  private void add() throws SQLException {
    int rowState = rows.getInt(3);
    ReadingState kind = ReadingState.of(rowState);
    long rowDay = whole(2);
    long rowReadings = whole(7);
    tally.add(rows.getInt(6), kind, rowDay / DAY_MS, rowReadings, whole(13));
    if (!kind.isReading()) {
      dropped[rowState] += rowReadings;
      return;
    }
    boolean same =
        cellOpen
            && rowDay == dayMs
            && rowState == state
            && whole(4) == temperatureCell
            && whole(5) == speedCell;
    if (!same) {
      finishCell();
      cellOpen = true;
      dayMs = rowDay;
      state = rowState;
      temperatureCell = whole(4);
      speedCell = whole(5);
      lowest = Long.MAX_VALUE;
      highest = Long.MIN_VALUE;
    }
    readings += rowReadings;
    ms += whole(8);
    temperatureMs += whole(9);
    lowest = Math.min(lowest, whole(10));
    highest = Math.max(highest, whole(11));
    speedMs += whole(12);
  }

  /** Engines differ in the width of a column; read at another width than its own it is slow. */
  private long whole(int column) throws SQLException {
    return narrow[column] ? rows.getInt(column) : rows.getLong(column);
  }

  private static boolean[] narrow(ResultSetMetaData columns) throws SQLException {
    boolean[] narrow = new boolean[columns.getColumnCount() + 1];
    for (int column = 1; column < narrow.length; column++) {
      narrow[column] = columns.getColumnType(column) == Types.INTEGER;
    }
    return narrow;
  }

  private void finishCell() {
    if (!cellOpen) {
      return;
    }
    Bearing register = bearings.get(bearing - 1);
    boolean stopped = state == ReadingState.STOPPED.code();
    boolean speedLogged = stopped || speedCell >= 0;
    cells.add(
        Math.toIntExact(dayMs / DAY_MS),
        !stopped,
        ms,
        readings,
        temperatureMs / 1000.0 / ms,
        lowest / 1000.0,
        highest / 1000.0,
        speedLogged,
        speedLogged ? speedMs / 1000.0 / ms : register.speedRpm());
    cellOpen = false;
    readings = 0;
    ms = 0;
    temperatureMs = 0;
    speedMs = 0;
  }

  private Optional<BearingDuty> finishBearing() {
    finishCell();
    DutyCells built = cells.build();
    DroppedReadings left = droppedReadings();
    cells.clear();
    dropped = new long[ReadingState.values().length];
    if (bearing == 0 || (built.size() == 0 && left.total() == 0)) {
      return Optional.empty();
    }
    return Optional.of(new BearingDuty(bearings.get(bearing - 1).key(), built, left));
  }

  private DroppedReadings droppedReadings() {
    return new DroppedReadings(
        count(ReadingState.NO_TEMPERATURE)
            + count(ReadingState.STATUS_TEXT)
            + count(ReadingState.TEMPERATURE_UNREADABLE),
        count(ReadingState.BAD_QUALITY) + count(ReadingState.UNKNOWN_QUALITY),
        count(ReadingState.IMPLAUSIBLE),
        count(ReadingState.NEGATIVE_SPEED));
  }

  private long count(ReadingState reason) {
    return dropped[reason.code()];
  }
}
