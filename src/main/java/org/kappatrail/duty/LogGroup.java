package org.kappatrail.duty;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Tables of one shape, read by one scan.
 *
 * @param shape how they are scanned
 * @param tables the tables
 * @param firstSource number of the first table; the others follow
 */
record LogGroup(LogTable.Shape shape, List<LogTable> tables, int firstSource) {
  LogGroup {
    tables = List.copyOf(tables);
  }

  /** Puts tables of one shape together; the sources are numbered through. */
  static List<LogGroup> of(List<LogTable> tables) {
    Map<LogTable.Shape, List<LogTable>> byShape = new LinkedHashMap<>();
    for (LogTable table : tables) {
      byShape.computeIfAbsent(table.shape(), shape -> new ArrayList<>()).add(table);
    }
    List<LogGroup> groups = new ArrayList<>();
    int source = 0;
    for (Map.Entry<LogTable.Shape, List<LogTable>> entry : byShape.entrySet()) {
      groups.add(new LogGroup(entry.getKey(), entry.getValue(), source));
      source += entry.getValue().size();
    }
    return groups;
  }

  /** One table of the group, by itself. */
  LogGroup only(int index) {
    return new LogGroup(shape, List.of(tables.get(index)), firstSource + index);
  }
}
