package org.kappatrail.report.slides;

import java.awt.geom.Rectangle2D;
import java.io.IOException;
import java.time.ZoneOffset;
import java.util.Comparator;
import java.util.Date;
import java.util.List;
import java.util.Optional;
import org.apache.poi.ooxml.POIXMLProperties;
import org.apache.poi.openxml4j.exceptions.InvalidFormatException;
import org.apache.poi.util.Units;
import org.apache.poi.xslf.usermodel.XSLFChart;
import org.apache.poi.xslf.usermodel.XSLFGraphicFrame;
import org.apache.poi.xslf.usermodel.XSLFShape;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.apache.xmlbeans.XmlException;
import org.openxmlformats.schemas.drawingml.x2006.chart.ChartSpaceDocument;

/**
 * A chart that the program which shows the slides draws itself, and that its user can edit: it
 * carries its numbers in a workbook of its own.
 *
 * @param title its title with the unit
 * @param alternative what it shows, for those who do not see it
 * @param sheet its numbers
 * @param series how they are drawn
 * @param span its stretch of calendar
 * @param left its axis of values
 * @param right a second one
 */
record NativeChart(
    String title,
    String alternative,
    ChartSheet sheet,
    List<ChartSeries> series,
    ChartSpan span,
    ValueAxis left,
    Optional<ValueAxis> right) {
  NativeChart {
    // In the order of the legend, which goes by kind: its entries are told by their number.
    series = series.stream().sorted(Comparator.comparing(ChartSeries::kind)).toList();
  }

  void draw(Stage stage, Leaf leaf, Rectangle2D place) throws IOException {
    XSLFChart chart = stage.show().createChart();
    try {
      String xml = new ChartXml(this, place, leaf.fit()).text();
      chart.getCTChartSpace().set(ChartSpaceDocument.Factory.parse(xml).getChartSpace());
      XSSFWorkbook workbook = chart.getWorkbook();
      sheet.fill(workbook);
      POIXMLProperties.CoreProperties core = workbook.getProperties().getCoreProperties();
      Date day = Date.from(span.to().atStartOfDay(ZoneOffset.UTC).toInstant());
      core.setCreator("Kappatrail");
      core.setCreated(Optional.of(day));
      core.getUnderlyingProperties().setModifiedProperty(Optional.of(day));
    } catch (XmlException | InvalidFormatException e) {
      throw new IllegalStateException(e);
    }
    leaf.slide()
        .addChart(
            chart,
            new Rectangle2D.Double(
                Units.toEMU(place.getX()),
                Units.toEMU(place.getY()),
                Units.toEMU(place.getWidth()),
                Units.toEMU(place.getHeight())));
    describe(leaf);
  }

  /** The frame of the chart is the last shape of its slide. */
  private void describe(Leaf leaf) {
    List<XSLFShape> shapes = leaf.slide().getShapes();
    if (shapes.get(shapes.size() - 1) instanceof XSLFGraphicFrame frame) {
      var named =
          ((org.openxmlformats.schemas.presentationml.x2006.main.CTGraphicalObjectFrame)
                  frame.getXmlObject())
              .getNvGraphicFramePr()
              .getCNvPr();
      named.setName(title);
      named.setDescr(alternative);
    }
  }
}
