package org.kappatrail.report.slides;

import org.apache.poi.xslf.usermodel.XSLFSimpleShape;
import org.openxmlformats.schemas.drawingml.x2006.main.CTLineProperties;
import org.openxmlformats.schemas.drawingml.x2006.main.CTShapeProperties;
import org.openxmlformats.schemas.drawingml.x2006.main.CTSolidColorFillProperties;
import org.openxmlformats.schemas.drawingml.x2006.main.STSchemeColorVal;
import org.openxmlformats.schemas.presentationml.x2006.main.CTShape;

/** Draws in the colour of the template's text, so that marks stand out on a dark page too. */
final class Themed {
  private Themed() {}

  /** Gives a shape's outline, and its fill where it is filled, the colour of the text. */
  static void ink(XSLFSimpleShape shape) {
    CTShapeProperties properties = ((CTShape) shape.getXmlObject()).getSpPr();
    if (properties.isSetSolidFill()) {
      text(properties.getSolidFill());
    }
    CTLineProperties line = properties.getLn();
    if (line != null && line.isSetSolidFill()) {
      text(line.getSolidFill());
    }
  }

  private static void text(CTSolidColorFillProperties fill) {
    if (fill.isSetSrgbClr()) {
      fill.unsetSrgbClr();
    }
    if (!fill.isSetSchemeClr()) {
      fill.addNewSchemeClr().setVal(STSchemeColorVal.TX_1);
    }
  }
}
