package org.kappatrail.tribology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class KappaUncertaintyTest {
  private static final int RUNS = 40_000;

  /**
   * Monte Carlo propagation (JCGM 101:2008) through the whole chain, index held. The ends of the
   * interval are estimated to 0.013 σ and the probability to 0.0025; the tolerances are four times
   * that, rounded.
   */
  @ParameterizedTest
  @CsvSource({"46, 6.8, 62, 0.006, 1.5", "220, 19, 75, 0.03, 0.2", "150, 15, 45, 0.008, 1"})
  void agreesWithAMonteCarloRun(
      double v40, double v100, double temperatureC, double sigmaLnV40, double sigmaC) {
    OilViscosity oil = OilViscosity.measured(v40, v100);
    double ratedCst = 20;
    double kappa = ViscosityRatio.kappa(oil.viscosityCst(temperatureC), ratedCst);
    KappaUncertainty uncertainty =
        KappaUncertainty.of(
            kappa,
            sigmaLnV40,
            oil.sensitivityToV40(temperatureC),
            oil.sensitivityToTemperature(temperatureC),
            sigmaC);
    Random random = new Random(4);
    double[] drawn = new double[RUNS];
    for (int i = 0; i < RUNS; i++) {
      double trueV40 = v40 * Math.exp(sigmaLnV40 * random.nextGaussian());
      double trueC = temperatureC + sigmaC * random.nextGaussian();
      drawn[i] = OilViscosity.withIndexOf(trueV40, oil).viscosityCst(trueC) / ratedCst;
    }
    Arrays.sort(drawn);
    double tolerance = 0.05 * uncertainty.sigmaLn();
    assertThat(Math.log(uncertainty.low()))
        .isEqualTo(Math.log(drawn[RUNS / 40]), within(tolerance));
    assertThat(Math.log(uncertainty.high()))
        .isEqualTo(Math.log(drawn[RUNS - RUNS / 40]), within(tolerance));
    double floor = kappa * Math.exp(-0.8 * uncertainty.sigmaLn());
    double share = Arrays.stream(drawn).filter(value -> value < floor).count() / (double) RUNS;
    assertThat(uncertainty.probabilityBelow(floor)).isEqualTo(share, within(0.01));
  }

  /** Standard normal distribution, any table: Φ(−1.96) = 0.0250, Φ(1) = 0.8413. */
  @Test
  void probabilityIsTheNormalOne() {
    KappaUncertainty uncertainty = new KappaUncertainty(2, 0.1);
    assertThat(uncertainty.probabilityBelow(2)).isEqualTo(0.5, within(1e-12));
    assertThat(uncertainty.probabilityBelow(uncertainty.low())).isEqualTo(0.0250, within(0.00005));
    assertThat(uncertainty.probabilityBelow(2 * Math.exp(0.1))).isEqualTo(0.8413, within(0.00005));
    assertThat(uncertainty.low() * uncertainty.high()).isEqualTo(4, within(1e-12));
  }

  @Test
  void partsAddAsSquares() {
    assertThat(KappaUncertainty.of(1, 0.03, 1, -0.04, 1).sigmaLn()).isEqualTo(0.05, within(1e-12));
    assertThat(KappaUncertainty.of(1, 0.03, 2, -0.04, 2).sigmaLn()).isEqualTo(0.10, within(1e-12));
  }

  @Test
  void certainRatioIsOnOneSideOfTheFloor() {
    KappaUncertainty certain = KappaUncertainty.of(1, 0, 1, -0.04, 0);
    assertThat(certain.low()).isEqualTo(1);
    assertThat(certain.high()).isEqualTo(1);
    assertThat(certain.probabilityBelow(1.001)).isEqualTo(1);
    assertThat(certain.probabilityBelow(1)).isZero();
  }

  @Test
  void impossibleInputsAreRefused() {
    assertThatThrownBy(() -> new KappaUncertainty(0, 0.1))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new KappaUncertainty(1, Double.NaN))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> KappaUncertainty.of(1, -0.1, 1, -0.04, 1))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> KappaUncertainty.of(1, 0.1, Double.NaN, -0.04, 1))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new KappaUncertainty(1, 0.1).probabilityBelow(0))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
