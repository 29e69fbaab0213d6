package org.kappatrail.review.correlation;

import java.util.Map;
import java.util.Set;

/** Names of variables in files, and the words and units that people read. */
public final class Names {
  public static final String KAPPA = "kappa";
  public static final String KAPPA_REFERENCE = "kappa_reference";
  public static final String TEMPERATURE = "temperature_c";

  private static final Set<String> PLURAL =
      Set.of("oil_hours", "particles_4um_per_ml", "particles_6um_per_ml", "particles_14um_per_ml");

  private static final String ELEMENT_SUFFIX = "_ppm";

  private record Words(String name, String brief, String unit) {}

  private static final Map<String, Words> KNOWN =
      Map.ofEntries(
          Map.entry(KAPPA, new Words("κ", "κ", "")),
          Map.entry(KAPPA_REFERENCE, new Words("κ at reference conditions", "κ at reference", "")),
          Map.entry("viscosity_40c_cst", new Words("viscosity at 40 °C", "ν at 40 °C", "mm²/s")),
          Map.entry("viscosity_100c_cst", new Words("viscosity at 100 °C", "ν at 100 °C", "mm²/s")),
          Map.entry(TEMPERATURE, new Words("operating temperature", "temperature", "°C")),
          Map.entry("water_ppm", new Words("water", "water", "mg/kg")),
          Map.entry(
              "particles_4um_per_ml", new Words("particles ≥ 4 µm", "particles ≥ 4 µm", "per ml")),
          Map.entry(
              "particles_6um_per_ml", new Words("particles ≥ 6 µm", "particles ≥ 6 µm", "per ml")),
          Map.entry(
              "particles_14um_per_ml",
              new Words("particles ≥ 14 µm", "particles ≥ 14 µm", "per ml")),
          Map.entry("acid_number_mg_koh_g", new Words("acid number", "acid number", "mg KOH/g")),
          Map.entry("oil_hours", new Words("oil hours", "oil hours", "h")));

  private Names() {}

  /** Name in a sentence. */
  public static String of(String variable) {
    return words(variable).name();
  }

  /** True where the name takes a verb in the plural. */
  static boolean plural(String variable) {
    return PLURAL.contains(variable);
  }

  /** Name where there is little room. */
  public static String brief(String variable) {
    return words(variable).brief();
  }

  /** Name with its unit, as an axis carries it. */
  public static String withUnit(String variable) {
    Words words = words(variable);
    return words.unit().isEmpty() ? words.name() : words.name() + ", " + words.unit();
  }

  private static Words words(String variable) {
    Words known = KNOWN.get(variable);
    if (known != null) {
      return known;
    }
    boolean element =
        variable.endsWith(ELEMENT_SUFFIX) && variable.length() > ELEMENT_SUFFIX.length();
    String stem =
        element ? variable.substring(0, variable.length() - ELEMENT_SUFFIX.length()) : variable;
    String name = stem.replace('_', ' ');
    return new Words(name, name, element ? "mg/kg" : "");
  }
}
