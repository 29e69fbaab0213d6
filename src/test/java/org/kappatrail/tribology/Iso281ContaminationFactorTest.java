package org.kappatrail.tribology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class Iso281ContaminationFactorTest {
  /**
   * Equations of ISO 281:2007, Annex A, coefficients from memory; each value worked by hand at Dpw
   * 125 mm, whose cube root is 5, and κ 1: 125^0.55 = 14.2328.
   */
  @ParameterizedTest
  @CsvSource({
    "inline-filter, 13/10, 0.88674",
    "inline-filter, 15/12, 0.49205",
    "inline-filter, 17/14, 0.27604",
    "inline-filter, 19/16, 0.16379",
    "bath, 13/10, 0.86408",
    "bath, 15/12, 0.31636",
    "bath, 17/14, 0.12607",
    "bath, 19/16, 0.061083",
    "bath, 21/18, 0.012899"
  })
  void eachClassFollowsItsEquation(String supply, String code, double worked) {
    ContaminationFactor factor = factor(code, OilSupply.parse(supply).orElseThrow(), 1, 125);
    assertThat(factor.value()).isEqualTo(worked, within(0.0001));
    assertThat(factor.upperBound()).isFalse();
    assertThat(factor.basis()).contains(code);
  }

  @Test
  void classMustCoverBothNumbers() {
    ContaminationFactor class15 = factor("15/12", OilSupply.BATH, 1, 125);
    assertThat(factor("14/10", OilSupply.BATH, 1, 125)).isEqualTo(class15);
    assertThat(factor("13/11", OilSupply.BATH, 1, 125)).isEqualTo(class15);
    assertThat(factor("20/13/11", OilSupply.BATH, 1, 125)).isEqualTo(class15);
  }

  @Test
  void oilDirtierThanEveryClassGetsTheLastOneAsAnUpperBound() {
    ContaminationFactor last = factor("19/16", OilSupply.INLINE_FILTER, 1, 125);
    ContaminationFactor beyond = factor("20/16", OilSupply.INLINE_FILTER, 1, 125);
    assertThat(beyond.value()).isEqualTo(last.value());
    assertThat(beyond.upperBound()).isTrue();
    assertThat(beyond.basis()).contains("dirtier than -/19/16");
  }

  @Test
  void lowerBoundCountsAsTheNextDirtierNumber() {
    assertThat(factor("≥16/12", OilSupply.BATH, 1, 125))
        .isEqualTo(factor("17/12", OilSupply.BATH, 1, 125));
    assertThat(factor(">15/12", OilSupply.BATH, 1, 125).value())
        .isLessThan(factor("15/12", OilSupply.BATH, 1, 125).value());
  }

  @ParameterizedTest
  @ValueSource(strings = {"18/*/13", "18/16/-", "*/*/*"})
  void codeWithoutTheTwoNumbersGivesNoFactor(String code) {
    assertThat(
            Iso281ContaminationFactor.factor(CleanlinessCode.parse(code), OilSupply.BATH, 1, 125))
        .isEmpty();
  }

  @ParameterizedTest
  @EnumSource(OilSupply.class)
  void thickerFilmCleanerOilAndLargerBearingNeverLowerTheFactor(OilSupply supply) {
    Random random = new Random(281);
    for (int i = 0; i < 3000; i++) {
      int number = 6 + random.nextInt(17);
      CleanlinessCode code = CleanlinessCode.parse("-/" + number + "/" + (number - 4));
      double kappa = 0.1 * Math.pow(40, random.nextDouble());
      double pitchMm = 10 * Math.pow(100, random.nextDouble());
      double value = value(code, supply, kappa, pitchMm);
      assertThat(value).isBetween(0.0, 1.0);
      assertThat(value(code, supply, kappa * 1.1, pitchMm)).isGreaterThanOrEqualTo(value);
      assertThat(value(code, supply, kappa, pitchMm * 1.1)).isGreaterThanOrEqualTo(value);
      assertThat(value(code.cleanerBy(2), supply, kappa, pitchMm)).isGreaterThanOrEqualTo(value);
    }
  }

  @Test
  void ratioIsHeldAtTheEndsOfItsRange() {
    CleanlinessCode code = CleanlinessCode.parse("-/17/14");
    assertThat(value(code, OilSupply.BATH, 40, 60)).isEqualTo(value(code, OilSupply.BATH, 4, 60));
    assertThat(value(code, OilSupply.BATH, 0.01, 60))
        .isEqualTo(value(code, OilSupply.BATH, 0.1, 60));
    assertThat(value(code, OilSupply.BATH, 3.9, 60)).isLessThan(value(code, OilSupply.BATH, 4, 60));
  }

  @Test
  void smallBearingInDirtyOilGetsNothing() {
    assertThat(factor("21/18", OilSupply.BATH, 1, 20).value()).isZero();
  }

  @ParameterizedTest
  @CsvSource({"0, 60", "NaN, 60", "1, 0", "1, NaN"})
  void impossibleInputsAreRefused(double kappa, double pitchMm) {
    CleanlinessCode code = CleanlinessCode.parse("18/16/13");
    assertThatThrownBy(() -> Iso281ContaminationFactor.factor(code, OilSupply.BATH, kappa, pitchMm))
        .isInstanceOf(IllegalArgumentException.class);
  }

  private static double value(
      CleanlinessCode code, OilSupply supply, double kappa, double pitchMm) {
    return Iso281ContaminationFactor.factor(code, supply, kappa, pitchMm).orElseThrow().value();
  }

  private static ContaminationFactor factor(
      String code, OilSupply supply, double kappa, double pitchMm) {
    return Iso281ContaminationFactor.factor(CleanlinessCode.parse(code), supply, kappa, pitchMm)
        .orElseThrow();
  }
}
