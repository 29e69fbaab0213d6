package org.kappatrail.review.trend;

import java.time.LocalDate;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.apache.commons.math3.stat.descriptive.rank.Median;
import org.kappatrail.statistics.Cusum;

/**
 * Slow, small shifts of an oil that a trend test misses: the lower cumulative sum of the
 * standardised reference trail with k 0.5 and h 5 standard deviations (Page 1954; the customary
 * choice of Montgomery, Introduction to Statistical Quality Control, chapter 9, from memory).
 *
 * @param day day of the first sample at which the sum signals
 * @param lasting whether the later samples stand below the target too, so that it was not one odd
 *     sample: their median is lower by half a standard deviation or more (tool convention)
 */
public record OilShift(LocalDate day, boolean lasting) {
  private static final double SLACK = 0.5;
  private static final double LIMIT = 5;
  private static final int RECENT = 8;

  /**
   * Looks for a signal; empty where the sum gives none.
   *
   * @param days days of the samples, in time
   * @param lnKappa ln κ at reference conditions
   * @param fresh that of the registered oil when fresh
   * @param sigmaLn measuring scatter, above 0
   */
  public static Optional<OilShift> find(
      List<LocalDate> days, double[] lnKappa, double fresh, double sigmaLn) {
    double[] standardised =
        Arrays.stream(lnKappa).map(value -> (value - fresh) / sigmaLn).toArray();
    OptionalInt signal = Cusum.lower(standardised, SLACK, LIMIT).firstSignal();
    if (signal.isEmpty()) {
      return Optional.empty();
    }
    int n = standardised.length;
    double median =
        new Median().evaluate(Arrays.copyOfRange(standardised, Math.max(0, n - RECENT), n));
    return Optional.of(new OilShift(days.get(signal.getAsInt()), median <= -SLACK));
  }
}
