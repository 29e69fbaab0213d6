package org.kappatrail.intake;

import java.nio.file.FileSystems;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import java.util.regex.PatternSyntaxException;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.NearestName;
import org.kappatrail.history.SampleColumns;

/** Reads a block of the settings that says how one kind of export is read. */
final class MappingReader {
  /** Canonical columns of readings. */
  static final List<String> READING_COLUMNS =
      List.of(
          "time",
          "time_of_day",
          "asset",
          "bearing",
          "temperature_c",
          "speed_rpm",
          "quality",
          "tag",
          "value");

  private static final List<String> KEYS =
      List.of(
          "files",
          "columns",
          "units",
          "date-format",
          "decimal",
          "thousands",
          "delimiter",
          "encoding",
          "skip-lines",
          "header-rows",
          "footer",
          "constant",
          "sheet",
          "timezone",
          "missing");
  private static final List<String> LOG_KEYS = List.of("tags", "jdbc", "table");
  private static final Pattern NAME = Pattern.compile("[\\p{Ll}\\p{N}][^\\s,;\"]{0,80}");

  /** What a block's files hold. */
  enum Kind {
    SAMPLES,
    TEMPERATURES
  }

  private MappingReader() {}

  static ExportMapping read(SettingsNode node, Kind kind) {
    List<String> keys = new ArrayList<>(KEYS);
    if (kind == Kind.TEMPERATURES) {
      keys.addAll(LOG_KEYS);
    }
    node.only(keys);
    Optional<String> jdbc = kind == Kind.SAMPLES ? Optional.empty() : node.text("jdbc");
    Optional<String> table = kind == Kind.SAMPLES ? Optional.empty() : node.text("table");
    return new ExportMapping(
        files(node, jdbc),
        jdbc,
        table,
        columns(node, "columns", kind),
        units(node, kind),
        dateFormat(node),
        decimalComma(node),
        thousands(node),
        delimiter(node),
        encoding(node),
        node.wholeNumber("skip-lines", new Limit(0, 10_000, "lines"), 0, "3"),
        node.wholeNumber("header-rows", new Limit(1, 10, "rows"), 1, "2"),
        node.text("footer"),
        constants(node, kind),
        node.text("sheet"),
        node.text("timezone").map(name -> SettingsReader.zone(node).getId()),
        kind == Kind.SAMPLES ? Map.of() : tags(node.child("tags")),
        node.texts("missing"));
  }

  private static String files(SettingsNode node, Optional<String> jdbc) {
    String files = node.text("files").orElse("");
    if (files.isEmpty() && jdbc.isEmpty()) {
      throw node.bad("files", "is required: which files the block is for", "\"samples/*.csv\"");
    }
    try {
      FileSystems.getDefault().getPathMatcher("glob:" + files);
    } catch (PatternSyntaxException e) {
      throw node.bad("files", "is no pattern of file names", "\"samples/north-*.csv\"");
    }
    return files;
  }

  private static Map<String, String> columns(SettingsNode node, String key, Kind kind) {
    Map<String, String> columns = new LinkedHashMap<>();
    SettingsNode child = node.child(key);
    for (String header : child.keys()) {
      String canonical = Texts.clean(child.text(header).orElse(""));
      check(child, header, canonical, kind);
      columns.put(header, canonical);
    }
    return columns;
  }

  private static void check(SettingsNode node, String key, String canonical, Kind kind) {
    List<String> known = known(kind);
    if (known.contains(canonical)) {
      return;
    }
    String nearest = NearestName.of(canonical, known).orElse("");
    boolean free =
        kind == Kind.SAMPLES
            && NAME.matcher(canonical).matches()
            && (canonical.endsWith(SampleColumns.ELEMENT_SUFFIX) || !isNear(canonical, nearest));
    if (!free) {
      throw node.bad(
          key,
          "is no column of "
              + (kind == Kind.SAMPLES ? "samples" : "readings")
              + "; the nearest is "
              + nearest
              + "; known are "
              + String.join(", ", known)
              + (kind == Kind.SAMPLES ? ", <element>_ppm, and names in lower case" : ""),
          nearest);
    }
  }

  /** True where a name looks like a slip of the pen of a known one. */
  private static boolean isNear(String name, String known) {
    String bare = withoutDigits(name);
    String other = withoutDigits(known);
    int distance = NearestName.distance(bare, other);
    boolean sameDigits = name.replaceAll("\\D", "").equals(known.replaceAll("\\D", ""));
    return distance == 0 ? sameDigits : distance <= 2;
  }

  private static String withoutDigits(String name) {
    return Texts.key(name).replaceAll("[_\\d]", "");
  }

  private static List<String> known(Kind kind) {
    if (kind == Kind.TEMPERATURES) {
      return READING_COLUMNS;
    }
    List<String> known = new ArrayList<>(SampleColumns.DESCRIPTIVE);
    known.addAll(SampleColumns.NUMERIC);
    return known;
  }

