package org.kappatrail.duty;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.ExportMapping.Tag;
import org.kappatrail.history.UnusableInputException;

/** Which column of a table of readings carries what. */
final class LogLayout {
  static final String TIME = "time";

  /** Stands beside a time that is only a day; a column is it only where the settings say so. */
  static final String TIME_OF_DAY = "time_of_day";

  static final String ASSET = "asset";
  static final String BEARING = "bearing";
  static final String TEMPERATURE = "temperature_c";
  static final String SPEED = "speed_rpm";
  static final String QUALITY = "quality";
  static final String TAG = "tag";
  static final String VALUE = "value";

  private static final List<String> CANONICAL =
      List.of(TIME, TIME_OF_DAY, ASSET, BEARING, TEMPERATURE, SPEED, QUALITY, TAG, VALUE);

  /** Forms of a table of readings. */
  enum Form {
    /** A row per reading. */
    LONG,
    /** A row per instant and a column per tag. */
    WIDE,
    /** A row per value, which names its tag. */
    TAGGED;

    private List<String> required() {
      return switch (this) {
        case LONG -> List.of(TIME, ASSET, BEARING, TEMPERATURE);
        case WIDE -> List.of(TIME);
        case TAGGED -> List.of(TIME, TAG, VALUE);
      };
    }
  }

  private final String name;
  private final ExportMapping mapping;
  private final Form form;
  private final Map<String, Integer> columns = new LinkedHashMap<>();
  private final Map<Integer, Tag> tagColumns = new LinkedHashMap<>();
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
    this.name = name;
    this.mapping = mapping;
    Map<String, String> wanted = wanted(header);
    boolean named = header.stream().anyMatch(column -> TAG.equals(wanted.get(key(column))));
    form = mapping.tags().isEmpty() ? Form.LONG : named ? Form.TAGGED : Form.WIDE;
    if (form == Form.TAGGED && !wanted.containsValue(VALUE)) {
      wanted.replaceAll((column, meant) -> meant.equals(TEMPERATURE) ? VALUE : meant);
    }
    for (int index = 0; index < header.size(); index++) {
      place(header.get(index), index, wanted);
    }
    requireColumns(header);
  }

  /** True where day and time of day stand in columns of their own. */
  boolean splitsTime() {
    return columns.containsKey(TIME_OF_DAY) && columns.containsKey(TIME);
  }

  Form form() {
    return form;
  }

  /** Position of a canonical column; empty where the table has none. */
  Optional<Integer> find(String canonical) {
    return Optional.ofNullable(columns.get(canonical));
  }

  /** Wide form: position and tag of every column that is one. */
  Map<Integer, Tag> tagColumns() {
    return Map.copyOf(tagColumns);
  }

  /** The text that the settings give for every row. */
  Optional<String> constant(String canonical) {
    return Optional.ofNullable(mapping.constants().get(canonical));
  }

  /** Columns in which a row carries a quantity. */
  List<Integer> places(String canonical, List<String> row) {
    if (form == Form.WIDE && !canonical.equals(TIME)) {
      return tagColumns.keySet().stream()
          .filter(index -> label(tagColumns.get(index)).equals(canonical))
          .toList();
    }
    if (form == Form.TAGGED && (canonical.equals(TEMPERATURE) || canonical.equals(SPEED))) {
      String tag = find(TAG).filter(index -> index < row.size()).map(row::get).orElse("");
      boolean meant = label(mapping.tags().get(tag.strip())).equals(canonical);
      return meant ? List.of(find(VALUE).orElseThrow()) : List.of();
    }
    return find(canonical).map(List::of).orElse(List.of());
  }

  List<String> unused() {
    return List.copyOf(unused);
  }

  private static String label(@org.jspecify.annotations.Nullable Tag tag) {
    return tag == null ? "" : tag.quantity().label();
  }

  private void place(String column, int index, Map<String, String> wanted) {
    Optional<Tag> tag = form == Form.WIDE ? tagOf(column) : Optional.empty();
    String canonical = wanted.get(key(column));
    if (tag.isPresent()) {
      tagColumns.put(index, tag.get());
    } else if (canonical == null || mapping.constants().containsKey(canonical)) {
      unused.add(column);
    } else if (columns.putIfAbsent(canonical, index) != null) {
      throw new UnusableInputException(
          name + ": two columns carry " + canonical + "; name one of them in columns: only");
    }
  }

  private Optional<Tag> tagOf(String column) {
    return mapping.tags().entrySet().stream()
        .filter(entry -> key(entry.getKey()).equals(key(column)))
        .map(Map.Entry::getValue)
        .findFirst();
  }

  /** True where a tag has no asset of its own, so that the row's asset tells the bearing. */
  boolean takesAssetsFromRows() {
    return mapping.tags().values().stream().anyMatch(tag -> tag.asset().isEmpty());
  }

  /** Bearings whose asset a row of a log with a column per tag must tell. */
  List<String> bearingsOfRowAsset() {
    return tagColumns.values().stream()
        .filter(tag -> tag.asset().isEmpty())
        .map(Tag::bearing)
        .distinct()
        .toList();
  }

  /** The bearing that a tag without an asset names; empty for any other tag. */
  Optional<String> bearingOfRowAsset(String tag) {
    return Optional.ofNullable(mapping.tags().get(tag))
        .filter(known -> known.asset().isEmpty())
        .map(Tag::bearing);
  }

  private void requireColumns(List<String> header) {
    if (takesAssetsFromRows() && !columns.containsKey(ASSET) && constant(ASSET).isEmpty()) {
      throw new UnusableInputException(
          name
              + ": has no column asset, which the tags without asset: need; it has "
              + String.join(", ", header)
              + "; name it in columns:, or put asset: to each of tags: in kappatrail.yaml");
    }
    for (String required : form.required()) {
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
    boolean measures =
        tagColumns.values().stream().anyMatch(tag -> tag.quantity() == Tag.Quantity.TEMPERATURE);
    if (form == Form.WIDE && !measures) {
      throw new UnusableInputException(
          name
              + ": no column is a temperature tag of the settings; it has "
              + String.join(", ", header)
              + "; correct tags: in kappatrail.yaml");
    }
  }

  private Map<String, String> wanted(List<String> header) {
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
      if (!wanted.containsValue(canonical) && !canonical.equals(TIME_OF_DAY)) {
        wanted.putIfAbsent(canonical, canonical);
      }
    }
    wanted.keySet().removeIf(column -> header.stream().noneMatch(name -> key(name).equals(column)));
    return wanted;
  }

  static String key(String column) {
    return column.strip().toLowerCase(Locale.ROOT);
  }
}
