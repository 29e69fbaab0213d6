package org.kappatrail.review.correlation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.kappatrail.review.correlation.CheckValues.asset;
import static org.kappatrail.review.correlation.CheckValues.find;
import static org.kappatrail.review.correlation.CheckValues.variable;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

class CorrelationsTest {
  private static final String PAIRS = "/published/tied_pairs.csv";
  private static final String SCIPY = "/published/tied_pairs_scipy.csv";
  private static final double[] X = CheckValues.column(PAIRS, 0);
  private static final double[] Y = CheckValues.column(PAIRS, 1);

  /** Values by scipy; script and version in the table. */
  @Test
  void rankCorrelationWithTiesAndAtLagsAgreesWithTheStatisticsPackage() {
    List<PairCorrelation> tests =
        Correlations.of(List.of(asset("A", variable(Names.KAPPA, X), variable("iron_ppm", Y))))
            .assets();
    assertThat(measured(tests, 0)).isCloseTo(CheckValues.value(SCIPY, "tied"), within(1e-14));
    assertThat(measured(tests, 1))
        .isCloseTo(CheckValues.value(SCIPY, "y_one_later"), within(1e-14));
    assertThat(measured(tests, -2))
        .isCloseTo(CheckValues.value(SCIPY, "y_two_earlier"), within(1e-14));
    assertThat(find(tests, Names.KAPPA, "iron_ppm", -2, Form.MEASURED).n()).isEqualTo(X.length - 2);
  }

  @Test
  void censoredValuesRankBelowAndAboveAllMeasuredOnes() {
    List<Optional<Value>> values =
        Arrays.stream(Y)
            .mapToObj(
                value ->
                    Optional.of(
                        value <= 15
                            ? new Value(value / 2, Value.Range.BELOW)
                            : value >= 28
                                ? new Value(28 + value % 3, Value.Range.ABOVE)
                                : Value.measured(value)))
            .toList();
    List<PairCorrelation> tests =
        Correlations.of(
                List.of(asset("A", variable(Names.KAPPA, X), Variable.of("iron_ppm", values))))
            .assets();
    assertThat(measured(tests, 0)).isCloseTo(CheckValues.value(SCIPY, "censored"), within(1e-14));
  }

  /** One swings where the other drifts, so that nothing is carried over in both: scipy's p. */
  @Test
  void withoutSharedSerialCorrelationPIsThatOfTheStatisticsPackageAndWithItPIsLarger() {
    int n = X.length;
    double[] swinging =
        IntStream.range(0, n).mapToDouble(i -> X[i % 2 == 0 ? i : n - 1 - i]).toArray();
    List<PairCorrelation> tests =
        Correlations.of(
                List.of(
                    asset("swinging", variable("a", swinging), variable("b", Y)),
                    asset("in-time", variable("a", X), variable("b", Y))))
            .assets();
    assertThat(tests.get(0).nEffective()).isEqualTo(n);
    assertThat(tests.get(0).coefficient())
        .isCloseTo(CheckValues.value(SCIPY, "swinging"), within(1e-14));
    assertThat(tests.get(0).p()).isCloseTo(CheckValues.value(SCIPY, "swinging_p"), within(1e-12));
    assertThat(tests.get(2).nEffective()).isLessThan(n / 2.0);
    assertThat(tests.get(2).p()).isGreaterThan(1e4 * CheckValues.value(SCIPY, "tied_p"));
  }

  @Test
  void aSeriesThatComesLaterIsFoundAtAPositiveLag() {
    double[] cause = random(1, 40);
    double[] effect = new double[cause.length];
    effect[0] = 0.1;
    effect[1] = -0.2;
    System.arraycopy(cause, 0, effect, 2, cause.length - 2);
    List<PairCorrelation> later =
        Correlations.of(
                List.of(asset("A", variable(Names.KAPPA, cause), variable("iron_ppm", effect))))
            .assets();
    assertThat(measured(later, 2)).isCloseTo(1, within(1e-12));
    List<PairCorrelation> earlier =
        Correlations.of(
                List.of(asset("A", variable(Names.KAPPA, effect), variable("iron_ppm", cause))))
            .assets();
    assertThat(measured(earlier, -2)).isCloseTo(1, within(1e-12));
    assertThat(later.stream().filter(test -> test.form() == Form.MEASURED))
        .extracting(PairCorrelation::lag)
        .containsExactly(-3, -2, -1, 0, 1, 2, 3);
  }

  @Test
  void onlyKappaIsSetAgainstTheRestAtLags() {
    List<PairCorrelation> tests =
        Correlations.of(
                List.of(
                    asset(
                        "A",
                        variable(Names.KAPPA_REFERENCE, random(2, 20)),
                        variable("iron_ppm", random(3, 20)),
                        variable("copper_ppm", random(4, 20)))))
            .assets();
    assertThat(tests.stream().filter(test -> test.x().equals(Names.KAPPA_REFERENCE))).hasSize(28);
    assertThat(tests.stream().filter(test -> test.x().equals("iron_ppm")))
        .extracting(PairCorrelation::lag)
        .containsExactly(0, 0);
  }

