package org.kappatrail.review.trend;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.kappatrail.review.Moved;
import org.kappatrail.tribology.OilViscosity;

class AttributionTest {
  private static final double PITCH_MM = 150;

  @Test
  void theThreePartsAddUpToTheWholeChangeForAThousandPairs() {
    SplittableRandom random = new SplittableRandom(20261201);
    for (int i = 0; i < 1000; i++) {
      FilmState a = state(random);
      FilmState b = state(random);
      Attribution moved = Attribution.between(a, b);
      assertThat(moved.oil() + moved.temperature() + moved.speed())
          .isCloseTo(b.lnKappa(PITCH_MM) - a.lnKappa(PITCH_MM), within(1e-12));
      assertThat(
              moved.share(moved.oil())
                  + moved.share(moved.temperature())
                  + moved.share(moved.speed()))
          .isCloseTo(moved.change(), within(1e-12));
    }
  }

  @Test
  void theOilHasNoPartWhereOnlyTheTemperatureMoved() {
    FilmState a = new FilmState(OilViscosity.measured(150, 14.8), 60, 300);
    Attribution moved = Attribution.between(a, a.at(78, 300));
    assertThat(moved.oil()).isEqualTo(0);
    assertThat(moved.speed()).isEqualTo(0);
    assertThat(moved.temperature()).isLessThan(-0.5);
  }

  @Test
  void theTemperatureHasNoPartWhereOnlyTheOilMoved() {
    FilmState a = new FilmState(OilViscosity.measured(150, 14.8), 60, 300);
    Attribution moved = Attribution.between(a, a.with(OilViscosity.measured(120, 12.6)));
    assertThat(moved.temperature()).isEqualTo(0);
    assertThat(moved.speed()).isEqualTo(0);
    assertThat(moved.oil()).isLessThan(-0.1);
  }

  /** ISO 281:2007: ν1 falls with n^−0.83 below 1000 r/min, so κ follows n^0.83. */
  @Test
  void halfTheSpeedTakesThePowerOfTheRatedViscosity() {
    FilmState a = new FilmState(OilViscosity.measured(150, 14.8), 60, 600);
    Attribution moved = Attribution.between(a, a.at(60, 300));
    assertThat(moved.speed()).isCloseTo(-0.83 * Math.log(2), within(1e-12));
  }

  @Test
  void turnedRoundEveryPartChangesItsSign() {
    SplittableRandom random = new SplittableRandom(5);
    FilmState a = state(random);
    FilmState b = state(random);
    Attribution there = Attribution.between(a, b);
    Attribution back = Attribution.between(b, a);
    assertThat(back.oil()).isCloseTo(-there.oil(), within(1e-12));
    assertThat(back.temperature()).isCloseTo(-there.temperature(), within(1e-12));
    assertThat(back.speed()).isCloseTo(-there.speed(), within(1e-12));
  }

  /** ln(0.66) in parts of 9/34, 27/34 and −2/34, by hand. */
  @Test
  void inWordsTheWholePercentagesAddUp() {
    double whole = Math.log(0.66);
    Attribution moved = new Attribution(whole * 9 / 34, whole * 27 / 34, -whole * 2 / 34);
    assertThat(Moved.words(moved))
        .isEqualTo("κ fell by 34 %: oil 9 %, temperature 27 %, speed −2 %");
    SplittableRandom random = new SplittableRandom(8);
    for (int i = 0; i < 1000; i++) {
      Moved.Percentages found =
          Moved.percentages(Attribution.between(state(random), state(random)));
      assertThat(found.oil() + found.temperature() + found.speed()).isEqualTo(found.whole());
    }
  }

  @Test
  void partsThatCancelOutAreStillTold() {
    assertThat(Moved.words(new Attribution(-0.2, 0.2, 0)))
        .isEqualTo("κ stayed: oil 20 %, temperature −20 %, speed 0 %");
  }

  private static FilmState state(SplittableRandom random) {
    double v40 = random.nextDouble(20, 500);
    return new FilmState(
        OilViscosity.withIndexOf(v40, OilViscosity.measured(150, 14.8)),
        random.nextDouble(15, 110),
        random.nextDouble(10, 3000));
  }
}
