package org.kappatrail.report.page;

import org.kappatrail.review.Level;

/** A level as shape and word: thin ring, half-filled diamond, filled square, in ink. */
final class LevelMark {
  private LevelMark() {}

  /** Markup of the mark with its word. */
  static String of(Level level) {
    String shape =
        switch (level) {
          case CLEAR -> "<circle cx=\"7\" cy=\"7\" r=\"5\" class=\"mark-line\"/>";
          case ALERT ->
              "<path d=\"M7 1 L13 7 L7 13 L1 7 Z\" class=\"mark-line\"/>"
                  + "<path d=\"M7 1 L7 13 L1 7 Z\" class=\"mark-fill\"/>";
          case ALARM ->
              "<rect x=\"1.5\" y=\"1.5\" width=\"11\" height=\"11\" class=\"mark-fill\"/>";
        };
    return "<span class=\"level\"><svg viewBox=\"0 0 14 14\" width=\"14\" height=\"14\""
        + " aria-hidden=\"true\">"
        + shape
        + "</svg> "
        + level.label()
        + "</span>";
  }
}
