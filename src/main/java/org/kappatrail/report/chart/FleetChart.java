package org.kappatrail.report.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.AffineTransform;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;
import org.kappatrail.review.Review;
import org.kappatrail.tribology.LubricationRegime;
import org.knowm.xchart.style.markers.SeriesMarkers;

/**
 * Where every bearing stands: from the fresh oil at the charge's first operating point the step
 * that the oil took, then the one that temperature and speed took, to the present κ with its
 * interval.
 */
public final class FleetChart implements Drawing {
  /** More rows than this are not legible on one picture. */
  public static final int MOST_ROWS = 40;

  private static final int WIDTH = PanelStack.WIDTH;
  private static final int LEFT = 236;
  private static final int RIGHT = 132;
  private static final int HEAD = 100;
  private static final int FOOT = 62;
  private static final int ROW = 25;

  /** Steps stand this far above and below the middle of a row, px. */
  private static final double LANE = 4.5;

  private static final double THICK = 5;

  private final List<FleetRow> rows;
  private final int all;
  private final String source;
  private final BarePlot plot;

  private FleetChart(List<FleetRow> rows, int all, String source) {
    this.rows = rows;
    this.all = all;
    this.source = source;
    double[] values =
        rows.stream()
            .flatMapToDouble(
                row ->
                    DoubleStream.of(
                        row.film().uncertainty().low(),
                        row.film().uncertainty().high(),
                        row.fresh(),
                        row.afterOil(),
                        row.floor()))
            .toArray();
    Axis across =
        Axis.wideLog(
            Math.max(0.02, DoubleStream.of(values).min().orElseThrow()),
            Math.min(100, DoubleStream.of(values).max().orElseThrow()));
    Axis down = new Axis(-rows.size(), 0, false, List.of());
    plot = new BarePlot(across, down);
    plot.points(
        "fresh oil where the charge began",
        rows.stream().filter(row -> row.moved().isPresent()).mapToDouble(FleetRow::fresh).toArray(),
        heights(true, LANE),
        Palette.wash(Palette.KAPPA, 0.45),
        SeriesMarkers.CIRCLE);
    plot.points(
        "κ now",
        rows.stream().mapToDouble(row -> row.film().kappa()).toArray(),
        heights(false, -LANE),
        Palette.KAPPA,
        SeriesMarkers.CIRCLE);
  }

  private double[] heights(boolean movedOnly, double above) {
    List<Double> heights = new ArrayList<>();
    for (int i = 0; i < rows.size(); i++) {
      if (!movedOnly || rows.get(i).moved().isPresent()) {
        heights.add(-(i + 0.5) + above / ROW);
      }
    }
    return heights.stream().mapToDouble(Double::doubleValue).toArray();
  }

  /** The picture of a review; empty where no κ is known. */
  public static Optional<Drawing> of(Review review) {
    List<FleetRow> every = FleetRow.of(review);
    if (every.isEmpty()) {
      return Optional.empty();
    }
    String site = review.settings().site();
    return Optional.of(
        new FleetChart(
            every.subList(0, Math.min(MOST_ROWS, every.size())),
            every.size(),
            (site.isEmpty() ? "" : site + "; ")
                + "state of "
                + review.asOf()
                + "; κ by ISO 281 from viscosity by ASTM D341; whiskers: 95 % interval"));
  }

  @Override
  public int width() {
    return WIDTH;
  }

  @Override
  public int height() {
    return HEAD + rows.size() * ROW + FOOT;
  }

  /** A row each, in order; the key is the asset. */
  @Override
  public List<Spot> spots() {
    List<Spot> spots = new ArrayList<>();
    for (int i = 0; i < rows.size(); i++) {
      spots.add(new Spot(rows.get(i).asset(), 8, HEAD + i * (double) ROW, WIDTH - 16.0, ROW));
    }
    return spots;
  }

  @Override
  public void paint(Graphics2D g) {
    Quality.set(g);
    g.setColor(Palette.PAPER);
    g.fill(new Rectangle2D.Double(0, 0, width(), height()));
    head(g);
    AffineTransform before = g.getTransform();
    g.translate(LEFT, HEAD);
    plot.paint(
        g, WIDTH - LEFT - RIGHT, rows.size() * ROW, this::regimes, canvas -> rows(g, canvas));
    g.setTransform(before);
    g.setFont(ChartFont.of(11));
    g.setColor(Palette.QUIET_INK);
    g.drawString(Fitted.to(g, source, WIDTH - 40.0), 20, height() - 12);
  }

  private void head(Graphics2D g) {
    g.setColor(Palette.INK);
    g.setFont(ChartFont.bold(17));
    g.drawString("Where every bearing stands", 20, 24);
    g.setFont(ChartFont.of(12.5f));
    g.setColor(Palette.QUIET_INK);
    String which =
        all > rows.size()
            ? "the worst " + rows.size() + " of " + all + " bearings"
            : all + (all == 1 ? " bearing" : " bearings");
    g.drawString("κ, viscosity ratio; " + which + ", least κ over its floor first", 20, 42);
    new FleetKey(g).paint(20, 62);
  }

