package org.kappatrail.report.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;

/** A bar of slanting lines, drawn one by one so that raster and vector look alike. */
final class Hatched {
  private static final double STEP = 4;

  private Hatched() {}

  /** A hatched bar from one place to another, centred on a height, px. */
  static void bar(Canvas canvas, double from, double to, double y, double thick, Color ink) {
    bar(canvas.graphics(), Math.min(from, to), Math.max(from, to), y, thick, ink);
  }

  static void bar(Graphics2D g, double left, double right, double y, double thick, Color ink) {
    if (right - left < 0.5) {
      return;
    }
    double top = y - thick / 2;
    double bottom = y + thick / 2;
    g.setColor(Palette.PAPER);
    g.fill(new Rectangle2D.Double(left, top, right - left, thick));
    g.setColor(ink);
    g.setStroke(new BasicStroke(1.3f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER));
    for (double x = left - thick; x < right; x += STEP) {
      double low = Math.max(x, left);
      double high = Math.min(x + thick, right);
      if (high > low) {
        g.draw(new Line2D.Double(low, bottom - (low - x), high, bottom - (high - x)));
      }
    }
    g.setStroke(new BasicStroke(0.8f));
    g.draw(new Rectangle2D.Double(left, top, right - left, thick));
  }
}
