package org.kappatrail.review.correlation;

import java.util.Arrays;
import java.util.function.IntPredicate;
import java.util.function.IntToDoubleFunction;

/** The pairs that two variables of one asset make, in time; a place without both is left out. */
final class Paired {
  private final double[] x;
  private final double[] y;

  private Paired(double[] x, double[] y) {
    this.x = x;
    this.y = y;
  }

  /**
   * Pairs x of a sample with y of the sample a number of samples after it.
   *
   * @param lag samples; below 0 y is the earlier one
   */
  static Paired of(
      int samples,
      int lag,
      IntPredicate hasX,
      IntToDoubleFunction ofX,
      IntPredicate hasY,
      IntToDoubleFunction ofY) {
    double[] x = new double[samples];
    double[] y = new double[samples];
    int count = 0;
    for (int i = Math.max(0, -lag); i < samples && i + lag < samples; i++) {
      if (hasX.test(i) && hasY.test(i + lag)) {
        x[count] = ofX.applyAsDouble(i);
        y[count++] = ofY.applyAsDouble(i + lag);
      }
    }
    return new Paired(Arrays.copyOf(x, count), Arrays.copyOf(y, count));
  }

  int size() {
    return x.length;
  }

  double[] x() {
    return x.clone();
  }

  double[] y() {
    return y.clone();
  }
}
