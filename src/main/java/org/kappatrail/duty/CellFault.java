package org.kappatrail.duty;

import java.util.Locale;
import org.kappatrail.history.ExportMapping;

/** Kinds of cells that the program cannot make sense of, as they are reported. */
enum CellFault {
  TIME(ReadingState.TIME_UNREADABLE, LogLayout.TIME, false),
  CELLS(ReadingState.TOO_MANY_CELLS, "", false),
  BEARING(ReadingState.UNKNOWN_BEARING, LogLayout.BEARING, true),
  QUALITY(ReadingState.UNKNOWN_QUALITY, LogLayout.QUALITY, true),
  TEMPERATURE_STATUS(ReadingState.STATUS_TEXT, LogLayout.TEMPERATURE, true),
  TEMPERATURE(ReadingState.TEMPERATURE_UNREADABLE, LogLayout.TEMPERATURE, false),
  SPEED_STATUS(ReadingState.RUNNING, LogLayout.SPEED, true),
  SPEED(ReadingState.RUNNING, LogLayout.SPEED, false);

  private final ReadingState state;
  private final String column;
  private final boolean summed;

  CellFault(ReadingState state, String column, boolean summed) {
    this.state = state;
    this.column = column;
    this.summed = summed;
  }

  /** The state of the statement that tells of it; a speed that is a text leaves the reading in. */
  ReadingState state() {
    return state;
  }

  String column() {
    return column;
  }

  /** True where one row of the problems stands for all cells with the same text. */
  boolean isSummed() {
    return summed;
  }

  /** What is wrong with a cell and what to do. */
  String explain(String value, long count, ExportMapping mapping) {
    if (value.indexOf('\n') >= 0) {
      return "a quotation mark opens here and the cell runs over "
          + value.lines().count()
          + " lines; close it";
    }
    return switch (this) {
      case TIME ->
          mapping.dateFormat().isPresent()
              ? "not a time of the form " + mapping.dateFormat().get() + "; correct the cell"
              : "not a time such as 2026-03-31T14:05:00; set date-format for this file";
      case CELLS -> "the row has more cells than the header; quote a cell that holds a delimiter";
      case BEARING -> readings(count) + " of a bearing that the register does not have";
      case QUALITY ->
          rows(count) + " this mark, the first one here; only good, 192 and nothing count";
      case TEMPERATURE_STATUS ->
          rows(count) + " this text and no temperature, the first one here; left out";
      case SPEED_STATUS ->
          rows(count) + " this text and no speed, the first one here; taken as not logged";
      case TEMPERATURE, SPEED -> number(value, mapping);
    };
  }

  private static String number(String value, ExportMapping mapping) {
    if (mapping.decimalComma()) {
      return "not a number with a decimal comma; take decimal: comma out for this file";
    }
    return value.indexOf(',') >= 0
        ? "not a number with a decimal point; set decimal: comma or thousands for this file"
        : "not a number; correct the cell";
  }

  private static String readings(long count) {
    return count(count) + (count == 1 ? " reading" : " readings");
  }

  private static String rows(long count) {
    return count(count) + (count == 1 ? " row carries" : " rows carry");
  }

  private static String count(long count) {
    return String.format(Locale.ROOT, "%,d", count);
  }
}
