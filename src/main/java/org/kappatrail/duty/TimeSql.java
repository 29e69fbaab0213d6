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

  /** Forms that most logs have, told by length and end; a regular expression costs far more. */
  private static final String PLAIN_LOCAL = "length({t}) = 19 AND {t} LIKE '%:__'";

  private static final String PLAIN_UTC =
      "suffix({t}, 'Z') AND CASE length({t}) WHEN 20 THEN TRUE ELSE {t} LIKE '%:__.%Z' END";

  /** Times as ISO 8601 texts, a blank allowed in place of the T. */
  static TimeSql iso(String column) {
    return new TimeSql(
        """
        CASE
          WHEN {local} THEN epoch_ms(TRY_CAST({t} AS TIMESTAMP))
          WHEN {utc} THEN epoch_ms(TRY_CAST({t} AS TIMESTAMP))
          WHEN {odd_local} THEN epoch_ms(TRY_CAST({tidy} AS TIMESTAMP))
          WHEN {odd_offset} THEN epoch_ms(TRY_CAST({tidy} AS TIMESTAMPTZ))
        END"""
            .replace("{local}", PLAIN_LOCAL)
            .replace("{utc}", PLAIN_UTC)
            .replace("{odd_local}", matches(LOCAL))
            .replace("{odd_offset}", matches(OFFSET))
            .replace("{tidy}", "replace(replace(trim({t}), ',', '.'), ' +', '+')")
            .replace("{t}", column),
        "CASE WHEN {local} THEN FALSE WHEN {utc} THEN TRUE ELSE {odd_offset} END"
            .replace("{local}", PLAIN_LOCAL)
            .replace("{utc}", PLAIN_UTC)
            .replace("{odd_offset}", matches(OFFSET))
            .replace("{t}", column));
  }

  private static String matches(String pattern) {
    return "regexp_full_match(trim({t}), " + SqlText.literal(pattern) + ")";
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