  private void regimes(Canvas canvas) {
    double boundary = LubricationRegime.MIXED_FROM;
    double full = LubricationRegime.FULL_FILM_FROM;
    regime(canvas, 1e-3, boundary, Palette.BOUNDARY_WASH, LubricationRegime.BOUNDARY);
    regime(canvas, boundary, full, Palette.MIXED_WASH, LubricationRegime.MIXED);
    regime(canvas, full, 1e3, Palette.FILM_WASH, LubricationRegime.FULL_FILM);
    BasicStroke hair = new BasicStroke(0.6f);
    Rectangle2D area = canvas.plot();
    for (double tick : plot.across().ticks()) {
      double x = canvas.x(tick);
      canvas.line(x, area.getMinY(), x, area.getMaxY(), Palette.RULE, hair);
      canvas.textCentred(
          plot.across().text(tick), x, area.getMaxY() + 16, Palette.QUIET_INK, 11.5f);
    }
    for (int i = 1; i < rows.size(); i++) {
      double y = area.getMinY() + i * (double) ROW;
      canvas.line(area.getMinX(), y, area.getMaxX(), y, Palette.RULE, hair);
    }
    canvas.line(
        area.getMinX(), area.getMaxY(), area.getMaxX(), area.getMaxY(), Palette.QUIET_INK, hair);
  }

  private static void regime(
      Canvas canvas, double low, double high, Color wash, LubricationRegime regime) {
    Rectangle2D area = canvas.plot();
    double left = Math.max(area.getMinX(), Math.min(canvas.x(low), area.getMaxX()));
    double right = Math.max(area.getMinX(), Math.min(canvas.x(high), area.getMaxX()));
    if (right - left < 1) {
      return;
    }
    canvas.graphics().setColor(wash);
    canvas
        .graphics()
        .fill(new Rectangle2D.Double(left, area.getMinY(), right - left, area.getHeight()));
    if (right - left > canvas.widthOf(regime.label(), 11.5f) + 8) {
      canvas.text(regime.label(), left + 4, area.getMinY() - 6, Palette.QUIET_INK, 11.5f);
    }
  }

  private void rows(Graphics2D g, Canvas canvas) {
    Rectangle2D area = canvas.plot();
    for (int i = 0; i < rows.size(); i++) {
      FleetRow row = rows.get(i);
      double y = area.getMinY() + (i + 0.5) * ROW;
      steps(canvas, row, y);
      canvas.line(
          canvas.x(row.floor()),
          y - ROW / 2.0 + 2,
          canvas.x(row.floor()),
          y + ROW / 2.0 - 2,
          Palette.INK,
          new BasicStroke(1.2f, 0, 0, 10, new float[] {3, 2}, 0));
      canvas.line(
          canvas.x(row.film().uncertainty().low()),
          y + LANE,
          canvas.x(row.film().uncertainty().high()),
          y + LANE,
          Palette.KAPPA,
          new BasicStroke(1.2f));
      name(g, row, y);
      canvas.textLeftOf(
          KappaText.of(row.film().kappa()), area.getMaxX() + 44, y + 4, Palette.KAPPA, 12f);
      LevelShape.paint(g, row.film().level(), area.getMaxX() + 54, y);
      canvas.text(row.film().level().label(), area.getMaxX() + 66, y + 4, Palette.INK, 11.5f);
    }
  }

  private static void steps(Canvas canvas, FleetRow row, double y) {
    if (row.moved().isEmpty()) {
      return;
    }
    double fresh = canvas.x(row.fresh());
    double between = canvas.x(row.afterOil());
    double now = canvas.x(row.film().kappa());
    canvas.bar(fresh, between, y - LANE, THICK, Palette.VISCOSITY);
    Hatched.bar(canvas, between, now, y + LANE, THICK, Palette.TEMPERATURE);
    canvas.line(between, y - LANE, between, y + LANE, Palette.QUIET_INK, new BasicStroke(0.9f));
  }

  private static void name(Graphics2D g, FleetRow row, double y) {
    double room = LEFT - 32.0;
    g.setFont(ChartFont.of(11.5f));
    String bearing = Fitted.to(g, row.bearing(), room * 0.4);
    double width = g.getFontMetrics().stringWidth(bearing);
    g.setColor(Palette.QUIET_INK);
    g.drawString(bearing, (float) (-12 - width), (float) y + 4);
    g.setFont(ChartFont.bold(11.5f));
    g.setColor(Palette.INK);
    String asset = Fitted.to(g, row.asset(), room - width - 8);
    g.drawString(asset, (float) (20 - LEFT), (float) y + 4);
  }
}
