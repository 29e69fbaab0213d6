package org.kappatrail.review;

import org.kappatrail.duty.DutyCells;

/** Finds rows of day cells by day. */
final class DayRows {
  private DayRows() {}

  /** Index of the first row on or after a day; the number of rows where there is none. */
  static int firstAtOrAfter(DutyCells cells, int epochDay) {
    int low = 0;
    int high = cells.size();
    while (low < high) {
      int middle = (low + high) >>> 1;
      if (cells.epochDay(middle) < epochDay) {
        low = middle + 1;
      } else {
        high = middle;
      }
    }
    return low;
  }

  /** Index after the last row of the day of a row. */
  static int endOfDay(DutyCells cells, int row) {
    int day = cells.epochDay(row);
    int end = row;
    while (end < cells.size() && cells.epochDay(end) == day) {
      end++;
    }
    return end;
  }
}
