package org.kappatrail.statistics;

import java.util.Optional;

/** What is left of a series when its own Theil–Sen line is taken out. */
public final class Detrend {

  /**
   * Grid of the residuals, 2¹⁹ units in the last place of the greatest |y| (about 1e-10 of it): far
   * below any measured digit and above the rounding of the arithmetic, so that residuals which are
   * equal rank equal.
   */
  private static final int GRID_BITS = 19;

  /** The slope alone is wanted; its limits are not looked at. */
  private static final double ANY_CONFIDENCE = 0.95;

  private Detrend() {}

  /**
   * Residuals y − line(t), in the order given and in the unit of y; a series with a trend added
   * leaves the same residuals but for a constant. A series that lies on a line leaves exact zeros.
   * Empty for fewer than two distinct times. NaN is refused.
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
    double grid = Math.scalb(Math.ulp(greatest), GRID_BITS);
    double[] residuals = new double[y.length];
    for (int i = 0; i < y.length; i++) {
      double residual = (y[i] - middleY) - slope * (t[i] - middleT);
      residuals[i] = Math.rint(residual / grid) * grid + 0.0;
    }
    return residuals;
  }
}
