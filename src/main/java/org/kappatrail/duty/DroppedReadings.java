package org.kappatrail.duty;

/**
 * Readings that were left out before anything was computed, by reason.
 *
 * @param noTemperature without a temperature, or with a text in its place
 * @param badQuality marked bad by the log
 * @param implausible outside −40…200 °C
 * @param negativeSpeed with a speed below 0
 */
public record DroppedReadings(
    long noTemperature, long badQuality, long implausible, long negativeSpeed) {
  public static final DroppedReadings NONE = new DroppedReadings(0, 0, 0, 0);

  public long total() {
    return noTemperature + badQuality + implausible + negativeSpeed;
  }
}
