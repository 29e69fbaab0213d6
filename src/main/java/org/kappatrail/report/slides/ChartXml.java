package org.kappatrail.report.slides;

import java.awt.Color;
import java.awt.geom.Rectangle2D;
import java.io.StringWriter;
import java.time.LocalDate;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.SortedMap;
import javax.xml.stream.XMLOutputFactory;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamWriter;
import org.kappatrail.report.chart.Palette;
import org.kappatrail.report.table.SixDigits;

/**
 * A chart in the XML of office drawings (ECMA-376 part 1, 21.2), whose order of elements is fixed.
 * Written here, as the library knows no single calls for logarithmic areas on a date axis, whiskers
 * from cells and labels of series together.
 */
final class ChartXml {
  private static final String CHART = "http://schemas.openxmlformats.org/drawingml/2006/chart";
  private static final String DRAWING = "http://schemas.openxmlformats.org/drawingml/2006/main";
  private static final String GENERAL = "General";
  private static final String DATES = "yyyy-mm-dd";

  private static final double TEXT = 12;
  private static final double TITLE_TEXT = 14;
  private static final double LEGEND_KEY = 40;
  private static final double TITLE_GAP = 30;
  private static final double AXIS_ROOM = 40;
  private static final double TICK_ROOM = 54;
  private static final double LEGEND_LINE = 22;
  private static final int EMU = 12_700;

  private static final int DAY_AXIS = 1;
  private static final int LEFT_AXIS = 2;
  private static final int HIDDEN_DAY_AXIS = 3;
  private static final int RIGHT_AXIS = 4;

  private final NativeChart chart;
  private final Rectangle2D place;
  private final double legendFrom;
  private final double legendHeight;
  private final int mostTicks;
  private final StringWriter text = new StringWriter();
  private final XMLStreamWriter xml;

  /** The XML of a chart that takes a place on a slide. */
  ChartXml(NativeChart chart, Rectangle2D place, TextFit fit) {
    this.chart = chart;
    this.place = place;
    legendFrom = fit.width(chart.title(), TITLE_TEXT, true) + TITLE_GAP;
    double keys =
        chart.series().stream()
            .filter(ChartSeries::inLegend)
            .mapToDouble(
                item -> fit.width(chart.sheet().name(item.column()), TEXT, false) + LEGEND_KEY)
            .sum();
    legendHeight = (keys > place.getWidth() - legendFrom ? 2 : 1) * LEGEND_LINE;
    mostTicks = (int) Math.max(2, (place.getWidth() - 2 * AXIS_ROOM) / TICK_ROOM);
    try {
      xml = XMLOutputFactory.newInstance().createXMLStreamWriter(text);
    } catch (XMLStreamException e) {
      throw new IllegalStateException(e);
    }
  }

  String text() {
    try {
      write();
    } catch (XMLStreamException e) {
      throw new IllegalStateException(e);
    }
    return text.toString();
  }

  private void write() throws XMLStreamException {
    xml.setPrefix("c", CHART);
    xml.setPrefix("a", DRAWING);
    open("chartSpace");
    xml.writeNamespace("c", CHART);
    xml.writeNamespace("a", DRAWING);
    value("date1904", "0");
    value("roundedCorners", "0");
    open("chart");
    title();
    value("autoTitleDeleted", "0");
    plot();
    legend();
    value("plotVisOnly", "1");
    value("dispBlanksAs", "span");
    close();
    open("spPr");
    solid(Palette.PAPER);
    noLine();
    close();
    textProperties(TEXT, Palette.INK, false);
    close();
    xml.flush();
  }

  private void title() throws XMLStreamException {
    open("title");
    open("tx");
    open("rich");
    drawing("bodyPr");
    close();
    drawing("p");
    drawing("r");
    drawing("rPr");
    attribute("lang", "en-GB");
    attribute("sz", hundredths(TITLE_TEXT));
    attribute("b", "1");
    solid(chart.right().isPresent() ? Palette.INK : chart.left().ink());
    close();
    drawing("t");
    xml.writeCharacters(chart.title());
    close();
    close();
    close();
    close();
    close();
    layout(false, 0.01, 0.01, 0, 0);
    value("overlay", "1");
    close();
  }

