package org.kappatrail.intake;

import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;

/**
 * How a file writes numbers, as far as its values tell.
 *
 * @param decimalComma true where the comma is the decimal sign
 * @param thousands separator of thousands
 * @param doubt what the values leave open
 */
record NumberGuess(boolean decimalComma, Optional<String> thousands, Optional<String> doubt) {
  private static final Pattern BOUND = Pattern.compile("^[<>≤≥=\\s\\u00A0]+|\\s*%$");
  private static final Pattern SURE_COMMA = Pattern.compile("[+-]?\\d+,(\\d{1,2}|\\d{4,})");
  private static final Pattern SURE_POINT = Pattern.compile("[+-]?\\d*\\.(\\d{1,2}|\\d{4,})");
  private static final Pattern ZERO_COMMA = Pattern.compile("[+-]?(0|\\d{4,}),\\d+");
  private static final Pattern ZERO_POINT = Pattern.compile("[+-]?(0|\\d{4,})\\.\\d+");
  private static final Pattern POINT_GROUPS = Pattern.compile("[+-]?\\d{1,3}(\\.\\d{3})+,\\d+");
  private static final Pattern COMMA_GROUPS = Pattern.compile("[+-]?\\d{1,3}(,\\d{3})+\\.\\d+");
  private static final Pattern MANY_POINTS = Pattern.compile("[+-]?\\d{1,3}(\\.\\d{3}){2,}");
  private static final Pattern MANY_COMMAS = Pattern.compile("[+-]?\\d{1,3}(,\\d{3}){2,}");
  private static final Pattern OPEN_COMMA = Pattern.compile("[+-]?[1-9]\\d{0,2},\\d{3}");
  private static final Pattern OPEN_POINT = Pattern.compile("[+-]?[1-9]\\d{0,2}\\.\\d{3}");
  private static final Pattern BLANK_GROUPS =
      Pattern.compile("[+-]?\\d{1,3}([ \\u00A0\\u202F\\u2009]\\d{3})+([.,]\\d+)?");
  private static final Pattern TICK_GROUPS = Pattern.compile("[+-]?\\d{1,3}('\\d{3})+([.,]\\d+)?");

  /** The guess for all values of columns of numbers. */
  static NumberGuess of(List<String> texts) {
    List<String> values = texts.stream().map(text -> BOUND.matcher(text).replaceAll("")).toList();
    boolean comma = any(values, SURE_COMMA, ZERO_COMMA, POINT_GROUPS, MANY_POINTS);
    boolean point = any(values, SURE_POINT, ZERO_POINT, COMMA_GROUPS, MANY_COMMAS);
    boolean openComma = any(values, OPEN_COMMA);
    boolean openPoint = any(values, OPEN_POINT);
    if (comma && point) {
      return new NumberGuess(
          false,
          Optional.empty(),
          Optional.of("some numbers have a decimal comma and others a decimal point; see which"));
    }
    Optional<String> groups = groups(values);
    if (comma) {
      boolean pointGroups = any(values, POINT_GROUPS, MANY_POINTS) || openPoint;
      return new NumberGuess(true, pointGroups ? Optional.of(".") : groups, Optional.empty());
    }
    if (point) {
      boolean commaGroups = any(values, COMMA_GROUPS, MANY_COMMAS) || openComma;
      return new NumberGuess(false, commaGroups ? Optional.of(",") : groups, Optional.empty());
    }
    if (openComma) {
      return new NumberGuess(
          true,
          groups,
          Optional.of(
              "1,234 may be one and a bit or a thousand and more; for thousands write decimal:"
                  + " point and thousands: \",\""));
    }
    if (openPoint) {
      return new NumberGuess(
          false,
          groups,
          Optional.of(
              "1.234 may be one and a bit or a thousand and more; for thousands write decimal:"
                  + " comma and thousands: \".\""));
    }
    return new NumberGuess(false, groups, Optional.empty());
  }

  private static Optional<String> groups(List<String> values) {
    if (any(values, BLANK_GROUPS)) {
      return Optional.of(" ");
    }
    return any(values, TICK_GROUPS) ? Optional.of("'") : Optional.empty();
  }

  private static boolean any(List<String> values, Pattern... patterns) {
    for (Pattern pattern : patterns) {
      if (values.stream().anyMatch(value -> pattern.matcher(value).matches())) {
        return true;
      }
    }
    return false;
  }
}
