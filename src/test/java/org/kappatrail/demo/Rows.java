package org.kappatrail.demo;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Rows of a small table that has a header and no quoted cells. */
final class Rows {
  private Rows() {}

  static List<Map<String, String>> of(String text) {
    List<String> lines = text.lines().toList();
    String[] header = lines.get(0).split(",", -1);
    return lines.stream().skip(1).map(line -> row(header, line)).toList();
  }

  private static Map<String, String> row(String[] header, String line) {
    String[] cells = line.split(",", -1);
    if (cells.length != header.length) {
      throw new IllegalArgumentException(header.length + " cells expected: " + line);
    }
    Map<String, String> row = new LinkedHashMap<>();
    for (int i = 0; i < cells.length; i++) {
      row.put(header[i], cells[i]);
    }
    return row;
  }

  static String text(Map<String, String> row, String column) {
    String cell = row.get(column);
    if (cell == null) {
      throw new IllegalArgumentException("no column " + column + " in " + row);
    }
    return cell;
  }

  static double number(Map<String, String> row, String column) {
    return Double.parseDouble(text(row, column));
  }
}
