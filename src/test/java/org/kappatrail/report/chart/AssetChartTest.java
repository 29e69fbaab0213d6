package org.kappatrail.report.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.kappatrail.history.Settings;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.OneBearing;
import org.kappatrail.review.Review;
import org.kappatrail.review.correlation.Correlations;

class AssetChartTest {
  private static final LocalDate START = LocalDate.of(2025, 1, 1);
  private static final int SAMPLES = 9;

  @Test
  void everySampleHasAPlaceInTheOrderOfTime() {
    AssetReview asset = thinning(0.99);
    Drawing drawing = AssetChart.of(review(asset), asset).orElseThrow();
    assertThat(drawing.spots())
        .extracting(Spot::key)
        .containsExactlyElementsOf(asset.samples().stream().map(sample -> sample.id()).toList());
    for (int i = 1; i < SAMPLES; i++) {
      Spot before = drawing.spots().get(i - 1);
      Spot after = drawing.spots().get(i);
      assertThat(before.x() + before.width()).isLessThanOrEqualTo(after.x() + 1e-9);
    }
  }

  /**
   * An oil that loses a fraction of its viscosity every 30 days at one temperature: κ at 40 °C goes
   * with ν40 itself, so the slope in the note is that fraction.
   */
  @Test
  void theTrendInWordsIsTheLossOfTheOil() throws IOException {
    AssetReview asset = thinning(0.985);
    String svg = ChartFiles.svg(AssetChart.of(review(asset), asset).orElseThrow());
    Matcher note = Pattern.compile("trend of this charge −([0-9.]+) % in 30 days").matcher(svg);
    assertThat(note.find()).isTrue();
    assertThat(Double.parseDouble(note.group(1))).isCloseTo(1.5, within(0.051));
    assertThat(svg).contains(", falling<").contains(">outlook<");
  }

  @Test
  void theTimeShownReachesToTheHorizonWhereThereIsAnOutlook() {
    AssetReview thin = thinning(0.985);
    Drawing with = AssetChart.of(review(thin), thin).orElseThrow();
    AssetReview two = asset(2, 0.985);
    Drawing without = AssetChart.of(review(two), two).orElseThrow();
    double right = PanelStack.WIDTH - Panel.RIGHT;
    assertThat(lastX(with)).isLessThan(right * 0.8);
    assertThat(lastX(without)).as("two samples give no outlook").isGreaterThan(right * 0.8);
  }

  private static double lastX(Drawing drawing) {
    List<Spot> spots = drawing.spots();
    return spots.get(spots.size() - 1).x();
  }

  private static AssetReview thinning(double factor) {
    return asset(SAMPLES, factor);
  }

  private static AssetReview asset(int samples, double factor) {
    OneBearing asset = new OneBearing("A");
    for (int i = 0; i < samples; i++) {
      LocalDate day = START.plusDays(30L * i);
      asset.day(day, 40).sample(day, 150 * Math.pow(factor, i));
    }
    return asset.review();
  }

  private static Review review(AssetReview asset) {
    return new Review(
        START.plusDays(30L * SAMPLES),
        Settings.defaults(),
        List.of(asset),
        Optional.empty(),
        Correlations.of(List.of()),
        List.of(),
        List.of());
  }
}
