package org.kappatrail.tribology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RatingLifeTest {
  /**
   * ISO 281:2007: a million revolutions where load equals rating; p 3 for ball, 10/3 for roller.
   */
  @Test
  void basicLifeIsAMillionRevolutionsAtTheRatingItself() {
    for (BearingType type : BearingType.values()) {
      double hours = Iso281RatingLife.basicHours(type, 50, 50, 1000);
      assertThat(hours * 60 * 1000).isEqualTo(1e6, within(1e-6));
    }
    double ball = Iso281RatingLife.basicHours(BearingType.THRUST_BALL, 100, 10, 1000);
    double roller = Iso281RatingLife.basicHours(BearingType.RADIAL_ROLLER, 100, 10, 1000);
    assertThat(ball).isEqualTo(16666.7, within(0.05));
    assertThat(roller).isEqualTo(35907.2, within(0.05));
    assertThat(Iso281RatingLife.modifiedHours(2.5, ball)).isEqualTo(2.5 * ball);
  }

  @ParameterizedTest
  @CsvSource({"0, 10, 1000", "100, 0, 1000", "100, 10, 0", "NaN, 10, 1000", "100, 10, -5"})
  void impossibleRatingsAreRefused(double ratingKn, double loadKn, double speedRpm) {
    assertThatThrownBy(
            () -> Iso281RatingLife.basicHours(BearingType.RADIAL_BALL, ratingKn, loadKn, speedRpm))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void constantDutyHasItsPlainLife() {
    PalmgrenMiner duty = new PalmgrenMiner();
    for (int i = 0; i < 365; i++) {
      duty.add(24, 52000);
    }
    assertThat(duty.equivalentLifeHours()).hasValueCloseTo(52000.0, withinPercentage(1e-10));
    assertThat(duty.damage()).isEqualTo(8760.0 / 52000, within(1e-12));
    assertThat(duty.hours()).isEqualTo(8760);
  }

  /**
   * Miner 1945: shares of half and half at lives of 10 000 and 30 000 h give their harmonic mean.
   */
  @Test
  void mixedDutyHasTheHarmonicMeanOfItsLives() {
    PalmgrenMiner duty = new PalmgrenMiner();
    duty.add(500, 10000);
    duty.add(500, 30000);
    assertThat(duty.equivalentLifeHours()).hasValueCloseTo(15000.0, within(1e-6));
  }

  @Test
  void nothingRunHasNoLife() {
    PalmgrenMiner duty = new PalmgrenMiner();
    assertThat(duty.equivalentLifeHours()).isEmpty();
    duty.add(0, 1000);
    assertThat(duty.equivalentLifeHours()).isEmpty();
    assertThat(duty.damage()).isZero();
    assertThatThrownBy(() -> duty.add(-1, 1000)).isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> duty.add(1, 0)).isInstanceOf(IllegalArgumentException.class);
  }

  /** Cantley, ASLE Transactions 20 (1977): tests at 25, 100 and 400 ppm. */
  @ParameterizedTest
  @CsvSource({"25, 2.297", "100, 1.000", "400, 0.435"})
  void waterShortensLifeAsCantleyFound(double waterPpm, double published) {
    assertThat(CantleyWaterLife.factor(waterPpm)).hasValueCloseTo(published, within(0.0005));
  }

  @Test
  void waterOutsideTheTestsGivesNoFactor() {
    assertThat(CantleyWaterLife.factor(24.9)).isEmpty();
    assertThat(CantleyWaterLife.factor(400.1)).isEmpty();
    assertThatThrownBy(() -> CantleyWaterLife.factor(-1))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void labelsReadBack() {
    for (BearingType type : BearingType.values()) {
      assertThat(BearingType.parse(" " + type.label() + " ")).contains(type);
      assertThat(type.isBall()).isEqualTo(type.label().endsWith("ball"));
    }
    for (OilSupply supply : OilSupply.values()) {
      assertThat(OilSupply.parse(supply.label())).contains(supply);
    }
    assertThat(BearingType.parse("RADIAL-ROLLER")).contains(BearingType.RADIAL_ROLLER);
    assertThat(BearingType.parse("radial ball")).isEmpty();
    assertThat(OilSupply.parse("")).isEmpty();
  }
}
