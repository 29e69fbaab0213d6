package org.kappatrail.intake;

import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The date pattern of a column, as far as its values tell.
 *
 * @param pattern pattern for the settings; empty for ISO 8601
 * @param doubt what the values leave open
 */
record DateGuess(Optional<String> pattern, Optional<String> doubt) {
  private static final String TIME =
      "(?<time>[T ]\\s*\\d{1,2}:\\d{2}(?<seconds>:\\d{2}(?<fraction>[.,]\\d{1,6})?)?"
          + "(?<half>\\s?[AaPp]\\.?[Mm]\\.?)?)?";
  private static final Pattern NUMERIC =
      Pattern.compile(
          "(?<a>\\d{1,2})(?<sep>[-/.])(?<b>\\d{1,2})[-/.](?<year>\\d{4}|\\d{2})" + TIME);
  private static final Pattern YEAR_FIRST =
      Pattern.compile("\\d{4}(?<sep>[-/.])\\d{1,2}[-/.]\\d{1,2}" + TIME);
  private static final Pattern NAMED =
      Pattern.compile(
          "\\d{1,2}(?<sep>[- ./])(?<name>\\p{L}{3,9})[- ./](?<year>\\d{4}|\\d{2})" + TIME);
  private static final Pattern NAME_FIRST =
      Pattern.compile("(?<name>\\p{L}{3,9}) \\d{1,2}(?<comma>,?) ?(?<year>\\d{4})" + TIME);
  private static final DateText ISO = DateText.iso(java.time.ZoneOffset.UTC);

  /** The guess for the values of a column; empty where they are no dates. */
  static Optional<DateGuess> of(List<String> values) {
    if (values.isEmpty()) {
      return Optional.empty();
    }
    if (values.stream().allMatch(value -> ISO.parse(value, false).isPresent())) {
      return Optional.of(new DateGuess(Optional.empty(), Optional.empty()));
    }
    if (values.stream().allMatch(value -> value.matches("\\d{10}|\\d{13}"))) {
      boolean seconds = values.get(0).length() == 10;
      return Optional.of(
          new DateGuess(Optional.of(seconds ? "epoch-seconds" : "epoch-millis"), Optional.empty()));
    }
    if (values.stream().allMatch(value -> value.matches("(19|20)\\d{6}"))) {
      return Optional.of(new DateGuess(Optional.of("yyyyMMdd"), Optional.empty()));
    }
    for (Pattern form : List.of(NUMERIC, YEAR_FIRST, NAMED, NAME_FIRST)) {
      List<Matcher> matched =
          values.stream()
              .map(DatePattern::even)
              .map(form::matcher)
              .filter(Matcher::matches)
              .toList();
      if (matched.size() * 10 >= values.size() * 8) {
        return Optional.of(guess(form, matched));
      }
    }
    return Optional.empty();
  }

  private static DateGuess guess(Pattern form, List<Matcher> matched) {
    Matcher one = matched.get(0);
    String day;
    Optional<String> doubt = Optional.empty();
    if (form == NUMERIC) {
      String sep = one.group("sep");
      String year = one.group("year").length() == 2 ? "yy" : "yyyy";
      boolean dayFirst = matched.stream().anyMatch(m -> Integer.parseInt(m.group("a")) > 12);
      boolean monthFirst = matched.stream().anyMatch(m -> Integer.parseInt(m.group("b")) > 12);
      day =
          monthFirst && !dayFirst ? "MM" + sep + "dd" + sep + year : "dd" + sep + "MM" + sep + year;
      String other = "MM" + sep + "dd" + sep + year + time(matched);
      if (dayFirst && monthFirst) {
        doubt = Optional.of("some dates fit day first only, others month first only; see which");
      } else if (!dayFirst && !monthFirst) {
        doubt =
            Optional.of(
                "day or month first cannot be told, no day is past the 12th; else write " + other);
      }
    } else if (form == YEAR_FIRST) {
      day = "yyyy" + one.group("sep") + "MM" + one.group("sep") + "dd";
    } else {
      String name = matched.stream().anyMatch(m -> m.group("name").length() > 4) ? "MMMM" : "MMM";
      String year = one.group("year").length() == 2 ? "yy" : "yyyy";
      day =
          form == NAMED
              ? "d" + one.group("sep") + name + one.group("sep") + year
              : name + " d" + one.group("comma") + " " + year;
    }
    String pattern = day + time(matched);
    DateText reader =
        new DateText(
            Optional.of(pattern), java.time.ZoneOffset.UTC, java.time.ZoneOffset.UTC, false);
    List<String> unread =
        matched.stream()
            .map(Matcher::group)
            .filter(text -> reader.parse(text, false).isEmpty())
            .toList();
    if (doubt.isEmpty() && !unread.isEmpty()) {
      doubt =
          Optional.of("it does not read '" + unread.get(0) + "'; names of months must be English");
    }
    return new DateGuess(Optional.of(pattern), doubt);
  }

  private static String time(List<Matcher> matched) {
    List<Matcher> timed = matched.stream().filter(m -> m.group("time") != null).toList();
    if (timed.isEmpty()) {
      return "";
    }
    Matcher one = timed.get(0);
    boolean half = timed.stream().anyMatch(m -> m.group("half") != null);
    StringBuilder pattern = new StringBuilder(one.group("time").startsWith("T") ? "'T'" : " ");
    pattern.append(half ? "h" : "H").append(":mm");
    if (one.group("seconds") != null) {
      pattern.append(":ss");
      String fraction = one.group("fraction");
      if (fraction != null) {
        pattern.append(fraction.charAt(0)).append("S".repeat(fraction.length() - 1));
      }
    }
    if (half) {
      String written = one.group("half");
      pattern.append(written != null && written.startsWith(" ") ? " a" : "a");
    }
    return timed.size() == matched.size() ? pattern.toString() : "[" + pattern + "]";
  }
}
