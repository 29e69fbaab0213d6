package org.kappatrail.statistics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.junit.jupiter.api.Test;

class DetrendTest {

  @Test
  void residualsAreWhatTheLineLeaves() {
    Published table = Published.table("epa2009_ex17_6_sulfate.csv");
    double[] t = table.column("sampling_date");
    double[] y = table.column("sulfate_ppm");
    TheilSen.Line line = TheilSen.fit(t, y, 0.95).orElseThrow();
    double[] residuals = Detrend.residuals(t, y).orElseThrow();
    assertThat(residuals).hasSameSizeAs(y);
    for (int i = 0; i < y.length; i++) {
      assertThat(residuals[i]).isCloseTo(y[i] - line.at(t[i]), within(1e-7));
    }
    assertThat(TheilSen.fit(t, residuals, 0.95).orElseThrow().slope())
        .as("nothing is left of the trend")
        .isCloseTo(0, within(1e-6));
  }

  @Test
  void aSeriesOnALineLeavesExactZeros() {
    double[] t = {19_000, 19_030, 19_061, 19_091, 19_122, 19_153};
    double[] y = Arrays.stream(t).map(day -> 3.8 - 0.000_713 * day).toArray();
    assertThat(Detrend.residuals(t, y).orElseThrow()).containsOnly(0.0);
  }

  @Test
  void addingATrendMovesAllResidualsAlike() {
    double[] t = {0, 1, 2, 3, 4, 5, 6};
    double[] y = {4, 1, 5, 2, 6, 3, 7};
    double[] steeper = new double[7];
    Arrays.setAll(steeper, i -> y[i] + 12 * t[i]);
    double[] before = Detrend.residuals(t, y).orElseThrow();
    double[] after = Detrend.residuals(t, steeper).orElseThrow();
    double moved = after[0] - before[0];
    assertThat(Arrays.stream(after).map(residual -> residual - moved).toArray())
        .containsExactly(before, within(1e-7));
  }

  @Test
  void nothingOneAndAllEqual() {
    assertThat(Detrend.residuals(new double[0], new double[0])).isEmpty();
    assertThat(Detrend.residuals(new double[] {1}, new double[] {1})).isEmpty();
    assertThat(Detrend.residuals(new double[] {1, 1}, new double[] {1, 2})).isEmpty();
    assertThat(Detrend.residuals(new double[] {1, 2, 3}, new double[] {0.1, 0.1, 0.1}))
        .hasValueSatisfying(residuals -> assertThat(residuals).containsExactly(0, 0, 0));
    assertThat(Detrend.residuals(new double[] {1, 2, 3}, new double[3]))
        .hasValueSatisfying(residuals -> assertThat(residuals).containsExactly(0, 0, 0));
  }
}
