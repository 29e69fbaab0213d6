package org.kappatrail.report.chart;

import java.awt.Graphics2D;

/** Shortens text to a width. */
final class Fitted {
  private Fitted() {}

  /** The text, or its beginning with an ellipsis where it is wider than a number of px. */
  static String to(Graphics2D g, String anyText, double width) {
    String text = PlainText.of(anyText);
    if (g.getFontMetrics().stringWidth(text) <= width) {
      return text;
    }
    int end = text.length();
    while (end > 0 && g.getFontMetrics().stringWidth(text.substring(0, end) + "…") > width) {
      end = text.offsetByCodePoints(end, -1);
    }
    return text.substring(0, end).stripTrailing() + "…";
  }
}
