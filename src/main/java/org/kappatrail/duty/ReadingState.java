package org.kappatrail.duty;

import org.kappatrail.history.FileAccount;

/** What becomes of a reading; the statement speaks of a state by its code. */
public enum ReadingState {
  RUNNING(0, "used, running"),
  STOPPED(1, "used, stopped"),
  REPEATED(2, "at an instant that has another reading"),
  LATER(3, FileAccount.LATER),
  TIME_UNREADABLE(4, "time that cannot be read"),
  TOO_MANY_CELLS(5, "more cells than the header"),
  UNKNOWN_BEARING(6, "bearing that is not in the register"),
  BAD_QUALITY(7, "marked bad"),
  UNKNOWN_QUALITY(8, "unknown quality mark"),
  NO_TEMPERATURE(9, "no temperature"),
  STATUS_TEXT(10, "a text in place of the temperature"),
  TEMPERATURE_UNREADABLE(11, "temperature that is not a number"),
  IMPLAUSIBLE(12, "outside −40…200 °C"),
  NEGATIVE_SPEED(13, "speed below 0"),
  JOINED(14, "used within another reading of the instant");

  private static final ReadingState[] BY_CODE = values();

  private final int code;
  private final String label;

  ReadingState(int code, String label) {
    this.code = code;
    this.label = label;
  }

  /** The code in the statement. */
  int code() {
    return code;
  }

  /** For people. */
  public String label() {
    return label;
  }

  /** True where it is a reading that counts. */
  public boolean isReading() {
    return this == RUNNING || this == STOPPED;
  }

  /** True where the row is used, as a reading or as a part of one. */
  public boolean isUsed() {
    return isReading() || this == JOINED;
  }

  /** The state of a code of the statement. */
  static ReadingState of(int code) {
    return BY_CODE[code];
  }
}
