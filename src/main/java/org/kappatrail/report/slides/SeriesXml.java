package org.kappatrail.report.slides;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import javax.xml.stream.XMLStreamException;
import org.kappatrail.report.table.SixDigits;

/** Writes the series of a chart, each with its cells and what they hold (ECMA-376 part 1, 21.2). */
final class SeriesXml {
  private static final String GENERAL = "General";
  private static final String DATES = "yyyy-mm-dd";

  private final DrawingXml xml;
  private final List<ChartSeries> series;
  private final ChartSheet sheet;

  SeriesXml(DrawingXml xml, NativeChart chart) {
    this.xml = xml;
    series = chart.series();
    sheet = chart.sheet();
  }

  void write(ChartSeries item) throws XMLStreamException {
    String index = Integer.toString(series.indexOf(item));
    xml.open("ser");
    xml.value("idx", index);
    xml.value("order", index);
    xml.open("tx");
    xml.open("strRef");
    xml.element("f", sheet.nameCell(item.column()));
    xml.open("strCache");
    xml.value("ptCount", "1");
    xml.open("pt");
    xml.attribute("idx", "0");
    xml.element("v", sheet.name(item.column()));
    xml.close();
    xml.close();
    xml.close();
    xml.close();
    xml.open("spPr");
    if (item.kind() == ChartSeries.Kind.AREA) {
      xml.solid(item.ink());
      xml.noLine();
    } else {
      xml.line(item.ink(), item.points(), item.dash());
    }
    xml.close();
    if (item.kind() != ChartSeries.Kind.AREA) {
      marker(item);
    }
    if (!item.label().isEmpty()) {
      labels(item);
    }
    if (item.above().isPresent() && item.below().isPresent()) {
      whiskers(item);
    }
    xml.open("cat");
    numbers(sheet.dayRange(), Optional.empty());
    xml.close();
    xml.open("val");
    numbers(sheet.valueRange(item.column()), Optional.of(sheet.values(item.column())));
    xml.close();
    if (item.kind() != ChartSeries.Kind.AREA) {
      xml.value("smooth", "0");
    }
    xml.close();
  }

  private void marker(ChartSeries item) throws XMLStreamException {
    xml.open("marker");
    xml.value("symbol", item.marker());
    if (!item.marker().equals("none")) {
      xml.value("size", "6");
      xml.open("spPr");
      xml.solid(item.ink());
      xml.line(item.ink(), 0.75, "solid");
      xml.close();
    }
    xml.close();
  }

  private void labels(ChartSeries item) throws XMLStreamException {
    xml.open("dLbls");
    xml.open("spPr");
    xml.noFill();
    xml.noLine();
    xml.close();
    xml.textProperties(ChartXml.TEXT, item.ink(), false);
    xml.value("dLblPos", item.label());
    xml.value("showLegendKey", "0");
    xml.value("showVal", "0");
    xml.value("showCatName", "0");
    xml.value("showSerName", "1");
    xml.value("showPercent", "0");
    xml.value("showBubbleSize", "0");
    xml.close();
  }

  private void whiskers(ChartSeries item) throws XMLStreamException {
    xml.open("errBars");
    xml.value("errDir", "y");
    xml.value("errBarType", "both");
    xml.value("errValType", "cust");
    xml.value("noEndCap", "1");
    for (boolean up : new boolean[] {true, false}) {
      int column = up ? item.above().getAsInt() : item.below().getAsInt();
      xml.open(up ? "plus" : "minus");
      numbers(sheet.valueRange(column), Optional.of(sheet.values(column)));
      xml.close();
    }
    xml.open("spPr");
    xml.line(item.whiskerInk(), 1.25, "solid");
    xml.close();
    xml.close();
  }

  /** A column with what it holds; the days where no values are given. */
  private void numbers(String range, Optional<SortedMap<LocalDate, Double>> values)
      throws XMLStreamException {
    List<LocalDate> days = sheet.days();
    xml.open("numRef");
    xml.element("f", range);
    xml.open("numCache");
    xml.element("formatCode", values.isPresent() ? GENERAL : DATES);
    xml.value("ptCount", Integer.toString(days.size()));
    for (int i = 0; i < days.size(); i++) {
      LocalDate day = days.get(i);
      Double number =
          values.isPresent() ? values.get().get(day) : Double.valueOf(ChartSheet.serial(day));
      if (number != null) {
        xml.open("pt");
        xml.attribute("idx", Integer.toString(i));
        xml.element("v", SixDigits.text(number));
        xml.close();
      }
    }
    xml.close();
    xml.close();
  }
}
