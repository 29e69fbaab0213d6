package org.kappatrail.review.correlation;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.kappatrail.statistics.CorrelationTest;
import org.kappatrail.statistics.RepeatedMeasuresCorrelation;

/**
 * Repeated-measures correlation of all pairs of variables, the asset as subject. An asset in which
 * one of the two never changes says nothing of them and is left out.
 */
final class FleetTests {
  private static final int LEAST_ASSETS = 2;

  private FleetTests() {}

  /** Every test that at least two assets and enough pairs stand behind; without q. */
  static List<PairCorrelation> of(List<List<Column>> assets) {
    List<Map<String, Column>> byName = new ArrayList<>();
    Set<String> names = new LinkedHashSet<>();
    for (List<Column> columns : assets) {
      Map<String, Column> named = new LinkedHashMap<>();
      columns.forEach(column -> named.put(column.name(), column));
      byName.add(named);
      names.addAll(named.keySet());
    }
    List<String> order = List.copyOf(names);
    List<PairCorrelation> tests = new ArrayList<>();
    for (int first = 0; first < order.size(); first++) {
      for (int second = first + 1; second < order.size(); second++) {
        for (Form form : Form.values()) {
          test(byName, order.get(first), order.get(second), form).ifPresent(tests::add);
        }
      }
    }
    return tests;
  }

  private static Optional<PairCorrelation> test(
      List<Map<String, Column>> assets, String x, String y, Form form) {
    List<double[]> xs = new ArrayList<>();
    List<double[]> ys = new ArrayList<>();
    FleetSampleSize size = new FleetSampleSize(form);
    for (Map<String, Column> asset : assets) {
      Column columnX = asset.get(x);
      Column columnY = asset.get(y);
      if (columnX != null && columnY != null) {
        Paired pairs = Column.numbers(columnX, columnY, form);
        if (size.add(pairs.x(), pairs.y())) {
          xs.add(pairs.x());
          ys.add(pairs.y());
        }
      }
    }
    if (size.assets() < LEAST_ASSETS || size.pairs() < Correlations.LEAST_PAIRS) {
      return Optional.empty();
    }
    return RepeatedMeasuresCorrelation.of(xs, ys)
        .map(
            found ->
                new PairCorrelation(
                    Scope.FLEET,
                    Optional.empty(),
                    x,
                    y,
                    0,
                    form,
                    found.n(),
                    found.subjects(),
                    CorrelationTest.of(found.r(), size.effective()),
                    OptionalDouble.empty(),
                    ByConstruction.tied(x, y)));
  }
}
