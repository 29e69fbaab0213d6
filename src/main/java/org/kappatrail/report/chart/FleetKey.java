package org.kappatrail.report.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;

/** What the marks of the fleet picture mean, on one line. */
final class FleetKey {
  private static final double GAP = 20;

  private final Graphics2D g;

  FleetKey(Graphics2D g) {
    this.g = g;
  }

  void paint(double left, double y) {
    double x = left;
    dot(x + 4, y, Palette.wash(Palette.KAPPA, 0.45));
    x = text("registered oil when fresh, where the charge began", x + 14, y);
    g.setColor(Palette.VISCOSITY);
    g.fill(new Rectangle2D.Double(x, y - 2.5, 26, 5));
    x = text("what the oil did", x + 32, y);
    Hatched.bar(g, x, x + 26, y, 5, Palette.TEMPERATURE);
    x = text("what temperature and speed did", x + 32, y);
    g.setColor(Palette.KAPPA);
    g.setStroke(new BasicStroke(1.2f));
    g.draw(new Line2D.Double(x, y, x + 24, y));
    dot(x + 12, y, Palette.KAPPA);
    x = text("κ now", x + 30, y);
    g.setColor(Palette.INK);
    g.setStroke(new BasicStroke(1.2f, 0, 0, 10, new float[] {3, 2}, 0));
    g.draw(new Line2D.Double(x + 2, y - 8, x + 2, y + 8));
    text("floor", x + 9, y);
  }

  private void dot(double x, double y, Color ink) {
    g.setColor(ink);
    g.fill(new Ellipse2D.Double(x - 3.5, y - 3.5, 7, 7));
  }

  private double text(String words, double x, double y) {
    g.setColor(Palette.QUIET_INK);
    g.setFont(ChartFont.of(11.5f));
    g.drawString(words, (float) x, (float) y + 4);
    return x + g.getFontMetrics().stringWidth(words) + GAP;
  }
}
