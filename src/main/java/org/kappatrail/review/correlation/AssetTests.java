package org.kappatrail.review.correlation;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.kappatrail.statistics.AverageRanks;
import org.kappatrail.statistics.CorrelationTest;
import org.kappatrail.statistics.EffectiveSampleSize;
import org.kappatrail.statistics.Pearson;

/**
 * Spearman's correlation of all pairs of variables of one asset, judged at the effective sample
 * size.
 *
 * <p>Lags count samples, whatever the days between them, and pairs left out for a missing value
 * leave no gap: the serial correlation is that from pair to pair.
 */
final class AssetTests {
  private static final int MOST_LAG = 3;

  /** Variables that are set against the rest at lags too. */
  private static final Set<String> LAGGED = Set.of(Names.KAPPA, Names.KAPPA_REFERENCE);

  private AssetTests() {}

  /** Every test that has enough pairs and variables that vary; without q. */
  static List<PairCorrelation> of(String asset, List<Column> columns) {
    List<PairCorrelation> tests = new ArrayList<>();
    for (int first = 0; first < columns.size(); first++) {
      for (int second = first + 1; second < columns.size(); second++) {
        Column x = columns.get(first);
        Column y = columns.get(second);
        int reach = LAGGED.contains(x.name()) ? MOST_LAG : 0;
        for (int lag = -reach; lag <= reach; lag++) {
          for (Form form : Form.values()) {
            test(asset, x, y, lag, form).ifPresent(tests::add);
          }
        }
      }
    }
    return tests;
  }

  private static Optional<PairCorrelation> test(
      String asset, Column x, Column y, int lag, Form form) {
    Paired pairs = Column.ranked(x, y, lag, form);
    if (pairs.size() < Correlations.LEAST_PAIRS) {
      return Optional.empty();
    }
    double[] ranksX = AverageRanks.rank(pairs.x());
    double[] ranksY = AverageRanks.rank(pairs.y());
    OptionalDouble rho = Pearson.r(ranksX, ranksY);
    if (rho.isEmpty()) {
      return Optional.empty();
    }
    CorrelationTest judged =
        form == Form.MEASURED
            ? CorrelationTest.ofRanks(
                rho.getAsDouble(), EffectiveSampleSize.pyperPeterman(ranksX, ranksY))
            : CorrelationTest.ofDetrendedRanks(
                rho.getAsDouble(), EffectiveSampleSize.detrended(ranksX, ranksY));
    return Optional.of(
        new PairCorrelation(
            Scope.ASSET,
            Optional.of(asset),
            x.name(),
            y.name(),
            lag,
            form,
            pairs.size(),
            1,
            judged.withLeastP(StandingOut.leastP(ranksX, ranksY, rho.getAsDouble())),
            OptionalDouble.empty(),
            ByConstruction.tied(x.name(), y.name())));
  }
}
