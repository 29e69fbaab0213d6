package org.kappatrail.duty;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.kappatrail.history.BearingKey;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.Problem;
import org.kappatrail.history.SourceLine;

/** Gathers the problems of the readings: each cell by itself, or one row for cells of one text. */
final class RejectedCells {
  private static final int MOST_PER_FILE = 1000;

  private record Unknown(SourceLine first, long count) {}

  private final List<BearingKey> register;
  private final List<Problem> problems = new ArrayList<>();
  private final Map<String, Unknown> unknownBearings = new LinkedHashMap<>();

  RejectedCells(List<BearingKey> register) {
    this.register = List.copyOf(register);
  }

  /**
   * Adds the problems of a file.
   *
   * @param table the file
   * @param odd its odd texts
   * @param unreadable cells that are listed one by one, as the statement counted them
   */
  void add(LogTable table, LogLayout layout, OddTexts odd, long unreadable) {
    if (table.file().format() == LogFile.Format.PARQUET) {
      addTexts(table, odd);
      return;
    }
    int[] listed = {0};
    new CellFinder(table, layout, odd)
        .find(
            (fault, text, occurrence, line) -> {
              if (fault.isSummed() || listed[0] < MOST_PER_FILE) {
                add(table, fault, text, occurrence, line);
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
              String.format(Locale.ROOT, "%,d further cells of this file cannot be read", rest)));
    }
  }

  /** All problems; call it once, after the last file. */
  List<Problem> problems() {
    List<Problem> all = new ArrayList<>(problems);
    unknownBearings.forEach((text, unknown) -> all.add(unknownBearing(text, unknown)));
    all.sort(null);
    return all;
  }

  private void addTexts(LogTable table, OddTexts odd) {
    for (CellFault fault : CellFault.values()) {
      odd.of(fault).entrySet().stream()
          .limit(MOST_PER_FILE)
          .forEach(
              entry ->
                  add(table, fault, entry.getKey(), entry.getValue(), entry.getValue().firstRow()));
    }
  }

  private void add(
      LogTable table, CellFault fault, String text, OddTexts.Occurrence occurrence, long line) {
    ExportMapping mapping = table.file().mapping();
    SourceLine source = new SourceLine(table.file().name(), line);
    if (fault == CellFault.BEARING && text.indexOf('\n') < 0) {
      unknownBearings.merge(
          text,
          new Unknown(source, occurrence.count()),
          (first, next) -> new Unknown(first.first(), first.count() + next.count()));
      return;
    }
    problems.add(
        new Problem(
            source, fault.column(), text, fault.explain(text, occurrence.count(), mapping)));
  }

  private Problem unknownBearing(String text, Unknown unknown) {
    String name = text.replace(OddTexts.BETWEEN, '/');
    String nearest =
        NearestName.of(name, register.stream().map(BearingKey::toString).toList())
            .map(known -> "; the nearest name there is '" + known + "'")
            .orElse("");
    String remedy = "; correct bearings.csv or the log";
    return new Problem(
        unknown.first(),
        LogLayout.BEARING,
        name,
        CellFault.BEARING.explain(name, unknown.count(), ExportMapping.canonical("*"))
            + nearest
            + remedy);
  }
}
