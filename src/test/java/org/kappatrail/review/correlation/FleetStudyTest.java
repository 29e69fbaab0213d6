package org.kappatrail.review.correlation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.kappatrail.statistics.RepeatedMeasuresCorrelation;

/**
 * How often the fleet's test at 5 % calls a link between two variables that have none, beside the
 * plain repeated-measures test. Seeded; the standard error of a rate of 5 % is 0.5 points. All
 * figures stand in {@code studies/fleet_correlation.csv}.
 */
@Tag("slow")
class FleetStudyTest {
  private static final int FLEETS = 2_000;
  private static final double WILD = 30;

  static List<List<String>> cases() {
    return CheckValues.rows("/studies/fleet_correlation.csv");
  }

  @ParameterizedTest(name = "values, assets, n, φ, rates {0}")
  @MethodSource("cases")
  void falseCallsOfTheFleetStayNearFivePercentOrBelow(List<String> row) {
    String values = row.get(0);
    int assets = Integer.parseInt(row.get(1));
    int n = Integer.parseInt(row.get(2));
    double phi = Double.parseDouble(row.get(3));
    Random random = new Random(assets * 1000L + n);
    int[] calls = new int[3];
    for (int fleet = 0; fleet < FLEETS; fleet++) {
      count(fleet(values, assets, n, phi, random), calls);
    }
    double[] found = Arrays.stream(calls).mapToDouble(call -> 100.0 * call / FLEETS).toArray();
    double[] stated = row.stream().skip(4).mapToDouble(Double::parseDouble).toArray();
    assertThat(found).containsExactly(stated, within(0.005));
    assertThat(found[1]).isLessThan(8);
    assertThat(found[2]).isLessThan(8);
  }

  private static void count(List<List<Column>> fleet, int[] calls) {
    List<double[]> xs = new ArrayList<>();
    List<double[]> ys = new ArrayList<>();
    for (List<Column> columns : fleet) {
      Paired pairs = Column.numbers(columns.get(0), columns.get(1), Form.MEASURED);
      xs.add(pairs.x());
      ys.add(pairs.y());
    }
    calls[0] += RepeatedMeasuresCorrelation.of(xs, ys).orElseThrow().p() <= 0.05 ? 1 : 0;
    for (PairCorrelation test : FleetTests.of(fleet)) {
      calls[test.form() == Form.MEASURED ? 1 : 2] += test.p() <= 0.05 ? 1 : 0;
    }
  }

  private static List<List<Column>> fleet(
      String values, int assets, int n, double phi, Random random) {
    List<List<Column>> fleet = new ArrayList<>();
    for (int asset = 0; asset < assets; asset++) {
      double[] x = series(n, phi, random);
      double[] y = series(n, phi, random);
      double spread = Math.exp(random.nextGaussian());
      switch (values) {
        case "normal" -> {}
        case "unlike spread" -> {
          Arrays.setAll(x, i -> x[i] * spread);
          Arrays.setAll(y, i -> y[i] * spread);
        }
        case "skewed" -> {
          Arrays.setAll(x, i -> Math.exp(x[i]));
          Arrays.setAll(y, i -> Math.exp(y[i]));
        }
        case "one wild sample" -> {
          if (asset == 0) {
            x[n / 2] += WILD;
            y[n / 2] -= WILD;
          }
        }
        default -> throw new IllegalArgumentException(values);
      }
      AssetSeries series =
          CheckValues.asset(
              "A" + asset, CheckValues.variable("x", x), CheckValues.variable("y", y));
      fleet.add(
          series.variables().stream()
              .map(variable -> new Column(variable, series.days()))
              .toList());
    }
    return fleet;
  }

  private static double[] series(int n, double phi, Random random) {
    double[] values = new double[n];
    double state = random.nextGaussian();
    for (int i = 0; i < n; i++) {
      values[i] = state;
      state = phi * state + Math.sqrt(1 - phi * phi) * random.nextGaussian();
    }
    return values;
  }
}
