package org.kappatrail.report.workbook;

import java.util.Map;
import java.util.Set;

/** How the cells of a column are shown; follows from the column's name. */
enum CellKind {
  TEXT("@", 0),
  PROSE("@", 90),
  LEVEL("@", 0),
  DATE("yyyy-mm-dd", 12),
  GENERAL("General", 12),
  WHOLE("0", 8),
  GROUPED("#,##0", 12),
  ONE("0.0", 10),
  TWO("0.00", 9),
  THREE("0.000", 9),
  FOUR("0.0000", 10);

  private static final Set<String> DATES =
      Set.of(
          "sampled_at",
          "date",
          "cusum_signal",
          "crossing_earliest",
          "crossing_likely",
          "crossing_latest",
          "sampled",
          "next sample");

  private static final Set<String> PROSES = Set.of("reason", "message", "problem", "story");

  private static final Map<String, CellKind> NUMBERS =
      Map.ofEntries(
          Map.entry("oil_hours", GROUPED),
          Map.entry("temperature_c", ONE),
          Map.entry("temperature, °C", ONE),
          Map.entry("speed_rpm", ONE),
          Map.entry("rating_life_h", GROUPED),
          Map.entry("running_hours", ONE),
          Map.entry("mixed_hours", ONE),
          Map.entry("price", GROUPED),
          Map.entry("net_saving", GROUPED),
          Map.entry("break_even_ratio", ONE),
          Map.entry("probability_below_floor", FOUR),
          Map.entry("P below floor", FOUR),
          Map.entry("failure_probability", FOUR),
          Map.entry("contamination_factor", THREE),
          Map.entry("water_life_factor", THREE),
          Map.entry("life_modification", TWO),
          Map.entry("coefficient", THREE),
          Map.entry("low", THREE),
          Map.entry("high", THREE),
          Map.entry("oil", FOUR),
          Map.entry("temperature", FOUR),
          Map.entry("speed", FOUR),
          Map.entry("total", FOUR),
          Map.entry("slope_per_30d", FOUR),
          Map.entry("slope_low", FOUR),
          Map.entry("slope_high", FOUR),
          Map.entry("floor", TWO),
          Map.entry("p", FOUR),
          Map.entry("q", FOUR));

  private final String format;
  private final int widthChars;

  CellKind(String format, int widthChars) {
    this.format = format;
    this.widthChars = widthChars;
  }

  /** Number format as a workbook writes it. */
  String format() {
    return format;
  }

  /** Width in characters; 0 where the content decides. */
  int widthChars() {
    return widthChars;
  }

  static CellKind ofText(String column) {
    if (column.equals("level")) {
      return LEVEL;
    }
    if (PROSES.contains(column)) {
      return PROSE;
    }
    return DATES.contains(column) ? DATE : TEXT;
  }

  static CellKind ofNumber(String column) {
    if (column.endsWith("_cst")) {
      return TWO;
    }
    boolean kappa = column.startsWith("kappa") || column.startsWith("κ");
    return kappa ? THREE : NUMBERS.getOrDefault(column, GENERAL);
  }
}
