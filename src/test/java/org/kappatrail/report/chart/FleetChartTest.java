package org.kappatrail.report.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.kappatrail.history.Settings;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.OneBearing;
import org.kappatrail.review.Review;
import org.kappatrail.review.correlation.Correlations;

class FleetChartTest {
  private static final LocalDate START = LocalDate.of(2025, 1, 1);

  @Test
  void aRowLeadsFromFreshOilByOilAndHeatToThePresentKappa() {
    FleetRow row = FleetRow.of(review(List.of(asset("A", 150, 120, 60, 72)))).get(0);
    assertThat(row.afterOil()).as("the oil thinned").isLessThan(row.fresh());
    assertThat(row.film().kappa()).as("and it got warmer").isLessThan(row.afterOil());
    double rest = row.moved().orElseThrow().temperature() + row.moved().orElseThrow().speed();
    assertThat(row.afterOil() * Math.exp(rest)).isCloseTo(row.film().kappa(), within(1e-12));
  }

  @Test
  void coolerAndThickerRunTheOtherWay() {
    FleetRow row = FleetRow.of(review(List.of(asset("A", 150, 165, 72, 60)))).get(0);
    assertThat(row.afterOil()).isGreaterThan(row.fresh());
    assertThat(row.film().kappa()).isGreaterThan(row.afterOil());
  }

  @Test
  void theWorstStandsFirst() {
    Review review =
        review(
            List.of(
                asset("fair", 150, 150, 60, 60),
                asset("low", 150, 150, 60, 85),
                asset("high", 150, 150, 60, 50)));
    assertThat(FleetRow.of(review))
        .extracting(FleetRow::asset)
        .containsExactly("low", "fair", "high");
    Drawing drawing = FleetChart.of(review).orElseThrow();
    assertThat(drawing.spots()).extracting(Spot::key).containsExactly("low", "fair", "high");
    assertThat(drawing.spots()).extracting(Spot::y).isSorted();
    assertThat(drawing.spots())
        .allSatisfy(
            spot -> {
              assertThat(spot.x() + spot.width()).isLessThanOrEqualTo(drawing.width());
              assertThat(spot.y() + spot.height()).isLessThanOrEqualTo(drawing.height());
            });
  }

  @Test
  void ofMoreThanFortyTheWorstAreShownAndThatIsSaid() throws IOException {
    List<AssetReview> assets = new ArrayList<>();
    for (int i = 0; i < 43; i++) {
      assets.add(asset(String.format(Locale.ROOT, "A%02d", i), 150, 150, 60, 60 + i / 4.0));
    }
    Drawing drawing = FleetChart.of(review(assets)).orElseThrow();
    assertThat(drawing.spots()).hasSize(40);
    assertThat(drawing.spots().get(0).key()).isEqualTo("A42");
    assertThat(ChartFiles.svg(drawing)).contains("the worst 40 of 43 bearings").contains(">A03<");
    assertThat(ChartFiles.svg(drawing)).doesNotContain(">A02<");
  }

  @Test
  void levelsAndNumbersStandBesideTheRow() throws IOException {
    Review review = review(List.of(asset("hot", 150, 150, 60, 95)));
    String svg = ChartFiles.svg(FleetChart.of(review).orElseThrow());
    double kappa = FleetRow.of(review).get(0).film().kappa();
    assertThat(kappa).isLessThan(1);
    assertThat(svg)
        .contains(">" + KappaText.of(kappa) + "<")
        .contains(">alarm<")
        .contains(">mixed<");
  }

  @Test
  void withoutAnyKappaThereIsNoPicture() {
    assertThat(FleetChart.of(review(List.of()))).isEmpty();
  }

  /** An asset whose oil and temperature go from one value to another over seven samples. */
  private static AssetReview asset(
      String id, double firstV40, double lastV40, double firstC, double lastC) {
    OneBearing asset = new OneBearing(id);
    for (int day = 0; day <= 180; day++) {
      asset.day(START.plusDays(day), firstC + (lastC - firstC) * day / 180);
    }
    for (int i = 0; i <= 6; i++) {
      asset.sample(START.plusDays(30L * i), firstV40 + (lastV40 - firstV40) * i / 6);
    }
    return asset.review();
  }

  private static Review review(List<AssetReview> assets) {
    return new Review(
        START.plusDays(180),
        Settings.defaults(),
        assets,
        Optional.empty(),
        Correlations.of(List.of()),
        List.of(),
        List.of());
  }
}
