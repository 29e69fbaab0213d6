package org.kappatrail.duty;

import org.kappatrail.history.UnusableInputException;

/**
 * How a column of times becomes milliseconds since 1970 in DuckDB.
 *
 * @param clockMs expression of the clock reading, ms; NULL where it is no time
 * @param zoned condition under which the reading had an offset, so that it is UTC already
 */
record TimeSql(String clockMs, String zoned) {
  private static final String LOCAL =
      "\\d{4}-\\d\\d-\\d\\d([T ]\\d\\d:\\d\\d(:\\d\\d([.,]\\d+)?)?)?";
  private static final String OFFSET =
      "\\d{4}-\\d\\d-\\d\\d[T ]\\d\\d:\\d\\d(:\\d\\d([.,]\\d+)?)? ?(Z|[+-]\\d\\d(:?\\d\\d)?)";

  /** Times as ISO 8601 texts, a blank allowed in place of the T. */
  static TimeSql iso(String column) {
    String tidy = "replace(replace(trim(" + column + "), ',', '.'), ' +', '+')";
    // As long as yyyy-MM-ddTHH:mm:ss and with its last colon: needs no closer look.
    String plain = "length(" + column + ") = 19 AND " + column + "[17] = ':'";
    String zoned =
        "CASE WHEN "
            + plain
            + " THEN FALSE ELSE regexp_full_match(trim("
            + column
            + "), "
            + SqlText.literal(OFFSET)
            + ") END";
    String clock =
        "CASE WHEN "
            + plain
            + " THEN epoch_ms(TRY_CAST("
            + column
            + " AS TIMESTAMP)) WHEN regexp_full_match(trim("
            + column
            + "), "
            + SqlText.literal(LOCAL)
            + ") THEN epoch_ms(TRY_CAST("
            + tidy
            + " AS TIMESTAMP)) WHEN regexp_full_match(trim("
            + column
            + "), "
            + SqlText.literal(OFFSET)
            + ") THEN epoch_ms(TRY_CAST("
            + tidy
            + " AS TIMESTAMPTZ)) END";
    return new TimeSql(clock, zoned);
  }

  /** Times of a typed column; {@code format} tells what whole numbers count. */
  static TimeSql typed(String column, String type, String format, String place) {
    if (type.startsWith("TIMESTAMP WITH TIME ZONE")) {
      return new TimeSql("epoch_ms(" + column + ")", "TRUE");
    }
    if (type.startsWith("TIMESTAMP") || type.equals("DATE")) {
      return new TimeSql("epoch_ms(CAST(" + column + " AS TIMESTAMP))", "FALSE");
    }
    if (NumberSql.isNumeric(type)) {
      return epoch("CAST(" + column + " AS DOUBLE)", format, place);
    }
    throw new UnusableInputException(
        place + ": a column of type " + type + " holds no times; give a text or a timestamp");
  }

  /** Times as counts since 1970. */
  static TimeSql epoch(String number, String format, String place) {
    String factor =
        switch (format) {
          case "epoch-seconds" -> "1000";
          case "epoch-millis" -> "1";
          default ->
              throw new UnusableInputException(
                  place
                      + ": times are numbers; set date-format: epoch-seconds or epoch-millis for"
                      + " this file");
        };
    String ms = "FLOOR(" + number + " * " + factor + " + 0.5)";
    return new TimeSql(
        "CASE WHEN " + ms + " BETWEEN 0 AND 1e15 THEN CAST(" + ms + " AS BIGINT) END", "TRUE");
  }
}
