package org.kappatrail.report.slides;

import java.awt.Color;
import java.util.Locale;
import org.apache.poi.xslf.usermodel.XSLFAutoShape;
import org.apache.xmlbeans.XmlCursor;
import org.apache.xmlbeans.XmlException;
import org.apache.xmlbeans.XmlObject;
import org.openxmlformats.schemas.presentationml.x2006.main.CTShape;

/** Fills a shape with diagonal lines; set as XML, as the library has no call for it. */
final class Hatch {
  private Hatch() {}

  /** Takes the place of the shape's solid fill. */
  static void fill(XSLFAutoShape shape, Color ink, Color paper) {
    String pattern =
        "<a:pattFill xmlns:a=\"http://schemas.openxmlformats.org/drawingml/2006/main\""
            + " prst=\"wdUpDiag\"><a:fgClr><a:srgbClr val=\""
            + hex(ink)
            + "\"/></a:fgClr><a:bgClr><a:srgbClr val=\""
            + hex(paper)
            + "\"/></a:bgClr></a:pattFill>";
    CTShape xml = (CTShape) shape.getXmlObject();
    try (XmlCursor place = xml.getSpPr().getSolidFill().newCursor();
        XmlCursor source = XmlObject.Factory.parse(pattern).newCursor()) {
      source.toFirstChild();
      source.copyXml(place);
      place.removeXml();
    } catch (XmlException e) {
      throw new IllegalStateException(e);
    }
  }

  /** A colour as drawings write it. */
  static String hex(Color colour) {
    return String.format(Locale.ROOT, "%06X", colour.getRGB() & 0xFFFFFF);
  }
}
