package org.kappatrail.duty;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * The distinct texts of one file that the statement could not use, by kind. The engine itself tells
 * them, so that what is reported is what was left out.
 */
final class OddTexts {
  /** Stands between asset and bearing in the text of an unknown bearing. */
  static final char BETWEEN = '\u0001';

  private static final int MOST_TEXTS = 20_000;

  /**
   * How often a text stands in the file.
   *
   * @param count rows
   * @param firstRow first row of a Parquet file; 0 in a CSV file
   */
  record Occurrence(long count, long firstRow) {
    private Occurrence plus(Occurrence other) {
      return new Occurrence(count + other.count, Math.min(firstRow, other.firstRow));
    }
  }

  private final Map<CellFault, Map<String, Occurrence>> texts = new EnumMap<>(CellFault.class);

  /** The texts of a kind; empty where there are none. */
  Map<String, Occurrence> of(CellFault fault) {
    return texts.getOrDefault(fault, Map.of());
  }

  /** A text as it is looked for: readers of CSV differ in the blanks around it. */
  static String key(String text) {
    return text.strip();
  }

  /** The same texts but some of one kind. */
  OddTexts without(CellFault fault, Set<String> some) {
    OddTexts rest = new OddTexts();
    rest.texts.putAll(texts);
    Map<String, Occurrence> left = new LinkedHashMap<>(of(fault));
    left.keySet().removeAll(some);
    rest.texts.put(fault, left);
    return rest;
  }

  /**
   * Asks for the texts.
   *
   * @param readings query of the readings of that file alone, with their texts
   */
  static OddTexts find(DuckEngine engine, String readings, boolean withFlaws) throws SQLException {
    OddTexts odd = new OddTexts();
    try (Statement statement = engine.statement()) {
      odd.ask(statement, faults(readings));
      if (withFlaws) {
        odd.ask(statement, flaws(readings));
      }
    }
    return odd;
  }

  private void ask(Statement statement, String sql) throws SQLException {
    try (ResultSet rows = statement.executeQuery(sql)) {
      while (rows.next()) {
        CellFault fault = CellFault.valueOf(rows.getString(1));
        texts
            .computeIfAbsent(fault, key -> new LinkedHashMap<>())
            .merge(
                key(rows.getString(2)),
                new Occurrence(rows.getLong(3), rows.getLong(4)),
                Occurrence::plus);
      }
    }
  }

  private static String faults(String readings) {
    StringBuilder kind = new StringBuilder("CASE fault");
    StringBuilder text = new StringBuilder("CASE fault");
    List<String> codes = new ArrayList<>();
    for (CellFault fault : CellFault.values()) {
      if (fault.state().isReading()) {
        continue;
      }
      int code = fault.state().code();
      codes.add(Integer.toString(code));
      kind.append(" WHEN ").append(code).append(" THEN '").append(fault.name()).append('\'');
      text.append(" WHEN ").append(code).append(" THEN ").append(textOf(fault));
    }
    return grouped(
        kind + " END", text + " END", readings, "fault IN (" + String.join(", ", codes) + ")");
  }

  private static String flaws(String readings) {
    String kind =
        "CASE WHEN regexp_matches(speed_text, '\\d') THEN '"
            + CellFault.SPEED.name()
            + "' ELSE '"
            + CellFault.SPEED_STATUS.name()
            + "' END";
    return grouped(kind, "speed_text", readings, "flaw = 1 AND fault NOT BETWEEN 4 AND 6");
  }

  private static String grouped(String kind, String text, String readings, String where) {
    return "SELECT kind, text, COUNT(*), MIN(row_number) FROM (SELECT "
        + kind
        + " AS kind, COALESCE("
        + text
        + ", '') AS text, row_number FROM ("
        + readings
        + ") WHERE "
        + where
        + ") GROUP BY kind, text ORDER BY kind, text LIMIT "
        + MOST_TEXTS;
  }

  private static String textOf(CellFault fault) {
    return switch (fault) {
      case TIME -> "time_text";
      case BEARING ->
          "concat(COALESCE(asset_text, ''), chr("
              + (int) BETWEEN
              + "), COALESCE(bearing_text, ''))";
      case QUALITY -> "quality_text";
      case TEMPERATURE, TEMPERATURE_STATUS -> "temperature_text";
      case SPEED, SPEED_STATUS -> "speed_text";
      case CELLS -> "''";
    };
  }
}
