package org.kappatrail.tribology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import org.junit.jupiter.api.Test;

class FilmThicknessTest {
  /** Dowson 1968, recomputed: U 4.3962e-11, G 4549.4, W 4.3962e-5, R 0.01 m give 0.5189 µm. */
  @Test
  void lineContactFollowsDowson() {
    double film = FilmThickness.lineContactMinimum(4.3962e-11, 4549.4, 4.3962e-5);
    assertThat(FilmThickness.micrometres(film, 0.01)).isEqualTo(0.5189, within(0.00005));
  }

  /**
   * Hamrock and Dowson 1977, exponents of the published equation: tenfold speed, material and load
   * change the film by 10^0.68, 10^0.49 and 10^−0.073; a long ellipse nears 3.63 U^0.68 G^0.49
   * W^−0.073, a circle has 1 − e^−0.68 = 0.49338 of it.
   */
  @Test
  void pointContactFollowsHamrockAndDowson() {
    double film = FilmThickness.pointContactMinimum(1e-11, 5000, 1e-6, 1);
    assertThat(FilmThickness.pointContactMinimum(1e-10, 5000, 1e-6, 1) / film)
        .isEqualTo(4.7863, within(0.00005));
    assertThat(FilmThickness.pointContactMinimum(1e-11, 50000, 1e-6, 1) / film)
        .isEqualTo(3.0903, within(0.00005));
    assertThat(FilmThickness.pointContactMinimum(1e-11, 5000, 1e-5, 1) / film)
        .isEqualTo(0.84528, within(0.000005));
    assertThat(film / FilmThickness.pointContactMinimum(1e-11, 5000, 1e-6, 100))
        .isEqualTo(0.49338, within(0.000005));
    assertThat(FilmThickness.pointContactMinimum(1, 1, 1, 100))
        .isCloseTo(3.63, withinPercentage(1e-9));
  }

  @Test
  void impossibleContactsAreRefused() {
    assertThatThrownBy(() -> FilmThickness.lineContactMinimum(0, 1, 1))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("speed parameter");
    assertThatThrownBy(() -> FilmThickness.pointContactMinimum(1, 1, 1, Double.NaN))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> FilmThickness.micrometres(1, -1))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
