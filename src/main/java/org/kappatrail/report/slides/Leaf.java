package org.kappatrail.report.slides;

import java.awt.geom.Rectangle2D;
import org.apache.poi.xslf.usermodel.XSLFSlide;

/**
 * A slide with its headline set.
 *
 * @param slide the slide
 * @param fit measures its text
 * @param room where there is room under the headline, points
 */
record Leaf(XSLFSlide slide, TextFit fit, Rectangle2D room) {
  Box box(Rectangle2D place) {
    return new Box(slide, fit, place);
  }

  Box box(double x, double y, double width, double height) {
    return box(new Rectangle2D.Double(x, y, width, height));
  }
}