  private static Map<String, String> units(SettingsNode node, Kind kind) {
    Map<String, String> units = new LinkedHashMap<>();
    SettingsNode child = node.child("units");
    for (String column : child.keys()) {
      if (kind == Kind.TEMPERATURES && !READING_COLUMNS.contains(column)) {
        check(child, column, column, kind);
      }
      List<String> known = Units.of(column);
      if (known.isEmpty()) {
        throw child.bad(column, "is given for a column without units; name a canonical column", "");
      }
      String written = child.text(column).orElse("");
      units.put(
          column,
          Units.find(column, written)
              .orElseThrow(
                  () ->
                      child.bad(
                          column,
                          "is no unit of this column; known are " + String.join(", ", known),
                          known.get(known.size() - 1))));
    }
    return units;
  }

  private static Optional<String> dateFormat(SettingsNode node) {
    Optional<String> pattern = node.text("date-format");
    if (pattern.isPresent() && !DatePattern.isEpoch(pattern.get())) {
      try {
        DatePattern.formatter(pattern.get());
      } catch (IllegalArgumentException e) {
        throw node.bad(
            "date-format",
            "is no date pattern ("
                + e.getMessage()
                + "); days dd, months MM or MMM, years yyyy,"
                + " HH:mm:ss, or epoch-seconds or epoch-millis",
            "dd/MM/yyyy");
      }
    }
    return pattern;
  }

  private static boolean decimalComma(SettingsNode node) {
    String decimal = node.text("decimal").orElse("point").toLowerCase(Locale.ROOT);
    return switch (decimal) {
      case "comma", "," -> true;
      case "point", "." -> false;
      default -> throw node.bad("decimal", "must be comma or point", "comma");
    };
  }

  private static Optional<String> thousands(SettingsNode node) {
    Optional<String> written = node.text("thousands");
    if (written.isEmpty()) {
      return written;
    }
    String sign =
        switch (written.get().toLowerCase(Locale.ROOT)) {
          case "comma" -> ",";
          case "point" -> ".";
          case "blank", "space" -> " ";
          case "apostrophe" -> "'";
          default -> written.get();
        };
    boolean isDecimal = sign.equals(decimalComma(node) ? "," : ".");
    if (sign.length() != 1 || isDecimal || Character.isLetterOrDigit(sign.charAt(0))) {
      throw node.bad("thousands", "must be one sign, not the decimal sign", "\"'\"");
    }
    return Optional.of(sign);
  }

  private static Optional<String> delimiter(SettingsNode node) {
    Optional<String> written = node.text("delimiter");
    if (written.isEmpty()) {
      return written;
    }
    String sign =
        switch (written.get().toLowerCase(Locale.ROOT)) {
          case "tab", "\\t" -> "\t";
          case "comma" -> ",";
          case "semicolon" -> ";";
          case "pipe" -> "|";
          default -> written.get();
        };
    if (sign.length() != 1
        || "\"\r\n".contains(sign)
        || Character.isLetterOrDigit(sign.charAt(0))) {
      throw node.bad("delimiter", "must be one sign, or tab", "\";\"");
    }
    return Optional.of(sign);
  }

  private static Optional<String> encoding(SettingsNode node) {
    Optional<String> name = node.text("encoding");
    if (name.isPresent() && Encodings.find(name.get()).isEmpty()) {
      throw node.bad(
          "encoding", "is no encoding; UTF-8, windows-1252 and UTF-16 are common", "windows-1252");
    }
    return name.map(String::strip);
  }

  private static Map<String, String> constants(SettingsNode node, Kind kind) {
    SettingsNode child = node.child("constant");
    Map<String, String> constants = node.textsByKey("constant");
    for (String column : constants.keySet()) {
      check(child, column, column, kind);
    }
    return constants;
  }

  private static Map<String, ExportMapping.Tag> tags(SettingsNode node) {
    Map<String, ExportMapping.Tag> tags = new LinkedHashMap<>();
    for (String name : node.keys()) {
      SettingsNode tag = node.child(name).only(List.of("asset", "bearing", "quantity"));
      if (tag.text("asset").filter(String::isBlank).isPresent()) {
        throw tag.bad("asset", "is empty; name it, or leave it out where a column does", "fan-1");
      }
      String bearing = required(tag, "bearing", "DE");
      String quantity = tag.text("quantity").orElse("temperature_c");
      tags.put(name, new ExportMapping.Tag(tag.text("asset"), bearing, quantity(tag, quantity)));
    }
    return tags;
  }

  private static ExportMapping.Tag.Quantity quantity(SettingsNode tag, String label) {
    for (ExportMapping.Tag.Quantity quantity : ExportMapping.Tag.Quantity.values()) {
      if (quantity.label().equals(label)) {
        return quantity;
      }
    }
    throw tag.bad("quantity", "must be temperature_c, speed_rpm or quality", "temperature_c");
  }

  private static String required(SettingsNode node, String key, String example) {
    return node.text(key)
        .filter(text -> !text.isBlank())
        .orElseThrow(() -> node.bad(key, "is required", example));
  }
}
