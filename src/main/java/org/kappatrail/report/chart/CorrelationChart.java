package org.kappatrail.report.chart;

import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Rectangle2D;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.CorrelationVariables;
import org.kappatrail.review.Review;
import org.kappatrail.review.correlation.Judgement;
import org.kappatrail.review.correlation.Link;
import org.kappatrail.review.correlation.Names;
import org.kappatrail.review.correlation.PairCorrelation;

/**
 * What goes with what: the matrix of all pairs, for an asset with the lag profile and the scatter
 * of the strongest pair of κ.
 */
public final class CorrelationChart implements Drawing {
  private static final int WIDTH = PanelStack.WIDTH;
  private static final int MARGIN = 20;
  private static final int HEAD = 54;
  private static final int PLOTS = 300;
  private static final int FOOT = 30;
  private static final int LEAST_VARIABLES = 2;
  private static final Set<String> KAPPAS = Set.of(Names.KAPPA, Names.KAPPA_REFERENCE);

  private final String title;
  private final String subtitle;
  private final String source;
  private final CorrelationMatrix matrix;
  private final List<Plot> plots;

  private CorrelationChart(
      String title, String subtitle, String source, CorrelationMatrix matrix, List<Plot> plots) {
    this.title = title;
    this.subtitle = subtitle;
    this.source = source;
    this.matrix = matrix;
    this.plots = List.copyOf(plots);
  }

  /** The picture of one asset; empty where no test could be made. */
  public static Optional<Drawing> of(
      Review review, AssetReview asset, List<PairCorrelation> tests) {
    List<Link> links = Link.of(tests);
    String bearing =
        CorrelationVariables.bearing(asset)
            .map(shown -> ", κ of bearing " + shown.bearing().id())
            .orElse("");
    return drawing(
        asset.asset().id() + " · what goes with what",
        "Rank correlation of "
            + asset.samples().size()
            + " samples"
            + bearing
            + "; below the diagonal as measured, above it without each one's drift",
        source(review),
        links,
        plots(asset, links));
  }

  /** The picture of the fleet; empty where no test could be made. */
  public static Optional<Drawing> ofFleet(Review review) {
    List<PairCorrelation> tests = review.correlations().fleet();
    int most = tests.stream().mapToInt(PairCorrelation::assets).max().orElse(0);
    return drawing(
        "The fleet · what goes with what",
        "Repeated-measures correlation within "
            + most
            + " assets; below the diagonal as measured, above it without each one's drift",
        source(review),
        Link.of(tests),
        List.of());
  }

  private static Optional<Drawing> drawing(
      String title, String subtitle, String source, List<Link> links, List<Plot> plots) {
    CorrelationMatrix matrix = new CorrelationMatrix(links, WIDTH - 2 * MARGIN);
    return matrix.variables().size() < LEAST_VARIABLES
        ? Optional.empty()
        : Optional.of(new CorrelationChart(title, subtitle, source, matrix, plots));
  }

  private static String source(Review review) {
    String site = review.settings().site();
    return (site.isEmpty() ? "" : site + "; ")
        + "samples up to "
        + review.asOf()
        + "; false discovery rate over "
        + review.correlations().tests()
        + " tests; correlation is not cause";
  }

  /** Lag profile and scatter of the strongest pair that κ is in; none where there is no such. */
  private static List<Plot> plots(AssetReview asset, List<Link> links) {
    return strongest(links)
        .map(
            found ->
                List.of(
                    LagProfile.of(sameSeries(links, found), found, WIDTH / 2 - MARGIN, PLOTS),
                    PairScatter.of(
                        CorrelationVariables.of(asset),
                        found.measured(),
                        WIDTH / 2 - MARGIN,
                        PLOTS)))
        .orElse(List.of());
  }

  /** The surest link of κ, called ones first; pairs tied by construction do not count. */
  static Optional<Link> strongest(List<Link> links) {
    return links.stream()
        .filter(link -> KAPPAS.contains(link.measured().x()))
        .filter(link -> link.judgement() != Judgement.BY_CONSTRUCTION)
        .min(Comparator.comparing(Link::judgement).thenComparing(Link.SUREST));
  }

  private static List<Link> sameSeries(List<Link> links, Link pair) {
    return links.stream()
        .filter(link -> link.measured().x().equals(pair.measured().x()))
        .filter(link -> link.measured().y().equals(pair.measured().y()))
        .toList();
  }

  CorrelationMatrix matrix() {
    return matrix;
  }

  List<Plot> plots() {
    return plots;
  }

  @Override
  public int width() {
    return WIDTH;
  }

  @Override
  public int height() {
    return HEAD + matrix.height() + (plots.isEmpty() ? 0 : PLOTS) + FOOT;
  }

  @Override
  public void paint(Graphics2D g) {
    g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    g.setRenderingHint(
        RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
    g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
    g.setColor(Palette.PAPER);
    g.fill(new Rectangle2D.Double(0, 0, width(), height()));
    g.setColor(Palette.INK);
    g.setFont(ChartFont.bold(17));
    g.drawString(Fitted.to(g, title, WIDTH - 2.0 * MARGIN), MARGIN, 24);
    g.setFont(ChartFont.of(12.5f));
    g.setColor(Palette.QUIET_INK);
    g.drawString(Fitted.to(g, subtitle, WIDTH - 2.0 * MARGIN), MARGIN, 42);
    place(g, MARGIN, HEAD, () -> matrix.paint(g));
    int x = MARGIN;
    for (Plot plot : plots) {
      place(g, x, HEAD + matrix.height(), () -> plot.paint(g));
      x += WIDTH / 2;
    }
    g.setFont(ChartFont.of(11));
    g.setColor(Palette.QUIET_INK);
    g.drawString(source, MARGIN, height() - 10);
  }

  /** Put back by hand: the vector writer does not undo a copied graphics' transform. */
  private static void place(Graphics2D g, int x, int y, Runnable painter) {
    g.translate(x, y);
    painter.run();
    g.translate(-x, -y);
  }
}
