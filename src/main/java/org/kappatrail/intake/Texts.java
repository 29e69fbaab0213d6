package org.kappatrail.intake;

import java.text.Normalizer;
import java.util.List;
import java.util.Locale;
import java.util.regex.Pattern;
import org.kappatrail.history.MissingTexts;

/** Handling of cell and header texts. */
final class Texts {
  /** What a decoder puts in place of a byte that is none in the encoding. */
  static final char REPLACEMENT = '\uFFFD';

  /** Texts that stand for a missing name; shorter, as a name may be NA or ND. */
  private static final List<String> MISSING_NAME =
      List.of("", "-", "–", "—", "--", "n/a", "#n/a", "null", "none");

  private static final Pattern BRACKETS = Pattern.compile("[(\\[{][^)\\]}]*[)\\]}]");
  private static final Pattern ACCENTS = Pattern.compile("\\p{M}+");
  private static final Pattern OTHER = Pattern.compile("[^\\p{L}\\p{N}%]+");
  private static final Pattern BLANKS = Pattern.compile("[\\s\\u00A0]+");

  private Texts() {}

  /** Without blanks at both ends; no-break blanks and byte order marks are blanks too. */
  static String clean(String text) {
    int start = 0;
    int end = text.length();
    while (start < end && isBlank(text.charAt(start))) {
      start++;
    }
    while (end > start && isBlank(text.charAt(end - 1))) {
      end--;
    }
    return text.substring(start, end);
  }

  static boolean isMissing(String cleaned) {
    return MissingTexts.isUsual(cleaned);
  }

  static boolean isMissingName(String cleaned) {
    return MISSING_NAME.contains(cleaned.toLowerCase(Locale.ROOT));
  }

  /**
   * A column name to compare by: lower case, no accents, runs of anything else as one {@code _}.
   */
  static String key(String header) {
    String plain = Normalizer.normalize(clean(header), Normalizer.Form.NFKD);
    plain = ACCENTS.matcher(plain).replaceAll("").toLowerCase(Locale.ROOT);
    plain = plain.replace("ß", "ss").replace("µ", "u").replace("μ", "u");
    plain = OTHER.matcher(plain).replaceAll("_");
    return trimUnderscores(plain);
  }

  /** As {@link #key}, without what stands in brackets. */
  static String keyWithoutBrackets(String header) {
    return key(BRACKETS.matcher(header).replaceAll(" "));
  }

  /** Name that a further column goes by: lower case, blanks as {@code _}. */
  static String columnName(String header) {
    return BLANKS.matcher(clean(header).toLowerCase(Locale.ROOT)).replaceAll("_");
  }

  private static String trimUnderscores(String text) {
    int start = text.startsWith("_") ? 1 : 0;
    int end = text.length() > start && text.endsWith("_") ? text.length() - 1 : text.length();
    return text.substring(start, end);
  }

  private static boolean isBlank(char letter) {
    return Character.isWhitespace(letter)
        || letter == '\u00A0'
        || letter == '\u202F'
        || letter == '\u2007'
        || letter == '\uFEFF'
        || letter == '\u200B';
  }
}
