package org.kappatrail.report.chart;

/** Text from outside as a picture can carry it. */
final class PlainText {
  private PlainText() {}

  /**
   * The text without what would be unlawful in XML or would turn the writing direction of what
   * stands beside it: control characters and lone halves of a surrogate pair become U+FFFD,
   * directional overrides and isolates go.
   */
  static String of(String text) {
    StringBuilder plain = new StringBuilder(text.length());
    text.codePoints()
        .filter(point -> !turnsDirection(point))
        .map(point -> lawful(point) ? point : 0xFFFD)
        .forEach(plain::appendCodePoint);
    return plain.toString();
  }

  private static boolean turnsDirection(int point) {
    return (point >= 0x202A && point <= 0x202E) || (point >= 0x2066 && point <= 0x2069);
  }

  private static boolean lawful(int point) {
    boolean half = point >= Character.MIN_SURROGATE && point <= Character.MAX_SURROGATE;
    return !half && !Character.isISOControl(point) && point != 0xFFFE && point != 0xFFFF;
  }
}
