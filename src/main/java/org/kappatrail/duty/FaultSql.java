package org.kappatrail.duty;

/** Why a row of a file is no reading, as an SQL expression over the columns of LongReadings. */
final class FaultSql {
  /** Marks that historians put on readings which are not good; they are counted, not reported. */
  private static final String KNOWN_BAD =
      "'bad|uncertain|questionable|substituted|suspect|stale|-?\\d+'";

  private FaultSql() {}

  /** A ReadingState code, 0 where the reading may be used. */
  static String fault() {
    return "CASE WHEN trim(overflow) <> '' THEN "
        + ReadingState.TOO_MANY_CELLS.code()
        + " WHEN instant_ms IS NULL THEN "
        + ReadingState.TIME_UNREADABLE.code()
        + " WHEN names.bearing IS NULL THEN "
        + ReadingState.UNKNOWN_BEARING.code()
        + " WHEN quality_text IS NOT NULL AND quality_text NOT IN ('Good', 'good', 'GOOD', '192')"
        + " AND lower(trim(quality_text)) NOT IN ('good', '192', '') THEN CASE WHEN"
        + " regexp_full_match(lower(trim(quality_text)), "
        + KNOWN_BAD
        + ") THEN "
        + ReadingState.BAD_QUALITY.code()
        + " ELSE "
        + ReadingState.UNKNOWN_QUALITY.code()
        + " END WHEN temperature IS NULL THEN CASE WHEN temperature_text IS NULL OR"
        + " trim(temperature_text) = '' THEN "
        + ReadingState.NO_TEMPERATURE.code()
        + " WHEN regexp_matches(temperature_text, '\\d') THEN "
        + ReadingState.TEMPERATURE_UNREADABLE.code()
        + " ELSE "
        + ReadingState.STATUS_TEXT.code()
        + " END ELSE 0 END";
  }

  /** 1 where a speed stands there and is no number. */
  static String flaw() {
    return "CASE WHEN speed IS NULL AND trim(speed_text) <> '' THEN 1 ELSE 0 END";
  }
}
