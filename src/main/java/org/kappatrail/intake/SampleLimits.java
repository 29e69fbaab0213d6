package org.kappatrail.intake;

import java.util.Map;
import org.kappatrail.history.SampleColumns;

/** Ranges of the sample columns in their canonical units (tool convention). */
final class SampleLimits {
  private static final Limit COUNT = new Limit(0, 1e9, "per ml");
  private static final Limit ELEMENT = new Limit(0, 1e6, "ppm");
  private static final Limit FURTHER = new Limit(-1e15, 1e15, "");

  private static final Map<String, Limit> LIMITS =
      Map.of(
          SampleColumns.OIL_HOURS, new Limit(0, 1e7, "h"),
          SampleColumns.VISCOSITY_40C, new Limit(0.2, 100_000, "cSt"),
          SampleColumns.VISCOSITY_100C, new Limit(0.2, 5_000, "cSt"),
          SampleColumns.WATER, ELEMENT,
          SampleColumns.PARTICLES_4UM, COUNT,
          SampleColumns.PARTICLES_6UM, COUNT,
          SampleColumns.PARTICLES_14UM, COUNT,
          SampleColumns.ACID_NUMBER, new Limit(0, 100, "mg KOH/g"),
          SampleColumns.TEMPERATURE, new Limit(-40, 200, "°C"));

  private SampleLimits() {}

  /** Range of a column; every {@code _ppm} column is an element, any other column is free. */
  static Limit of(String column) {
    Limit known = LIMITS.get(column);
    if (known != null) {
      return known;
    }
    return column.endsWith(SampleColumns.ELEMENT_SUFFIX) ? ELEMENT : FURTHER;
  }
}
