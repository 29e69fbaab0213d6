package org.kappatrail.statistics;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.stream.IntStream;

/** A table of published check values: lines that start with # name the source. */
record Published(List<String> columns, List<List<String>> rows) {

  static Published table(String file) {
    return read("/published/" + file);
  }

  /** A table of this project's own seeded simulations, kept so that a change of a figure shows. */
  static Published study(String file) {
    return read("/studies/" + file);
  }

  private static Published read(String resource) {
    try (InputStream in = Published.class.getResourceAsStream(resource)) {
      List<List<String>> lines =
          new String(in.readAllBytes(), StandardCharsets.UTF_8)
              .lines()
              .filter(line -> !line.startsWith("#"))
              .map(line -> List.of(line.split(",", -1)))
              .toList();
      return new Published(lines.get(0), lines.subList(1, lines.size()));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  double[] column(String name) {
    int at = columns.indexOf(name);
    return rows.stream().mapToDouble(row -> Double.parseDouble(row.get(at))).toArray();
  }

  /** Columns {@code name} and {@code value}. */
  static Values values(String file) {
    Map<String, Double> byName = new LinkedHashMap<>();
    for (List<String> row : table(file).rows) {
      byName.put(row.get(0), Double.valueOf(row.get(1)));
    }
    return new Values(byName);
  }

  /** Check values by name. */
  record Values(Map<String, Double> byName) {

    double get(String name) {
      return Objects.requireNonNull(byName.get(name), name);
    }
  }

  /** The column {@code name}, split into one array for each run of the key column. */
  List<double[]> columnBy(String key, String name) {
    double[] keys = column(key);
    double[] values = column(name);
    return Arrays.stream(keys)
        .distinct()
        .mapToObj(
            wanted ->
                IntStream.range(0, keys.length)
                    .filter(i -> keys[i] == wanted)
                    .mapToDouble(i -> values[i])
                    .toArray())
        .toList();
  }

  /** Half a unit in the last of the significant digits that a value is printed with. */
  static double halfUnit(double value, int significantDigits) {
    return 0.5 * Math.pow(10, Math.floor(Math.log10(Math.abs(value))) + 1 - significantDigits);
  }
}
