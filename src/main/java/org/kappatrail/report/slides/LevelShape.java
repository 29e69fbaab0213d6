package org.kappatrail.report.slides;

import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import org.apache.poi.sl.usermodel.ShapeType;
import org.apache.poi.xslf.usermodel.XSLFAutoShape;
import org.apache.poi.xslf.usermodel.XSLFFreeformShape;
import org.apache.poi.xslf.usermodel.XSLFSlide;
import org.kappatrail.report.chart.Palette;
import org.kappatrail.review.Level;

/** A level's mark in ink: thin ring, half-filled diamond, filled square. */
final class LevelShape {
  private LevelShape() {}

  /** Draws the mark into a square of a side around a centre. */
  static void draw(XSLFSlide slide, Level level, double centreX, double centreY, double side) {
    Rectangle2D square = new Rectangle2D.Double(centreX - side / 2, centreY - side / 2, side, side);
    switch (level) {
      case CLEAR -> outline(slide, ShapeType.ELLIPSE, square);
      case ALERT -> {
        outline(slide, ShapeType.DIAMOND, square);
        half(slide, square);
      }
      case ALARM -> {
        XSLFAutoShape mark = outline(slide, ShapeType.RECT, square);
        mark.setFillColor(Palette.INK);
        Themed.ink(mark);
      }
    }
  }

  private static XSLFAutoShape outline(XSLFSlide slide, ShapeType kind, Rectangle2D square) {
    XSLFAutoShape mark = slide.createAutoShape();
    mark.setShapeType(kind);
    mark.setAnchor(square);
    mark.setFillColor(null);
    mark.setLineColor(Palette.INK);
    mark.setLineWidth(1.25);
    Themed.ink(mark);
    return mark;
  }

  private static void half(XSLFSlide slide, Rectangle2D square) {
    Path2D.Double left = new Path2D.Double();
    left.moveTo(square.getCenterX(), square.getMinY());
    left.lineTo(square.getCenterX(), square.getMaxY());
    left.lineTo(square.getMinX(), square.getCenterY());
    left.closePath();
    XSLFFreeformShape mark = slide.createFreeform();
    mark.setPath(left);
    mark.setFillColor(Palette.INK);
    mark.setLineColor(Palette.INK);
    mark.setLineWidth(0.5);
    Themed.ink(mark);
  }
}
