package org.kappatrail.report.chart;

import java.awt.BasicStroke;
import java.util.List;
import org.kappatrail.review.correlation.CorrelationSentences;
import org.kappatrail.review.correlation.Judgement;
import org.kappatrail.review.correlation.Link;
import org.kappatrail.review.correlation.Names;
import org.kappatrail.review.correlation.PairCorrelation;
import org.knowm.xchart.style.markers.SeriesMarkers;

/** The coefficient of one pair at every lag with its interval: does it lead or follow? */
final class LagProfile {
  private static final Axis COEFFICIENT =
      new Axis(-1.05, 1.05, false, List.of(-1.0, -0.5, 0.0, 0.5, 1.0));
  private static final Axis LAGS =
      new Axis(-3.6, 3.6, false, List.of(-3.0, -2.0, -1.0, 0.0, 1.0, 2.0, 3.0));
  private static final double APART = 0.13;

  private LagProfile() {}

  /**
   * The profile.
   *
   * @param links the pair's links, one per lag
   * @param strongest the one among them to point at
   */
  static Plot of(List<Link> links, Link strongest, int width, int height) {
    String x = Names.brief(strongest.measured().x());
    String y = Names.brief(strongest.measured().y());
    List<PairCorrelation> measured = links.stream().map(Link::measured).toList();
    List<PairCorrelation> detrended =
        links.stream().flatMap(link -> link.detrended().stream()).toList();
    Plot plot =
        new Plot(
            "Coefficient of "
                + y
                + " with "
                + x
                + " by lag"
                + (strongest.judgement() == Judgement.CHANCE ? " (could be chance)" : ""),
            "samples by which " + y + " comes after " + x,
            width,
            height,
            LAGS,
            COEFFICIENT);
    plot.under(
        canvas -> {
          canvas.horizontal(0, Palette.QUIET_INK, new BasicStroke(0.8f));
          measured.forEach(
              test -> canvas.whisker(test.lag() - APART, test.low(), test.high(), Palette.INK));
          detrended.forEach(
              test ->
                  canvas.whisker(
                      test.lag() + APART,
                      test.low(),
                      test.high(),
                      Palette.wash(Palette.QUIET_INK, 0.7)));
        });
    plot.series(
        "as measured",
        measured.stream().mapToDouble(test -> test.lag() - APART).toArray(),
        measured.stream().mapToDouble(test -> test.coefficient()).toArray(),
        Palette.INK,
        0,
        SeriesMarkers.CIRCLE);
    plot.series(
        "detrended",
        detrended.stream().mapToDouble(test -> test.lag() + APART).toArray(),
        detrended.stream().mapToDouble(test -> test.coefficient()).toArray(),
        Palette.QUIET_INK,
        0,
        SeriesMarkers.DIAMOND);
    return plot.over(
        canvas -> {
          PairCorrelation test = strongest.measured();
          canvas.textLeftOf(
              CorrelationSentences.coefficient(test.coefficient()),
              canvas.x(test.lag() - APART) - 6,
              canvas.y(test.coefficient()) + 4,
              Palette.INK,
              11.5f);
          canvas.text(
              "● as measured   ◆ detrended; whiskers: 95 % interval",
              canvas.plot().getMinX(), -10, Palette.QUIET_INK, 11f);
        });
  }
}
