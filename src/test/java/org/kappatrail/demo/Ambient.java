package org.kappatrail.demo;

import java.time.LocalDate;

/** Air around the machines: the hall, and outdoors. */
final class Ambient {
  private static final int WARMEST_DAY_OF_YEAR = 205;

  static final Ambient HALL = new Ambient("hall", 27, 8, 1.3, 1.5);
  static final Ambient OUTDOORS = new Ambient("outdoors", 10.5, 8, 2.2, 3);

  private final double meanC;
  private final double[] deviationC = new double[Timeline.HOURS];

  private Ambient(String name, double meanC, double swingC, double weatherC, double dayC) {
    this.meanC = meanC;
    double[] weather = Noise.named("weather", name).series(Timeline.DAYS + 2, weatherC, 0.75);
    for (int hour = 0; hour < deviationC.length; hour++) {
      LocalDate day = Timeline.day(hour);
      double year = (day.getDayOfYear() - WARMEST_DAY_OF_YEAR + (hour % 24) / 24.0) / 365.25;
      double clock = (hour % 24 - 15) / 24.0;
      int front = hour / 24;
      double share = (hour % 24) / 24.0;
      deviationC[hour] =
          swingC * StrictMath.cos(2 * Math.PI * year)
              + dayC * StrictMath.cos(2 * Math.PI * clock)
              + weather[front] * (1 - share)
              + weather[front + 1] * share;
    }
  }

  static Ambient of(String asset) {
    return asset.startsWith("UT-") ? OUTDOORS : HALL;
  }

  double meanC() {
    return meanC;
  }

  /** How far the hour is from the mean of the year, °C. */
  double deviationC(int hour) {
    return deviationC[hour];
  }
}
