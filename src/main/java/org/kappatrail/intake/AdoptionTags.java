package org.kappatrail.intake;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/** The tags of a log with a column per tag or a row per value, and what each seems to measure. */
final class AdoptionTags {
  private static final int MOST_TAGS = 500;
  private static final RawTable.Header NO_HEADER = new RawTable.Header("", List.of());

  private final Map<String, TagGuess> guesses = new LinkedHashMap<>();
  private final Map<String, RawTable.Header> headers = new LinkedHashMap<>();
  private final List<String> temperatures = new ArrayList<>();

  private AdoptionTags() {}

  /** Tags that are columns: those of numbers without a meaning of their own. */
  static AdoptionTags ofColumns(List<ColumnGuess> columns, NumberText numbers) {
    AdoptionTags tags = new AdoptionTags();
    for (ColumnGuess guess : columns) {
      if (guess.canonical().isEmpty() && guess.isMostlyNumbers()) {
        tags.add(guess.header(), guess.values(), numbers);
      }
    }
    return tags;
  }

  /** Tags that rows name, in the order of their names. */
  static AdoptionTags ofRows(List<ColumnGuess> columns, List<RawRow> rows, NumberText numbers) {
    Map<String, List<String>> values = new TreeMap<>();
    int tag = position(columns, "tag");
    int value = position(columns, "value");
    for (RawRow row : rows) {
      if (!Texts.isMissing(row.cell(tag))) {
        List<String> ofTag = values.computeIfAbsent(row.cell(tag), name -> new ArrayList<>());
        if (value >= 0) {
          ofTag.add(row.cell(value));
        }
      }
    }
    AdoptionTags tags = new AdoptionTags();
    values.forEach((name, found) -> tags.add(new RawTable.Header(name, List.of()), found, numbers));
    return tags;
  }

  private void add(RawTable.Header header, List<String> values, NumberText numbers) {
    TagGuess guess = TagGuess.of(header, values, numbers);
    headers.putIfAbsent(header.name(), header);
    guesses.putIfAbsent(header.name(), guess);
    if (!guess.isSpeed() && guess.doubt().isEmpty()) {
      temperatures.addAll(values);
    }
  }

  /** What the size of the temperatures says against °C; empty where a name states the unit. */
  Optional<String> unitDoubt() {
    boolean stated =
        headers.values().stream()
            .anyMatch(header -> SampleColumn.statedUnit("temperature_c", header).isPresent());
    return stated ? Optional.empty() : UnitGuess.doubt("temperature_c", temperatures);
  }

  /** Units that the names state, where they are not the ones used inside. */
  Map<String, String> units() {
    Map<String, String> units = new LinkedHashMap<>();
    guesses.forEach(
        (name, guess) ->
            SampleColumn.statedUnit(guess.quantity(), headers.getOrDefault(name, NO_HEADER))
                .filter(unit -> !unit.equals(Units.of(guess.quantity()).get(0)))
                .ifPresent(unit -> units.put(guess.quantity(), unit)));
    return units;
  }

  /**
   * Lines of the settings, with comments. Tags that are only taken for something by their values
   * are comments too where others are sure.
   *
   * @param assetIsKnown true where a column names the asset
   */
  List<String> lines(boolean assetIsKnown) {
    List<String> lines = new ArrayList<>();
    lines.add(
        "    # which bearing each tag belongs to is not in the file: put "
            + (assetIsKnown ? "the bearing in" : "asset and bearing in")
            + ", and take out the tags of no bearing");
    lines.add("    tags:");
    boolean anySure =
        guesses.values().stream().anyMatch(guess -> !guess.isSpeed() && guess.doubt().isEmpty());
    String place = assetIsKnown ? "{bearing: BEARING" : "{asset: ASSET, bearing: BEARING";
    guesses.entrySet().stream()
        .limit(MOST_TAGS)
        .forEach(
            entry -> {
              TagGuess guess = entry.getValue();
              boolean doubted = guess.doubt().isPresent();
              String tag = AdoptionBlock.quoted(entry.getKey()) + ": " + place + ", quantity: ";
              lines.add((anySure && doubted ? "    # " : "      ") + tag + guess.quantity() + "}");
              guess.doubt().ifPresent(doubt -> lines.add("    #   not sure: " + doubt));
            });
    if (guesses.size() > MOST_TAGS) {
      lines.add("    # and " + (guesses.size() - MOST_TAGS) + " tags more");
    }
    return lines;
  }

  private static int position(List<ColumnGuess> columns, String name) {
    return columns.stream()
        .filter(guess -> guess.is(name))
        .map(ColumnGuess::position)
        .findFirst()
        .orElse(-1);
  }
}
