package org.kappatrail.report.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.function.DoubleUnaryOperator;

/** Draws over or under a panel's plot in its own coordinates. */
final class Canvas {
  private final Graphics2D g;
  private final Rectangle2D plot;
  private final DoubleUnaryOperator xOf;
  private final DoubleUnaryOperator yOf;

  Canvas(Graphics2D g, Rectangle2D plot, DoubleUnaryOperator xOf, DoubleUnaryOperator yOf) {
    this.g = g;
    this.plot = plot;
    this.xOf = xOf;
    this.yOf = yOf;
  }

  Rectangle2D plot() {
    return plot;
  }

  /** Horizontal place of a day number, px. */
  double x(double day) {
    return xOf.applyAsDouble(day);
  }

  /** Vertical place of a value, px. */
  double y(double value) {
    return yOf.applyAsDouble(value);
  }

  /** Fills the plot's width between two values. */
  void band(double low, double high, Color colour) {
    double top = Math.max(plot.getMinY(), Math.min(y(high), plot.getMaxY()));
    double bottom = Math.max(plot.getMinY(), Math.min(y(low), plot.getMaxY()));
    if (bottom - top > 0.5) {
      g.setColor(colour);
      g.fill(new Rectangle2D.Double(plot.getX(), top, plot.getWidth(), bottom - top));
    }
  }

  /** Fills between two lines over the same days. */
  void ribbon(double[] days, double[] low, double[] high, Color colour) {
    if (days.length < 2) {
      return;
    }
    Path2D area = new Path2D.Double();
    area.moveTo(x(days[0]), inside(y(high[0])));
    for (int i = 1; i < days.length; i++) {
      area.lineTo(x(days[i]), inside(y(high[i])));
    }
    for (int i = days.length - 1; i >= 0; i--) {
      area.lineTo(x(days[i]), inside(y(low[i])));
    }
    area.closePath();
    g.setColor(colour);
    g.fill(area);
  }

  void polyline(double[] days, double[] values, Color colour, BasicStroke stroke) {
    if (days.length < 2) {
      return;
    }
    Path2D line = new Path2D.Double();
    line.moveTo(x(days[0]), inside(y(values[0])));
    for (int i = 1; i < days.length; i++) {
      line.lineTo(x(days[i]), inside(y(values[i])));
    }
    g.setColor(colour);
    g.setStroke(stroke);
    g.draw(line);
  }

  void horizontal(double value, Color colour, BasicStroke stroke) {
    line(plot.getMinX(), y(value), plot.getMaxX(), y(value), colour, stroke);
  }

  /** A whisker from one value to another. */
  void whisker(double day, double low, double high, Color colour) {
    double x = x(day);
    line(x, inside(y(low)), x, inside(y(high)), colour, new BasicStroke(1.1f));
  }

  /** A ring on paper over a point: a censored value. */
  void ring(double day, double value, Color colour) {
    Ellipse2D ring = new Ellipse2D.Double(x(day) - 3.6, y(value) - 3.6, 7.2, 7.2);
    g.setColor(Palette.PAPER);
    g.fill(ring);
    g.setColor(colour);
    g.setStroke(new BasicStroke(1.1f));
    g.draw(ring);
  }

  /** A bar from one place to another, centred on a height, px. */
  void bar(double from, double to, double y, double thick, Color colour) {
    double left = Math.min(from, to);
    double right = Math.max(from, to);
    g.setColor(colour);
    g.fill(new Rectangle2D.Double(left, y - thick / 2, right - left, thick));
  }

  /** A filled diamond, place and half width in px. */
  void diamond(double x, double y, double half, Color colour) {
    Path2D shape = new Path2D.Double();
    shape.moveTo(x, y - half);
    shape.lineTo(x + half, y);
    shape.lineTo(x, y + half);
    shape.lineTo(x - half, y);
    shape.closePath();
    g.setColor(colour);
    g.fill(shape);
  }

  void line(double x1, double y1, double x2, double y2, Color colour, BasicStroke stroke) {
    g.setColor(colour);
    g.setStroke(stroke);
    g.draw(new Line2D.Double(x1, y1, x2, y2));
  }

  void text(String text, double x, double y, Color colour, float size) {
    g.setColor(colour);
    g.setFont(ChartFont.of(size));
    g.drawString(PlainText.of(text), (float) x, (float) y);
  }

  /** Text that ends at x. */
  void textLeftOf(String text, double x, double y, Color colour, float size) {
    g.setFont(ChartFont.of(size));
    text(text, x - g.getFontMetrics().stringWidth(text), y, colour, size);
  }

  /** Text centred at x. */
  void textCentred(String text, double x, double y, Color colour, float size) {
    g.setFont(ChartFont.of(size));
    text(text, x - g.getFontMetrics().stringWidth(text) / 2.0, y, colour, size);
  }

  double widthOf(String text, float size) {
    g.setFont(ChartFont.of(size));
    return g.getFontMetrics().stringWidth(text);
  }

  Graphics2D graphics() {
    return g;
  }

  private double inside(double y) {
    return Math.max(plot.getMinY(), Math.min(plot.getMaxY(), y));
  }
}
