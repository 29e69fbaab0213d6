package org.kappatrail.tribology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class AstmD341Test {
  /**
   * Published worked example, printed with T = °C + 273: 32 mm²/s at 40 °C and 5.4 at 100 °C give A
   * 9.5259, B 3.7449 and 8.5 mm²/s at 80 °C. The temperatures here are shifted by the 0.15 K.
   */
  @Test
  void reproducesThePublishedWorkedExample() {
    AstmD341 law = AstmD341.through(39.85, 32, 99.85, 5.4);
    assertThat(law.a()).isEqualTo(9.5259, within(0.00005));
    assertThat(law.b()).isEqualTo(3.7449, within(0.00005));
    assertThat(law.viscosityCst(79.85)).isEqualTo(8.5, within(0.05));
    assertThat(AstmD341.through(40, 32, 100, 5.4).viscosityCst(80)).isEqualTo(8.5, within(0.05));
  }

  /**
   * ASME, Viscosity and Density of over 40 Lubricating Fluids (1953), as given by Bates and Watts
   * 1988, A1.5: measured 93.90 mm²/s at 25 °C and 165.1 at 0 °C. From the two hotter points the law
   * gives 94.21 and 164.9. The measured values are printed to four digits.
   */
  @Test
  void foretellsAMeasuredOilBelowTheTwoPointsThatFixIt() {
    AstmD341 law = AstmD341.through(37.78, 73.60, 98.89, 29.30);
    assertThat(law.viscosityCst(25)).isCloseTo(93.90, withinPercentage(0.4));
    assertThat(law.viscosityCst(0)).isCloseTo(165.1, withinPercentage(0.4));
    assertThat(law.viscosityCst(25)).isEqualTo(94.21, within(0.01));
    assertThat(law.viscosityCst(0)).isEqualTo(164.9, within(0.05));
  }

  @Test
  void passesThroughBothPoints() {
    AstmD341 law = AstmD341.through(40, 220, 100, 19.2);
    assertThat(law.viscosityCst(40)).isCloseTo(220, withinPercentage(1e-9));
    assertThat(law.viscosityCst(100)).isCloseTo(19.2, withinPercentage(1e-9));
    AstmD341 sameSlope = AstmD341.withSlope(law.b(), 40, 220);
    assertThat(sameSlope.a()).isEqualTo(law.a(), within(1e-12));
  }

  /** ASTM D341 gives its inverse of the low branch as good to 0.03 %; 0.0292 % just at 2 mm²/s. */
  @ParameterizedTest
  @ValueSource(
      doubles = {
        0.21, 0.25, 0.3, 0.5, 0.8, 1, 1.2, 1.5, 1.8, 1.9, 1.99, 1.9999, 2, 2.0001, 2.0007, 2.001,
        2.1, 5, 1000, 100000
      })
  void viscosityComesBackFromItsTemperature(double viscosityCst) {
    AstmD341 law = AstmD341.through(40, 46, 100, 6.8);
    double temperatureC = law.temperatureC(viscosityCst);
    assertThat(law.viscosityCst(temperatureC)).isCloseTo(viscosityCst, withinPercentage(0.03));
  }

  @Test
  void roundTripsHoldForManyOils() {
    Random random = new Random(341);
    for (int i = 0; i < 2000; i++) {
      double v40 = Math.exp(Math.log(1.5) + random.nextDouble() * Math.log(1000));
      double v100 = Math.max(0.25, v40 * (0.05 + 0.3 * random.nextDouble()));
      AstmD341 law = AstmD341.through(40, v40, 100, v100);
      assertThat(law.viscosityCst(40)).isCloseTo(v40, withinPercentage(0.03));
      assertThat(law.viscosityCst(100)).isCloseTo(v100, withinPercentage(0.03));
      double v = Math.exp(Math.log(0.21) + random.nextDouble() * Math.log(1e6));
      assertThat(law.viscosityCst(law.temperatureC(v))).isCloseTo(v, withinPercentage(0.03));
    }
  }

  @Test
  void viscosityFallsWithTemperatureThroughTheLowBranch() {
    AstmD341 law = AstmD341.through(40, 4.6, 100, 1.6);
    double before = Double.POSITIVE_INFINITY;
    for (double temperatureC = -40; temperatureC <= 200; temperatureC += 0.01) {
      double viscosityCst = law.viscosityCst(temperatureC);
      assertThat(viscosityCst).isLessThan(before);
      before = viscosityCst;
    }
    assertThat(before).isBetween(0.21, 1.0);
  }

  @ParameterizedTest
  @CsvSource({"46, 6.8, 40", "46, 6.8, 70", "680, 37, 0", "4.6, 1.6, 120", "4.6, 1.6, 60"})
  void slopeAgreesWithADifferenceQuotient(double v40, double v100, double temperatureC) {
    AstmD341 law = AstmD341.through(40, v40, 100, v100);
    double step = 1e-3;
    double quotient =
        Math.log(law.viscosityCst(temperatureC + step) / law.viscosityCst(temperatureC - step))
            / (2 * step);
    assertThat(law.relativeSlopePerC(temperatureC)).isCloseTo(quotient, withinPercentage(1e-4));
  }

  @Test
  void thinnerThanTheLawReachesIsRefusedWithTheLimit() {
    AstmD341 law = AstmD341.through(40, 2.2, 100, 0.9);
    assertThatThrownBy(() -> law.viscosityCst(900))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("900")
        .hasMessageContaining("0.21 mm²/s");
    assertThatThrownBy(() -> AstmD341.through(40, 2.2, 100, 0.2))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("0.2 mm²/s")
        .hasMessageContaining("0.21");
    assertThatThrownBy(() -> law.temperatureC(0.2099)).isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void veryThickOilStaysFiniteInTheColdOrIsRefused() {
    AstmD341 law = AstmD341.through(40, 3200, 100, 120);
    assertThat(law.viscosityCst(-60)).isGreaterThan(1e8).isLessThan(Double.MAX_VALUE);
    assertThatThrownBy(() -> law.viscosityCst(-270))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("too large");
  }

  @ParameterizedTest
  @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, -273.15, -300})
  void impossibleTemperaturesAreRefused(double temperatureC) {
    AstmD341 law = AstmD341.through(40, 46, 100, 6.8);
    assertThatThrownBy(() -> law.viscosityCst(temperatureC))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("temperature");
  }

  @Test
  void oilThatThickensWithHeatIsRefused() {
    assertThatThrownBy(() -> AstmD341.through(40, 46, 100, 50))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("50.0 mm²/s at 100.0 °C");
    assertThatThrownBy(() -> AstmD341.through(40, 46, 40, 6.8))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new AstmD341(9.5, Double.NaN))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void extrapolationBeginsOutsideTenToAHundredAndThirtyDegrees() {
    assertThat(AstmD341.extrapolated(9.99)).isTrue();
    assertThat(AstmD341.extrapolated(10)).isFalse();
    assertThat(AstmD341.extrapolated(130)).isFalse();
    assertThat(AstmD341.extrapolated(130.01)).isTrue();
  }
}
