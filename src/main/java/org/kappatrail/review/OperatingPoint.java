package org.kappatrail.review;

import java.util.Locale;
import java.util.OptionalDouble;

/**
 * Temperature and speed that stand for a sample.
 *
 * @param temperatureC oil temperature in the contact, °C; empty where none is known
 * @param temperatureSource where it comes from
 * @param speedRpm speed, r/min
 * @param speedSource where it comes from
 * @param windowHours running hours of the window behind it
 */
public record OperatingPoint(
    OptionalDouble temperatureC,
    TemperatureSource temperatureSource,
    double speedRpm,
    SpeedSource speedSource,
    double windowHours) {

  /** Where a temperature comes from. */
  public enum TemperatureSource {
    LOG,
    SAMPLE,
    NONE;

    /** The word used in files. */
    public String label() {
      return name().toLowerCase(Locale.ROOT);
    }
  }

  /** Where a speed comes from. */
  public enum SpeedSource {
    LOG,
    REGISTER;

    /** The word used in files. */
    public String label() {
      return name().toLowerCase(Locale.ROOT);
    }
  }
}
