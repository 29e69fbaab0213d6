package org.kappatrail.report.slides;

import java.awt.Color;
import java.io.StringWriter;
import java.util.Locale;
import javax.xml.stream.XMLOutputFactory;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamWriter;

/**
 * Writes the elements of which charts are made, in the XML of office drawings (ECMA-376 part 1).
 */
final class DrawingXml {
  private static final String CHART = "http://schemas.openxmlformats.org/drawingml/2006/chart";
  private static final String DRAWING = "http://schemas.openxmlformats.org/drawingml/2006/main";
  private static final int EMU = 12_700;

  private final StringWriter text = new StringWriter();
  private final XMLStreamWriter xml;

  /** Begins a chart. */
  DrawingXml() throws XMLStreamException {
    xml = XMLOutputFactory.newInstance().createXMLStreamWriter(text);
    xml.setPrefix("c", CHART);
    xml.setPrefix("a", DRAWING);
    open("chartSpace");
    xml.writeNamespace("c", CHART);
    xml.writeNamespace("a", DRAWING);
  }

  /** Ends the chart and gives its text. */
  String end() throws XMLStreamException {
    close();
    xml.flush();
    return text.toString();
  }

  void characters(String content) throws XMLStreamException {
    xml.writeCharacters(content);
  }

  void noFill() throws XMLStreamException {
    xml.writeEmptyElement("a", "noFill", DRAWING);
  }

  void layout(boolean inner, double x, double y, double width, double height)
      throws XMLStreamException {
    open("layout");
    open("manualLayout");
    if (inner) {
      value("layoutTarget", "inner");
    }
    value("xMode", "edge");
    value("yMode", "edge");
    value("x", number(x));
    value("y", number(y));
    if (width > 0) {
      value("w", number(width));
      value("h", number(height));
    }
    close();
    close();
  }

  void textProperties(double points, Color ink, boolean strong) throws XMLStreamException {
    open("txPr");
    drawing("bodyPr");
    attribute("rot", "0");
    attribute("vert", "horz");
    close();
    drawing("p");
    drawing("pPr");
    drawing("defRPr");
    attribute("sz", hundredths(points));
    attribute("b", strong ? "1" : "0");
    solid(ink);
    close();
    close();
    drawing("endParaRPr");
    attribute("lang", "en-GB");
    close();
    close();
    close();
  }

  void line(Color ink, double points, String dash) throws XMLStreamException {
    if (points == 0) {
      noLine();
      return;
    }
    drawing("ln");
    attribute("w", Integer.toString((int) Math.round(points * EMU)));
    solid(ink);
    drawing("prstDash");
    attribute("val", dash);
    close();
    close();
  }

  void noLine() throws XMLStreamException {
    drawing("ln");
    noFill();
    close();
  }

  void solid(Color colour) throws XMLStreamException {
    drawing("solidFill");
    drawing("srgbClr");
    attribute("val", Hatch.hex(colour));
    close();
    close();
  }

  void open(String name) throws XMLStreamException {
    xml.writeStartElement("c", name, CHART);
  }

  void drawing(String name) throws XMLStreamException {
    xml.writeStartElement("a", name, DRAWING);
  }

  void close() throws XMLStreamException {
    xml.writeEndElement();
  }

  void attribute(String name, String value) throws XMLStreamException {
    xml.writeAttribute(name, value);
  }

  void value(String name, String value) throws XMLStreamException {
    open(name);
    attribute("val", value);
    close();
  }

  void element(String name, String content) throws XMLStreamException {
    open(name);
    xml.writeCharacters(content);
    close();
  }

  static String hundredths(double points) {
    return Integer.toString((int) Math.round(points * 100));
  }

  static String number(double value) {
    return String.format(Locale.ROOT, "%.6g", value);
  }
}
