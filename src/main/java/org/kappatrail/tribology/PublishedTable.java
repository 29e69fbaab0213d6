package org.kappatrail.tribology;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** Reads a published table from the program's own resources: {@code #} lines, a header, rows. */
final class PublishedTable {
  private PublishedTable() {}

  /** Rows of a resource beside this class, split at commas; comments and header left out. */
  static List<String[]> rows(String resource) {
    try (InputStream in = PublishedTable.class.getResourceAsStream(resource)) {
      if (in == null) {
        throw new IllegalStateException("the program lacks its table " + resource);
      }
      BufferedReader lines = new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8));
      List<String[]> rows = new ArrayList<>();
      boolean header = true;
      for (String line = lines.readLine(); line != null; line = lines.readLine()) {
        if (line.startsWith("#") || line.isBlank()) {
          continue;
        }
        if (header) {
          header = false;
        } else {
          rows.add(line.split(",", -1));
        }
      }
      return rows;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** A number, or a fraction such as {@code 1/3}. */
  static double number(String cell) {
    int slash = cell.indexOf('/');
    return slash < 0
        ? Double.parseDouble(cell)
        : Double.parseDouble(cell.substring(0, slash))
            / Double.parseDouble(cell.substring(slash + 1));
  }
}
