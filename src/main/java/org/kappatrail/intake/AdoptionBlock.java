package org.kappatrail.intake;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;

/** Writes the block of the settings for a foreign export. */
final class AdoptionBlock {
  private final String name;
  private final MappingReader.Kind kind;
  private final AdoptionGrid grid;
  private final GridShape shape;
  private final List<ColumnGuess> columns;
  private final StringBuilder out = new StringBuilder();

  AdoptionBlock(
      Path file,
      MappingReader.Kind kind,
      AdoptionGrid grid,
      GridShape shape,
      List<ColumnGuess> columns) {
    this.name = file.getFileName().toString();
    this.kind = kind;
    this.grid = grid;
    this.shape = shape;
    this.columns = columns;
  }

  MappingReader.Kind kind() {
    return kind;
  }

  GridShape shape() {
    return shape;
  }

  List<ColumnGuess> columns() {
    return columns;
  }

  String name() {
    return name;
  }

  String yaml() {
    out.setLength(0);
    title();
    line(kind == MappingReader.Kind.SAMPLES ? "samples:" : "temperatures:");
    String folder = kind == MappingReader.Kind.SAMPLES ? "samples/" : "temperatures/";
    line("  - files: " + quoted(folder + name));
    note("a pattern such as " + folder + "north-*.csv takes every export of this kind");
    mapping();
    NumberGuess numbers = numbers();
    Optional<AdoptionTags> tags = tags(numbers);
    units(tags);
    dates();
    numbers(numbers);
    form();
    tags.ifPresent(found -> found.lines(find("asset").isPresent()).forEach(this::line));
    return out.toString();
  }

  private void title() {
    String what = kind == MappingReader.Kind.SAMPLES ? "laboratory export" : "log";
    String form =
        grid.encoding().isPresent()
            ? "text in " + grid.encoding().get() + " with " + said(grid.delimiter().orElse(','))
            : "workbook";
    line("# " + name + ": a " + what + ", " + form + ", " + shape.body().size() + " rows seen.");
    line("# Lines that begin with # say what the file does not settle.");
    line(
        "# Where kappatrail.yaml has "
            + (kind == MappingReader.Kind.SAMPLES ? "samples:" : "temperatures:")
            + " already, put the lines from '- files' on below it.");
  }

  private void mapping() {
    line("    columns:");
    List<String> unknown = new ArrayList<>();
    List<String> found = new ArrayList<>();
    for (ColumnGuess guess : columns) {
      if (guess.canonical().isPresent()) {
        found.add(guess.canonical().get());
        line("      " + quoted(title(guess)) + ": " + guess.canonical().get());
        guess.doubt().ifPresent(doubt -> note("  not sure: " + doubt));
      } else if (!guess.header().name().isEmpty()) {
        unknown.add(title(guess) + guess.doubt().map(why -> " (" + why + ")").orElse(""));
      }
    }
    if (!isWide() && !unknown.isEmpty()) {
      note("not recognised, so read under their own names where they hold numbers:");
      unknown.forEach(header -> note("  " + header));
    }
    List<String> places = new ArrayList<>(List.of("asset", "bearing"));
    places.removeIf(place -> found.contains(place) || !required().contains(place));
    if (kind == MappingReader.Kind.TEMPERATURES && !places.isEmpty()) {
      note("not found: " + String.join(" and ", places) + "; put in what the file is of:");
      String fill =
          String.join(", ", places.stream().map(name -> name + ": " + blank(name)).toList());
      line("    constant: {" + fill + "}");
      found.addAll(places);
    }
    for (String required : required()) {
      if (!found.contains(required)) {
        note(
            "not found: "
                + required
                + ", which is required; name its column above"
                + (required.equals("sample") || required.equals("time")
                    ? ""
                    : " or, where it is one for the whole file, write constant: {"
                        + required
                        + ": …}"));
      }
    }
  }

