package org.kappatrail.report.chart;

import java.awt.Font;

/** The system's sans serif. */
final class ChartFont {
  private ChartFont() {}

  static Font of(float size) {
    return new Font(Font.SANS_SERIF, Font.PLAIN, 1).deriveFont(size);
  }

  static Font bold(float size) {
    return new Font(Font.SANS_SERIF, Font.BOLD, 1).deriveFont(size);
  }
}
