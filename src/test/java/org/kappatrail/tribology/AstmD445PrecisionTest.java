package org.kappatrail.tribology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;

class AstmD445PrecisionTest {
  /** ASTM D445, precision clause, reproducibility of in-service formulated oils at 40 °C. */
  @Test
  void reproducibilityFollowsTheStandardsTable() {
    List<String> row =
        PublishedTable.rows("/published/astm-d445-precision.csv").stream()
            .filter(candidate -> candidate.get(0).equals("reproducibility"))
            .filter(candidate -> candidate.get(1).equals("used_in_service_formulated"))
            .filter(candidate -> candidate.get(2).equals("40"))
            .findFirst()
            .orElseThrow();
    for (double v40 = 25; v40 <= 150; v40 += 2.5) {
      double limitCst =
          PublishedTable.number(row, 3) * Math.pow(v40, PublishedTable.number(row, 4));
      assertThat(AstmD445Precision.reproducibilityPercent(v40) * v40 / 100)
          .isEqualTo(limitCst, within(1e-9));
    }
  }

  @Test
  void relativeValueIsHeldOutsideTheRange() {
    assertThat(AstmD445Precision.reproducibilityPercent(5))
        .isEqualTo(AstmD445Precision.reproducibilityPercent(25));
    assertThat(AstmD445Precision.reproducibilityPercent(680))
        .isEqualTo(AstmD445Precision.reproducibilityPercent(150));
    assertThat(AstmD445Precision.reproducibilityPercent(26))
        .isGreaterThan(AstmD445Precision.reproducibilityPercent(25));
    assertThatThrownBy(() -> AstmD445Precision.reproducibilityPercent(0))
        .isInstanceOf(IllegalArgumentException.class);
  }

  /** ASTM E177: a 95 % limit on the difference of two results is 1.96 √2 = 2.77 σ. */
  @Test
  void sigmaIsTheLimitOverTwoPointSevenSeven() {
    assertThat(AstmD445Precision.sigmaLn(0.0122))
        .isEqualTo(0.0122 / (1.96 * Math.sqrt(2)), within(0.00001));
    assertThatThrownBy(() -> AstmD445Precision.sigmaLn(Double.NaN))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
