package org.kappatrail.intake;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import java.util.function.UnaryOperator;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.NearestName;
import org.kappatrail.history.Problem;
import org.kappatrail.history.SourceLine;
import org.kappatrail.history.UnusableInputException;

/** Which column of a table carries what. */
final class Columns {
  private final Map<String, Integer> positions = new LinkedHashMap<>();
  private final Map<Integer, String> further = new LinkedHashMap<>();
  private final Map<String, Integer> furtherByName = new LinkedHashMap<>();
  private final Map<String, String> constants;
  private final RawTable table;

  /**
   * Settles the columns.
   *
   * @param table the table
   * @param mapping block of the settings
   * @param known names that have a meaning in this kind of table
   * @param required those of them that must be there
   * @throws UnusableInputException where a required or mapped column is missing or stands twice
   */
  Columns(
      RawTable table,
      ExportMapping mapping,
      Collection<String> known,
      Collection<String> required) {
    this.table = table;
    this.constants = mapping.constants();
    Set<Integer> taken = new LinkedHashSet<>();
    for (Map.Entry<String, String> entry : mapping.columns().entrySet()) {
      int position =
          find(entry.getKey())
              .orElseThrow(() -> unusable(entry.getValue(), missingMapped(entry.getKey())));
      if (positions.putIfAbsent(entry.getValue(), position) != null || !taken.add(position)) {
        throw unusable(
            entry.getValue(),
            "the settings map two columns to it, or one column twice; name each once in columns:");
      }
    }
    for (String name : known) {
      if (!positions.containsKey(name) && !constants.containsKey(name)) {
        OptionalInt position = only(name, at -> matches(at, name, taken, Texts::key));
        if (position.isEmpty()) {
          position = only(name, at -> matches(at, name, taken, Texts::keyWithoutBrackets));
        }
        if (position.isPresent()) {
          positions.put(name, position.getAsInt());
          taken.add(position.getAsInt());
        }
      }
    }
    for (int position = 0; position < table.header().size(); position++) {
      if (!taken.contains(position) && !table.header().get(position).name().isEmpty()) {
        String name = Texts.columnName(table.header().get(position).name());
        further.put(position, name);
        furtherByName.putIfAbsent(name, position);
      }
    }
    for (String name : required) {
      if (!positions.containsKey(name) && !constants.containsKey(name)) {
        throw unusable(name, missingRequired(name));
      }
    }
  }

  /** Position of a column, with a meaning or further; empty where the table has none. */
  OptionalInt position(String name) {
    Integer position = positions.get(name);
    if (position == null) {
      position = furtherByName.get(name);
    }
    return position == null ? OptionalInt.empty() : OptionalInt.of(position);
  }

  /** Known and mapped columns with their positions. */
  Map<String, Integer> positions() {
    return Map.copyOf(positions);
  }

  /** The text that the settings give for every row. */
  Optional<String> constant(String name) {
    return Optional.ofNullable(constants.get(name));
  }

  /** Columns without a meaning here, by position, with the names they go by. */
  Map<Integer, String> further() {
    return new LinkedHashMap<>(further);
  }

  /** Header of a column, as it stands in the file. */
  RawTable.Header header(int position) {
    return table.header().get(position);
  }

  /** True where a row repeats the header, or a row of it. */
  boolean isHeader(RawRow row) {
    int filled = 0;
    for (int position = 0; position < table.header().size(); position++) {
      String cell = row.cell(position);
      RawTable.Header header = table.header().get(position);
      boolean same = cell.equalsIgnoreCase(header.name());
      for (String alias : header.aliases()) {
        same |= cell.equalsIgnoreCase(alias);
      }
      if (!same) {
        return false;
      }
      filled += cell.isEmpty() ? 0 : 1;
    }
    return filled > 1;
  }

  int width() {
    return table.header().size();
  }

  private Optional<Integer> find(String wanted) {
    List<UnaryOperator<String>> keys = List.of(Texts::clean, Texts::key, Texts::keyWithoutBrackets);
    for (UnaryOperator<String> key : keys) {
      String name = key.apply(wanted);
      OptionalInt byName =
          only(wanted, at -> key.apply(table.header().get(at).name()).equals(name));
      if (byName.isPresent()) {
        return Optional.of(byName.getAsInt());
      }
    }
    for (UnaryOperator<String> key : keys) {
      String name = key.apply(wanted);
      OptionalInt byAlias =
          only(
              wanted,
              at -> table.header().get(at).aliases().stream().map(key).anyMatch(name::equals));
      if (byAlias.isPresent()) {
        return Optional.of(byAlias.getAsInt());
      }
    }
    return Optional.empty();
  }

  private boolean matches(
      int position, String name, Set<Integer> taken, UnaryOperator<String> key) {
    return !taken.contains(position)
        && key.apply(table.header().get(position).name()).equals(Texts.key(name));
  }

  private OptionalInt only(String name, java.util.function.IntPredicate matches) {
    List<Integer> found = new ArrayList<>();
    for (int position = 0; position < table.header().size(); position++) {
      if (matches.test(position)) {
        found.add(position);
      }
    }
    if (found.size() > 1) {
      throw unusable(
          name,
          "columns "
              + (found.get(0) + 1)
              + " and "
              + (found.get(1) + 1)
              + " both go by this name; name the right one in columns:, as '"
              + name
              + " #1' or '"
              + name
              + " #2'");
    }
    return found.isEmpty() ? OptionalInt.empty() : OptionalInt.of(found.get(0));
  }

  private String missingMapped(String header) {
    return "the settings name a column '" + header + "' that is not there; " + available(header);
  }

  private String missingRequired(String name) {
    StringBuilder text = new StringBuilder("this column is required and not there; ");
    text.append(available(name));
    if (table.names().stream().anyMatch(header -> header.indexOf('\0') >= 0)) {
      return text.append("; the text is in another encoding; set encoding: UTF-16LE for it")
          .toString();
    }
    if (table.header().size() == 1) {
      text.append("; where this is one column only by mistake, set delimiter for it");
    }
    return text.append("; rename the column, or name it in columns: of kappatrail.yaml").toString();
  }

  private String available(String wanted) {
    List<String> names =
        table.names().stream()
            .filter(name -> !name.isEmpty())
            .map(name -> name.replace("\0", ""))
            .toList();
    String nearest =
        NearestName.of(wanted, names).map(name -> " (nearest: '" + name + "')").orElse("");
    return "the file has " + String.join(", ", names) + nearest;
  }

  private UnusableInputException unusable(String column, String text) {
    return new UnusableInputException(
        new Problem(new SourceLine(table.file(), table.headerLine()), column, "", text));
  }
}
