package org.kappatrail.intake;

import java.time.format.DateTimeFormatter;
import java.time.format.DateTimeFormatterBuilder;
import java.time.format.ResolverStyle;
import java.time.temporal.ChronoField;
import java.util.Locale;
import java.util.regex.Pattern;

/**
 * A date pattern of the settings, as of {@link DateTimeFormatter}, read strictly: 31 February is no
 * date. Month and day names are English whatever the machine's language, in either case. A year of
 * two digits lies in 1980 to 2079 (tool convention).
 */
final class DatePattern {
  private static final int FIRST_SHORT_YEAR = 1980;
  private static final Pattern SEPT = Pattern.compile("(?i)\\bsept\\b\\.?");
  private static final Pattern BLANKS = Pattern.compile("[\\s\\u00A0\\u202F]+");

  private DatePattern() {}

  /** True for {@code epoch-seconds} and {@code epoch-millis}. */
  static boolean isEpoch(String pattern) {
    return pattern.equals("epoch-seconds") || pattern.equals("epoch-millis");
  }

  static double millis(String pattern, double value) {
    return pattern.equals("epoch-seconds") ? value * 1000 : value;
  }

  /** One blank for every run of blanks, and the usual three letters for September. */
  static String even(String text) {
    return SEPT.matcher(BLANKS.matcher(text).replaceAll(" ")).replaceAll("Sep");
  }

  /**
   * The reader of a pattern.
   *
   * @throws IllegalArgumentException where it is none
   */
  static DateTimeFormatter formatter(String pattern) {
    DateTimeFormatterBuilder builder =
        new DateTimeFormatterBuilder().parseCaseInsensitive().parseLenient();
    StringBuilder part = new StringBuilder();
    int at = 0;
    boolean day = false;
    while (at < pattern.length()) {
      char letter = pattern.charAt(at);
      int end = letter == '\'' ? endOfQuote(pattern, at) : endOfRun(pattern, at);
      String run = pattern.substring(at, end);
      if ((letter == 'y' || letter == 'u') && run.length() == 2) {
        append(builder, part);
        builder.appendValueReduced(ChronoField.YEAR, 2, 2, FIRST_SHORT_YEAR);
        day = true;
      } else {
        day |= letter == 'y' || letter == 'u';
        part.append(letter == 'y' ? "u".repeat(run.length()) : run);
      }
      at = end;
    }
    if (!day) {
      throw new IllegalArgumentException("it has no year; write yyyy or yy for it");
    }
    append(builder, part);
    return builder.toFormatter(Locale.ENGLISH).withResolverStyle(ResolverStyle.STRICT);
  }

  private static void append(DateTimeFormatterBuilder builder, StringBuilder part) {
    if (!part.isEmpty()) {
      builder.appendPattern(part.toString());
      part.setLength(0);
    }
  }

  private static int endOfQuote(String pattern, int start) {
    int close = pattern.indexOf('\'', start + 1);
    if (close < 0) {
      throw new IllegalArgumentException("a quote is not closed");
    }
    return close + 1;
  }

  private static int endOfRun(String pattern, int start) {
    int end = start + 1;
    while (end < pattern.length() && pattern.charAt(end) == pattern.charAt(start)) {
      end++;
    }
    return end;
  }
}
