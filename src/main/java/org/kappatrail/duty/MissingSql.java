package org.kappatrail.duty;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.MissingTexts;

/**
 * Cells that stand for a missing value: the usual texts, and those that {@code missing:} names.
 * They are read as if they were empty.
 */
final class MissingSql {
  private MissingSql() {}

  /** The text column, NULL where the settings take its text for missing. */
  static String withoutNamed(String text, ExportMapping mapping) {
    if (mapping.missing().isEmpty()) {
      return text;
    }
    return "CASE WHEN trim({t}) IN ({missing}) THEN NULL ELSE {t} END"
        .replace("{t}", text)
        .replace(
            "{missing}", SqlText.literals(mapping.missing().stream().map(String::strip).toList()));
  }

  /** The number, NULL where it is one that the settings take for missing. */
  static String withoutNamedNumber(String number, ExportMapping mapping) {
    List<String> numbers = numbers(mapping);
    return numbers.isEmpty()
        ? number
        : "CASE WHEN {n} IN ({missing}) THEN NULL ELSE {n} END"
            .replace("{missing}", String.join(", ", numbers))
            .replace("{n}", number);
  }

  /** The text, NULL where it is one of the usual ones; a text that begins with a digit is none. */
  static String withoutUsual(String text) {
    return "CASE WHEN {t} >= '0' AND {t} < ':' THEN {t} WHEN {usual} THEN NULL ELSE {t} END"
        .replace("{usual}", isUsual(text))
        .replace("{t}", text);
  }

  /** True where the text is one of the usual ones. */
  static String isUsual(String text) {
    return "lower(trim(" + text + ")) IN (" + SqlText.literals(MissingTexts.USUAL) + ")";
  }

  /** Numbers among the texts, for columns that hold numbers: -9999 is -9999.0 there. */
  private static List<String> numbers(ExportMapping mapping) {
    List<String> numbers = new ArrayList<>();
    for (String text : mapping.missing()) {
      String plain = mapping.decimalComma() ? text.strip().replace(',', '.') : text.strip();
      if (plain.matches("[+-]?\\d{1,30}(\\.\\d{0,30})?")) {
        numbers.add(new BigDecimal(plain).toPlainString());
      }
    }
    return numbers;
  }
}
