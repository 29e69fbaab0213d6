package org.kappatrail.review.trend;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

class DriftTest {
  private static final double[] MONTHS = {0, 30, 60, 90, 120, 150, 180, 210};

  @Test
  void fewerThanFourSamplesAreNotJudged() {
    for (int n = 0; n < 4; n++) {
      Drift drift = Drift.of(Arrays.copyOf(MONTHS, n), new double[n], 0.01);
      assertThat(drift.direction()).isEqualTo(Direction.UNKNOWN);
      assertThat(drift.slopePer30Days()).isEmpty();
      assertThat(drift.p()).isEmpty();
    }
  }

  /** The exact one-sided p of four falling values is 1/4! (Kendall). */
  @Test
  void fourFallingSamplesAreEnough() {
    Drift drift = Drift.of(Arrays.copyOf(MONTHS, 4), new double[] {0, -0.03, -0.06, -0.09}, 0.01);
    assertThat(drift.direction()).isEqualTo(Direction.FALLING);
    assertThat(drift.p().getAsDouble()).isCloseTo(1 / 24.0, within(1e-15));
    assertThat(drift.slopePer30Days().getAsDouble()).isCloseTo(-0.03, within(1e-12));
    assertThat(drift.change()).isCloseTo(-0.09, within(1e-12));
  }

  @Test
  void aChangeWithinTheScatterIsSteadyHoweverOrderly() {
    double[] values = Arrays.stream(MONTHS).map(day -> -day / 30 * 0.001).toArray();
    assertThat(Drift.of(MONTHS, values, 0.01).direction()).isEqualTo(Direction.STEADY);
    assertThat(Drift.of(MONTHS, values, 0.005).direction()).isEqualTo(Direction.FALLING);
  }

  @Test
  void aRisingTrailRises() {
    double[] values = Arrays.stream(MONTHS).map(day -> day / 30 * 0.02).toArray();
    assertThat(Drift.of(MONTHS, values, 0.01).direction()).isEqualTo(Direction.RISING);
  }

  @Test
  void equalValuesAreSteadyAndEqualTimesGiveNoJudgement() {
    assertThat(Drift.of(MONTHS, new double[8], 0.01).direction()).isEqualTo(Direction.STEADY);
    assertThat(Drift.of(new double[8], MONTHS, 0.01).direction()).isEqualTo(Direction.UNKNOWN);
  }

  /**
   * Seeded Monte Carlo on trails of known slope with the scatter of a laboratory (normal): how
   * often Gilbert's 95 % limits hold the true slope, and how often a flat trail is called falling.
   */
  @Test
  @Tag("slow")
  void theLimitsHoldTheTrueSlopeAndFlatTrailsAreSeldomCalledFalling() {
    SplittableRandom random = new SplittableRandom(17);
    for (int n : new int[] {8, 12, 24}) {
      int runs = 4000;
      int held = 0;
      int falling = 0;
      for (int run = 0; run < runs; run++) {
        double[] days = new double[n];
        double[] flat = new double[n];
        double[] sloped = new double[n];
        double slope = -0.015 / 30;
        for (int i = 0; i < n; i++) {
          days[i] = 30 * i + random.nextDouble(-4, 4);
          flat[i] = 0.006 * gaussian(random);
          sloped[i] = flat[i] + slope * days[i];
        }
        Drift drift = Drift.of(days, sloped, 0.006);
        double low = drift.line().orElseThrow().slopeLow().orElseThrow();
        double high = drift.line().orElseThrow().slopeHigh().orElseThrow();
        held += low <= slope && slope <= high ? 1 : 0;
        falling += Drift.of(days, flat, 0.006).direction() == Direction.FALLING ? 1 : 0;
      }
      assertThat(held / (double) runs).as("coverage at n " + n).isBetween(0.93, 0.97);
      assertThat(falling / (double) runs).as("false alarms at n " + n).isLessThanOrEqualTo(0.06);
    }
  }

  static double gaussian(SplittableRandom random) {
    double radius = StrictMath.sqrt(-2 * StrictMath.log(1 - random.nextDouble()));
    return radius * StrictMath.cos(2 * Math.PI * random.nextDouble());
  }
}
