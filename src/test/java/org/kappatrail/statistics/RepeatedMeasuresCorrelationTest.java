package org.kappatrail.statistics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class RepeatedMeasuresCorrelationTest {

  private static final Published TABLE = Published.table("bland_altman_1995.csv");
  private static final List<double[]> ACIDITY = TABLE.columnBy("subject", "pH");
  private static final List<double[]> CARBON_DIOXIDE = TABLE.columnBy("subject", "PaCO2_kPa");

  /** Bland and Altman 1995; values of Bakdash and Marusich 2017, seven decimals. */
  @Test
  void agreesWithTheIntramuralAcidityExample() {
    RepeatedMeasuresCorrelation result =
        RepeatedMeasuresCorrelation.of(ACIDITY, CARBON_DIOXIDE).orElseThrow();
    assertThat(result.r()).isCloseTo(-0.5067697, within(5e-8));
    assertThat(result.df()).isEqualTo(38);
    assertThat(result.p()).isCloseTo(0.0008471, within(5e-8));
    assertThat(result.low()).isCloseTo(-0.7067146, within(5e-8));
    assertThat(result.high()).isCloseTo(-0.2318631, within(5e-8));
    assertThat(result.subjects()).isEqualTo(8);
    assertThat(result.n()).isEqualTo(47);
  }

  @Test
  void subjectsWithOneOrNoObservationChangeNothing() {
    List<double[]> x = new ArrayList<>(ACIDITY);
    List<double[]> y = new ArrayList<>(CARBON_DIOXIDE);
    x.add(new double[] {7});
    y.add(new double[] {5});
    x.add(new double[0]);
    y.add(new double[0]);
    assertThat(RepeatedMeasuresCorrelation.of(x, y))
        .isEqualTo(RepeatedMeasuresCorrelation.of(ACIDITY, CARBON_DIOXIDE));
  }

  @Test
  void differencesBetweenSubjectsAreTakenOut() {
    List<double[]> x = List.of(new double[] {1, 2, 3}, new double[] {101, 102, 103});
    List<double[]> y = List.of(new double[] {3, 2, 1}, new double[] {1003, 1002, 1001});
    assertThat(RepeatedMeasuresCorrelation.of(x, y).orElseThrow())
        .isEqualTo(new RepeatedMeasuresCorrelation(-1, 3, 0, -1, -1, 2, 6));
  }

  @Test
  void oneDegreeOfFreedomLeavesTheIntervalOpen() {
    RepeatedMeasuresCorrelation result =
        RepeatedMeasuresCorrelation.of(
                List.of(new double[] {1, 2, 3}), List.of(new double[] {1, 3, 2}))
            .orElseThrow();
    assertThat(result.df()).isEqualTo(1);
    assertThat(result.r()).isCloseTo(0.5, within(1e-15));
    assertThat(result.low()).isEqualTo(-1);
    assertThat(result.high()).isEqualTo(1);
  }

  @Test
  void nothingTooFewOrConstantWithinSubjectsHasNoCorrelation() {
    assertThat(RepeatedMeasuresCorrelation.of(List.of(), List.of())).isEmpty();
    List<double[]> two = List.of(new double[] {1, 2});
    assertThat(RepeatedMeasuresCorrelation.of(two, two)).isEmpty();
    List<double[]> varying = List.of(new double[] {1, 2, 3}, new double[] {4, 6, 5});
    List<double[]> steps = List.of(new double[] {0.1, 0.1, 0.1}, new double[] {0.7, 0.7, 0.7});
    assertThat(RepeatedMeasuresCorrelation.of(varying, steps)).isEmpty();
    assertThat(RepeatedMeasuresCorrelation.of(steps, varying)).isEmpty();
  }

  @Test
  void subjectsThatDoNotPairOffAreRefused() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> RepeatedMeasuresCorrelation.of(ACIDITY, List.of()))
        .withMessageContaining("x has 8 subjects and y 0");
  }
}
