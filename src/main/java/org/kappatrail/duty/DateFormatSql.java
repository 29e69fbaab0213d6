package org.kappatrail.duty;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.kappatrail.history.UnusableInputException;

/** Times in a pattern of {@link java.time.format.DateTimeFormatter}, read by DuckDB. */
final class DateFormatSql {
  private static final Map<String, String> SPECIFIERS =
      Map.ofEntries(
          Map.entry("yyyy", "%Y"),
          Map.entry("uuuu", "%Y"),
          Map.entry("yy", "%y"),
          Map.entry("uu", "%y"),
          Map.entry("MMMM", "%B"),
          Map.entry("MMM", "%b"),
          Map.entry("MM", "%m"),
          Map.entry("M", "%-m"),
          Map.entry("dd", "%d"),
          Map.entry("d", "%-d"),
          Map.entry("EEE", "%a"),
          Map.entry("EEEE", "%A"),
          Map.entry("HH", "%H"),
          Map.entry("H", "%-H"),
          Map.entry("hh", "%I"),
          Map.entry("h", "%-I"),
          Map.entry("a", "%p"),
          Map.entry("mm", "%M"),
          Map.entry("m", "%-M"),
          Map.entry("ss", "%S"),
          Map.entry("s", "%-S"),
          Map.entry("SSS", "%g"),
          Map.entry("SSSSSS", "%f"),
          Map.entry("X", "%z"),
          Map.entry("XX", "%z"),
          Map.entry("XXX", "%z"),
          Map.entry("x", "%z"),
          Map.entry("xx", "%z"),
          Map.entry("xxx", "%z"),
          Map.entry("Z", "%z"));

  private DateFormatSql() {}

  /** The text column's times; {@code format} may also be epoch-seconds or epoch-millis. */
  static TimeSql of(String column, String format, String place) {
    if (format.startsWith("epoch-")) {
      return TimeSql.epoch("TRY_CAST(" + column + " AS DOUBLE)", format, place);
    }
    List<String> specifiers =
        variants(format).stream().map(DateFormatSql::specifiers).distinct().toList();
    boolean zoned = specifiers.stream().anyMatch(each -> each.contains("%z"));
    if (zoned && !specifiers.stream().allMatch(each -> each.contains("%z"))) {
      throw new UnusableInputException(
          "kappatrail.yaml: temperatures: date-format '"
              + format
              + "': an offset cannot be optional in a log");
    }
    String text = "trim(" + column + ")";
    if (format.contains("X")) {
      text = "regexp_replace(" + text + ", 'Z$', '+00')";
    }
    String parsed = "try_strptime(" + text + ", [" + SqlText.literals(specifiers) + "])";
    return new TimeSql("epoch_ms(" + parsed + ")", zoned ? "TRUE" : "FALSE");
  }

  /** The patterns with and without each part in square brackets, the longest first. */
  private static List<String> variants(String format) {
    int open = indexOutsideQuotes(format, '[', 0);
    if (open < 0) {
      return List.of(format);
    }
    int close = indexOutsideQuotes(format, ']', open);
    int nested = indexOutsideQuotes(format, '[', open + 1);
    if (close < 0 || (nested >= 0 && nested < close)) {
      throw new UnusableInputException(
          "kappatrail.yaml: temperatures: date-format '"
              + format
              + "': brackets close and do not nest");
    }
    String before = format.substring(0, open);
    String part = format.substring(open + 1, close);
    List<String> variants = new ArrayList<>();
    for (String rest : variants(format.substring(close + 1))) {
      variants.add(before + part + rest);
      variants.add(before + rest);
    }
    return variants;
  }

  private static int indexOutsideQuotes(String format, char sign, int from) {
    boolean quoted = false;
    for (int at = from; at < format.length(); at++) {
      quoted ^= format.charAt(at) == '\'';
      if (!quoted && format.charAt(at) == sign) {
        return at;
      }
    }
    return -1;
  }

  private static String specifiers(String format) {
    StringBuilder specifiers = new StringBuilder();
    int at = 0;
    while (at < format.length()) {
      char letter = format.charAt(at);
      int end = at + 1;
      if (letter == '\'') {
        end = endOfQuote(format, at);
        specifiers.append(literal(format.substring(at + 1, end - 1)));
      } else if (Character.isLetter(letter)) {
        while (end < format.length() && format.charAt(end) == letter) {
          end++;
        }
        specifiers.append(specifier(format, format.substring(at, end)));
      } else {
        specifiers.append(literal(Character.toString(letter)));
      }
      at = end;
    }
    return specifiers.toString();
  }

  private static int endOfQuote(String format, int start) {
    int close = format.indexOf('\'', start + 1);
    if (close < 0) {
      throw new UnusableInputException(
          "kappatrail.yaml: temperatures: date-format '" + format + "': a quote is not closed");
    }
    return close + 1;
  }

  private static String literal(String text) {
    return text.replace("%", "%%");
  }

  private static String specifier(String format, String letters) {
    String specifier = SPECIFIERS.get(letters);
    if (specifier == null) {
      throw new UnusableInputException(
          "kappatrail.yaml: temperatures: date-format '"
              + format
              + "': '"
              + letters
              + "' cannot be read in a log; use yyyy MM dd HH hh mm ss SSS a MMM XXX,"
              + " or epoch-seconds or epoch-millis");
    }
    return specifier;
  }
}
