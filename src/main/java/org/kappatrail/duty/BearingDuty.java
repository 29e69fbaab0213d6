package org.kappatrail.duty;

import org.kappatrail.history.BearingKey;

/**
 * A bearing's log in cells.
 *
 * @param bearing the bearing
 * @param cells what it did
 * @param dropped readings that were left out
 */
public record BearingDuty(BearingKey bearing, DutyCells cells, DroppedReadings dropped) {
  /** A bearing without any log. */
  public static BearingDuty none(BearingKey bearing) {
    return new BearingDuty(bearing, DutyCells.none(), DroppedReadings.NONE);
  }
}
