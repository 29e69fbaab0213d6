package org.kappatrail.tribology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class Iso281ReliabilityTest {
  /**
   * ISO 281:2007, Table 12, with the formula of ISO/TR 1281-2 to four digits; the rows marked so
   * are from memory. The tolerance is half of the last digit printed.
   */
  @Test
  void weibullFormReproducesTheTableOfReliabilityFactors() {
    List<List<String>> rows = PublishedTable.rows("/published/iso-281-a1.csv");
    assertThat(rows).hasSize(14);
    for (List<String> row : rows) {
      double a1 = Iso281Reliability.lifeAdjustment(PublishedTable.number(row, 0));
      int decimals = row.get(1).length() - row.get(1).indexOf('.') - 1;
      double halfDigit = row.get(1).contains(".") ? 0.5 * Math.pow(10, -decimals) : 1e-12;
      assertThat(a1).isEqualTo(PublishedTable.number(row, 1), within(halfDigit));
      assertThat(a1).isEqualTo(PublishedTable.number(row, 2), within(0.00005));
    }
  }

  @Test
  void survivalAtTheAdjustedLifeIsTheReliability() {
    for (double reliability = 90; reliability < 99.99; reliability += 0.1) {
      double a1 = Iso281Reliability.lifeAdjustment(reliability);
      assertThat(100 * Iso281Reliability.survival(a1 * 40000, 40000))
          .isEqualTo(reliability, within(1e-9));
    }
  }

  @Test
  void tenInAHundredFailByTheRatingLifeAndNoneInItsFirstTwentieth() {
    assertThat(Iso281Reliability.failureProbability(40000, 40000)).isEqualTo(0.1, within(1e-12));
    assertThat(Iso281Reliability.survival(2000, 40000)).isEqualTo(1);
    assertThat(Iso281Reliability.failureProbability(2000, 40000)).isZero();
    assertThat(Iso281Reliability.survival(2001, 40000)).isLessThan(1);
    assertThat(Iso281Reliability.survivalAtLifeFraction(0)).isEqualTo(1);
  }

  @Test
  void conditionalProbabilitiesMultiplyToThePlainOne() {
    double l10 = 30000;
    for (double before = 0; before < 100000; before += 3700) {
      double survivesBefore = Iso281Reliability.survival(before, l10);
      double survivesNext = 1 - Iso281Reliability.conditionalFailureProbability(before, 8760, l10);
      assertThat(survivesBefore * survivesNext)
          .isEqualTo(Iso281Reliability.survival(before + 8760, l10), within(1e-12));
    }
  }

  @Test
  void wornBearingFailsSoonerThanANewOne() {
    double before = -1;
    for (double used = 0; used < 20; used += 0.1) {
      double probability = Iso281Reliability.failureProbabilityOfAddedLife(used, 0.2);
      assertThat(probability).isGreaterThan(before).isBetween(0.0, 1.0);
      before = probability;
    }
    assertThat(Iso281Reliability.failureProbabilityOfAddedLife(1e6, 1)).isBetween(0.99, 1.0);
    assertThat(Iso281Reliability.failureProbabilityOfAddedLife(0.5, 0)).isZero();
  }

  @ParameterizedTest
  @ValueSource(doubles = {89.9, 100, Double.NaN})
  void reliabilityOutsideTheTableIsRefused(double reliabilityPercent) {
    assertThatThrownBy(() -> Iso281Reliability.lifeAdjustment(reliabilityPercent))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("reliability");
  }

  @Test
  void impossibleTimesAreRefused() {
    assertThatThrownBy(() -> Iso281Reliability.survival(-1, 100))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> Iso281Reliability.survival(1, 0))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> Iso281Reliability.survivalAtLifeFraction(Double.NaN))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> Iso281Reliability.failureProbabilityOfAddedLife(0.1, -0.1))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
