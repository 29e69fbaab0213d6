package org.kappatrail.report.chart;

import java.awt.Color;
import java.awt.geom.Rectangle2D;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.kappatrail.review.correlation.AssetSeries;
import org.kappatrail.review.correlation.Names;
import org.kappatrail.review.correlation.PairCorrelation;
import org.kappatrail.review.correlation.Variable;
import org.knowm.xchart.style.markers.SeriesMarkers;

/** One pair of an asset at its lag, its samples joined in the order of time. */
final class PairScatter {
  private static final float DATE_SIZE = 11f;
  private static final String PARTICLES = "particles_";
  private static final List<String> AFTER =
      List.of("in the same sample", "one sample", "two samples", "three samples");
  private static final Map<String, Color> INKS =
      Map.of(
          Names.KAPPA,
          Palette.KAPPA,
          Names.KAPPA_REFERENCE,
          Palette.KAPPA,
          Names.TEMPERATURE,
          Palette.TEMPERATURE,
          "viscosity_40c_cst",
          Palette.VISCOSITY,
          "water_ppm",
          Palette.WATER,
          "iron_ppm",
          Palette.IRON);

  private PairScatter() {}

  private record Point(LocalDate day, double x, double y) {}

  /** The scatter of a pair that the series holds. */
  static Plot of(AssetSeries series, PairCorrelation pair, int width, int height) {
    List<Point> points = points(series, pair);
    double[] xs = points.stream().mapToDouble(Point::x).toArray();
    double[] ys = points.stream().mapToDouble(Point::y).toArray();
    Color ink = ink(pair.y());
    Plot plot =
        new Plot(
            title(pair),
            capital(Names.withUnit(pair.x())),
            width,
            height,
            axis(pair.x(), xs),
            axis(pair.y(), ys));
    plot.series("samples", xs, ys, ink, Palette.wash(ink, 0.35), 0.9f, SeriesMarkers.CIRCLE);
    return plot.over(
        canvas -> {
          Point first = points.get(0);
          Point last = points.get(points.size() - 1);
          canvas.ring(first.x(), first.y(), ink);
          List<Rectangle2D> taken = new ArrayList<>();
          for (Point point : points) {
            taken.add(around(canvas.x(point.x()), canvas.y(point.y()), 5, 5));
          }
          date(canvas, first, taken);
          date(canvas, last, taken);
          canvas.text(
              "joined in the order of time, from the ring on",
              canvas.plot().getMinX(),
              -10,
              Palette.QUIET_INK,
              11f);
        });
  }

  /** Writes the day of a point beside it, where the fewest points and words are. */
  private static void date(Canvas canvas, Point point, List<Rectangle2D> taken) {
    String text = point.day().toString();
    double half = canvas.widthOf(text, DATE_SIZE) / 2;
    double x = canvas.x(point.x());
    double y = canvas.y(point.y());
    Rectangle2D place =
        Stream.of(
                around(x, y - 13, half, 6),
                around(x, y + 13, half, 6),
                around(x + half + 9, y, half, 6),
                around(x - half - 9, y, half, 6))
            .min(Comparator.comparingLong(box -> cost(canvas, box, taken)))
            .orElseThrow();
    taken.add(place);
    canvas.text(text, (float) place.getMinX(), place.getMaxY() - 2, Palette.INK, DATE_SIZE);
  }

  private static long cost(Canvas canvas, Rectangle2D box, List<Rectangle2D> taken) {
    long outside = canvas.plot().contains(box) ? 0 : taken.size();
    return outside + taken.stream().filter(box::intersects).count();
  }

  private static Rectangle2D around(double x, double y, double halfWidth, double halfHeight) {
    return new Rectangle2D.Double(x - halfWidth, y - halfHeight, 2 * halfWidth, 2 * halfHeight);
  }

  private static List<Point> points(AssetSeries series, PairCorrelation pair) {
    Variable x = variable(series, pair.x());
    Variable y = variable(series, pair.y());
    List<Point> points = new ArrayList<>();
    for (int i = 0; i < x.size(); i++) {
      int j = i + pair.lag();
      if (j >= 0 && j < x.size() && x.has(i) && y.has(j)) {
        points.add(
            new Point(
                LocalDate.ofEpochDay((long) Math.floor(series.days().get(i))),
                shown(pair.x(), x.arithmetic(i)),
                shown(pair.y(), y.arithmetic(j))));
      }
    }
    return points;
  }

  private static Variable variable(AssetSeries series, String name) {
    return series.variables().stream()
        .filter(variable -> variable.name().equals(name))
        .findFirst()
        .orElseThrow();
  }

  /** Counts are drawn as counts, on a logarithmic axis. */
  private static double shown(String name, double value) {
    return name.startsWith(PARTICLES) ? Math.pow(10, value) : value;
  }

  private static Axis axis(String name, double[] values) {
    double least = java.util.Arrays.stream(values).min().orElse(0);
    double most = java.util.Arrays.stream(values).max().orElse(1);
    return name.startsWith(PARTICLES) ? Axis.log(least, most) : Axis.linear(least, most);
  }

  private static String title(PairCorrelation pair) {
    String y = capital(Names.withUnit(pair.y()));
    int lag = pair.lag();
    if (lag == 0) {
      return y + ", against " + Names.of(pair.x()) + " " + AFTER.get(0);
    }
    return y
        + ", "
        + AFTER.get(Math.abs(lag))
        + (lag > 0 ? " after " : " before ")
        + Names.of(pair.x());
  }

  private static Color ink(String name) {
    return name.startsWith(PARTICLES)
        ? Palette.PARTICLES
        : INKS.getOrDefault(name, Palette.QUIET_INK);
  }

  private static String capital(String text) {
    return text.startsWith("κ")
        ? text
        : text.substring(0, 1).toUpperCase(java.util.Locale.ROOT) + text.substring(1);
  }
}
