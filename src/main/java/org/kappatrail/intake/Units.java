package org.kappatrail.intake;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.tribology.AstmD341;

/** Units in which a column may be given, and the way to the one that is used inside. */
final class Units {
  private static final Map<String, DoubleUnaryOperator> SHARE = new LinkedHashMap<>();
  private static final Map<String, DoubleUnaryOperator> VISCOSITY = new LinkedHashMap<>();
  private static final Map<String, DoubleUnaryOperator> COUNT = new LinkedHashMap<>();
  private static final Map<String, DoubleUnaryOperator> TEMPERATURE = new LinkedHashMap<>();
  private static final Map<String, DoubleUnaryOperator> HOURS = new LinkedHashMap<>();
  private static final Map<String, DoubleUnaryOperator> SPEED = new LinkedHashMap<>();
  private static final Map<String, DoubleUnaryOperator> ACID = new LinkedHashMap<>();

  private static final Map<String, String> SYNONYMS =
      Map.ofEntries(
          Map.entry("%", "percent"),
          Map.entry("pct", "percent"),
          Map.entry("wt%", "percent"),
          Map.entry("%wt", "percent"),
          Map.entry("mass%", "percent"),
          Map.entry("mg/kg", "ppm"),
          Map.entry("ug/g", "ppm"),
          Map.entry("mm2/s", "cst"),
          Map.entry("/ml", "per-ml"),
          Map.entry("1/ml", "per-ml"),
          Map.entry("perml", "per-ml"),
          Map.entry("p/ml", "per-ml"),
          Map.entry("particles/ml", "per-ml"),
          Map.entry("counts/ml", "per-ml"),
          Map.entry("/100ml", "per-100-ml"),
          Map.entry("1/100ml", "per-100-ml"),
          Map.entry("per100ml", "per-100-ml"),
          Map.entry("p/100ml", "per-100-ml"),
          Map.entry("/l", "per-l"),
          Map.entry("1/l", "per-l"),
          Map.entry("perl", "per-l"),
          Map.entry("perlitre", "per-l"),
          Map.entry("°c", "celsius"),
          Map.entry("c", "celsius"),
          Map.entry("degc", "celsius"),
          Map.entry("°f", "fahrenheit"),
          Map.entry("f", "fahrenheit"),
          Map.entry("degf", "fahrenheit"),
          Map.entry("k", "kelvin"),
          Map.entry("h", "hours"),
          Map.entry("hr", "hours"),
          Map.entry("hrs", "hours"),
          Map.entry("d", "days"),
          Map.entry("r/min", "rpm"),
          Map.entry("1/min", "rpm"),
          Map.entry("u/min", "rpm"),
          Map.entry("rev/min", "rpm"),
          Map.entry("min-1", "rpm"),
          Map.entry("1/s", "hz"),
          Map.entry("mgkoh/g", "mg-koh-g"));

  static {
    SHARE.put("ppm", value -> value);
    SHARE.put("percent", value -> value * 10_000);
    VISCOSITY.put("cst", value -> value);
    COUNT.put("per-ml", value -> value);
    COUNT.put("per-100-ml", value -> value / 100);
    COUNT.put("per-l", value -> value / 1000);
    TEMPERATURE.put("celsius", value -> value);
    TEMPERATURE.put("fahrenheit", value -> (value - 32) * 5 / 9);
    TEMPERATURE.put("kelvin", value -> value - AstmD341.ZERO_CELSIUS_K);
    HOURS.put("hours", value -> value);
    HOURS.put("days", value -> value * 24);
    SPEED.put("rpm", value -> value);
    SPEED.put("hz", value -> value * 60);
    ACID.put("mg-koh-g", value -> value);
  }

  private Units() {}

  /** Units of a column, the one used inside first; none for a column without units. */
  static List<String> of(String column) {
    return List.copyOf(table(column).keySet());
  }

  /** The name a unit goes by here, whatever way it is written; empty where unknown for it. */
  static Optional<String> find(String column, String written) {
    String bare =
        Texts.clean(written)
            .toLowerCase(Locale.ROOT)
            .replaceAll("[\\s\\u00A0_]+", "")
            .replace("²", "2")
            .replace("µ", "u")
            .replace("º", "°");
    String name = SYNONYMS.getOrDefault(bare, bare);
    return table(column).containsKey(name) ? Optional.of(name) : Optional.empty();
  }

  /** Conversion to the unit used inside. */
  static DoubleUnaryOperator toInside(String column, String unit) {
    return table(column).getOrDefault(unit, value -> value);
  }

  private static Map<String, DoubleUnaryOperator> table(String column) {
    return switch (column) {
      case SampleColumns.VISCOSITY_40C, SampleColumns.VISCOSITY_100C -> VISCOSITY;
      case SampleColumns.PARTICLES_4UM, SampleColumns.PARTICLES_6UM, SampleColumns.PARTICLES_14UM ->
          COUNT;
      case SampleColumns.TEMPERATURE -> TEMPERATURE;
      case SampleColumns.OIL_HOURS -> HOURS;
      case SampleColumns.ACID_NUMBER -> ACID;
      case "speed_rpm" -> SPEED;
      default -> column.endsWith(SampleColumns.ELEMENT_SUFFIX) ? SHARE : Map.of();
    };
  }
}
