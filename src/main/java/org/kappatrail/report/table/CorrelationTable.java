package org.kappatrail.report.table;

import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.kappatrail.review.Review;
import org.kappatrail.review.correlation.PairCorrelation;
import tech.tablesaw.api.Table;

/** Every test of a correlation; no q where the pair is tied by construction. */
final class CorrelationTable {
  private CorrelationTable() {}

  static Table of(Review review) {
    List<PairCorrelation> tests =
        Stream.concat(
                review.correlations().assets().stream(), review.correlations().fleet().stream())
            .toList();
    return new TableOf<PairCorrelation>("correlations")
        .text("scope", test -> test.scope().label())
        .optionalText("asset", PairCorrelation::asset)
        .text("x", PairCorrelation::x)
        .text("y", PairCorrelation::y)
        .whole("lag", PairCorrelation::lag)
        .text("form", test -> test.form().label())
        .whole("n", PairCorrelation::n)
        .number("n_effective", test -> OptionalDouble.of(test.nEffective()))
        .number("coefficient", test -> OptionalDouble.of(test.coefficient()))
        .number("low", test -> OptionalDouble.of(test.low()))
        .number("high", test -> OptionalDouble.of(test.high()))
        .number("p", test -> OptionalDouble.of(test.p()))
        .number("q", PairCorrelation::q)
        .from(tests);
  }
}
