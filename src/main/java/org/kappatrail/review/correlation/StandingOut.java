package org.kappatrail.review.correlation;

import java.util.Arrays;
import org.kappatrail.statistics.FisherExact;

/**
 * What two variables can tell that mostly stand at one value, as below a limit of detection.
 *
 * <p>Where both are at their commonest value in more than half of the pairs, their coefficient is
 * little more than whether the few that stand out do so together, and Student's t of it is far off:
 * one sample that stands out in both of 30 gives a coefficient of 1, yet happens once in 30 times
 * by chance. Then p is never below the exact probability that as many stand out together, or for a
 * coefficient below 0 that as many stand out apart (this tool's convention; seeded study in the
 * tests).
 */
final class StandingOut {
  private static final double MOST = 0.5;

  private StandingOut() {}

  /** Least p of a coefficient between two variables; 0 where no such bound holds. */
  static double leastP(double[] x, double[] y, double coefficient) {
    int n = x.length;
    Common commonX = Common.of(x);
    Common commonY = Common.of(y);
    if (commonX.count() <= MOST * n || commonY.count() <= MOST * n) {
      return 0;
    }
    int both = 0;
    for (int i = 0; i < n; i++) {
      if (x[i] != commonX.value() && y[i] != commonY.value()) {
        both++;
      }
    }
    int outX = n - commonX.count();
    int outY = n - commonY.count();
    return coefficient >= 0 || both > 0
        ? FisherExact.atLeast(n, outX, outY, both)
        : FisherExact.atLeast(n, outX, n - outY, outX);
  }

  private record Common(double value, int count) {
    static Common of(double[] values) {
      double[] sorted = values.clone();
      Arrays.sort(sorted);
      Common common = new Common(0, 0);
      for (int from = 0; from < sorted.length; ) {
        int to = from;
        while (to < sorted.length && sorted[to] == sorted[from]) {
          to++;
        }
        if (to - from > common.count()) {
          common = new Common(sorted[from], to - from);
        }
        from = to;
      }
      return common;
    }
  }
}
