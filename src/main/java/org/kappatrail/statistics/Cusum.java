package org.kappatrail.statistics;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;

/**
 * One-sided cumulative sums for slow, small shifts: S = max(0, S₋₁ + z − k) upward, S = max(0, S₋₁
 * − z − k) downward, with a signal where S first exceeds h. Source: Page, Biometrika 41 (1954)
 * 100–115; with a head start (fast initial response), Lucas and Crosier, Technometrics 24 (1982)
 * 199–205.
 *
 * <p>The values, k and h share one unit: standard deviations from target, or the measured unit if k
 * and h are given in it. No values give no sums and no signal. NaN is refused.
 */
public final class Cusum {

  private Cusum() {}

  /**
   * Sums after each value, both directions counted positive; they run on after a signal.
   *
   * @param firstSignal place of the first sum above h, counted from 0; empty where none is
   */
  public record Result(List<Double> sums, OptionalInt firstSignal) {

    public Result {
      sums = List.copyOf(sums);
    }
  }

  /** Downward sum from zero. */
  public static Result lower(double[] standardised, double k, double h) {
    return lower(standardised, k, h, 0);
  }

  /** Downward sum from a head start, customarily h/2. */
  public static Result lower(double[] standardised, double k, double h, double headStart) {
    return run(standardised, -1, k, h, headStart);
  }

  /** Upward sum from zero. */
  public static Result upper(double[] standardised, double k, double h) {
    return upper(standardised, k, h, 0);
  }

  /** Upward sum from a head start, customarily h/2. */
  public static Result upper(double[] standardised, double k, double h, double headStart) {
    return run(standardised, 1, k, h, headStart);
  }

  private static Result run(double[] values, int sign, double k, double h, double headStart) {
    Inputs.requireFinite(values, "standardised");
    if (!(k >= 0 && h > 0 && headStart >= 0)) {
      throw new IllegalArgumentException(
          "k " + k + " and head start " + headStart + " must be 0 or more, h " + h + " above 0");
    }
    List<Double> sums = new ArrayList<>(values.length);
    OptionalInt firstSignal = OptionalInt.empty();
    double sum = headStart;
    for (int i = 0; i < values.length; i++) {
      sum = Math.max(0, sum + sign * values[i] - k);
      sums.add(sum);
      if (sum > h && firstSignal.isEmpty()) {
        firstSignal = OptionalInt.of(i);
      }
    }
    return new Result(sums, firstSignal);
  }
}