  /** Both charts of an asset have their plot between the same edges. */
  private void plot() throws XMLStreamException {
    open("plotArea");
    double top = (legendHeight + 8) / place.getHeight();
    double foot = 24 / place.getHeight();
    layout(
        true,
        AXIS_ROOM / place.getWidth(),
        top,
        1 - 2 * AXIS_ROOM / place.getWidth(),
        1 - top - foot);
    group("areaChart", ChartSeries.Kind.AREA, DAY_AXIS, LEFT_AXIS);
    group("lineChart", ChartSeries.Kind.LINE, DAY_AXIS, LEFT_AXIS);
    group("lineChart", ChartSeries.Kind.LINE_RIGHT, HIDDEN_DAY_AXIS, RIGHT_AXIS);
    dayAxis(DAY_AXIS, LEFT_AXIS, true);
    valueAxis(LEFT_AXIS, DAY_AXIS, chart.left(), true);
    if (chart.right().isPresent()) {
      dayAxis(HIDDEN_DAY_AXIS, RIGHT_AXIS, false);
      valueAxis(RIGHT_AXIS, HIDDEN_DAY_AXIS, chart.right().get(), false);
    }
    close();
  }

  private void group(String element, ChartSeries.Kind kind, int dayAxis, int valueAxis)
      throws XMLStreamException {
    List<ChartSeries> members =
        chart.series().stream().filter(item -> item.kind() == kind).toList();
    if (members.isEmpty()) {
      return;
    }
    open(element);
    value("grouping", kind == ChartSeries.Kind.AREA ? "stacked" : "standard");
    value("varyColors", "0");
    for (ChartSeries item : members) {
      series(item);
    }
    if (kind != ChartSeries.Kind.AREA) {
      value("marker", "1");
    }
    value("axId", Integer.toString(dayAxis));
    value("axId", Integer.toString(valueAxis));
    close();
  }

  private void series(ChartSeries item) throws XMLStreamException {
    String index = Integer.toString(chart.series().indexOf(item));
    open("ser");
    value("idx", index);
    value("order", index);
    open("tx");
    open("strRef");
    element("f", chart.sheet().nameCell(item.column()));
    open("strCache");
    value("ptCount", "1");
    open("pt");
    attribute("idx", "0");
    element("v", chart.sheet().name(item.column()));
    close();
    close();
    close();
    close();
    open("spPr");
    if (item.kind() == ChartSeries.Kind.AREA) {
      solid(item.ink());
      noLine();
    } else {
      line(item.ink(), item.points(), item.dash());
    }
    close();
    if (item.kind() != ChartSeries.Kind.AREA) {
      marker(item);
    }
    if (!item.label().isEmpty()) {
      labels(item);
    }
    if (item.above().isPresent() && item.below().isPresent()) {
      whiskers(item);
    }
    open("cat");
    numbers(chart.sheet().dayRange(), Optional.empty());
    close();
    open("val");
    numbers(
        chart.sheet().valueRange(item.column()), Optional.of(chart.sheet().values(item.column())));
    close();
    if (item.kind() != ChartSeries.Kind.AREA) {
      value("smooth", "0");
    }
    close();
  }

  private void marker(ChartSeries item) throws XMLStreamException {
    open("marker");
    value("symbol", item.marker());
    if (!item.marker().equals("none")) {
      value("size", "6");
      open("spPr");
      solid(item.ink());
      line(item.ink(), 0.75, "solid");
      close();
    }
    close();
  }

  private void labels(ChartSeries item) throws XMLStreamException {
    open("dLbls");
    open("spPr");
    xml.writeEmptyElement("a", "noFill", DRAWING);
    noLine();
    close();
    textProperties(TEXT, item.ink(), false);
    value("dLblPos", item.label());
    value("showLegendKey", "0");
    value("showVal", "0");
    value("showCatName", "0");
    value("showSerName", "1");
    value("showPercent", "0");
    value("showBubbleSize", "0");
    close();
  }

  private void whiskers(ChartSeries item) throws XMLStreamException {
    open("errBars");
    value("errDir", "y");
    value("errBarType", "both");
    value("errValType", "cust");
    value("noEndCap", "1");
    for (boolean up : new boolean[] {true, false}) {
      int column = up ? item.above().getAsInt() : item.below().getAsInt();
      open(up ? "plus" : "minus");
      numbers(chart.sheet().valueRange(column), Optional.of(chart.sheet().values(column)));
      close();
    }
    open("spPr");
    line(item.whiskerInk(), 1.25, "solid");
    close();
    close();
  }

  /** A column with what it holds; the days where no values are given. */
  private void numbers(String range, Optional<SortedMap<LocalDate, Double>> values)
      throws XMLStreamException {
    List<LocalDate> days = chart.sheet().days();
    open("numRef");
    element("f", range);
    open("numCache");
    element("formatCode", values.isPresent() ? GENERAL : DATES);
    value("ptCount", Integer.toString(days.size()));
    for (int i = 0; i < days.size(); i++) {
      LocalDate day = days.get(i);
      Double number =
          values.isPresent() ? values.get().get(day) : Double.valueOf(ChartSheet.serial(day));
      if (number != null) {
        open("pt");
        attribute("idx", Integer.toString(i));
        element("v", SixDigits.text(number));
        close();
      }
    }
    close();
    close();
  }

