package org.kappatrail.duty;

import java.util.List;
import java.util.stream.Collectors;

/** Quotes names and texts for SQL. */
final class SqlText {
  private SqlText() {}

  static String literal(String text) {
    return "'" + text.replace("'", "''") + "'";
  }

  static String identifier(String name) {
    return "\"" + name.replace("\"", "\"\"") + "\"";
  }

  static String literals(List<String> texts) {
    return texts.stream().map(SqlText::literal).collect(Collectors.joining(", "));
  }
}
