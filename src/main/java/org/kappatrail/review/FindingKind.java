package org.kappatrail.review;

import java.util.Locale;

/** Every kind of finding; the file name of a kind is its name in lower case with hyphens. */
public enum FindingKind {
  /** κ of the latest sample lies below the floor. */
  BELOW_FLOOR,
  /** The interval of the latest κ reaches below the floor. */
  NEAR_FLOOR,
  /** κ above 4: more viscosity buys no more life. */
  ABOVE_FOUR,
  /** No operating temperature is known for a sample. */
  NO_TEMPERATURE,
  /** No measured viscosity at 40 °C for a sample. */
  NO_VISCOSITY,
  /** Viscosity taken outside 10…130 °C. */
  EXTRAPOLATED,
  /** Two samples of one asset and moment. */
  COINCIDENT_SAMPLES,
  /** A sample unlike its asset and like another one's. */
  SWAPPED_SAMPLES,
  /** Viscosity off the registered grade of ISO 3448. */
  OFF_GRADE,
  /** A viscosity outside the range in which the laboratory's precision is known. */
  OUTSIDE_PRECISION_RANGE,
  /** A number that looks as if it were in another unit. */
  UNIT_SUSPICION,
  /** A temperature that does not move. */
  STUCK_SENSOR,
  /** Days without readings in a log. */
  LOG_GAP,
  /** Readings that were dropped from a log. */
  DROPPED_READINGS,
  /** Viscosity jumped toward fresh oil without a recorded change. */
  UNRECORDED_OIL_CHANGE,
  /** Oil hours fell back without a recorded change. */
  INFERRED_CHARGE,
  /** Water above the site's limit. */
  WATER_HIGH,
  /** Dirtier than the site's limit. */
  DIRTY,
  /** Acid number risen more than the site allows. */
  ACID_HIGH,
  /** The oil's own viscosity falls. */
  OIL_DRIFT,
  /** κ falls, whatever the cause. */
  FILM_DRIFT,
  /** A slow small shift of the oil, seen by the cumulative sum. */
  OIL_SHIFT,
  /** Temperature is what lowered κ. */
  HEAT,
  /** A dip below the floor that comes back with the season. */
  SEASONAL_DIP,
  /** A crossing of the floor is foreseen. */
  CROSSING_FORESEEN;

  /** The name used in files. */
  public String label() {
    return name().toLowerCase(Locale.ROOT).replace('_', '-');
  }
}
