package org.kappatrail.report.slides;

import java.awt.geom.Rectangle2D;
import java.util.List;
import javax.xml.stream.XMLStreamException;
import org.kappatrail.report.chart.Palette;

/**
 * A chart in the XML of office drawings (ECMA-376 part 1, 21.2), whose order of elements is fixed.
 * Written here, as the library knows no single calls for logarithmic areas on a date axis, whiskers
 * from cells and labels of series together.
 */
final class ChartXml {
  /** Size of all text but the title. */
  static final double TEXT = 12;

  private static final double TITLE_TEXT = 14;
  private static final double LEGEND_KEY = 40;
  private static final double TITLE_GAP = 30;
  private static final double AXIS_ROOM = 40;
  private static final double TICK_ROOM = 54;
  private static final double LEGEND_LINE = 22;

  private static final int DAY_AXIS = 1;
  private static final int LEFT_AXIS = 2;
  private static final int HIDDEN_DAY_AXIS = 3;
  private static final int RIGHT_AXIS = 4;

  private final NativeChart chart;
  private final Rectangle2D place;
  private final double legendFrom;
  private final double legendHeight;
  private final int mostTicks;
  private final DrawingXml xml;

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
      xml = new DrawingXml();
    } catch (XMLStreamException e) {
      throw new IllegalStateException(e);
    }
  }

  String text() {
    try {
      write();
      return xml.end();
    } catch (XMLStreamException e) {
      throw new IllegalStateException(e);
    }
  }

  private void write() throws XMLStreamException {
    xml.value("date1904", "0");
    xml.value("roundedCorners", "0");
    xml.open("chart");
    title();
    xml.value("autoTitleDeleted", "0");
    plot();
    legend();
    xml.value("plotVisOnly", "1");
    xml.value("dispBlanksAs", "span");
    xml.close();
    xml.open("spPr");
    xml.solid(Palette.PAPER);
    xml.noLine();
    xml.close();
    xml.textProperties(TEXT, Palette.INK, false);
  }

  private void title() throws XMLStreamException {
    xml.open("title");
    xml.open("tx");
    xml.open("rich");
    xml.drawing("bodyPr");
    xml.close();
    xml.drawing("p");
    xml.drawing("r");
    xml.drawing("rPr");
    xml.attribute("lang", "en-GB");
    xml.attribute("sz", DrawingXml.hundredths(TITLE_TEXT));
    xml.attribute("b", "1");
    xml.solid(chart.right().isPresent() ? Palette.INK : chart.left().ink());
    xml.close();
    xml.drawing("t");
    xml.characters(chart.title());
    xml.close();
    xml.close();
    xml.close();
    xml.close();
    xml.close();
    xml.layout(false, 0.01, 0.01, 0, 0);
    xml.value("overlay", "1");
    xml.close();
  }

  /** Both charts of an asset have their plot between the same edges. */
  private void plot() throws XMLStreamException {
    xml.open("plotArea");
    double top = (legendHeight + 8) / place.getHeight();
    double foot = 24 / place.getHeight();
    xml.layout(
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
    xml.close();
  }

  private void group(String element, ChartSeries.Kind kind, int dayAxis, int valueAxis)
      throws XMLStreamException {
    List<ChartSeries> members =
        chart.series().stream().filter(item -> item.kind() == kind).toList();
    if (members.isEmpty()) {
      return;
    }
    xml.open(element);
    xml.value("grouping", kind == ChartSeries.Kind.AREA ? "stacked" : "standard");
    xml.value("varyColors", "0");
    SeriesXml series = new SeriesXml(xml, chart);
    for (ChartSeries item : members) {
      series.write(item);
    }
    if (kind != ChartSeries.Kind.AREA) {
      xml.value("marker", "1");
    }
    xml.value("axId", Integer.toString(dayAxis));
    xml.value("axId", Integer.toString(valueAxis));
    xml.close();
  }

  private void dayAxis(int id, int crossed, boolean shown) throws XMLStreamException {
    xml.open("dateAx");
    xml.value("axId", Integer.toString(id));
    xml.open("scaling");
    xml.value("orientation", "minMax");
    xml.value("max", DrawingXml.number(ChartSheet.serial(chart.span().to())));
    xml.value("min", DrawingXml.number(ChartSheet.serial(chart.span().from())));
    xml.close();
    xml.value("delete", shown ? "0" : "1");
    xml.value("axPos", "b");
    xml.open("numFmt");
    xml.attribute("formatCode", "mmm yy");
    xml.attribute("sourceLinked", "0");
    xml.close();
    xml.value("majorTickMark", "out");
    xml.value("minorTickMark", "none");
    xml.value("tickLblPos", "low");
    xml.open("spPr");
    xml.line(Palette.QUIET_INK, 0.75, "solid");
    xml.close();
    xml.textProperties(TEXT, Palette.INK, false);
    xml.value("crossAx", Integer.toString(crossed));
    xml.value("crosses", "min");
    xml.value("auto", "0");
    xml.value("lblOffset", "50");
    xml.value("baseTimeUnit", "days");
    xml.value("majorUnit", Integer.toString(chart.span().stepMonths(mostTicks)));
    xml.value("majorTimeUnit", "months");
    xml.close();
  }

  private void valueAxis(int id, int crossed, ValueAxis axis, boolean left)
      throws XMLStreamException {
    xml.open("valAx");
    xml.value("axId", Integer.toString(id));
    xml.open("scaling");
    if (axis.logarithmic()) {
      xml.value("logBase", DrawingXml.number(axis.step()));
    }
    xml.value("orientation", "minMax");
    xml.value("max", DrawingXml.number(axis.high()));
    xml.value("min", DrawingXml.number(axis.low()));
    xml.close();
    xml.value("delete", "0");
    xml.value("axPos", left ? "l" : "r");
    if (left) {
      xml.open("majorGridlines");
      xml.open("spPr");
      xml.line(Palette.RULE, 0.75, "solid");
      xml.close();
      xml.close();
    }
    xml.open("numFmt");
    xml.attribute("formatCode", "General");
    xml.attribute("sourceLinked", "0");
    xml.close();
    xml.value("majorTickMark", "none");
    xml.value("minorTickMark", "none");
    xml.value("tickLblPos", "nextTo");
    xml.open("spPr");
    xml.noLine();
    xml.close();
    xml.textProperties(TEXT, axis.ink(), true);
    xml.value("crossAx", Integer.toString(crossed));
    xml.value("crosses", left ? "min" : "max");
    xml.value("crossBetween", "midCat");
    xml.value("majorUnit", DrawingXml.number(axis.step()));
    xml.close();
  }

  private void legend() throws XMLStreamException {
    xml.open("legend");
    xml.value("legendPos", "t");
    for (int i = 0; i < chart.series().size(); i++) {
      if (!chart.series().get(i).inLegend()) {
        xml.open("legendEntry");
        xml.value("idx", Integer.toString(i));
        xml.value("delete", "1");
        xml.close();
      }
    }
    double from = legendFrom / place.getWidth();
    xml.layout(false, from, 0.0, 1 - from, (legendHeight + 2) / place.getHeight());
    xml.value("overlay", "1");
    xml.textProperties(TEXT, Palette.INK, false);
    xml.close();
  }
}
