package org.kappatrail.tribology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class ViscosityRatioTest {
  /** ISO 281:2007, 9.3.3.3; values recomputed from the equations, to the digits printed. */
  @ParameterizedTest
  @CsvSource({
    "1500, 60, 15.0000, 0.00005",
    "1480, 85, 12.6874, 0.00005",
    "500, 100, 25.8861, 0.00005",
    "15, 500, 212.604, 0.0005"
  })
  void ratedViscosityFollowsTheStandard(
      double speedRpm, double pitchMm, double ratedCst, double halfDigit) {
    assertThat(Iso281RatedViscosity.ratedViscosityCst(speedRpm, pitchMm))
        .isEqualTo(ratedCst, within(halfDigit));
  }

  /** The two branches of ISO 281 as published: 2.33 % of the upper one apart at 1000 r/min. */
  @Test
  void branchesPartAtAThousandRevolutions() {
    double slow = Iso281RatedViscosity.ratedViscosityCst(Math.nextDown(1000.0), 60);
    double fast = Iso281RatedViscosity.ratedViscosityCst(1000, 60);
    assertThat(slow / fast).isEqualTo(1.0233, within(0.00005));
  }

  @Test
  void ratedViscosityFallsWithSpeedAndSize() {
    double before = Double.POSITIVE_INFINITY;
    for (double speedRpm = 1; speedRpm < 30000; speedRpm *= 1.01) {
      double rated = Iso281RatedViscosity.ratedViscosityCst(speedRpm, 60);
      assertThat(rated).isLessThan(before);
      assertThat(Iso281RatedViscosity.ratedViscosityCst(speedRpm, 61)).isLessThan(rated);
      before = rated;
    }
  }

  @ParameterizedTest
  @CsvSource({"0, 60", "-1, 60", "NaN, 60", "1500, 0", "1500, -5", "1500, NaN"})
  void impossibleOperatingPointsAreRefused(double speedRpm, double pitchMm) {
    assertThatThrownBy(() -> Iso281RatedViscosity.ratedViscosityCst(speedRpm, pitchMm))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("must be");
  }

  @Test
  void pitchStandsMidwayBetweenBoreAndOutside() {
    assertThat(Iso281RatedViscosity.pitchMm(60, 110)).isEqualTo(85);
    assertThatThrownBy(() -> Iso281RatedViscosity.pitchMm(110, 60))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("110.0 mm");
    assertThatThrownBy(() -> Iso281RatedViscosity.pitchMm(0, 60))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void ratioIsNotClipped() {
    assertThat(ViscosityRatio.kappa(75, 15)).isEqualTo(5);
    assertThat(ViscosityRatio.kappa(0.75, 15)).isEqualTo(0.05);
    assertThatThrownBy(() -> ViscosityRatio.kappa(Double.NaN, 15))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> ViscosityRatio.kappa(15, 0))
        .isInstanceOf(IllegalArgumentException.class);
  }

  /** Limits of the regimes: common practice, no source. */
  @ParameterizedTest
  @CsvSource({
    "0, boundary",
    "0.0999, boundary",
    "0.1, mixed",
    "0.9999, mixed",
    "1, full film",
    "9, full film"
  })
  void regimeFollowsTheRatio(double kappa, String label) {
    assertThat(LubricationRegime.of(kappa).label()).isEqualTo(label);
  }

  @ParameterizedTest
  @ValueSource(doubles = {-0.1, Double.NaN})
  void regimeOfAnImpossibleRatioIsRefused(double kappa) {
    assertThatThrownBy(() -> LubricationRegime.of(kappa))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