  /** The header; with its number where several columns go by it. */
  private String title(ColumnGuess guess) {
    String name = guess.header().name();
    long same = columns.stream().filter(other -> other.header().name().equals(name)).count();
    List<String> aliases = guess.header().aliases();
    return same > 1 && !aliases.isEmpty() ? aliases.get(aliases.size() - 1) : name;
  }

  /** Stands where a name is to be put in. */
  private static String blank(String column) {
    return column.equals("asset") ? "ASSET" : "BEARING";
  }

  private List<String> required() {
    if (kind == MappingReader.Kind.SAMPLES) {
      return List.of("sample", "asset", "sampled_at");
    }
    if (isTagged()) {
      return List.of("time", "tag", "value");
    }
    return isWide() ? List.of("time") : List.of("time", "asset", "bearing", "temperature_c");
  }

  private void units(Optional<AdoptionTags> tags) {
    Map<String, String> units = new LinkedHashMap<>();
    tags.ifPresent(found -> units.putAll(found.units()));
    List<String> doubts = new ArrayList<>();
    for (ColumnGuess guess : columns) {
      String column = guess.canonical().orElse("");
      List<String> known = Units.of(column);
      if (known.isEmpty()) {
        continue;
      }
      Optional<String> stated = SampleColumn.statedUnit(column, guess.header());
      stated.filter(unit -> !unit.equals(known.get(0))).ifPresent(unit -> units.put(column, unit));
      if (stated.isEmpty() && guess.canonical().isPresent()) {
        UnitGuess.doubt(column, guess.values()).ifPresent(doubts::add);
      }
    }
    if (!units.isEmpty()) {
      line("    units:");
      units.forEach((column, unit) -> line("      " + column + ": " + unit));
    }
    tags.flatMap(AdoptionTags::unitDoubt).ifPresent(doubts::add);
    doubts.forEach(this::note);
  }

  private void dates() {
    List<String> texts = new ArrayList<>();
    Optional<ColumnGuess> timeOfDay = find("time_of_day");
    for (ColumnGuess guess : columns) {
      if (guess.is("time") && timeOfDay.isPresent()) {
        texts.addAll(joined(guess, timeOfDay.get()));
      } else if (List.of("sampled_at", "received_on", "time")
          .contains(guess.canonical().orElse(""))) {
        texts.addAll(texts(guess));
      }
    }
    Optional<DateGuess> dates = DateGuess.of(texts);
    if (dates.isPresent()) {
      dates.get().pattern().ifPresent(pattern -> line("    date-format: " + quoted(pattern)));
      dates.get().doubt().ifPresent(doubt -> note("date-format is not sure: " + doubt));
    } else if (!texts.isEmpty()) {
      note("date-format: the form of '" + texts.get(0) + "' is not recognised; write it here");
    }
    for (ColumnGuess guess : columns) {
      if (kind == MappingReader.Kind.SAMPLES && guess.isTimesOfDay()) {
        note("the time of day in '" + guess.header().name() + "' is not read; the day suffices");
      }
    }
  }

  private NumberGuess numbers() {
    List<String> texts = new ArrayList<>();
    for (ColumnGuess guess : columns) {
      boolean named = List.of("sample", "asset", "bearing").contains(guess.canonical().orElse(""));
      if (guess.isMostlyNumbers() && !named) {
        texts.addAll(texts(guess));
      }
    }
    return NumberGuess.of(texts);
  }

  private Optional<ColumnGuess> find(String canonical) {
    return columns.stream().filter(guess -> guess.is(canonical)).findFirst();
  }

  /** The time of a row, of one column or two. */
  String timeText(RawRow row, ColumnGuess day) {
    return find("time_of_day")
        .map(time -> row.cell(day.position()) + ' ' + row.cell(time.position()))
        .orElse(row.cell(day.position()));
  }

  private List<String> joined(ColumnGuess day, ColumnGuess time) {
    return shape.body().stream()
        .filter(row -> !Texts.isMissing(row.cell(day.position())))
        .filter(row -> !Texts.isMissing(row.cell(time.position())))
        .map(row -> row.cell(day.position()) + ' ' + row.cell(time.position()))
        .toList();
  }

