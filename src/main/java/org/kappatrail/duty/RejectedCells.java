package org.kappatrail.duty;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import org.kappatrail.history.BearingKey;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.Problem;
import org.kappatrail.history.SourceLine;

/** Gathers the problems of the readings: each cell by itself, or one row for cells of one text. */
final class RejectedCells {
  private static final int MOST_PER_FILE = 1000;
  private static final int MOST_NAMES = 10;

  private final List<Problem> problems = new ArrayList<>();
  private final UnknownBearings unknownBearings;

  RejectedCells(List<BearingKey> register) {
    this.unknownBearings = new UnknownBearings(register);
  }

  /**
   * Adds the problems of a file.
   *
   * @param table the file
   * @param odd its odd texts
   * @param unreadable cells that are listed one by one, as the statement counted them
   */
  void add(LogTable table, LogLayout layout, OddTexts odd, long unreadable) {
    Map<String, OddTexts.Occurrence> tags = new LinkedHashMap<>(odd.of(CellFault.BEARING));
    tags.keySet().removeIf(text -> !text.endsWith(String.valueOf(OddTexts.BETWEEN)));
    if (layout.form() == LogLayout.Form.TAGGED && !tags.isEmpty()) {
      problems.add(unknownTags(table, tags));
      odd = odd.without(CellFault.BEARING, tags.keySet());
    }
    addCells(table, layout, odd, unreadable);
  }

  private void addCells(LogTable table, LogLayout layout, OddTexts odd, long unreadable) {
    if (table.file().format() == LogFile.Format.PARQUET) {
      addTexts(table, odd);
      return;
    }
    int[] listed = {0};
    new CellFinder(table, layout, odd)
        .find(
            (fault, column, text, occurrence, line) -> {
              if (fault.isSummed() || listed[0] < MOST_PER_FILE) {
                add(table, fault, column, text, occurrence, line);
              }
              listed[0] += fault.isSummed() ? 0 : 1;
            });
    long rest = unreadable - Math.min(listed[0], MOST_PER_FILE);
    if (rest > 0) {
      problems.add(
          new Problem(
              new SourceLine(table.file().name(), 0),
              "",
              "",
              String.format(
                  Locale.ROOT, "further cells of this file that cannot be read: %,d", rest)));
    }
  }

  /** All problems; call it once, after the last file. */
  List<Problem> problems() {
    List<Problem> all = new ArrayList<>(problems);
    all.addAll(unknownBearings.problems());
    all.sort(null);
    return all;
  }

  Map<String, Long> unknownBearings() {
    return unknownBearings.readings();
  }

  private void addTexts(LogTable table, OddTexts odd) {
    for (CellFault fault : CellFault.values()) {
      odd.of(fault).entrySet().stream()
          .limit(MOST_PER_FILE)
          .forEach(
              entry ->
                  add(
                      table,
                      fault,
                      fault.column(),
                      entry.getKey(),
                      entry.getValue(),
                      entry.getValue().firstRow()));
    }
  }

  private void add(
      LogTable table,
      CellFault fault,
      String column,
      String text,
      OddTexts.Occurrence occurrence,
      long line) {
    ExportMapping mapping = table.file().mapping();
    SourceLine source = new SourceLine(table.file().name(), line);
    if (fault == CellFault.BEARING && text.indexOf('\n') < 0) {
      unknownBearings.add(text.replace(OddTexts.BETWEEN, '/'), source, occurrence.count());
      return;
    }
    problems.add(
        new Problem(source, column, text, fault.explain(text, occurrence.count(), mapping)));
  }

  private static Problem unknownTags(LogTable table, Map<String, OddTexts.Occurrence> tags) {
    long readings = tags.values().stream().mapToLong(OddTexts.Occurrence::count).sum();
    String names =
        tags.keySet().stream()
            .map(tag -> tag.replace(String.valueOf(OddTexts.BETWEEN), ""))
            .limit(MOST_NAMES)
            .collect(Collectors.joining(", "));
    return new Problem(
        new SourceLine(table.file().name(), 0),
        LogLayout.TAG,
        names,
        String.format(
            Locale.ROOT,
            "%,d values of %,d tags that the settings do not name; add to tags: what is wanted",
            readings,
            tags.size()));
  }
}
