package org.kappatrail.review.correlation;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.kappatrail.statistics.BenjaminiHochberg;

/**
 * Makes every test of a review: within each asset ({@link AssetTests}), over the fleet ({@link
 * FleetTests}), and the false discovery rate over all of them, as measured and detrended, but for
 * pairs tied by construction.
 */
public final class Correlations {
  /** Pairs below which no test is made. */
  public static final int LEAST_PAIRS = 5;

  private Correlations() {}

  /** The tests of assets in the order given; no asset gives none. */
  public static CorrelationResults of(List<AssetSeries> series) {
    List<List<Column>> columns = series.parallelStream().map(Correlations::columns).toList();
    List<PairCorrelation> assets =
        IntStream.range(0, series.size())
            .parallel()
            .mapToObj(i -> AssetTests.of(series.get(i).asset(), columns.get(i)))
            .flatMap(List::stream)
            .toList();
    List<PairCorrelation> fleet = FleetTests.of(columns);
    return adjusted(assets, fleet);
  }

  private static List<Column> columns(AssetSeries series) {
    return series.variables().stream()
        .map(variable -> new Column(variable, series.days()))
        .toList();
  }

  private static CorrelationResults adjusted(
      List<PairCorrelation> assets, List<PairCorrelation> fleet) {
    double[] p =
        Stream.concat(assets.stream(), fleet.stream())
            .filter(test -> !test.byConstruction())
            .mapToDouble(test -> test.p())
            .toArray();
    double[] q = BenjaminiHochberg.adjust(p);
    int[] next = {0};
    return new CorrelationResults(withQ(assets, q, next), withQ(fleet, q, next));
  }

  private static List<PairCorrelation> withQ(List<PairCorrelation> tests, double[] q, int[] next) {
    List<PairCorrelation> adjusted = new ArrayList<>(tests.size());
    for (PairCorrelation test : tests) {
      adjusted.add(test.byConstruction() ? test : test.withQ(q[next[0]++]));
    }
    return adjusted;
  }
}
