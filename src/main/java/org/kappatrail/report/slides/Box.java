package org.kappatrail.report.slides;

import java.awt.Color;
import java.awt.geom.Rectangle2D;
import org.apache.poi.sl.usermodel.TextParagraph.TextAlign;
import org.apache.poi.sl.usermodel.TextShape.TextAutofit;
import org.apache.poi.sl.usermodel.VerticalAlignment;
import org.apache.poi.xslf.usermodel.XSLFSlide;
import org.apache.poi.xslf.usermodel.XSLFTextBox;
import org.apache.poi.xslf.usermodel.XSLFTextParagraph;
import org.apache.poi.xslf.usermodel.XSLFTextRun;
import org.jspecify.annotations.Nullable;
import org.kappatrail.report.office.ShownText;

/** A text box whose text fits: every line and paragraph is measured before it is set. */
final class Box {
  private final XSLFTextBox shape;
  private final TextFit fit;
  private final double width;
  private final double height;
  private double used;
  private @Nullable Color ink;
  private TextAlign align = TextAlign.LEFT;

  Box(XSLFSlide slide, TextFit fit, Rectangle2D place) {
    this.fit = fit;
    shape = slide.createTextBox();
    shape.setAnchor(place);
    shape.setLeftInset(0);
    shape.setRightInset(0);
    shape.setTopInset(0);
    shape.setBottomInset(0);
    shape.setWordWrap(true);
    shape.setTextAutofit(TextAutofit.NONE);
    shape.clearText();
    width = place.getWidth();
    height = place.getHeight();
  }

  /** Colour of what follows; without it that of the template's text. */
  Box ink(Color colour) {
    ink = colour;
    return this;
  }

  Box align(TextAlign wanted) {
    align = wanted;
    return this;
  }

  Box middle() {
    shape.setVerticalAlignment(VerticalAlignment.MIDDLE);
    return this;
  }

  /** One line, with an ellipsis where it is too long. */
  Box line(String text, double points, boolean strong) {
    return set(
        fit.oneLine(Words.joined(ShownText.of(text)), width, points, strong), points, strong, 1);
  }

  /** A paragraph of at most so many lines, and of no more than there is room for. */
  Box paragraph(String text, double points, boolean strong, int mostLines) {
    int room = (int) Math.floor((height - used) / (points * TextFit.LINE) + 1e-6);
    TextFit.Fitted fitted =
        fit.clipped(
            Words.joined(ShownText.of(text)),
            width,
            points,
            strong,
            Math.max(1, Math.min(room, mostLines)));
    return set(fitted.text(), points, strong, fitted.lines());
  }

  /** A paragraph over the whole box, smaller where that is needed. */
  Box fill(String text, double most, double least, boolean strong) {
    TextFit.Fitted fitted =
        fit.fit(Words.joined(ShownText.of(text)), width, height - used, most, least, strong);
    return set(fitted.text(), fitted.points(), strong, fitted.lines());
  }

  /** Height of what has been set. */
  double used() {
    return used;
  }

  private Box set(String text, double points, boolean strong, int lines) {
    XSLFTextParagraph paragraph = shape.addNewTextParagraph();
    paragraph.setTextAlign(align);
    paragraph.setSpaceBefore(0.0);
    paragraph.setSpaceAfter(0.0);
    paragraph.setLineSpacing(100.0);
    XSLFTextRun run = paragraph.addNewTextRun();
    run.setText(text);
    run.setFontSize(points);
    run.setBold(strong);
    if (ink != null) {
      run.setFontColor(ink);
    }
    used += lines * points * TextFit.LINE;
    return this;
  }
}
