package org.kappatrail.duty;

/**
 * Why a row of a file is no reading, as SQL expressions over the columns of FileReadings. What most
 * rows need not pass stands in a CASE, which skips it; AND and OR evaluate both sides.
 */
final class FaultSql {
  /** Marks that historians put on readings which are not good; they are counted, not reported. */
  private static final String KNOWN_BAD =
      "'bad|uncertain|questionable|substituted|suspect|stale|-?\\d+'";

  private FaultSql() {}

  /** Long form: a ReadingState code, 0 where the reading may be used. */
  static String fault() {
    return "CASE WHEN trim(overflow) <> '' THEN "
        + ReadingState.TOO_MANY_CELLS.code()
        + " WHEN instant_ms IS NULL THEN "
        + ReadingState.TIME_UNREADABLE.code()
        + " WHEN names.bearing IS NULL THEN "
        + ReadingState.UNKNOWN_BEARING.code()
        + " WHEN "
        + isNotGood("quality_text")
        + " THEN "
        + badQuality("quality_text")
        + " WHEN temperature IS NULL THEN "
        + noTemperature()
        + " ELSE 0 END";
  }

  /** True where a quality mark stands there and is not good. */
  static String isNotGood(String mark) {
    return """
        CASE
          WHEN {q} IS NULL OR {q} IN ('Good', 'good', 'GOOD', '192') THEN FALSE
          ELSE lower(trim({q})) NOT IN ('good', '192', '')
        END"""
        .replace("{q}", mark);
  }

  /** The state of a mark that is not good. */
  static String badQuality(String mark) {
    return "CASE WHEN regexp_full_match(lower(trim("
        + mark
        + ")), "
        + KNOWN_BAD
        + ") THEN "
        + ReadingState.BAD_QUALITY.code()
        + " ELSE "
        + ReadingState.UNKNOWN_QUALITY.code()
        + " END";
  }

  /** The state of a temperature that is no number. */
  static String noTemperature() {
    return "CASE WHEN temperature_text IS NULL OR "
        + MissingSql.isUsual("temperature_text")
        + " THEN "
        + ReadingState.NO_TEMPERATURE.code()
        + " WHEN regexp_matches(temperature_text, '\\d') THEN "
        + ReadingState.TEMPERATURE_UNREADABLE.code()
        + " ELSE "
        + ReadingState.STATUS_TEXT.code()
        + " END";
  }

  /** 1 where a speed stands there and is no number. */
  static String flaw() {
    return "CASE WHEN speed IS NOT NULL THEN 0 WHEN speed_text IS NULL THEN 0 WHEN "
        + MissingSql.isUsual("speed_text")
        + " THEN 0 ELSE 1 END";
  }
}
