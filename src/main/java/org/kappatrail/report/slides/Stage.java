package org.kappatrail.report.slides;

import java.awt.geom.Rectangle2D;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.apache.poi.ooxml.POIXMLException;
import org.apache.poi.openxml4j.exceptions.OpenXML4JRuntimeException;
import org.apache.poi.sl.usermodel.Placeholder;
import org.apache.poi.xslf.usermodel.SlideLayout;
import org.apache.poi.xslf.usermodel.XMLSlideShow;
import org.apache.poi.xslf.usermodel.XSLFRelation;
import org.apache.poi.xslf.usermodel.XSLFShape;
import org.apache.poi.xslf.usermodel.XSLFSheet;
import org.apache.poi.xslf.usermodel.XSLFSlide;
import org.apache.poi.xslf.usermodel.XSLFSlideLayout;
import org.apache.poi.xslf.usermodel.XSLFSlideMaster;
import org.apache.poi.xslf.usermodel.XSLFTextRun;
import org.apache.poi.xslf.usermodel.XSLFTextShape;
import org.kappatrail.history.UnusableInputException;
import org.kappatrail.report.office.FixedZip;
import org.kappatrail.report.office.ShownText;

/** The slide show: of the house, or on a site's template with its master, layouts and page. */
final class Stage implements AutoCloseable {
  private static final double GAP = 6;
  private static final double MARGIN = 40;
  private static final double LEAST_FOOTER = 150;
  private static final double LEAST_MARGIN = 12;
  private static final double FOOTER_HEIGHT = 22;
  private static final double LEAST_TITLE_POINTS = 18;

  private final XMLSlideShow show;
  private final String footer;
  private final TextFit fit;

  /**
   * Opens a show.
   *
   * @param template the site's own; its slides are dropped
   * @param footer text at the foot of each slide
   */
  Stage(Optional<Path> template, String footer) throws IOException {
    show = template.isPresent() ? of(template.get()) : HouseStyle.slideShow();
    this.footer = footer;
    fit = TextFit.in(family());
  }

  private static XMLSlideShow of(Path template) throws IOException {
    if (!Files.isRegularFile(template)) {
      throw new UnusableInputException(
          template + ": no such file; --template takes a PowerPoint file (.pptx or .potx)");
    }
    XMLSlideShow show;
    try (InputStream in = Files.newInputStream(template)) {
      show = new XMLSlideShow(in);
      show.getPackage()
          .replaceContentType(
              XSLFRelation.PRESENTATIONML_TEMPLATE.getContentType(),
              XSLFRelation.MAIN.getContentType());
    } catch (POIXMLException | OpenXML4JRuntimeException | IllegalArgumentException e) {
      throw new UnusableInputException(
          template + ": cannot be read as a PowerPoint file; save it as .pptx", e);
    }
    for (int i = show.getSlides().size() - 1; i >= 0; i--) {
      show.removeSlide(i);
    }
    return show;
  }

  private String family() {
    String family = show.getSlideMasters().get(0).getTheme().getMinorFont();
    return family == null ? "" : family;
  }

  XMLSlideShow show() {
    return show;
  }

  TextFit fit() {
    return fit;
  }

  /** The opening slide; gives the room under its lines. */
  Leaf opening(String title, List<String> lines) {
    XSLFSlide slide = show.createSlide(layout(SlideLayout.TITLE));
    Optional<XSLFTextShape> under = find(slide, Placeholder.SUBTITLE);
    XSLFTextShape heading = heading(slide);
    title(heading, title);
    Rectangle2D place =
        under
            .map(XSLFTextShape::getAnchor)
            .orElse(
                new Rectangle2D.Double(
                    heading.getAnchor().getX(),
                    heading.getAnchor().getMaxY() + GAP,
                    heading.getAnchor().getWidth(),
                    150));
    Rectangle2D room =
        new Rectangle2D.Double(
            place.getX() + heading.getLeftInset(),
            place.getY(),
            place.getWidth() - heading.getLeftInset() - heading.getRightInset(),
            place.getHeight());
    dropEmpty(slide, heading);
    Box box = new Box(slide, fit, room);
    for (int i = 0; i < lines.size(); i++) {
      box.paragraph(lines.get(i), i == 0 ? 22 : 18, false, 2);
    }
    double y = room.getY() + box.used() + 2 * GAP;
    return new Leaf(
        slide, fit, new Rectangle2D.Double(room.getX(), y, room.getWidth(), room.getMaxY() - y));
  }

  /** A slide with a headline. */
  Leaf leaf(String headline) {
    XSLFSlide slide = show.createSlide(layout(SlideLayout.TITLE_ONLY));
    XSLFTextShape heading = heading(slide);
    title(heading, headline);
    dropEmpty(slide, heading);
    double top = heading.getAnchor().getMaxY() + GAP;
    double left = Math.max(heading.getAnchor().getX() + heading.getLeftInset(), LEAST_MARGIN);
    double width =
        Math.min(
                heading.getAnchor().getMaxX() - heading.getRightInset(),
                show.getPageSize().getWidth() - LEAST_MARGIN)
            - left;
    double bottom = foot(slide, left, width);
    return new Leaf(slide, fit, new Rectangle2D.Double(left, top, width, bottom - top));
  }

