package org.kappatrail.tribology;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/**
 * A published table kept beside the classes: one {@code #} line with the source, a header line,
 * then plain comma-separated rows.
 */
final class PublishedTable {
  private PublishedTable() {}

  /** The rows below the header, cell by cell; an empty cell is an empty string. */
  static List<List<String>> rows(String resource) {
    try (InputStream in = PublishedTable.class.getResourceAsStream(resource)) {
      if (in == null) {
        throw new IllegalStateException("table " + resource + " is missing from the program");
      }
      BufferedReader reader = new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8));
      return reader
          .lines()
          .filter(line -> !line.isBlank() && !line.startsWith("#"))
          .skip(1)
          .map(line -> List.of(line.split(",", -1)))
          .toList();
    } catch (IOException e) {
      throw new UncheckedIOException("table " + resource + " cannot be read", e);
    }
  }

  static double number(List<String> row, int column) {
    return Double.parseDouble(row.get(column));
  }

  static int whole(List<String> row, int column) {
    return Integer.parseInt(row.get(column));
  }
}
