package org.kappatrail.report.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.DayKappa;
import org.kappatrail.review.Film;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.tribology.LubricationRegime;
import org.knowm.xchart.style.markers.SeriesMarkers;

/**
 * κ against time on a log axis: regimes as named washes, the floor, the governing bearing's samples
 * with their intervals and its daily band; the other bearings as thin lines.
 */
final class KappaPanel {
  private static final int HEIGHT = 290;

  /** More lines than this cannot be told apart; the table has them all. */
  private static final int MOST_OTHERS = 3;

  private static final List<Regime> REGIMES =
      List.of(
          new Regime(
              1e-3,
              LubricationRegime.MIXED_FROM,
              Palette.BOUNDARY_WASH,
              LubricationRegime.BOUNDARY.label()),
          new Regime(
              LubricationRegime.MIXED_FROM,
              LubricationRegime.FULL_FILM_FROM,
              Palette.MIXED_WASH,
              LubricationRegime.MIXED.label()),
          new Regime(
              LubricationRegime.FULL_FILM_FROM,
              1e3,
              Palette.FILM_WASH,
              LubricationRegime.FULL_FILM.label()));

  /** A regime's band on the axis. */
  private record Regime(double low, double high, Color wash, String name) {}

  private final AssetReview asset;
  private final BearingReview shown;

  private KappaPanel(AssetReview asset, BearingReview shown) {
    this.asset = asset;
    this.shown = shown;
  }

  static Optional<Panel> of(AssetReview asset, BearingReview shown, TimeSpan span) {
    Points points = AssetChart.kappaPoints(shown);
    return points.isEmpty()
        ? Optional.empty()
        : Optional.of(new KappaPanel(asset, shown).panel(points, span));
  }

  private Panel panel(Points points, TimeSpan span) {
    List<BearingReview> others =
        asset.bearings().stream()
            .filter(bearing -> !bearing.bearing().id().equals(shown.bearing().id()))
            .filter(bearing -> !AssetChart.kappaPoints(bearing).isEmpty())
            .limit(MOST_OTHERS)
            .toList();
    TrendOnPanel trend = new TrendOnPanel(shown);
    Panel panel =
        new Panel(
                "κ, viscosity ratio (" + shown.bearing().id() + ")",
                Palette.KAPPA,
                HEIGHT,
                span,
                axis(others))
            .under(this::washes)
            .under(canvas -> daily(canvas))
            .under(trend::under)
            .over(trend::over)
            .note(trend.note(span))
            .over(this::regimeNames)
            .over(this::floor)
            .over(this::whiskers);
    Color thin = Palette.wash(Palette.KAPPA, 0.55);
    for (BearingReview other : others) {
      Points line = AssetChart.kappaPoints(other);
      panel.series(
          "κ " + other.bearing().id(), line.days(), line.values(), thin, 1f, SeriesMarkers.NONE);
    }
    panel.over(canvas -> names(canvas, others));
    return panel.series(
        "κ " + shown.bearing().id(),
        points.days(),
        points.values(),
        Palette.KAPPA,
        1.6f,
        SeriesMarkers.CIRCLE);
  }

  private Axis axis(List<BearingReview> others) {
    List<Double> values = new ArrayList<>(List.of(shown.floor(), 1.0));
    films(shown)
        .forEach(
            film -> {
              values.add(film.uncertainty().low());
              values.add(film.uncertainty().high());
            });
    values.addAll(TrendOnPanel.values(shown));
    others.forEach(other -> films(other).forEach(film -> values.add(film.kappa())));
    shown.days().stream()
        .filter(day -> day.kappa().isPresent())
        .forEach(
            day -> {
              values.add(day.kappa().getAsDouble());
            });
    double least = values.stream().mapToDouble(v -> v).min().orElseThrow();
    double most = values.stream().mapToDouble(v -> v).max().orElseThrow();
    return Axis.log(Math.max(least, 0.02), Math.min(most, 100));
  }

  private static List<Film> films(BearingReview bearing) {
    return bearing.trail().stream().map(KappaPoint::film).flatMap(Optional::stream).toList();
  }

  private void washes(Canvas canvas) {
    for (Regime regime : REGIMES) {
      canvas.band(regime.low(), regime.high(), regime.wash());
    }
  }

  private void regimeNames(Canvas canvas) {
    for (Regime regime : REGIMES) {
      name(canvas, regime.low(), regime.high(), regime.name());
    }
  }

  private static void name(Canvas canvas, double low, double high, String name) {
    Rectangle2D plot = canvas.plot();
    double top = Math.max(plot.getMinY(), canvas.y(high));
    double bottom = Math.min(plot.getMaxY(), canvas.y(low));
    if (bottom - top > 16) {
      canvas.text(name, plot.getMinX() + 6, bottom - 5, Palette.QUIET_INK, 11.5f);
    }
  }

  private void daily(Canvas canvas) {
    List<DayKappa> days = shown.days().stream().filter(day -> day.kappa().isPresent()).toList();
    double[] x = days.stream().mapToDouble(day -> day.date().toEpochDay() + 0.5).toArray();
    double[] low = days.stream().mapToDouble(day -> day.kappaP05().getAsDouble()).toArray();
    double[] high = days.stream().mapToDouble(day -> day.kappaP95().getAsDouble()).toArray();
    DayLine.ribbon(canvas, x, low, high, Palette.wash(Palette.KAPPA, 0.22));
  }

  private void floor(Canvas canvas) {
    canvas.horizontal(shown.floor(), Palette.INK, AssetChart.dashed(1.2f));
    canvas.text(
        "floor " + Axis.log(0.1, 10).text(shown.floor()),
        canvas.plot().getMaxX() + 6,
        canvas.y(shown.floor()) + 4,
        Palette.INK,
        11.5f);
  }

  private void whiskers(Canvas canvas) {
    for (KappaPoint point : shown.trail()) {
      point
          .film()
          .ifPresent(
              film ->
                  canvas.whisker(
                      (double) point.sample().day().toEpochDay(),
                      film.uncertainty().low(),
                      film.uncertainty().high(),
                      Palette.KAPPA));
    }
  }

  private void names(Canvas canvas, List<BearingReview> others) {
    List<Double> taken = new ArrayList<>(List.of(canvas.y(shown.floor())));
    for (BearingReview other : others) {
      Points line = AssetChart.kappaPoints(other);
      double y = canvas.y(line.values()[line.values().length - 1]);
      double free = Labels.free(taken, y);
      canvas.text(
          other.bearing().id(),
          canvas.plot().getMaxX() + 6,
          free + 4,
          Palette.wash(Palette.KAPPA, 0.75),
          11.5f);
      canvas.line(
          canvas.plot().getMaxX(),
          y,
          canvas.plot().getMaxX() + 4,
          free,
          Palette.wash(Palette.KAPPA, 0.55),
          new BasicStroke(0.8f));
    }
  }
}
