package org.kappatrail.tribology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.kappatrail.tribology.OilViscosity.Source;

class OilViscosityTest {
  private static final OilViscosity VG_46 = OilViscosity.measured(46, 6.8);

  @Test
  void measuredOilPassesThroughItsTwoViscosities() {
    assertThat(VG_46.source()).isEqualTo(Source.MEASURED);
    assertThat(VG_46.viscosityCst(40)).isCloseTo(46, withinPercentage(1e-9));
    assertThat(VG_46.viscosityCst(100)).isCloseTo(6.8, withinPercentage(1e-9));
  }

  @Test
  void sampleWithoutAHotViscosityKeepsTheIndexOfItsOil() {
    OilViscosity sample = OilViscosity.withIndexOf(38, VG_46);
    assertThat(sample.source()).isEqualTo(Source.INDEX);
    assertThat(sample.viscosityIndex())
        .hasValueCloseTo(VG_46.viscosityIndex().orElseThrow(), within(0.01));
    assertThat(sample.viscosityCst(40)).isCloseTo(38, withinPercentage(1e-9));
  }

  @Test
  void sampleKeepsTheSlopeWhereNoHotViscosityHasTheIndex() {
    OilViscosity thin = OilViscosity.measured(4.6, 1.6);
    OilViscosity sample = OilViscosity.withIndexOf(4.2, thin);
    assertThat(thin.viscosityIndex()).isEmpty();
    assertThat(sample.source()).isEqualTo(Source.SLOPE);
    assertThat(sample.law().b()).isEqualTo(thin.law().b());
    OilViscosity diluted = OilViscosity.withIndexOf(5, VG_46);
    assertThat(diluted.source()).isEqualTo(Source.SLOPE);
    assertThat(diluted.viscosity100Cst()).isLessThan(2);
    assertThat(diluted.viscosityCst(100)).isEqualTo(diluted.viscosity100Cst());
  }

  @Test
  void registerTakesTheHotViscosityOrElseTheIndex() {
    OptionalDouble none = OptionalDouble.empty();
    assertThat(OilViscosity.register(46, OptionalDouble.of(6.8), OptionalDouble.of(150)))
        .isEqualTo(VG_46);
    OilViscosity byIndex =
        OilViscosity.register(
            73.30, none, OptionalDouble.of(AstmD2270.viscosityIndex(73.30, 8.86)));
    assertThat(byIndex.viscosity100Cst()).isEqualTo(8.86, within(1e-8));
    assertThat(byIndex.source()).isEqualTo(Source.INDEX);
    assertThatThrownBy(() -> OilViscosity.register(46, none, none))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("give its viscosity at 100 °C or its viscosity index");
    assertThatThrownBy(() -> OilViscosity.register(4.6, none, OptionalDouble.of(100)))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("viscosity index 100.0");
  }

  @Test
  void sensitivityIsOneAtFortyDegreesAndFallsAsTheOilWarms() {
    double before = Double.POSITIVE_INFINITY;
    for (double temperatureC = 0; temperatureC <= 120; temperatureC += 5) {
      double sensitivity = VG_46.sensitivityToV40(temperatureC);
      assertThat(sensitivity).isLessThan(before).isPositive();
      before = sensitivity;
    }
    assertThat(VG_46.sensitivityToV40(40)).isEqualTo(1, within(1e-9));
  }

  @ParameterizedTest
  @CsvSource({"220, 19, 70", "46, 6.8, 60", "15, 3.4, 85"})
  void sensitivityForetellsTheEffectOfAShiftAtHeldIndex(
      double v40, double v100, double temperatureC) {
    OilViscosity oil = OilViscosity.measured(v40, v100);
    OilViscosity shifted = OilViscosity.withIndexOf(v40 * 1.02, oil);
    double effect = Math.log(shifted.viscosityCst(temperatureC) / oil.viscosityCst(temperatureC));
    assertThat(oil.sensitivityToV40(temperatureC) * Math.log(1.02))
        .isCloseTo(effect, withinPercentage(1));
  }

  @Test
  void sensitivityHoldsTheSlopeWhereTheIndexIsUndefined() {
    OilViscosity thin = OilViscosity.measured(4.6, 1.6);
    AstmD341 thicker = AstmD341.withSlope(thin.law().b(), 40, 4.6 * 1.001);
    double effect = Math.log(thicker.viscosityCst(70) / thin.viscosityCst(70)) / Math.log(1.001);
    assertThat(thin.sensitivityToV40(70)).isCloseTo(effect, withinPercentage(0.1));
  }

  /**
   * Where one side of the difference has the index and the other has none, a jump must not show.
   */
  @Test
  void sensitivityStaysSmoothAcrossTheLowestViscosityThatHasAnIndex() {
    double below = OilViscosity.measured(7, 1.9999).sensitivityToV40(60);
    double edge = OilViscosity.measured(7, 2.0001).sensitivityToV40(60);
    assertThat(edge).isCloseTo(below, withinPercentage(0.1));
  }

  @Test
  void sensitivityToTemperatureForetellsTheEffectOfADegree() {
    double effect = Math.log(VG_46.viscosityCst(60.5) / VG_46.viscosityCst(59.5));
    assertThat(VG_46.sensitivityToTemperature(60)).isCloseTo(effect, withinPercentage(0.01));
  }

  @Test
  void oilBetweenTwoIsLinearInBothViscosities() {
    OilViscosity other = OilViscosity.withIndexOf(56, VG_46);
    OilViscosity between = OilViscosity.interpolate(VG_46, other, 0.25);
    assertThat(between.viscosity40Cst()).isEqualTo(48.5, within(1e-12));
    assertThat(between.viscosity100Cst())
        .isEqualTo(0.75 * 6.8 + 0.25 * other.viscosity100Cst(), within(1e-12));
    assertThat(between.source()).isEqualTo(Source.INDEX);
    assertThat(OilViscosity.interpolate(VG_46, other, 0)).isEqualTo(VG_46);
    assertThat(OilViscosity.interpolate(VG_46, other, 1)).isEqualTo(other);
    assertThatThrownBy(() -> OilViscosity.interpolate(VG_46, other, 1.5))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @ParameterizedTest
  @CsvSource({"46, 46", "46, 50", "46, 0.1", "46, NaN", "NaN, 6.8", "-46, 6.8"})
  void impossibleOilsAreRefused(double v40, double v100) {
    assertThatThrownBy(() -> OilViscosity.measured(v40, v100))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new OilViscosity(v40, v100, Source.MEASURED, VG_46.law()))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
