package org.kappatrail.report.page;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.KappaPoint;

/** κ of a bearing over its samples in the height of a line, with its floor. */
final class Sparkline {
  private static final double WIDTH = 120;
  private static final double HEIGHT = 22;
  private static final double MARGIN = 3;

  private Sparkline() {}

  static String of(BearingReview bearing) {
    List<double[]> points = new ArrayList<>();
    for (KappaPoint point : bearing.trail()) {
      point
          .film()
          .ifPresent(
              film ->
                  points.add(
                      new double[] {point.sample().day().toEpochDay(), Math.log(film.kappa())}));
    }
    if (points.size() < 2) {
      return "";
    }
    double floor = Math.log(bearing.floor());
    double from = points.get(0)[0];
    double to = Math.max(from + 1, points.get(points.size() - 1)[0]);
    double low = Math.min(floor, points.stream().mapToDouble(p -> p[1]).min().orElse(0)) - 0.05;
    double high = Math.max(floor, points.stream().mapToDouble(p -> p[1]).max().orElse(0)) + 0.05;
    StringBuilder line = new StringBuilder();
    double x = 0;
    double y = 0;
    for (double[] point : points) {
      x = MARGIN + (point[0] - from) / (to - from) * (WIDTH - 2 * MARGIN);
      y = y(point[1], low, high);
      line.append(line.isEmpty() ? "M" : "L").append(number(x)).append(' ').append(number(y));
    }
    String floorY = number(y(floor, low, high));
    return "<svg class=\"spark\" viewBox=\"0 0 120 22\" width=\"120\" height=\"22\" role=\"img\""
        + " aria-label=\"κ over its samples\"><path class=\"spark-floor\" d=\"M3 "
        + floorY
        + "L117 "
        + floorY
        + "\"/><path class=\"spark-line\" d=\""
        + line
        + "\"/><circle class=\"spark-end\" cx=\""
        + number(x)
        + "\" cy=\""
        + number(y)
        + "\" r=\"2.4\"/></svg>";
  }

  private static double y(double value, double low, double high) {
    return HEIGHT - MARGIN - (value - low) / (high - low) * (HEIGHT - 2 * MARGIN);
  }

  private static String number(double value) {
    return String.format(Locale.ROOT, "%.1f", value);
  }
}
