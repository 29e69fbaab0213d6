package org.kappatrail.report;

import java.awt.Font;
import java.awt.font.FontRenderContext;
import java.awt.font.LineBreakMeasurer;
import java.awt.font.TextAttribute;
import java.text.AttributedString;
import java.util.List;
import java.util.Locale;
import org.apache.poi.common.usermodel.fonts.FontGroup;
import org.apache.poi.xslf.usermodel.XSLFTextParagraph;
import org.apache.poi.xslf.usermodel.XSLFTextRun;
import org.apache.poi.xslf.usermodel.XSLFTextShape;

/** The height that a slide's text takes when Java's own line breaker sets it. */
final class SetText {
  private static final FontRenderContext CONTEXT = new FontRenderContext(null, true, true);

  /** Line height of slide text: common practice, no source. */
  private static final double LINE = 1.2;

  private SetText() {}

  static double height(XSLFTextShape shape) {
    double width = shape.getAnchor().getWidth() - shape.getLeftInset() - shape.getRightInset();
    double height = shape.getTopInset() + shape.getBottomInset();
    for (XSLFTextParagraph paragraph : shape.getTextParagraphs()) {
      for (XSLFTextRun run : paragraph.getTextRuns()) {
        height += lines(run, width) * run.getFontSize() * LINE;
      }
    }
    return height;
  }

  private static int lines(XSLFTextRun run, double width) {
    if (run.getRawText().isEmpty()) {
      return 0;
    }
    AttributedString text = new AttributedString(run.getRawText());
    text.addAttribute(TextAttribute.FONT, font(run));
    LineBreakMeasurer breaker = new LineBreakMeasurer(text.getIterator(), CONTEXT);
    int lines = 0;
    while (breaker.getPosition() < run.getRawText().length()) {
      breaker.nextLayout((float) width);
      lines++;
    }
    return lines;
  }

  /** The font named, a free one of the same widths, or the system's sans serif. */
  private static Font font(XSLFTextRun run) {
    int style = run.isBold() ? Font.BOLD : Font.PLAIN;
    String latin = run.getFontFamily(FontGroup.LATIN);
    String named = latin == null ? "" : latin;
    for (String family : List.of(named, "Liberation Sans")) {
      Font font = new Font(family, style, 1);
      boolean twin = !family.equals("Liberation Sans") || named.equals("Arial");
      if (twin && font.getFamily(Locale.ROOT).equals(family)) {
        return font.deriveFont((float) (double) run.getFontSize());
      }
    }
    return new Font(Font.SANS_SERIF, style, 1).deriveFont((float) (double) run.getFontSize());
  }
}
