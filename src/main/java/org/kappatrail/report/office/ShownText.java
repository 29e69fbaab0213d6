package org.kappatrail.report.office;

/**
 * Text from outside as it can stand in an office file: the text itself, without what would be
 * unlawful in XML or would act on the text around it.
 */
public final class ShownText {
  private static final char LEFT_TO_RIGHT_MARK = '\u200E';
  private static final char REPLACEMENT = '\uFFFD';
  private static final int NARROW_BLANK = 0x202F;

  private ShownText() {}

  /**
   * On one line: runs of white space become a blank, control characters and overrides of the
   * writing direction go, lone halves of a surrogate pair become U+FFFD. Text with letters that run
   * from right to left ends with a mark that keeps what follows it in its place.
   */
  public static String of(String text) {
    StringBuilder shown = new StringBuilder(text.length());
    boolean blank = false;
    boolean leftward = false;
    for (int point : text.codePoints().toArray()) {
      if (isBlank(point)) {
        blank = true;
      } else if (isLawful(point)) {
        if (blank && shown.length() > 0) {
          shown.append(' ');
        }
        blank = false;
        leftward |= runsLeftward(point);
        shown.appendCodePoint(isHalf(point) ? REPLACEMENT : point);
      }
    }
    return leftward ? shown.append(LEFT_TO_RIGHT_MARK).toString() : shown.toString();
  }

  /** The narrow blank between thousands is kept as it is. */
  private static boolean isBlank(int point) {
    return Character.isWhitespace(point) || (Character.isSpaceChar(point) && point != NARROW_BLANK);
  }

  private static boolean isHalf(int point) {
    return point >= Character.MIN_SURROGATE && point <= Character.MAX_SURROGATE;
  }

  private static boolean isLawful(int point) {
    boolean override = (point >= 0x202A && point <= 0x202E) || (point >= 0x2066 && point <= 0x2069);
    boolean unlawful = point == 0xFFFE || point == 0xFFFF || Character.isISOControl(point);
    return !override && !unlawful;
  }

  private static boolean runsLeftward(int point) {
    byte direction = Character.getDirectionality(point);
    return direction == Character.DIRECTIONALITY_RIGHT_TO_LEFT
        || direction == Character.DIRECTIONALITY_RIGHT_TO_LEFT_ARABIC;
  }
}
