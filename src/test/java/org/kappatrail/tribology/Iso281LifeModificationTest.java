package org.kappatrail.tribology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class Iso281LifeModificationTest {
  /**
   * Equations of ISO 281:2007, 9.3.3.3, worked by hand to three digits. At κ 1 and a load term of
   * 0.1 the ball family gives 0.1 (1 − 0.5684^0.83 · 0.1^(1/3))^−9.3.
   */
  @ParameterizedTest
  @CsvSource({
    "RADIAL_BALL, 1, 0.1, 2.43",
    "THRUST_BALL, 1, 0.3, 2.43",
    "RADIAL_ROLLER, 1, 0.1, 0.399",
    "THRUST_ROLLER, 1, 0.25, 0.399"
  })
  void eachFamilyFollowsItsEquation(
      BearingType type, double kappa, double loadRatio, double worked) {
    assertThat(plain(type, kappa, 0.5, 2 * loadRatio)).isCloseTo(worked, withinPercentage(0.2));
  }

  /**
   * The published coefficients leave a step at κ 0.4. While e_C Cu does not exceed the (divided)
   * load, it stays within 0.1 %; at κ 1 there is none.
   */
  @ParameterizedTest
  @EnumSource(BearingType.class)
  void branchesMeetAtTheirLimits(BearingType type) {
    for (double loadRatio = 1e-4; loadRatio <= 1; loadRatio += 0.001) {
      assertThat(plain(type, Math.nextDown(0.4), 1, loadRatio))
          .isCloseTo(plain(type, 0.4, 1, loadRatio), withinPercentage(0.1));
      assertThat(plain(type, Math.nextDown(1.0), 1, loadRatio))
          .isCloseTo(plain(type, 1, 1, loadRatio), withinPercentage(1e-9));
    }
  }

  @ParameterizedTest
  @EnumSource(BearingType.class)
  void thickerFilmCleanerOilAndLighterLoadNeverLowerTheFactor(BearingType type) {
    Random random = new Random(2007);
    for (int i = 0; i < 5000; i++) {
      double kappa = 0.1 * Math.pow(40, random.nextDouble());
      double clean = 0.02 + 0.9 * random.nextDouble();
      double loadRatio = 0.01 * Math.pow(100, random.nextDouble());
      double factor = plain(type, kappa, clean, loadRatio);
      assertThat(factor).isBetween(0.1, 50.0);
      assertThat(plain(type, kappa, clean * 1.05, loadRatio)).isGreaterThanOrEqualTo(factor);
      assertThat(plain(type, kappa, clean, loadRatio * 1.05)).isGreaterThanOrEqualTo(factor);
      assertThat(plain(type, kappa * 1.05, clean, loadRatio)).isGreaterThanOrEqualTo(factor);
    }
  }

  @ParameterizedTest
  @EnumSource(BearingType.class)
  void thinnestFilmAllowedGivesATenthWhateverTheLoad(BearingType type) {
    assertThat(plain(type, 0.1, 1, 0.01)).isEqualTo(0.1, within(0.0002));
    assertThat(plain(type, 0.1, 1, 1)).isBetween(0.1, 0.1005);
  }

  @Test
  void ratioBelowATenthGivesNoFactor() {
    assertThat(
            Iso281LifeModification.factor(BearingType.RADIAL_BALL, Math.nextDown(0.1), 0.5, 1, 10))
        .isEmpty();
    assertThat(
            Iso281LifeModification.factorWithEffectiveEp(
                BearingType.RADIAL_BALL, Math.nextDown(0.1), 0.5, 1, 10))
        .isEmpty();
  }

  @ParameterizedTest
  @EnumSource(BearingType.class)
  void ratioAboveFourCountsAsFour(BearingType type) {
    assertThat(plain(type, 40, 0.3, 0.1)).isEqualTo(plain(type, 4, 0.3, 0.1));
    assertThat(plain(type, 3.9, 0.3, 0.1)).isLessThan(plain(type, 4, 0.3, 0.1));
  }

  @ParameterizedTest
  @EnumSource(BearingType.class)
  void factorNeverExceedsFifty(BearingType type) {
    assertThat(plain(type, 4, 1, 5)).isEqualTo(50);
    assertThat(plain(type, 4, 1, 1e6)).isEqualTo(50);
  }

  @ParameterizedTest
  @EnumSource(BearingType.class)
  void oilWithoutAnyCleanlinessGivesATenth(BearingType type) {
    assertThat(plain(type, 2, 0, 1)).isEqualTo(0.1, within(1e-15));
  }

  /** ISO 281:2007, rule for effective EP additives: κ 1 may be used, at most 3; from memory. */
  @Test
  void effectiveEpAdditiveLetsTheRatioCountAsOne() {
    BearingType type = BearingType.RADIAL_BALL;
    assertThat(withEp(type, 0.5, 0.5, 0.16)).isEqualTo(plain(type, 1, 0.5, 0.16));
    assertThat(withEp(type, 0.5, 0.5, 0.16)).isGreaterThan(plain(type, 0.5, 0.5, 0.16));
    assertThat(withEp(type, 0.5, 0.5, 1)).isEqualTo(3);
    assertThat(plain(type, 1, 0.5, 1)).isGreaterThan(3);
  }

  @Test
  void epAdditiveChangesNothingOutsideItsRule() {
    BearingType type = BearingType.RADIAL_BALL;
    assertThat(withEp(type, 0.5, 0.1999, 0.5)).isEqualTo(plain(type, 0.5, 0.1999, 0.5));
    assertThat(withEp(type, 0.5, 0.2, 0.5)).isGreaterThan(plain(type, 0.5, 0.2, 0.5));
    assertThat(withEp(type, 1, 0.5, 1)).isEqualTo(plain(type, 1, 0.5, 1)).isGreaterThan(3);
    assertThat(plain(type, 0.9, 0.5, 1)).isGreaterThan(3);
    assertThat(withEp(type, 0.9, 0.5, 1)).isEqualTo(plain(type, 0.9, 0.5, 1));
  }

  @ParameterizedTest
  @CsvSource({
    "0, 0.5, 1, 10",
    "NaN, 0.5, 1, 10",
    "1, -0.1, 1, 10",
    "1, 1.1, 1, 10",
    "1, NaN, 1, 10",
    "1, 0.5, 0, 10",
    "1, 0.5, 1, 0",
    "1, 0.5, 1, NaN"
  })
  void impossibleInputsAreRefused(double kappa, double clean, double limitKn, double loadKn) {
    assertThatThrownBy(
            () ->
                Iso281LifeModification.factor(
                    BearingType.THRUST_ROLLER, kappa, clean, limitKn, loadKn))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("must");
  }

  /** ISO 281:2007, Annex B, simplified estimate. */
  @Test
  void fatigueLimitFollowsTheStaticRating() {
    assertThat(Iso281FatigueLimit.fatigueLoadLimitKn(BearingType.RADIAL_BALL, 44, 100))
        .isEqualTo(2);
    assertThat(Iso281FatigueLimit.fatigueLoadLimitKn(BearingType.THRUST_BALL, 44, 400))
        .isEqualTo(1);
    assertThat(Iso281FatigueLimit.fatigueLoadLimitKn(BearingType.RADIAL_ROLLER, 82, 60))
        .isEqualTo(10, within(1e-12));
    assertThat(Iso281FatigueLimit.fatigueLoadLimitKn(BearingType.THRUST_ROLLER, 82, 400))
        .isEqualTo(5, within(1e-12));
    assertThatThrownBy(() -> Iso281FatigueLimit.fatigueLoadLimitKn(BearingType.RADIAL_BALL, 0, 60))
        .isInstanceOf(IllegalArgumentException.class);
  }

  private static double plain(BearingType type, double kappa, double clean, double loadRatio) {
    return Iso281LifeModification.factor(type, kappa, clean, loadRatio * 10, 10).orElseThrow();
  }

  private static double withEp(BearingType type, double kappa, double clean, double loadRatio) {
    return Iso281LifeModification.factorWithEffectiveEp(type, kappa, clean, loadRatio * 10, 10)
        .orElseThrow();
  }
}