  /** Bland and Altman 1995; r of Bakdash and Marusich 2017, seven decimals. */
  @Test
  void fleetCoefficientIsTheRepeatedMeasuresCorrelation() {
    String table = "/published/bland_altman_1995.csv";
    List<List<String>> rows = CheckValues.rows(table);
    List<AssetSeries> subjects =
        rows.stream()
            .map(row -> row.get(0))
            .distinct()
            .map(
                subject ->
                    asset(
                        "S" + subject,
                        variable("ph", of(rows, subject, 1)),
                        variable("carbon_dioxide_kpa", of(rows, subject, 2))))
            .toList();
    PairCorrelation test =
        find(Correlations.of(subjects).fleet(), "ph", "carbon_dioxide_kpa", 0, Form.MEASURED);
    assertThat(test.coefficient()).isCloseTo(-0.5067697, within(5e-8));
    assertThat(test.n()).isEqualTo(47);
    assertThat(test.assets()).isEqualTo(8);
    assertThat(test.nEffective())
        .as("never more than the 38 degrees of freedom and two")
        .isLessThanOrEqualTo(40);
    assertThat(test.p()).isGreaterThanOrEqualTo(0.0008471);
  }

  /** Step-up rule as in Benjamini and Hochberg 1995: all up to the last k with p(k) ≤ k/m·0.05. */
  @Test
  void theFalseDiscoveryRateIsKeptOverAllTestsButThoseByConstruction() {
    double[] kappa = random(5, 30);
    double[] close = IntStream.range(0, 30).mapToDouble(i -> kappa[i] + 0.02 * i % 0.7).toArray();
    List<AssetSeries> fleet =
        List.of(
            asset(
                "A",
                variable(Names.KAPPA, kappa),
                variable("viscosity_40c_cst", close),
                variable("iron_ppm", close)),
            asset(
                "B",
                variable(Names.KAPPA, random(6, 30)),
                variable("viscosity_40c_cst", random(7, 30)),
                variable("iron_ppm", random(8, 30))));
    CorrelationResults results = Correlations.of(fleet);
    List<PairCorrelation> all =
        Stream.concat(results.assets().stream(), results.fleet().stream()).toList();
    assertThat(all.stream().filter(PairCorrelation::byConstruction))
        .isNotEmpty()
        .allSatisfy(test -> assertThat(test.y()).isEqualTo("viscosity_40c_cst"))
        .allSatisfy(test -> assertThat(test.q()).isEmpty());
    List<PairCorrelation> family = all.stream().filter(test -> !test.byConstruction()).toList();
    assertThat(results.tests()).isEqualTo(family.size());
    double[] p = family.stream().mapToDouble(test -> test.p()).sorted().toArray();
    double last = 0;
    for (int k = 1; k <= p.length; k++) {
      if (p[k - 1] <= 0.05 * k / p.length) {
        last = p[k - 1];
      }
    }
    double limit = last;
    assertThat(limit).isPositive();
    assertThat(family)
        .allSatisfy(
            test -> assertThat(test.q().orElseThrow() <= 0.05).isEqualTo(test.p() <= limit));
  }

  @Test
  void nothingIsTestedWhereThereIsTooLittle() {
    assertThat(Correlations.of(List.of())).isEqualTo(CorrelationResults.none());
    List<AssetSeries> little =
        List.of(
            asset("no-variable"),
            asset("one-variable", variable(Names.KAPPA, random(9, 9))),
            asset("one-sample", variable(Names.KAPPA, 1), variable("iron_ppm", 2)),
            asset(
                "four-samples",
                variable(Names.KAPPA, random(10, 4)),
                variable("iron_ppm", random(11, 4))),
            asset(
                "all-equal",
                variable(Names.KAPPA, 1, 1, 1, 1, 1, 1),
                variable("iron_ppm", 1, 2, 3, 5, 4, 6)));
    assertThat(Correlations.of(little)).isEqualTo(CorrelationResults.none());
  }

  @Test
  void fivePairsAreTestedAndMissingValuesTakeThemAway() {
    double[] x = {1, 3, 2, 5, 4, 7};
    List<Optional<Value>> gaps = new ArrayList<>();
    for (double value : new double[] {2, 1, 4, 3, 6, 5}) {
      gaps.add(Optional.of(Value.measured(value)));
    }
    gaps.set(2, Optional.empty());
    List<PairCorrelation> tests =
        Correlations.of(List.of(asset("A", variable("a", x), Variable.of("b", gaps)))).assets();
    assertThat(tests).extracting(PairCorrelation::n).containsExactly(5, 5);
  }

  @Test
  void samplesOnOneDayHaveNoDetrendedForm() {
    AssetSeries series =
        new AssetSeries(
            "A",
            List.of(1.0, 1.0, 1.0, 1.0, 1.0, 1.0),
            List.of(variable("a", 1, 3, 2, 5, 4, 7), variable("b", 2, 1, 4, 3, 6, 5)));
    assertThat(Correlations.of(List.of(series)).assets())
        .extracting(PairCorrelation::form)
        .containsExactly(Form.MEASURED);
  }

  private static double measured(List<PairCorrelation> tests, int lag) {
    return find(tests, Names.KAPPA, "iron_ppm", lag, Form.MEASURED).coefficient();
  }

  private static double[] random(long seed, int n) {
    Random random = new Random(seed);
    return IntStream.range(0, n).mapToDouble(i -> random.nextGaussian()).toArray();
  }

  private static double[] of(List<List<String>> rows, String subject, int column) {
    return rows.stream()
        .filter(row -> row.get(0).equals(subject))
        .mapToDouble(row -> Double.parseDouble(row.get(column)))
        .toArray();
  }
}
