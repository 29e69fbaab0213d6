package org.kappatrail.review.correlation;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** κ = ν(ν40, ν100, T)/ν1 by ISO 281; counts are cumulative by ISO 4406. */
class ByConstructionTest {

  @ParameterizedTest
  @CsvSource({
    "kappa, viscosity_40c_cst, true",
    "kappa, viscosity_100c_cst, true",
    "kappa, temperature_c, true",
    "kappa, kappa_reference, true",
    "kappa_reference, viscosity_40c_cst, true",
    "kappa_reference, temperature_c, false",
    "viscosity_40c_cst, temperature_c, false",
    "viscosity_40c_cst, viscosity_index, true",
    "particles_4um_per_ml, particles_14um_per_ml, true",
    "particles_4um_per_ml, iron_ppm, false",
    "kappa, iron_ppm, false",
    "kappa, water_ppm, false",
    "kappa_reference, acid_number_mg_koh_g, false"
  })
  void pairsThatAreArithmeticAreTiedWhicheverComesFirst(String x, String y, boolean tied) {
    assertThat(ByConstruction.tied(x, y)).isEqualTo(tied);
    assertThat(ByConstruction.tied(y, x)).isEqualTo(tied);
  }
}
