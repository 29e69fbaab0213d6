package org.kappatrail.duty;

import java.util.List;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.UnusableInputException;
import org.kappatrail.tribology.AstmD341;

/** How a column of numbers becomes a whole number of thousandths. */
final class NumberSql {
  private static final List<String> NUMERIC =
      List.of(
          "TINYINT",
          "SMALLINT",
          "INTEGER",
          "BIGINT",
          "HUGEINT",
          "UTINYINT",
          "USMALLINT",
          "UINTEGER",
          "UBIGINT",
          "UHUGEINT",
          "FLOAT",
          "DOUBLE");

  private NumberSql() {}

  static boolean isNumeric(String type) {
    return NUMERIC.contains(type) || type.startsWith("DECIMAL");
  }

  /** The column as a floating point number; NULL where it is none. */
  static String number(String column, String type, ExportMapping mapping, String place) {
    if (isNumeric(type)) {
      return MissingSql.withoutNamedNumber("CAST(" + column + " AS DOUBLE)", mapping);
    }
    if (!type.equals(LogTable.TEXT)) {
      throw new UnusableInputException(
          place + ": a column of type " + type + " holds no numbers; give a number or a text");
    }
    String text = MissingSql.withoutNamed(column, mapping);
    if (mapping.thousands().isPresent()) {
      text = withoutThousands(text, mapping.thousands().get(), mapping.decimalComma());
    }
    if (mapping.decimalComma()) {
      text = "CASE WHEN NOT contains(" + text + ", '.') THEN replace(" + text + ", ',', '.') END";
    }
    return "TRY_CAST(" + text + " AS DOUBLE)";
  }

  /** Groups of three without the sign between them; NULL where the sign stands elsewhere. */
  private static String withoutThousands(String text, String sign, boolean decimalComma) {
    String even = text;
    if (sign.isBlank()) {
      // No-break and narrow blanks count as blanks.
      even = "translate(trim(" + text + "), '\u00A0\u202F\u2009', '   ')";
    }
    String escaped = sign.isBlank() ? " " : "\\" + sign;
    String groups =
        "[+-]?\\d{1,3}(" + escaped + "\\d{3})+(" + (decimalComma ? "," : "\\.") + "\\d*)?";
    return "CASE WHEN NOT contains({e}, {s}) THEN {e} WHEN regexp_full_match(trim({e}), {g})"
        .concat(" THEN replace({e}, {s}, '') END")
        .replace("{g}", SqlText.literal(groups))
        .replace("{s}", SqlText.literal(sign.isBlank() ? " " : sign))
        .replace("{e}", even);
  }

  /**
   * The number in thousandths, half up; beyond a million it stays beyond a million, so that it can
   * be told from a missing one. Plain floating point steps, which every engine takes alike.
   */
  static String thousandths(String number) {
    return "CASE WHEN isfinite("
        + number
        + ") THEN CAST(FLOOR(LEAST(GREATEST("
        + number
        + ", -1000001), 1000001) * 1000 + 0.5) AS INTEGER) END";
  }

  /** Degrees Celsius from the unit that the settings name. */
  static String celsius(String number, ExportMapping mapping) {
    String unit = mapping.units().getOrDefault(LogLayout.TEMPERATURE, "celsius");
    return switch (unit) {
      case "celsius" -> number;
      case "fahrenheit" -> "((" + number + ") - 32) * 5 / 9";
      case "kelvin" -> "(" + number + ") - " + AstmD341.ZERO_CELSIUS_K;
      default -> throw unknown(LogLayout.TEMPERATURE, unit, "celsius, fahrenheit or kelvin");
    };
  }

  /** Revolutions per minute from the unit that the settings name. */
  static String rpm(String number, ExportMapping mapping) {
    String unit = mapping.units().getOrDefault(LogLayout.SPEED, "rpm");
    return switch (unit) {
      case "rpm" -> number;
      case "hz" -> "(" + number + ") * 60";
      default -> throw unknown(LogLayout.SPEED, unit, "rpm or hz");
    };
  }

  private static UnusableInputException unknown(String column, String unit, String known) {
    return new UnusableInputException(
        "kappatrail.yaml: temperatures: units: " + column + ": '" + unit + "' is not " + known);
  }
}
