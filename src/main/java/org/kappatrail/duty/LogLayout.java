package org.kappatrail.duty;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.UnusableInputException;

/** Which column of a long-form table carries what. */
final class LogLayout {
  static final String TIME = "time";
  static final String ASSET = "asset";
  static final String BEARING = "bearing";
  static final String TEMPERATURE = "temperature_c";
  static final String SPEED = "speed_rpm";
  static final String QUALITY = "quality";

  private static final List<String> CANONICAL =
      List.of(TIME, ASSET, BEARING, TEMPERATURE, SPEED, QUALITY);
  private static final List<String> REQUIRED = List.of(TIME, ASSET, BEARING, TEMPERATURE);

  private final Map<String, Integer> columns = new LinkedHashMap<>();
  private final List<String> unused = new ArrayList<>();

  /**
   * Settles the columns.
   *
   * @param name file or table, for messages
   * @param header names of its columns
   * @param mapping block of the settings
   * @throws UnusableInputException where a required or mapped column is missing or stands twice
   */
  LogLayout(String name, List<String> header, ExportMapping mapping) {
    Map<String, String> wanted = wanted(name, header, mapping);
    for (int index = 0; index < header.size(); index++) {
      String canonical = wanted.get(key(header.get(index)));
      if (canonical == null || mapping.constants().containsKey(canonical)) {
        unused.add(header.get(index));
      } else if (columns.putIfAbsent(canonical, index) != null) {
        throw new UnusableInputException(
            name + ": two columns carry " + canonical + "; name one of them in columns: only");
      }
    }
    for (String required : REQUIRED) {
      if (!columns.containsKey(required) && !mapping.constants().containsKey(required)) {
        throw new UnusableInputException(
            name
                + ": has no column "
                + required
                + "; it has "
                + String.join(", ", header)
                + "; add a temperatures: block with columns: to kappatrail.yaml");
      }
    }
  }

  /** Position of a canonical column; empty where the table has none. */
  Optional<Integer> find(String canonical) {
    return Optional.ofNullable(columns.get(canonical));
  }

  List<String> unused() {
    return List.copyOf(unused);
  }

  private static Map<String, String> wanted(
      String name, List<String> header, ExportMapping mapping) {
    Map<String, String> wanted = new TreeMap<>();
    for (Map.Entry<String, String> entry : mapping.columns().entrySet()) {
      String canonical = key(entry.getValue());
      if (!CANONICAL.contains(canonical)) {
        throw new UnusableInputException(
            "kappatrail.yaml: temperatures: columns: '"
                + entry.getValue()
                + "' is not a column of readings; these are "
                + String.join(", ", CANONICAL));
      }
      if (header.stream().noneMatch(column -> key(column).equals(key(entry.getKey())))) {
        throw new UnusableInputException(
            name
                + ": has no column '"
                + entry.getKey()
                + "' that the settings name; it has "
                + String.join(", ", header));
      }
      wanted.put(key(entry.getKey()), canonical);
    }
    for (String canonical : CANONICAL) {
      if (!wanted.containsValue(canonical)) {
        wanted.putIfAbsent(canonical, canonical);
      }
    }
    return wanted;
  }

  private static String key(String column) {
    return column.strip().toLowerCase(Locale.ROOT);
  }
}
