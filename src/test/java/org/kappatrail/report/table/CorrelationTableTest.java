package org.kappatrail.report.table;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.kappatrail.history.Settings;
import org.kappatrail.review.Review;
import org.kappatrail.review.correlation.CorrelationResults;
import org.kappatrail.review.correlation.Form;
import org.kappatrail.review.correlation.PairCorrelation;
import org.kappatrail.review.correlation.Scope;
import org.kappatrail.statistics.CorrelationTest;
import tech.tablesaw.api.Table;

class CorrelationTableTest {

  @Test
  void columnsAreThoseOfTheContractAndNoQMeansByConstruction() {
    PairCorrelation lagged = pair(Scope.ASSET, Optional.of("PM-DRY"), "iron_ppm", false);
    PairCorrelation tied = pair(Scope.FLEET, Optional.empty(), "temperature_c", true);
    Table table =
        CorrelationTable.of(
            new Review(
                LocalDate.of(2026, 10, 28),
                Settings.defaults(),
                List.of(),
                Optional.empty(),
                new CorrelationResults(List.of(lagged), List.of(tied)),
                List.of(),
                List.of()));
    assertThat(table.name()).isEqualTo("correlations");
    assertThat(String.join(",", table.columnNames()))
        .isEqualTo("scope,asset,x,y,lag,form,n,n_effective,coefficient,low,high,p,q");
    assertThat(table.rowCount()).isEqualTo(2);
    assertThat(table.row(0).getString("asset")).isEqualTo("PM-DRY");
    assertThat(table.row(0).getInt("lag")).isEqualTo(-1);
    assertThat(table.row(0).getString("form")).isEqualTo("measured");
    assertThat(table.row(0).getDouble("q")).isEqualTo(0.03);
    assertThat(table.row(1).getString("scope")).isEqualTo("fleet");
    assertThat(table.row(1).getString("asset")).isEmpty();
    assertThat(table.column("q").isMissing(1)).isTrue();
  }

  private static PairCorrelation pair(Scope scope, Optional<String> asset, String y, boolean tied) {
    return new PairCorrelation(
        scope,
        asset,
        "kappa",
        y,
        -1,
        Form.MEASURED,
        30,
        3,
        new CorrelationTest(-0.6, 22.5, 0.003, -0.8, -0.2),
        tied ? OptionalDouble.empty() : OptionalDouble.of(0.03),
        tied);
  }
}
