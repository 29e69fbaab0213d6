package org.kappatrail.review.correlation;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.IntStream;
import org.kappatrail.statistics.AverageRanks;
import org.kappatrail.statistics.CorrelationTest;
import org.kappatrail.statistics.RepeatedMeasuresCorrelation;

/**
 * Repeated-measures correlation of all pairs of variables, the asset as subject, judged at the
 * effective sample size ({@link FleetSampleSize}). An asset in which one of the two never changes
 * says nothing of them and is left out.
 *
 * <p>The coefficient is of the numbers themselves, so that one wild sample, such as a bottle filled
 * at the wrong machine, can make it alone. p is therefore the larger one of two: of the numbers,
 * and of their ranks within each asset; 1 where the two disagree in sign (this tool's convention;
 * seeded study in the tests).
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
    return IntStream.range(0, order.size())
        .parallel()
        .mapToObj(first -> withRest(byName, order, first))
        .flatMap(List::stream)
        .toList();
  }

  private static List<PairCorrelation> withRest(
      List<Map<String, Column>> assets, List<String> order, int first) {
    List<PairCorrelation> tests = new ArrayList<>();
    for (int second = first + 1; second < order.size(); second++) {
      for (Form form : Form.values()) {
        test(assets, order.get(first), order.get(second), form).ifPresent(tests::add);
      }
    }
    return tests;
  }

  private static Optional<PairCorrelation> test(
      List<Map<String, Column>> assets, String x, String y, Form form) {
    Stack numbers = new Stack(form);
    Stack ranks = new Stack(form);
    for (Map<String, Column> asset : assets) {
      Column columnX = asset.get(x);
      Column columnY = asset.get(y);
      if (columnX != null && columnY != null) {
        Paired values = Column.numbers(columnX, columnY, form);
        Paired ranked = Column.ranked(columnX, columnY, 0, form);
        numbers.add(values.x(), values.y());
        ranks.add(AverageRanks.rank(ranked.x()), AverageRanks.rank(ranked.y()));
      }
    }
    Optional<RepeatedMeasuresCorrelation> found = numbers.correlation();
    Optional<RepeatedMeasuresCorrelation> ofRanks = ranks.correlation();
    if (found.isEmpty() || ofRanks.isEmpty()) {
      return Optional.empty();
    }
    boolean agree = found.get().r() * ofRanks.get().r() > 0;
    CorrelationTest judged = CorrelationTest.of(found.get().r(), numbers.size.effective());
    CorrelationTest byRank = CorrelationTest.of(ofRanks.get().r(), ranks.size.effective());
    return Optional.of(
        new PairCorrelation(
            Scope.FLEET,
            Optional.empty(),
            x,
            y,
            0,
            form,
            found.get().n(),
            found.get().subjects(),
            judged.withLeastP(agree ? byRank.p() : 1),
            OptionalDouble.empty(),
            ByConstruction.tied(x, y)));
  }

  /** The pairs of all assets that say something. */
  private static final class Stack {
    private final List<double[]> xs = new ArrayList<>();
    private final List<double[]> ys = new ArrayList<>();
    private final FleetSampleSize size;

    Stack(Form form) {
      size = new FleetSampleSize(form);
    }

    void add(double[] x, double[] y) {
      if (size.add(x, y)) {
        xs.add(x);
        ys.add(y);
      }
    }

    Optional<RepeatedMeasuresCorrelation> correlation() {
      return size.assets() < LEAST_ASSETS || size.pairs() < Correlations.LEAST_PAIRS
          ? Optional.empty()
          : RepeatedMeasuresCorrelation.of(xs, ys);
    }
  }
}