  private void numbers(NumberGuess numbers) {
    if (numbers.decimalComma()) {
      line("    decimal: comma");
    }
    numbers.thousands().ifPresent(sign -> line("    thousands: " + quoted(sign)));
    numbers.doubt().ifPresent(doubt -> note("decimal is not sure: " + doubt));
  }

  private void form() {
    grid.delimiter()
        .filter(sign -> sign != ',')
        .ifPresent(sign -> line("    delimiter: " + quoted(sign == '\t' ? "tab" : "" + sign)));
    grid.encoding()
        .filter(encoding -> !encoding.equals("UTF-8"))
        .ifPresent(
            encoding -> {
              line("    encoding: " + encoding);
              if (encoding.equals("windows-1252")) {
                note(
                    "the bytes are no UTF-8; windows-1252 is the usual other, look at the accents");
              }
            });
    grid.sheet().ifPresent(sheet -> line("    sheet: " + quoted(sheet)));
    if (shape.skipLines() > 0) {
      line("    skip-lines: " + shape.skipLines());
    }
    if (shape.header().size() > 1) {
      line("    header-rows: " + shape.header().size());
    }
    shape.footer().ifPresent(footer -> line("    footer: " + quoted(footer)));
    TreeSet<String> odd = new TreeSet<>();
    for (ColumnGuess guess : columns) {
      if (guess.isMostlyNumbers()) {
        guess.values().stream().filter(value -> !GridShape.isNumber(value)).forEach(odd::add);
      } else if (guess.is("iso_4406")) {
        guess.values().stream().filter(value -> !ColumnGuess.isCode(value)).forEach(odd::add);
      }
    }
    if (!odd.isEmpty()) {
      String some = String.join(", ", odd.stream().limit(5).map(AdoptionBlock::quoted).toList());
      if (kind == MappingReader.Kind.SAMPLES) {
        note("texts among numbers; where they stand for a missing value write");
        note("missing: [" + some + "]");
      } else {
        note("texts among numbers, of which the readings are left out: " + some);
      }
    }
  }

  private Optional<AdoptionTags> tags(NumberGuess guessed) {
    NumberText numbers = new NumberText(guessed.decimalComma(), guessed.thousands());
    if (isTagged()) {
      return Optional.of(AdoptionTags.ofRows(columns, shape.body(), numbers));
    }
    return isWide() ? Optional.of(AdoptionTags.ofColumns(columns, numbers)) : Optional.empty();
  }

  boolean isTagged() {
    return kind == MappingReader.Kind.TEMPERATURES
        && columns.stream().anyMatch(guess -> guess.is("tag"));
  }

  /** True for a log with a column per tag. */
  boolean isWide() {
    return kind == MappingReader.Kind.TEMPERATURES
        && !isTagged()
        && columns.stream().noneMatch(guess -> guess.is("bearing") || guess.is("temperature_c"));
  }

  /**
   * Values that are texts; a workbook's own numbers and dates say nothing of how texts are read.
   */
  private List<String> texts(ColumnGuess guess) {
    List<String> texts = new ArrayList<>();
    for (RawRow row : shape.body()) {
      String cell = row.cell(guess.position());
      if (!row.isPlain(guess.position()) && !Texts.isMissing(cell)) {
        texts.add(cell);
      }
    }
    return texts;
  }

  private void line(String text) {
    out.append(text).append('\n');
  }

  private void note(String text) {
    line("    # " + text.replaceAll("[\\r\\n]+", " "));
  }

  private static String said(char delimiter) {
    return delimiter == '\t' ? "tabs" : "'" + delimiter + "'";
  }

  static String quoted(String text) {
    return '"' + text.replace("\\", "\\\\").replace("\"", "\\\"").replace("\t", "\\t") + '"';
  }
}
