package org.kappatrail.intake;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.DoubleUnaryOperator;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.Measurement;
import org.kappatrail.history.SampleColumns;

/**
 * A column of numbers of a file of samples, with its unit.
 *
 * @param name canonical name, or the name a further column goes by
 * @param position place in the row; -1 for a constant
 * @param constant text that holds for every row
 * @param unit unit it is given in; empty for one without units
 * @param numbers how numbers are written
 * @param missing markers of the settings for a missing value
 * @param note what is worth saying about the unit
 */
record SampleColumn(
    String name,
    int position,
    Optional<String> constant,
    Optional<String> unit,
    NumberText numbers,
    Set<String> missing,
    Optional<String> note) {
  private static final Pattern BRACKETED = Pattern.compile("[(\\[{]([^)\\]}]*)[)\\]}]");

  private static final Pattern LAST_WORD = Pattern.compile(".+[\\s_,;]+([^\\s_,;]+)");

  SampleColumn {
    missing = Set.copyOf(missing);
  }

  /** The columns of a table that carry numbers; further ones where most of their cells do. */
  static List<SampleColumn> of(
      RawTable table, Columns columns, ExportMapping mapping, Set<String> missing) {
    NumberText numbers = NumberText.of(mapping);
    List<SampleColumn> result = new ArrayList<>();
    Map<String, Integer> positions = new LinkedHashMap<>();
    for (String name : SampleColumns.NUMERIC) {
      columns.position(name).ifPresent(position -> positions.put(name, position));
    }
    for (String name : mapping.columns().values()) {
      if (!SampleColumns.DESCRIPTIVE.contains(name)) {
        columns.position(name).ifPresent(position -> positions.putIfAbsent(name, position));
      }
    }
    for (Map.Entry<Integer, String> entry : columns.further().entrySet()) {
      if (!positions.containsKey(entry.getValue())
          && (entry.getValue().endsWith(SampleColumns.ELEMENT_SUFFIX)
              || isMostlyNumbers(table, entry.getKey(), numbers, missing))) {
        positions.put(entry.getValue(), entry.getKey());
      }
    }
    for (Map.Entry<String, Integer> entry : positions.entrySet()) {
      result.add(column(entry.getKey(), entry.getValue(), columns, mapping, numbers, missing));
    }
    for (Map.Entry<String, String> entry : mapping.constants().entrySet()) {
      if (!SampleColumns.DESCRIPTIVE.contains(entry.getKey())) {
        result.add(
            new SampleColumn(
                entry.getKey(),
                -1,
                Optional.of(entry.getValue()),
                Optional.ofNullable(mapping.units().get(entry.getKey())),
                NumberText.PLAIN,
                missing,
                Optional.empty()));
      }
    }
    return result;
  }

  /** The measurement of a row; what is none becomes a problem of the row. */
  Optional<Measurement> read(RawRow raw, Row row) {
    String text = constant.orElseGet(() -> raw.cell(position));
    if (Texts.isMissing(text) || missing.contains(text)) {
      return Optional.empty();
    }
    boolean plain = position >= 0 && raw.isPlain(position);
    NumberText written = plain ? NumberText.PLAIN : numbers;
    String bare = text;
    boolean percentSign = text.endsWith("%");
    if (percentSign) {
      if (!unit.equals(Optional.of("percent"))) {
        row.problem(
            name,
            text,
            Units.of(name).contains("percent")
                ? "is given in percent; set units: {" + name + ": percent} for this file"
                : "not a number; take the % off");
        return Optional.empty();
      }
      bare = Texts.clean(text.substring(0, text.length() - 1));
    }
    Optional<Measurement> parsed = MeasurementText.parse(bare, written);
    if (parsed.isEmpty()) {
      row.problem(name, text, MeasurementText.complaint(bare, written));
      return parsed;
    }
    Measurement inside = convert(parsed.get());
    Optional<String> wrong = SampleLimits.of(name).complaint(inside.stated());
    if (wrong.isPresent()) {
      row.problem(name, text, wrong.get() + given());
      return Optional.empty();
    }
    return Optional.of(inside);
  }

  private String given() {
    return unit.filter(given -> !given.equals(Units.of(name).get(0)))
        .map(given -> " (read as " + given + ")")
        .orElse("");
  }

  private Measurement convert(Measurement value) {
    if (unit.isEmpty()) {
      return value;
    }
    DoubleUnaryOperator convert = Units.toInside(name, unit.get());
    double inside = convert.applyAsDouble(value.stated());
    if (value instanceof Measurement.Below) {
      return new Measurement.Below(inside);
    }
    return value instanceof Measurement.Above
        ? new Measurement.Above(inside)
        : new Measurement.Exact(inside);
  }

  private static SampleColumn column(
      String name,
      int position,
      Columns columns,
      ExportMapping mapping,
      NumberText numbers,
      Set<String> missing) {
    RawTable.Header header = columns.header(position);
    Optional<String> unit = Optional.ofNullable(mapping.units().get(name));
    Optional<String> stated = statedUnit(name, header);
    Optional<String> note = Optional.empty();
    List<String> known = Units.of(name);
    if (unit.isEmpty() && stated.isPresent() && !stated.get().equals(known.get(0))) {
      unit = stated;
      note =
          Optional.of(
              name
                  + " is read as "
                  + stated.get()
                  + ", as its header '"
                  + header.name()
                  + "' says");
    } else if (unit.isPresent() && stated.isPresent() && !stated.equals(unit)) {
      note =
          Optional.of(
              name
                  + " is read as "
                  + unit.get()
                  + " by the settings, though its header '"
                  + header.name()
                  + "' says "
                  + stated.get());
    }
    return new SampleColumn(name, position, Optional.empty(), unit, numbers, missing, note);
  }

  /** The unit that a header states in brackets, in a row of its own, or as its last word. */
  static Optional<String> statedUnit(String name, RawTable.Header header) {
    Set<String> candidates = new LinkedHashSet<>();
    Matcher bracketed = BRACKETED.matcher(header.name());
    while (bracketed.find()) {
      candidates.add(bracketed.group(1));
    }
    candidates.addAll(header.aliases());
    if (header.name().endsWith("%")) {
      candidates.add("%");
    }
    Matcher last = LAST_WORD.matcher(header.name());
    if (last.matches()) {
      candidates.add(last.group(1));
    }
    return candidates.stream().flatMap(text -> Units.find(name, text).stream()).findFirst();
  }

  private static boolean isMostlyNumbers(
      RawTable table, int position, NumberText numbers, Set<String> missing) {
    int filled = 0;
    int good = 0;
    for (RawRow row : table.rows()) {
      String text = row.cell(position);
      if (row.fault().isPresent() || Texts.isMissing(text) || missing.contains(text)) {
        continue;
      }
      filled++;
      NumberText written = row.isPlain(position) ? NumberText.PLAIN : numbers;
      good += MeasurementText.parse(text, written).isPresent() ? 1 : 0;
    }
    return good * 2 > filled;
  }
}
