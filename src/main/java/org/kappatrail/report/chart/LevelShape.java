package org.kappatrail.report.chart;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import org.kappatrail.review.Level;

/** A level as shape: thin ring, half-filled diamond, filled square, in ink. */
final class LevelShape {
  private static final double HALF = 4.5;

  private LevelShape() {}

  /** Paints the shape with its middle at a place, px. */
  static void paint(Graphics2D g, Level level, double x, double y) {
    g.setColor(Palette.INK);
    g.setStroke(new BasicStroke(1.1f));
    switch (level) {
      case CLEAR ->
          g.draw(new Ellipse2D.Double(x - HALF + 0.5, y - HALF + 0.5, 2 * HALF - 1, 2 * HALF - 1));
      case ALERT -> {
        g.fill(half(x, y));
        g.draw(diamond(x, y));
      }
      case ALARM ->
          g.fill(
              new Rectangle2D.Double(x - HALF + 0.5, y - HALF + 0.5, 2 * HALF - 1, 2 * HALF - 1));
    }
  }

  private static Path2D half(double x, double y) {
    Path2D path = new Path2D.Double();
    path.moveTo(x, y - HALF);
    path.lineTo(x, y + HALF);
    path.lineTo(x - HALF, y);
    path.closePath();
    return path;
  }

  private static Path2D diamond(double x, double y) {
    Path2D path = new Path2D.Double();
    path.moveTo(x, y - HALF);
    path.lineTo(x + HALF, y);
    path.lineTo(x, y + HALF);
    path.lineTo(x - HALF, y);
    path.closePath();
    return path;
  }
}
