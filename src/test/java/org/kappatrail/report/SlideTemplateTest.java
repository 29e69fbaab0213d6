package org.kappatrail.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.Dimension;
import java.awt.Rectangle;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.apache.poi.sl.extractor.SlideShowExtractor;
import org.apache.poi.sl.usermodel.ShapeType;
import org.apache.poi.xslf.usermodel.XMLSlideShow;
import org.apache.poi.xslf.usermodel.XSLFAutoShape;
import org.apache.poi.xslf.usermodel.XSLFShape;
import org.apache.poi.xslf.usermodel.XSLFSlide;
import org.apache.poi.xslf.usermodel.XSLFSlideMaster;
import org.apache.poi.xslf.usermodel.XSLFTextShape;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.cli.Run;

class SlideTemplateTest {
  private static final String BAND = "band of the site";

  @TempDir Path folder;

  @BeforeEach
  void writeASite() throws IOException {
    FleetFiles.write(folder.resolve("site"), List.of("Stock pump", "Dryer", "Winder"));
  }

  @Test
  void masterPageAndLayoutsOfTheTemplateAreUsedAndItsSlidesAreNot() throws IOException {
    Path template = template();
    byte[] before = Files.readAllBytes(template);
    Run run = slides(template);
    assertThat(run.err()).isEmpty();
    try (XMLSlideShow show = SlidesTest.open(folder.resolve("out.pptx"));
        SlideShowExtractor<?, ?> extractor = new SlideShowExtractor<>(show)) {
      assertThat(show.getPageSize()).isEqualTo(new Dimension(720, 540));
      assertThat(show.getSlideMasters().get(0).getShapes().stream().map(XSLFShape::getShapeName))
          .contains(BAND);
      assertThat(extractor.getText()).doesNotContain("a slide of last year").contains("Stock pump");
      SlidesTest.assertAllWithinThePage(show);
      for (XSLFSlide slide : show.getSlides()) {
        assertThat(slide.getSlideMaster()).isSameAs(show.getSlideMasters().get(0));
        assertThat(slide.getShapes())
            .as("no prompt is left standing")
            .noneMatch(
                shape ->
                    shape instanceof XSLFTextShape text
                        && text.getTextType() != null
                        && text.getText().isEmpty());
      }
    }
    assertThat(Files.readAllBytes(template)).isEqualTo(before);
  }

  @Test
  void theTemplateIsNeverWrittenTo() throws IOException {
    Path template = template();
    Run run =
        Run.of(
            "slides",
            folder.resolve("site").toString(),
            "--template",
            template.toString(),
            "--out",
            template.toString());
    assertThat(run.code()).isEqualTo(3);
    assertThat(run.err()).contains("is the template itself");
  }

  @Test
  void aTemplateThatIsNoneIsRefusedWithWhatToDo() throws IOException {
    Path text = Files.writeString(folder.resolve("notes.pptx"), "no slides");
    assertThat(slides(text).code()).isEqualTo(3);
    assertThat(slides(text).err()).contains("cannot be read as a PowerPoint file");
    assertThat(slides(folder.resolve("absent.pptx")).err()).contains("no such file");
    assertThat(folder.resolve("out.pptx")).doesNotExist();
  }

  private Run slides(Path template) {
    return Run.of(
        "slides",
        folder.resolve("site").toString(),
        "--template",
        template.toString(),
        "--out",
        folder.resolve("out.pptx").toString());
  }

  private Path template() throws IOException {
    Path file = folder.resolve("template.pptx");
    try (XMLSlideShow show = new XMLSlideShow();
        OutputStream out = Files.newOutputStream(file)) {
      XSLFSlideMaster master = show.getSlideMasters().get(0);
      XSLFAutoShape band = master.createAutoShape();
      band.setShapeType(ShapeType.RECT);
      band.setAnchor(new Rectangle(0, 0, 720, 14));
      band.setFillColor(new Color(200, 120, 20));
      ((org.openxmlformats.schemas.presentationml.x2006.main.CTShape) band.getXmlObject())
          .getNvSpPr()
          .getCNvPr()
          .setName(BAND);
      show.createSlide().createTextBox().setText("a slide of last year");
      show.write(out);
    }
    return file;
  }
}