  private void dayAxis(int id, int crossed, boolean shown) throws XMLStreamException {
    open("dateAx");
    value("axId", Integer.toString(id));
    open("scaling");
    value("orientation", "minMax");
    value("max", number(ChartSheet.serial(chart.span().to())));
    value("min", number(ChartSheet.serial(chart.span().from())));
    close();
    value("delete", shown ? "0" : "1");
    value("axPos", "b");
    open("numFmt");
    attribute("formatCode", "mmm yy");
    attribute("sourceLinked", "0");
    close();
    value("majorTickMark", "out");
    value("minorTickMark", "none");
    value("tickLblPos", "low");
    open("spPr");
    line(Palette.QUIET_INK, 0.75, "solid");
    close();
    textProperties(TEXT, Palette.INK, false);
    value("crossAx", Integer.toString(crossed));
    value("crosses", "min");
    value("auto", "0");
    value("lblOffset", "50");
    value("baseTimeUnit", "days");
    value("majorUnit", Integer.toString(chart.span().stepMonths(mostTicks)));
    value("majorTimeUnit", "months");
    close();
  }

  private void valueAxis(int id, int crossed, ValueAxis axis, boolean left)
      throws XMLStreamException {
    open("valAx");
    value("axId", Integer.toString(id));
    open("scaling");
    if (axis.logarithmic()) {
      value("logBase", number(axis.step()));
    }
    value("orientation", "minMax");
    value("max", number(axis.high()));
    value("min", number(axis.low()));
    close();
    value("delete", "0");
    value("axPos", left ? "l" : "r");
    if (left) {
      open("majorGridlines");
      open("spPr");
      line(Palette.RULE, 0.75, "solid");
      close();
      close();
    }
    open("numFmt");
    attribute("formatCode", GENERAL);
    attribute("sourceLinked", "0");
    close();
    value("majorTickMark", "none");
    value("minorTickMark", "none");
    value("tickLblPos", "nextTo");
    open("spPr");
    noLine();
    close();
    textProperties(TEXT, axis.ink(), true);
    value("crossAx", Integer.toString(crossed));
    value("crosses", left ? "min" : "max");
    value("crossBetween", "midCat");
    value("majorUnit", number(axis.step()));
    close();
  }

  private void legend() throws XMLStreamException {
    open("legend");
    value("legendPos", "t");
    for (int i = 0; i < chart.series().size(); i++) {
      if (!chart.series().get(i).inLegend()) {
        open("legendEntry");
        value("idx", Integer.toString(i));
        value("delete", "1");
        close();
      }
    }
    double from = legendFrom / place.getWidth();
    layout(false, from, 0.0, 1 - from, (legendHeight + 2) / place.getHeight());
    value("overlay", "1");
    textProperties(TEXT, Palette.INK, false);
    close();
  }

  private void layout(boolean inner, double x, double y, double width, double height)
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

  private void textProperties(double points, Color ink, boolean strong) throws XMLStreamException {
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

  private void line(Color ink, double points, String dash) throws XMLStreamException {
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

  private void noLine() throws XMLStreamException {
    drawing("ln");
    xml.writeEmptyElement("a", "noFill", DRAWING);
    close();
  }

  private void solid(Color colour) throws XMLStreamException {
    drawing("solidFill");
    drawing("srgbClr");
    attribute("val", Hatch.hex(colour));
    close();
    close();
  }

  private void open(String name) throws XMLStreamException {
    xml.writeStartElement("c", name, CHART);
  }

  private void drawing(String name) throws XMLStreamException {
    xml.writeStartElement("a", name, DRAWING);
  }

  private void close() throws XMLStreamException {
    xml.writeEndElement();
  }

  private void attribute(String name, String value) throws XMLStreamException {
    xml.writeAttribute(name, value);
  }

  private void value(String name, String value) throws XMLStreamException {
    open(name);
    attribute("val", value);
    close();
  }

  private void element(String name, String content) throws XMLStreamException {
    open(name);
    xml.writeCharacters(content);
    close();
  }

  private static String hundredths(double points) {
    return Integer.toString((int) Math.round(points * 100));
  }

  private static String number(double value) {
    return String.format(Locale.ROOT, "%.6g", value);
  }
}
