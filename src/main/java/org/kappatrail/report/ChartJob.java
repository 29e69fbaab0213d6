package org.kappatrail.report;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import org.kappatrail.report.chart.AssetChart;
import org.kappatrail.report.chart.CorrelationChart;
import org.kappatrail.report.chart.Drawing;
import org.kappatrail.report.chart.FleetChart;
import org.kappatrail.report.page.FileNames;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.Review;
import org.kappatrail.review.correlation.PairCorrelation;

/**
 * A chart to be drawn.
 *
 * @param kind what it shows
 * @param subject asset, or {@link #FLEET}
 * @param fileName its file's name without ending, no other chart's under any case
 * @param drawing the chart
 */
record ChartJob(Kind kind, String subject, String fileName, Drawing drawing) {
  /** Subject of the fleet's picture. */
  static final String FLEET = "fleet";

  private static final String CORRELATION_ENDING = "-correlation";

  /** What a chart shows. */
  enum Kind {
    TRAIL,
    CORRELATION,
    FLEET,
    FLEET_CORRELATION
  }

  /** Every chart of a review. */
  static List<ChartJob> of(Review review) {
    Map<String, String> names =
        FileNames.of(review.assets().stream().map(asset -> asset.asset().id()).toList());
    Set<String> taken = new HashSet<>();
    names.values().forEach(name -> taken.add(name.toLowerCase(Locale.ROOT)));
    Map<String, List<PairCorrelation>> correlations = review.correlations().byAsset();
    List<ChartJob> jobs = new ArrayList<>();
    FleetChart.of(review)
        .ifPresent(found -> jobs.add(new ChartJob(Kind.FLEET, FLEET, free(taken, FLEET), found)));
    CorrelationChart.ofFleet(review)
        .ifPresent(
            found ->
                jobs.add(
                    new ChartJob(
                        Kind.FLEET_CORRELATION,
                        FLEET,
                        free(taken, FLEET + CORRELATION_ENDING),
                        found)));
    for (AssetReview asset : review.assets()) {
      String id = asset.asset().id();
      String name = names.getOrDefault(id, "asset");
      AssetChart.of(review, asset)
          .ifPresent(found -> jobs.add(new ChartJob(Kind.TRAIL, id, name, found)));
      CorrelationChart.of(review, asset, correlations.getOrDefault(id, List.of()))
          .ifPresent(
              found ->
                  jobs.add(
                      new ChartJob(
                          Kind.CORRELATION, id, free(taken, name + CORRELATION_ENDING), found)));
    }
    return jobs;
  }

  private static String free(Set<String> taken, String wanted) {
    String name = wanted;
    for (int n = 2; !taken.add(name.toLowerCase(Locale.ROOT)); n++) {
      name = wanted + "-" + n;
    }
    return name;
  }
}