  private XSLFTextShape heading(XSLFSlide slide) {
    Optional<XSLFTextShape> given =
        find(slide, Placeholder.TITLE).or(() -> find(slide, Placeholder.CENTERED_TITLE));
    return given.orElseGet(
        () -> {
          XSLFTextShape box = slide.createTextBox();
          box.setAnchor(
              new Rectangle2D.Double(MARGIN, 20, show.getPageSize().getWidth() - 2 * MARGIN, 66));
          return box;
        });
  }

  /** Sets a title at its own size, or smaller where it is too long for its box. */
  private void title(XSLFTextShape shape, String text) {
    shape.clearText();
    XSLFTextRun run = shape.addNewTextParagraph().addNewTextRun();
    String joined = Words.joined(text);
    run.setText(joined);
    Double inherited = run.getFontSize();
    double most = inherited == null ? 26 : inherited;
    Rectangle2D box = shape.getAnchor();
    TextFit.Fitted fitted =
        fit.fit(
            joined,
            box.getWidth() - shape.getLeftInset() - shape.getRightInset(),
            box.getHeight() - shape.getTopInset() - shape.getBottomInset(),
            most,
            LEAST_TITLE_POINTS,
            true);
    run.setText(fitted.text());
    run.setFontSize(fitted.points());
  }

  /** Writes the footer and gives the height above which there is room. */
  private double foot(XSLFSlide slide, double left, double width) {
    XSLFSheet layout = slide.getSlideLayout();
    Rectangle2D place =
        find(layout, Placeholder.FOOTER)
            .map(XSLFTextShape::getAnchor)
            .orElse(
                new Rectangle2D.Double(
                    left,
                    show.getPageSize().getHeight() - FOOTER_HEIGHT - 10,
                    width,
                    FOOTER_HEIGHT));
    String number = Integer.toString(show.getSlides().size());
    Rectangle2D line =
        new Rectangle2D.Double(left, place.getY(), place.getMaxX() - left, place.getHeight());
    Box box = new Box(slide, fit, line.getWidth() > LEAST_FOOTER ? line : place);
    box.line(footer + " · " + number, 12, false);
    double least = place.getMinY();
    for (Placeholder kind : List.of(Placeholder.SLIDE_NUMBER, Placeholder.DATETIME)) {
      least =
          find(layout, kind)
              .map(shape -> shape.getAnchor().getMinY())
              .filter(y -> y > show.getPageSize().getHeight() / 2)
              .map(y -> Math.min(y, place.getMinY()))
              .orElse(least);
    }
    return least - GAP;
  }

  /** A layout by kind; else one with a title; else any. */
  private XSLFSlideLayout layout(SlideLayout kind) {
    for (XSLFSlideMaster master : show.getSlideMasters()) {
      XSLFSlideLayout found = master.getLayout(kind);
      if (found != null) {
        return found;
      }
    }
    XSLFSlideMaster first = show.getSlideMasters().get(0);
    for (XSLFSlideLayout layout : first.getSlideLayouts()) {
      if (find(layout, Placeholder.TITLE).isPresent()) {
        return layout;
      }
    }
    return first.getSlideLayouts()[0];
  }

  private static Optional<XSLFTextShape> find(XSLFSheet sheet, Placeholder kind) {
    for (XSLFShape shape : sheet.getShapes()) {
      if (shape instanceof XSLFTextShape text && text.getTextType() == kind) {
        return Optional.of(text);
      }
    }
    return Optional.empty();
  }

  /** Placeholders without text would show their prompt. */
  private static void dropEmpty(XSLFSlide slide, XSLFTextShape kept) {
    for (XSLFShape shape : List.copyOf(slide.getShapes())) {
      boolean prompt =
          shape instanceof XSLFTextShape text && shape != kept && text.getTextType() != null;
      if (prompt) {
        slide.removeShape(shape);
      }
    }
  }

  /** Sets what the presenter reads beside a slide. */
  void notes(Leaf leaf, List<String> lines) {
    for (XSLFTextShape shape : show.getNotesSlide(leaf.slide()).getPlaceholders()) {
      if (shape.getTextType() == Placeholder.BODY) {
        shape.clearText();
        lines.forEach(
            line -> shape.addNewTextParagraph().addNewTextRun().setText(ShownText.of(line)));
      }
    }
  }

  void write(OutputStream out) throws IOException {
    java.io.ByteArrayOutputStream bytes = new java.io.ByteArrayOutputStream();
    show.write(bytes);
    FixedZip.write(bytes.toByteArray(), out);
  }

  @Override
  public void close() throws IOException {
    show.close();
  }
}
