package org.kappatrail.intake;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.kappatrail.history.SampleColumns;

/** Finds the column that a header of a foreign export stands for, by the names of a table. */
final class ColumnSynonyms {
  private static final String TABLE = "column-names.csv";
  private static final Map<String, String> LAB = names("lab");
  private static final Map<String, String> LOG = names("log");
  private static final Map<String, String> ELEMENTS = names("element");

  private static final Pattern TRAILING_UNIT =
      Pattern.compile(
          "(_(ppm|mg_kg|cst|mm2_s|percent|pct|%|wt%|mg_koh_g|mgkoh_g|hours|hrs|h"
              + "|deg_?[cf]|c|f|k|celsius|fahrenheit|kelvin"
              + "|rpm|r_min|1_min|u_min|rev_min|min_1|hz))+$");
  private static final Set<String> WATER =
      Set.of("water", "wasser", "karl", "kf", "eau", "agua", "acqua", "vatten", "h2o");
  private static final Set<String> BESIDE_WATER =
      Set.of(
          "fischer",
          "k",
          "f",
          "content",
          "total",
          "by",
          "nach",
          "in",
          "oil",
          "gehalt",
          "teneur",
          "en",
          "contenido",
          "de",
          "ppm");
  private static final Set<String> BESIDE_ELEMENT = Set.of("ppm", "mg", "kg", "content", "icp");
  private static final Pattern COUNT =
      Pattern.compile("(^|.*_)(4|6|14)_?(um|micron|microns|mu)(_.*|c|$)");

  private ColumnSynonyms() {}

  /** Column of samples that a header stands for. */
  static Optional<String> ofSamples(RawTable.Header header) {
    for (String key : keys(header)) {
      Optional<String> found = sampleColumn(key);
      if (found.isPresent()) {
        return found;
      }
    }
    return Optional.empty();
  }

  /** Column of readings that a header stands for. */
  static Optional<String> ofReadings(RawTable.Header header) {
    return keys(header).stream().filter(LOG::containsKey).map(LOG::get).findFirst();
  }

  private static Optional<String> sampleColumn(String key) {
    String known = LAB.get(key);
    if (known != null) {
      return Optional.of(known);
    }
    if (key.matches("(.*_)?(visc|visk|kv|kin|v_?\\d).*")) {
      boolean hot = key.matches(".*(^|\\D)100(\\D|$).*");
      boolean warm = key.matches(".*(^|\\D)40(\\D|$).*");
      if (hot != warm && !key.contains("index")) {
        return Optional.of(hot ? SampleColumns.VISCOSITY_100C : SampleColumns.VISCOSITY_40C);
      }
    }
    List<String> words = List.of(key.split("_", -1));
    if (words.stream().anyMatch(WATER::contains)
        && words.stream().allMatch(word -> WATER.contains(word) || BESIDE_WATER.contains(word))) {
      return Optional.of(SampleColumns.WATER);
    }
    if (key.contains("4406")) {
      return Optional.of(SampleColumns.ISO_4406);
    }
    Matcher count = COUNT.matcher(key);
    if (count.matches()) {
      return Optional.of("particles_" + count.group(2) + "um_per_ml");
    }
    return element(words);
  }

  /** The element that all words name, such as {@code fe} and {@code iron}. */
  private static Optional<String> element(List<String> words) {
    Set<String> elements =
        words.stream()
            .filter(word -> !BESIDE_ELEMENT.contains(word) || words.size() == 1)
            .map(word -> ELEMENTS.getOrDefault(word, ""))
            .collect(Collectors.toSet());
    return elements.size() == 1
        ? elements.stream()
            .filter(element -> !element.isEmpty())
            .map(element -> element + SampleColumns.ELEMENT_SUFFIX)
            .findFirst()
        : Optional.empty();
  }

  private static List<String> keys(RawTable.Header header) {
    List<String> names = new ArrayList<>();
    names.add(header.name());
    names.addAll(header.aliases());
    List<String> keys = new ArrayList<>();
    for (String name : names) {
      for (String key : List.of(Texts.key(name), Texts.keyWithoutBrackets(name))) {
        keys.add(key);
        keys.add(TRAILING_UNIT.matcher(key).replaceAll(""));
      }
    }
    return keys.stream().filter(key -> !key.isEmpty()).distinct().toList();
  }

  /** Column by name, of one part of the table. */
  private static Map<String, String> names(String part) {
    Map<String, String> names = new LinkedHashMap<>();
    try (InputStream in = ColumnSynonyms.class.getResourceAsStream(TABLE)) {
      if (in == null) {
        throw new IllegalStateException("table " + TABLE + " is missing from the program");
      }
      new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8))
          .lines()
          .map(line -> line.split(",", -1))
          .filter(cells -> cells.length == 3 && cells[0].equals(part))
          .forEach(
              cells ->
                  Arrays.stream(cells[2].split(" ", -1))
                      .forEach(name -> names.putIfAbsent(name, cells[1])));
    } catch (IOException e) {
      throw new UncheckedIOException("table " + TABLE + " cannot be read", e);
    }
    return names;
  }
}
