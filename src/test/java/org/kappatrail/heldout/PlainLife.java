package org.kappatrail.heldout;

import java.util.OptionalDouble;

/**
 * Rated viscosity, contamination factor and life, written from ISO 281:2007 (9.3.3, Annex A, Annex
 * B); the coefficients of the contamination factor from memory.
 */
final class PlainLife {
  /** Highest scale numbers for 6 and 14 µm, c1, c2; cleanest class first. */
  private static final double[][] FILTERED = {
    {13, 10, 0.0864, 0.5663},
    {15, 12, 0.0432, 0.9987},
    {17, 14, 0.0288, 1.6329},
    {19, 16, 0.0216, 2.3362}
  };

  private static final double[][] BATH = {
    {13, 10, 0.0864, 0.6796},
    {15, 12, 0.0288, 1.141},
    {17, 14, 0.0133, 1.67},
    {19, 16, 0.00864, 2.5164},
    {21, 18, 0.00411, 3.8974}
  };

  /** ISO 4406, Table 1: highest count per ml of scale numbers 0, 1, 2… */
  private static final double[] HIGHEST_COUNTS = {
    0.01, 0.02, 0.04, 0.08, 0.16, 0.32, 0.64, 1.3, 2.5, 5, 10, 20, 40, 80, 160, 320, 640, 1300,
    2500, 5000, 10000, 20000, 40000, 80000, 160000, 320000, 640000, 1300000, 2500000
  };

  private PlainLife() {}

  static double rated(double rpm, double pitch) {
    return rpm < 1000
        ? 45000 * Math.pow(rpm, -0.83) / Math.sqrt(pitch)
        : 4500 / Math.sqrt(rpm * pitch);
  }

  static int scaleNumber(double count) {
    int number = 0;
    while (HIGHEST_COUNTS[number] < count) {
      number++;
    }
    return number;
  }

  static double contamination(boolean filtered, int number6, int number14, double kappa, double d) {
    double[][] classes = filtered ? FILTERED : BATH;
    double[] used = classes[classes.length - 1];
    for (int i = classes.length - 1; i >= 0; i--) {
      if (number6 <= classes[i][0] && number14 <= classes[i][1]) {
        used = classes[i];
      }
    }
    double clipped = Math.max(0.1, Math.min(4, kappa));
    double film = Math.min(1, used[2] * Math.pow(clipped, 0.68) * Math.pow(d, 0.55));
    return Math.max(0, Math.min(1, film * (1 - used[3] / Math.pow(d, 1.0 / 3))));
  }

  static OptionalDouble modification(String type, double kappa, double eC, double cu, double p) {
    if (kappa < 0.1) {
      return OptionalDouble.empty();
    }
    double k = Math.min(4, kappa);
    boolean ball = type.endsWith("ball");
    double divisor = type.startsWith("radial") ? 1 : ball ? 3 : 2.5;
    double c1 = ball ? 2.5671 : 1.5859;
    double c2 = k < 0.4 ? (ball ? 2.2649 : 1.3993) : (ball ? 1.9987 : 1.2348);
    double c3 = k < 0.4 ? 0.054381 : k < 1 ? 0.19087 : 0.071739;
    double film = Math.pow(Math.max(0, c1 - c2 / Math.pow(k, c3)), ball ? 0.83 : 1);
    double bracket = 1 - film * Math.pow(eC * cu / (divisor * p), ball ? 1.0 / 3 : 0.4);
    if (bracket <= 0) {
      return OptionalDouble.of(50);
    }
    return OptionalDouble.of(Math.min(50, 0.1 * Math.pow(bracket, ball ? -9.3 : -9.185)));
  }

  static double fatigueLimit(String type, double c0, double pitch) {
    double plain = c0 / (type.endsWith("ball") ? 22 : 8.2);
    return pitch > 100 ? plain * Math.sqrt(100 / pitch) : plain;
  }

  static double hours(String type, double c, double p, double rpm, double modification) {
    double exponent = type.endsWith("ball") ? 3 : 10.0 / 3;
    return modification * 1e6 / 60 / rpm * Math.pow(c / p, exponent);
  }
}
