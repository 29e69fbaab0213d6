package org.kappatrail.statistics;

import java.util.Optional;

/** What is left of a series when its own Theil–Sen line is taken out. */
public final class Detrend {

  /**
   * Grid of the residuals as a part of the greatest |y|: far below any measured digit and above the
   * rounding of the arithmetic, so that residuals which are equal rank equal.
   */
  private static final double GRID = 1e-10;

  /** The slope alone is wanted; its limits are not looked at. */
  private static final double ANY_CONFIDENCE = 0.95;

  private Detrend() {}

  /**
   * Residuals y − line(t), in the order given and in the unit of y; their median is near 0. A
   * series that lies on a line leaves exact zeros. Empty for fewer than two distinct times. NaN is
   * refused.
   */
  public static Optional<double[]> residuals(double[] t, double[] y) {
    return TheilSen.fit(t, y, ANY_CONFIDENCE).map(line -> residuals(t, y, line.slope()));
  }

  private static double[] residuals(double[] t, double[] y, double slope) {
    double middleT = Quantiles.median(t).orElseThrow();
    double middleY = Quantiles.median(y).orElseThrow();
    double greatest = 0;
    for (double value : y) {
      greatest = Math.max(greatest, Math.abs(value));
    }
    double grid = greatest * GRID;
    double[] residuals = new double[y.length];
    for (int i = 0; i < y.length; i++) {
      double residual = (y[i] - middleY) - slope * (t[i] - middleT);
      residuals[i] = grid > 0 ? Math.rint(residual / grid) * grid + 0.0 : residual;
    }
    return residuals;
  }
}
