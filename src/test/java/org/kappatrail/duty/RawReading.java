package org.kappatrail.duty;

import org.kappatrail.history.BearingKey;

/** A row of a log, cell by cell as it is written; empty texts are empty cells. */
record RawReading(
    String time, BearingKey bearing, String temperature, String speed, String quality) {
  String csv() {
    return String.join(",", time, bearing.asset(), bearing.bearing(), temperature, speed, quality);
  }
}
