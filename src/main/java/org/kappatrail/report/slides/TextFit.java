package org.kappatrail.report.slides;

import java.awt.Font;
import java.awt.font.FontRenderContext;
import java.text.BreakIterator;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/**
 * Measures text as a slide will set it, so that it fits its box: smaller down to the least size
 * that a room can read, then shortened with an ellipsis.
 */
final class TextFit {
  /** Line height of a slide's text, as a multiple of its size. */
  static final double LINE = 1.2;

  private static final String ELLIPSIS = "…";
  private static final FontRenderContext CONTEXT = new FontRenderContext(null, true, true);

  /** A word that is dropped whole rather than shown in part. */
  private static final int SHORT_WORD = 14;

  /** Points at which fonts are measured; widths scale with the size. */
  private static final float MEASURED_POINTS = 100;

  /** Renderers differ a little in hinting and kerning. */
  private static final double SPARE = 1.03;

  /** A stand-in font may be narrower than the slide's own. */
  private static final double SPARE_OF_STAND_IN = 1.1;

  /** Free fonts with the same widths. */
  private static final Map<String, String> TWINS =
      Map.of("Arial", "Liberation Sans", "Helvetica", "Liberation Sans", "Calibri", "Carlito");

  private final Font plain;
  private final Font bold;
  private final double spare;

  private TextFit(String family, double spare) {
    plain = new Font(family, Font.PLAIN, 1).deriveFont(MEASURED_POINTS);
    bold = new Font(family, Font.BOLD, 1).deriveFont(MEASURED_POINTS);
    this.spare = spare;
  }

  /** Measures in a font of a slide: itself, its twin, else the system's sans serif with room. */
  static TextFit in(String family) {
    for (String name : List.of(family, TWINS.getOrDefault(family, family))) {
      if (new Font(name, Font.PLAIN, 12).getFamily(Locale.ROOT).equalsIgnoreCase(name)) {
        return new TextFit(name, SPARE);
      }
    }
    return new TextFit(Font.SANS_SERIF, SPARE_OF_STAND_IN);
  }

  /**
   * A text with the size at which it fits.
   *
   * @param text the text, shortened where it had to be
   * @param points its size
   * @param lines lines that it takes
   */
  record Fitted(String text, double points, int lines) {
    double height() {
      return lines * points * LINE;
    }
  }

  double width(String text, double points, boolean strong) {
    return (strong ? bold : plain).getStringBounds(text, CONTEXT).getWidth()
        * points
        / MEASURED_POINTS
        * spare;
  }

  /** Fits a text into a box, in whole points from the most to the least. */
  Fitted fit(String text, double width, double height, double most, double least, boolean strong) {
    for (double points = most; points > least; points -= 1) {
      int lines = lines(text, width, points, strong).size();
      if (lines * points * LINE <= height) {
        return new Fitted(text, points, lines);
      }
    }
    int room = (int) Math.max(1, Math.floor(height / (least * LINE)));
    return clipped(text, width, least, strong, room);
  }

  /** A text of at most so many lines, with an ellipsis where it was longer. */
  Fitted clipped(String text, double width, double points, boolean strong, int mostLines) {
    List<String> lines = lines(text, width, points, strong);
    if (lines.size() <= mostLines) {
      return new Fitted(text, points, Math.max(1, lines.size()));
    }
    StringBuilder kept = new StringBuilder();
    for (String line : lines.subList(0, mostLines - 1)) {
      kept.append(line);
    }
    String last = lines.get(mostLines - 1);
    return new Fitted(kept + ended(last, width, points, strong), points, mostLines);
  }

  /** A text on one line, with an ellipsis where it was longer. */
  String oneLine(String text, double width, double points, boolean strong) {
    return width(text, points, strong) <= width ? text : ended(text, width, points, strong);
  }

  /** Cut at a blank where there is one, so that no number is shown in part. */
  private String ended(String text, double width, double points, boolean strong) {
    String kept = text.stripTrailing();
    boolean whole = width(kept + ELLIPSIS, points, strong) <= width;
    if (!whole) {
      double room = width - width(ELLIPSIS, points, strong);
      kept = kept.substring(0, fitting(kept, room, points, strong)).stripTrailing();
    }
    int blank = kept.lastIndexOf(' ');
    boolean within = kept.length() < text.length() && text.charAt(kept.length()) != ' ';
    if (!whole && within && blank > 0) {
      String part = kept.substring(blank);
      if (part.length() <= SHORT_WORD || part.codePoints().anyMatch(Character::isDigit)) {
        kept = kept.substring(0, blank).stripTrailing();
      }
    }
    return kept + ELLIPSIS;
  }

  /** Lines as they break: at blanks and hyphens, within a word where it is longer than a line. */
  List<String> lines(String text, double width, double points, boolean strong) {
    BreakIterator breaks = BreakIterator.getLineInstance(Locale.ROOT);
    breaks.setText(text);
    List<String> lines = new ArrayList<>();
    StringBuilder line = new StringBuilder();
    int from = breaks.first();
    for (int to = breaks.next(); to != BreakIterator.DONE; from = to, to = breaks.next()) {
      String word = text.substring(from, to);
      if (width(line + word.stripTrailing(), points, strong) > width && line.length() > 0) {
        lines.add(line.toString());
        line.setLength(0);
      }
      line.append(word);
      breakWithin(line, lines, width, points, strong);
    }
    if (line.length() > 0) {
      lines.add(line.toString());
    }
    return lines;
  }

  private void breakWithin(
      StringBuilder line, List<String> lines, double width, double points, boolean strong) {
    while (width(line.toString().stripTrailing(), points, strong) > width) {
      int first = line.offsetByCodePoints(0, 1);
      int cut = Math.max(first, fitting(line.toString(), width, points, strong));
      if (cut >= line.length()) {
        return;
      }
      lines.add(line.substring(0, cut));
      line.delete(0, cut);
    }
  }

  /** Length of the longest beginning that is no wider; found by halving. */
  private int fitting(String text, double width, double points, boolean strong) {
    int fits = 0;
    int beyond = text.codePointCount(0, text.length()) + 1;
    while (beyond - fits > 1) {
      int middle = (fits + beyond) / 2;
      String beginning = text.substring(0, text.offsetByCodePoints(0, middle));
      if (width(beginning, points, strong) <= width) {
        fits = middle;
      } else {
        beyond = middle;
      }
    }
    return text.offsetByCodePoints(0, fits);
  }
}
