package org.kappatrail.report.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.kappatrail.review.correlation.AssetSeries;
import org.kappatrail.review.correlation.Correlations;
import org.kappatrail.review.correlation.Form;
import org.kappatrail.review.correlation.Link;
import org.kappatrail.review.correlation.Value;
import org.kappatrail.review.correlation.Variable;

/** The pictures by their data. */
class CorrelationChartTest {
  private static final int SAMPLES = 30;
  private static final AssetSeries SERIES = series(List.of("kappa", "temperature_c", "iron_ppm"));
  private static final List<Link> LINKS = Link.of(Correlations.of(List.of(SERIES)).assets());

  @Test
  void theMatrixIsMeasuredBelowTheDiagonalAndDetrendedAboveIt() {
    CorrelationMatrix matrix = new CorrelationMatrix(LINKS, 1000);
    assertThat(matrix.variables()).containsExactly("kappa", "temperature_c", "iron_ppm");
    assertThat(matrix.at(2, 0).orElseThrow().form()).isEqualTo(Form.MEASURED);
    assertThat(matrix.at(0, 2).orElseThrow().form()).isEqualTo(Form.DETRENDED);
    assertThat(matrix.at(2, 0).orElseThrow().y()).isEqualTo("iron_ppm");
    assertThat(matrix.at(2, 0).orElseThrow().lag()).isZero();
    assertThat(matrix.at(1, 0).orElseThrow().byConstruction()).isTrue();
    assertThat(matrix.at(1, 1)).isEmpty();
  }

  @Test
  void whatFindsNoRoomInTheMatrixIsCounted() {
    List<String> names = new ArrayList<>();
    for (int i = 0; i < 30; i++) {
      names.add("metal" + i + "_ppm");
    }
    List<Link> links = Link.of(Correlations.of(List.of(series(names))).assets());
    CorrelationMatrix matrix = new CorrelationMatrix(links, 1000);
    assertThat(matrix.variables()).hasSize(26);
    assertThat(matrix.left()).isEqualTo(4);
  }

  @Test
  void theStrongestPairIsOfKappaAndNotByConstruction() {
    Link strongest = CorrelationChart.strongest(LINKS).orElseThrow();
    assertThat(strongest.measured().x()).isEqualTo("kappa");
    assertThat(strongest.measured().y()).isEqualTo("iron_ppm");
    assertThat(strongest.measured().lag()).isEqualTo(1);
    assertThat(CorrelationChart.strongest(List.of())).isEmpty();
  }

  @Test
  void theProfileHoldsEveryLagInBothForms() {
    Link strongest = CorrelationChart.strongest(LINKS).orElseThrow();
    List<Link> lags =
        LINKS.stream().filter(link -> link.measured().y().equals("iron_ppm")).toList();
    List<Link> ofKappa = lags.stream().filter(link -> link.measured().x().equals("kappa")).toList();
    Plot profile = LagProfile.of(ofKappa, strongest, 500, 300);
    assertThat(profile.chart().getSeriesCollection()).hasSize(2);
    assertThat(profile.chart().getSeries("as measured").getYData())
        .hasSize(7)
        .contains(strongest.measured().coefficient());
  }

  @Test
  void theScatterJoinsPairsAtTheirLagInTheOrderOfTime() {
    Link strongest = CorrelationChart.strongest(LINKS).orElseThrow();
    Plot scatter = PairScatter.of(SERIES, strongest.measured(), 500, 300);
    var points = scatter.chart().getSeries("samples");
    assertThat(points.getXData()).hasSize(SAMPLES - 1);
    Variable kappa = SERIES.variables().get(0);
    Variable iron = SERIES.variables().get(2);
    assertThat(points.getXData()[4]).isEqualTo(kappa.arithmetic(4));
    assertThat(points.getYData()[4]).isEqualTo(iron.arithmetic(5));
  }

  /** κ is noise, the temperature its mirror, and everything else follows κ by one sample. */
  private static AssetSeries series(List<String> names) {
    Random random = new Random(3);
    double[] kappa = new double[SAMPLES + 1];
    for (int i = 0; i < kappa.length; i++) {
      kappa[i] = 1.5 + 0.2 * random.nextGaussian();
    }
    List<Variable> variables = new ArrayList<>();
    for (String name : names) {
      List<Optional<Value>> values = new ArrayList<>();
      for (int i = 0; i < SAMPLES; i++) {
        double value =
            switch (name) {
              case "kappa" -> kappa[i + 1];
              case "temperature_c" -> 60 - 10 * kappa[i + 1] + random.nextGaussian();
              default -> 20 - 8 * kappa[i] + 0.3 * random.nextGaussian();
            };
        values.add(Optional.of(Value.measured(value)));
      }
      variables.add(Variable.of(name, values));
    }
    List<Double> days = new ArrayList<>();
    for (int i = 0; i < SAMPLES; i++) {
      days.add(19_000.0 + 30 * i);
    }
    return new AssetSeries("A", days, variables);
  }
}
