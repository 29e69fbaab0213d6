package org.kappatrail.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Dimension;
import java.awt.geom.Rectangle2D;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.stream.IntStream;
import org.apache.poi.ooxml.POIXMLDocumentPart.RelationPart;
import org.apache.poi.openxml4j.exceptions.InvalidFormatException;
import org.apache.poi.sl.extractor.SlideShowExtractor;
import org.apache.poi.xslf.usermodel.XMLSlideShow;
import org.apache.poi.xslf.usermodel.XSLFChart;
import org.apache.poi.xslf.usermodel.XSLFShape;
import org.apache.poi.xslf.usermodel.XSLFSlide;
import org.apache.poi.xslf.usermodel.XSLFTextRun;
import org.apache.poi.xslf.usermodel.XSLFTextShape;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.kappatrail.cli.Run;
import org.openxmlformats.schemas.drawingml.x2006.chart.CTPlotArea;

class SlidesTest {
  /** Opening, fleet, method. */
  private static final int FRAME = 3;

  private static final double LEAST_BODY_POINTS = 14;

  @TempDir Path folder;

  @Tag("slow")
  @ParameterizedTest
  @ValueSource(ints = {1, 5, 20})
  void everyChosenAssetHasASlideWithItsChartsAndTheirNumbers(int assets)
      throws IOException, InvalidFormatException {
    List<String> names =
        IntStream.rangeClosed(1, assets)
            .mapToObj(i -> "Machine " + i + " of the hall with a name of sixty characters or so..")
            .toList();
    FleetFiles.write(folder.resolve("site"), names);
    try (XMLSlideShow show = slides(ids(assets))) {
      List<XSLFSlide> own =
          show.getSlides().stream().filter(slide -> !charts(slide).isEmpty()).toList();
      assertThat(own).hasSize(assets);
      assertThat(show.getSlides().size()).isGreaterThanOrEqualTo(FRAME + assets + 1);
      for (XSLFSlide slide : own) {
        assertThat(charts(slide)).hasSize(2);
        for (XSLFChart chart : charts(slide)) {
          assertHasItsNumbers(chart);
        }
      }
      assertAllWithinThePage(show);
    }
  }

  @Test
  void bodyTextIsReadableFromTheBackOfARoom() throws IOException {
    FleetFiles.write(folder.resolve("site"), List.of("Stock pump", "Dryer", "Winder"));
    try (XMLSlideShow show = slides(ids(3))) {
      for (XSLFSlide slide : show.getSlides().subList(FRAME, show.getSlides().size())) {
        List<Double> sizes = new ArrayList<>();
        texts(slide).forEach(shape -> runs(shape).forEach(run -> sizes.add(run.getFontSize())));
        long small = sizes.stream().filter(size -> size < LEAST_BODY_POINTS).count();
        assertThat(small).as("the footer alone is smaller").isEqualTo(1);
      }
    }
  }

  @Tag("slow")
  @Test
  void hostileNamesStandAsTextAndLongOnesAreShortened() throws IOException {
    FleetFiles.write(folder.resolve("site"), FleetFiles.HOSTILE);
    try (XMLSlideShow show = slides(ids(FleetFiles.HOSTILE.size()));
        SlideShowExtractor<?, ?> extractor = new SlideShowExtractor<>(show)) {
      extractor.setNotesByDefault(false);
      String text = extractor.getText();
      assertThat(text)
          .contains("<img src=x onerror=alert(1)>: κ")
          .contains("=cmd|'/C calc'!A1: κ")
          .contains("מכונת נייר 7")
          .contains("a&b\"c'd]]>&amp;<!--")
          .doesNotContain("\u202E");
      assertThat(text).contains("Unbrokenxxx").doesNotContain("x".repeat(100)).contains("x…");
      assertAllWithinThePage(show);
      extractor.setNotesByDefault(true);
      assertThat(extractor.getText())
          .as("nothing is lost to the presenter")
          .contains("x".repeat(292));
    }
  }

  @Test
  void theSameReviewGivesTheSameBytes() throws IOException {
    FleetFiles.write(folder.resolve("site"), List.of("Stock pump", "Dryer"));
    for (String file : List.of("a.pptx", "b.pptx")) {
      assertThat(run("--out", folder.resolve(file).toString()).code()).isZero();
    }
    assertThat(Files.mismatch(folder.resolve("a.pptx"), folder.resolve("b.pptx"))).isEqualTo(-1);
  }

