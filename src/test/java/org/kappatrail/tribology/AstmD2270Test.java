package org.kappatrail.tribology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class AstmD2270Test {
  /** ASTM D2270, worked examples, printed as whole numbers; the third from memory. */
  @ParameterizedTest
  @CsvSource({"73.30, 8.86, 92", "22.83, 5.05, 156", "53.47, 7.80, 111"})
  void reproducesThePublishedExamples(double v40, double v100, long published) {
    assertThat(Math.round(AstmD2270.viscosityIndex(v40, v100))).isEqualTo(published);
  }

  /** ASTM D2270, Table X2.1: its quadratics against Table 1; they part by at most 0.12 %. */
  @Test
  void tableAgreesWithTheStandardsOwnQuadratics() {
    int checked = 0;
    for (List<String> row : PublishedTable.rows("/published/astm-d2270-table-x2-1.csv")) {
      double from = PublishedTable.number(row, 0);
      double to = row.get(1).equals("inf") ? 500 : PublishedTable.number(row, 1);
      for (double y = from; y < to; y += 0.05) {
        double low = quadratic(row, 2, y);
        double high = quadratic(row, 5, y);
        assertThat(AstmD2270.lowReferenceCst(y)).isCloseTo(low, withinPercentage(0.12));
        assertThat(AstmD2270.highReferenceCst(y)).isCloseTo(high, withinPercentage(0.12));
        checked++;
      }
    }
    assertThat(checked).isGreaterThan(9000);
  }

  /** ASTM D2270, Table 1: first, two inner and last rows. */
  @ParameterizedTest
  @CsvSource({"2, 7.994, 6.394", "2.5, 11.45, 9.063", "69, 4773, 1523", "70, 4905, 1558"})
  void referenceOilsOfTheTableHaveIndicesZeroAndAHundred(double v100, double low, double high) {
    assertThat(AstmD2270.viscosityIndex(low, v100)).isEqualTo(0, within(1e-9));
    assertThat(AstmD2270.viscosityIndex(high, v100)).isEqualTo(100, within(1e-9));
  }

  @Test
  void bothProceduresMeetAtAHundred() {
    for (double v100 = 2; v100 < 100; v100 += 0.37) {
      double high = AstmD2270.highReferenceCst(v100);
      double above = AstmD2270.viscosityIndex(high * (1 - 1e-9), v100);
      double below = AstmD2270.viscosityIndex(high * (1 + 1e-9), v100);
      assertThat(above).isBetween(100.0, 100.0001);
      assertThat(below).isBetween(99.9999, 100.0);
    }
  }

  @Test
  void indexComesBackFromTheViscosityThatItGives() {
    for (double v40 = 10; v40 <= 2000; v40 *= 1.05) {
      double before = 0;
      for (double index = 40; index <= 250; index += 0.5) {
        double v100 = AstmD2270.viscosity100Cst(v40, index).orElseThrow();
        assertThat(AstmD2270.viscosityIndex(v40, v100)).isEqualTo(index, within(0.01));
        assertThat(v100).isGreaterThan(before);
        before = v100;
      }
    }
  }

  @Test
  void indexRisesWithTheViscosityAtAHundredDegrees() {
    for (double v40 = 5; v40 < 800; v40 *= 1.3) {
      double before = Double.NEGATIVE_INFINITY;
      for (double v100 = 2; v100 < Math.min(70, v40 / 2); v100 += 0.01) {
        double index = AstmD2270.viscosityIndex(v40, v100);
        assertThat(index).isGreaterThan(before);
        before = index;
      }
    }
  }

  /** At 70 mm²/s the table's last row lies 0.03 % beside the equations that go on from it. */
  @Test
  void indexStepsByLessThanATenthWhereTheEquationsTakeOver() {
    double table = AstmD2270.viscosityIndex(1400, 70);
    double equations = AstmD2270.viscosityIndex(1400, Math.nextUp(70.0));
    assertThat(equations).isEqualTo(table, within(0.1)).isNotEqualTo(table);
  }

  @Test
  void noViscosityIsGivenWhereNoneFromTwoUpHasTheIndex() {
    assertThat(AstmD2270.viscosity100Cst(6, 110)).isEmpty();
    assertThat(AstmD2270.viscosity100Cst(1.9, 100)).isEmpty();
    assertThat(AstmD2270.viscosity100Cst(46, 1e6)).isEmpty();
    assertThat(AstmD2270.viscosity100Cst(6.394, 100)).hasValueCloseTo(2.0, within(1e-9));
  }

  @ParameterizedTest
  @CsvSource({"46, 1.99", "46, NaN", "NaN, 6.8", "6, 6", "6, 7"})
  void impossibleViscositiesAreRefused(double v40, double v100) {
    assertThatThrownBy(() -> AstmD2270.viscosityIndex(v40, v100))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("viscosity at");
  }

  @ParameterizedTest
  @ValueSource(doubles = {0, -3, Double.NaN})
  void impossibleViscositiesHaveNoWayBack(double v40) {
    assertThatThrownBy(() -> AstmD2270.viscosity100Cst(v40, 100))
        .isInstanceOf(IllegalArgumentException.class);
  }

  private static double quadratic(List<String> row, int first, double y) {
    return PublishedTable.number(row, first) * y * y
        + PublishedTable.number(row, first + 1) * y
        + PublishedTable.number(row, first + 2);
  }
}
