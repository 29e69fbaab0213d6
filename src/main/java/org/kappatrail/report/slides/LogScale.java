package org.kappatrail.report.slides;

import java.util.ArrayList;
import java.util.List;

/**
 * A logarithmic axis of κ between two places.
 *
 * @param low κ at the left end
 * @param high κ at the right end
 * @param fromX place of the left end
 * @param toX place of the right end
 */
record LogScale(double low, double high, double fromX, double toX) {
  private static final double[] STEPS = {1, 2, 5};

  double x(double kappa) {
    double share = Math.log(clamped(kappa) / low) / Math.log(high / low);
    return fromX + share * (toX - fromX);
  }

  private double clamped(double kappa) {
    return Math.min(high, Math.max(low, kappa));
  }

  /** Ticks at 1, 2 and 5 of each decade. */
  List<Double> ticks() {
    List<Double> ticks = new ArrayList<>();
    for (int decade = -4; decade <= 4; decade++) {
      for (double step : STEPS) {
        double tick = step * Math.pow(10, decade);
        if (tick >= low * 0.999 && tick <= high * 1.001) {
          ticks.add(tick);
        }
      }
    }
    return ticks;
  }
}
