package org.kappatrail.review.trend;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import org.kappatrail.statistics.MannKendall;
import org.kappatrail.statistics.TheilSen;

/**
 * How ln κ drifts over one oil charge: Theil–Sen slope with Gilbert's 95 % limits and the
 * Mann–Kendall test. A trail falls or rises where the one-sided p is at most 0.05 and the change
 * over the charge is larger than the measuring scatter. Fewer than four samples give no judgement.
 *
 * @param samples samples of the charge with a κ
 * @param line the line, days since 1970-01-01 against ln κ; empty below four samples
 * @param test the test; empty below four samples
 * @param change change of ln κ by the line from the first sample to the last
 * @param direction the judgement
 */
public record Drift(
    int samples,
    Optional<TheilSen.Line> line,
    Optional<MannKendall.Result> test,
    double change,
    Direction direction) {
  /** Samples below which nothing is judged. */
  public static final int LEAST_SAMPLES = 4;

  /** Days to which slopes refer. */
  public static final double SLOPE_DAYS = 30;

  private static final double SIGNIFICANCE = 0.05;
  private static final double CONFIDENCE = 0.95;

  /**
   * Tests a trail.
   *
   * @param days times in days, in order
   * @param lnKappa ln κ at those times
   * @param sigmaLn measuring scatter of ln κ
   */
  public static Drift of(double[] days, double[] lnKappa, double sigmaLn) {
    int n = days.length;
    Optional<TheilSen.Line> line =
        n < LEAST_SAMPLES ? Optional.empty() : TheilSen.fit(days, lnKappa, CONFIDENCE);
    Optional<MannKendall.Result> test =
        n < LEAST_SAMPLES ? Optional.empty() : MannKendall.test(days, lnKappa);
    if (line.isEmpty() || test.isEmpty()) {
      return new Drift(n, Optional.empty(), Optional.empty(), 0, Direction.UNKNOWN);
    }
    double change = line.get().slope() * (days[n - 1] - days[0]);
    return new Drift(n, line, test, change, direction(test.get(), change, sigmaLn));
  }

  private static Direction direction(MannKendall.Result test, double change, double sigmaLn) {
    if (test.pFalling() <= SIGNIFICANCE && change < -sigmaLn) {
      return Direction.FALLING;
    }
    return test.pRising() <= SIGNIFICANCE && change > sigmaLn ? Direction.RISING : Direction.STEADY;
  }

  public OptionalDouble slopePer30Days() {
    return line.map(found -> OptionalDouble.of(found.slope() * SLOPE_DAYS))
        .orElse(OptionalDouble.empty());
  }

  public OptionalDouble slopeLowPer30Days() {
    return scaled(line.map(TheilSen.Line::slopeLow).orElse(OptionalDouble.empty()));
  }

  public OptionalDouble slopeHighPer30Days() {
    return scaled(line.map(TheilSen.Line::slopeHigh).orElse(OptionalDouble.empty()));
  }

  /** One-sided p toward the side that the score points to. */
  public OptionalDouble p() {
    return test.map(found -> OptionalDouble.of(Math.min(found.pFalling(), found.pRising())))
        .orElse(OptionalDouble.empty());
  }

  private static OptionalDouble scaled(OptionalDouble slope) {
    return slope.isPresent()
        ? OptionalDouble.of(slope.getAsDouble() * SLOPE_DAYS)
        : OptionalDouble.empty();
  }

  /** Score of the Mann–Kendall test. */
  public OptionalLong score() {
    return test.map(found -> OptionalLong.of(found.s())).orElse(OptionalLong.empty());
  }

  /** ln κ by the line on a day; empty without a line. */
  public OptionalDouble lnKappaOn(double day) {
    return line.map(found -> OptionalDouble.of(found.at(day))).orElse(OptionalDouble.empty());
  }
}