  @Tag("slow")
  @Test
  void withoutANameTheAssetsThatNeedADecisionAreShown() throws IOException {
    List<String> names = Collections.nCopies(42, "Pump");
    FleetFiles.write(folder.resolve("site"), names);
    Path file = folder.resolve("slides.pptx");
    Run run = run("--out", file.toString());
    assertThat(run.out()).contains("(12 assets, ").contains(" more need a decision)");
    try (XMLSlideShow show = open(file)) {
      assertThat(show.getSlides().stream().filter(slide -> !charts(slide).isEmpty())).hasSize(12);
    }
  }

  @Test
  void anUnknownAssetIsRefusedWithTheNearestName() throws IOException {
    FleetFiles.write(folder.resolve("site"), List.of("Pump"));
    Run run = run("--out", folder.resolve("x.pptx").toString(), "--asset", "P0");
    assertThat(run.code()).isEqualTo(3);
    assertThat(run.err()).contains("no asset 'P0'").contains("P01");
    assertThat(folder.resolve("x.pptx")).doesNotExist();
  }

  private XMLSlideShow slides(List<String> assets) throws IOException {
    Path file = folder.resolve("slides.pptx");
    Run run = run("--out", file.toString(), "--asset", String.join(",", assets));
    assertThat(run.err()).isEmpty();
    assertThat(run.code()).isZero();
    return open(file);
  }

  private Run run(String... options) {
    List<String> arguments = new ArrayList<>(List.of("slides", folder.resolve("site").toString()));
    arguments.addAll(List.of(options));
    return Run.of(arguments.toArray(String[]::new));
  }

  static XMLSlideShow open(Path file) throws IOException {
    try (InputStream in = Files.newInputStream(file)) {
      return new XMLSlideShow(in);
    }
  }

  private static List<String> ids(int assets) {
    return IntStream.rangeClosed(1, assets)
        .mapToObj(i -> String.format(Locale.ROOT, "P%02d", i))
        .toList();
  }

  static List<XSLFChart> charts(XSLFSlide slide) {
    List<XSLFChart> charts = new ArrayList<>();
    for (RelationPart part : slide.getRelationParts()) {
      if (part.getDocumentPart() instanceof XSLFChart chart) {
        charts.add(chart);
      }
    }
    return charts;
  }

  /** Each series' cells are in the chart's own sheet, with the numbers that the chart shows. */
  private static void assertHasItsNumbers(XSLFChart chart)
      throws IOException, InvalidFormatException {
    XSSFSheet sheet = chart.getWorkbook().getSheet("data");
    CTPlotArea plot = chart.getCTChart().getPlotArea();
    int checked = 0;
    for (var lines : plot.getLineChartList()) {
      for (var series : lines.getSerList()) {
        var cells = series.getVal().getNumRef();
        String column = cells.getF().replaceAll("data!\\$([A-Z]+)\\$.*", "$1");
        int index = org.apache.poi.ss.util.CellReference.convertColStringToIndex(column);
        assertThat(sheet.getRow(0).getCell(index).getStringCellValue())
            .isEqualTo(series.getTx().getStrRef().getStrCache().getPtArray(0).getV());
        for (var point : cells.getNumCache().getPtList()) {
          assertThat(sheet.getRow((int) point.getIdx() + 1).getCell(index).getNumericCellValue())
              .isEqualTo(Double.parseDouble(point.getV()));
          checked++;
        }
      }
    }
    assertThat(checked).isGreaterThan(10);
  }

  static void assertAllWithinThePage(XMLSlideShow show) {
    Dimension page = show.getPageSize();
    for (XSLFSlide slide : show.getSlides()) {
      for (XSLFShape shape : slide.getShapes()) {
        Rectangle2D place = shape.getAnchor();
        if (place != null) {
          assertThat(place.getMinX()).isGreaterThanOrEqualTo(0);
          assertThat(place.getMinY()).isGreaterThanOrEqualTo(0);
          assertThat(place.getMaxX()).isLessThanOrEqualTo(page.getWidth() + 0.5);
          assertThat(place.getMaxY()).isLessThanOrEqualTo(page.getHeight() + 0.5);
        }
      }
      for (XSLFTextShape shape : texts(slide)) {
        assertThat(SetText.height(shape))
            .as("height of '%s'", shape.getText())
            .isLessThanOrEqualTo(shape.getAnchor().getHeight() + 0.5);
      }
    }
  }

  private static List<XSLFTextShape> texts(XSLFSlide slide) {
    return slide.getShapes().stream()
        .filter(XSLFTextShape.class::isInstance)
        .map(XSLFTextShape.class::cast)
        .filter(shape -> !shape.getText().isEmpty())
        .toList();
  }

  private static List<XSLFTextRun> runs(XSLFTextShape shape) {
    return shape.getTextParagraphs().stream()
        .flatMap(paragraph -> paragraph.getTextRuns().stream())
        .toList();
  }
}
