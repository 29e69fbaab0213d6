package org.kappatrail.statistics;

import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.BiConsumer;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Missing values are the caller's to leave out: no statistic takes them in silence. */
class MissingValuesTest {

  private static final double NAN = Double.NaN;
  private static final double[] WHOLE = {1, 2, 3, 4, 5, 6};
  private static final double[] SOME_MISSING = {1, 2, NAN, 4, 5, 6};
  private static final double[] ALL_MISSING = {NAN, NAN, NAN, NAN, NAN, NAN};
  private static final double[] INFINITE = {1, 2, 3, Double.NEGATIVE_INFINITY, 5, 6};

  static Stream<Arguments> statistics() {
    Map<String, BiConsumer<double[], double[]>> byName = new LinkedHashMap<>();
    byName.put("Theil-Sen", (x, y) -> TheilSen.fit(x, y, 0.95));
    byName.put("Mann-Kendall", MannKendall::test);
    byName.put("Mann-Kendall in order", (x, y) -> both(x, y, MannKendall::test));
    byName.put("lower CUSUM", (x, y) -> both(x, y, v -> Cusum.lower(v, 0.5, 5)));
    byName.put("upper CUSUM", (x, y) -> both(x, y, v -> Cusum.upper(v, 0.5, 5)));
    byName.put("ranks", (x, y) -> both(x, y, AverageRanks::rank));
    byName.put("Spearman", Spearman::rho);
    byName.put("Pearson", Pearson::r);
    byName.put("autocorrelation", (x, y) -> both(x, y, v -> Autocorrelation.upTo(v, 1)));
    byName.put("effective size", EffectiveSampleSize::pyperPeterman);
    byName.put("effective size of residuals", EffectiveSampleSize::detrended);
    byName.put(
        "repeated measures", (x, y) -> RepeatedMeasuresCorrelation.of(List.of(x), List.of(y)));
    byName.put("false discovery", (x, y) -> both(x, y, BenjaminiHochberg::adjust));
    byName.put("residuals", Detrend::residuals);
    byName.put("median", (x, y) -> both(x, y, Quantiles::median));
    byName.put("type 7 quantile", (x, y) -> both(x, y, v -> Quantiles.quantileType7(v, 0.9)));
    byName.put("weighted median", Quantiles::weightedMedian);
    byName.put("median absolute deviation", (x, y) -> both(x, y, RobustScale::mad));
    return byName.entrySet().stream().map(e -> Arguments.of(e.getKey(), e.getValue()));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("statistics")
  void missingAndInfiniteValuesAreRefused(String name, BiConsumer<double[], double[]> statistic) {
    for (double[] bad : List.of(SOME_MISSING, ALL_MISSING, INFINITE)) {
      assertThatIllegalArgumentException().as(name).isThrownBy(() -> statistic.accept(bad, WHOLE));
      assertThatIllegalArgumentException().as(name).isThrownBy(() -> statistic.accept(WHOLE, bad));
    }
  }

  static Stream<Arguments> pairedStatistics() {
    List<String> paired =
        List.of(
            "Theil-Sen",
            "Mann-Kendall",
            "Spearman",
            "Pearson",
            "effective size",
            "effective size of residuals",
            "repeated measures",
            "residuals",
            "weighted median");
    return statistics().filter(statistic -> paired.contains((String) statistic.get()[0]));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("pairedStatistics")
  void unequalLengthsAreRefused(String name, BiConsumer<double[], double[]> statistic) {
    assertThatIllegalArgumentException()
        .as(name)
        .isThrownBy(() -> statistic.accept(WHOLE, new double[] {1, 2, 3}))
        .withMessageContaining("x has 6 values and y 3");
  }

  /** Hands over only the array that is not whole, so that a refusal is of the bad value. */
  private static void both(double[] x, double[] y, Consumer<double[]> statistic) {
    statistic.accept(x == WHOLE ? y : x);
  }
}
