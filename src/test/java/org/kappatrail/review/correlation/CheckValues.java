package org.kappatrail.review.correlation;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** Tables of check values, and series made from numbers. */
final class CheckValues {
  private CheckValues() {}

  /** Rows of a table without its source lines and its head. */
  static List<List<String>> rows(String resource) {
    try (InputStream in = CheckValues.class.getResourceAsStream(resource)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8)
          .lines()
          .filter(line -> !line.startsWith("#"))
          .skip(1)
          .map(line -> List.of(line.split(",", -1)))
          .toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static double[] column(String resource, int column) {
    return rows(resource).stream()
        .mapToDouble(row -> Double.parseDouble(row.get(column)))
        .toArray();
  }

  /** The value of a name in a table of names and values. */
  static double value(String resource, String name) {
    return rows(resource).stream()
        .filter(row -> row.get(0).equals(name))
        .mapToDouble(row -> Double.parseDouble(row.get(1)))
        .findFirst()
        .orElseThrow();
  }

  static Variable variable(String name, double... values) {
    return Variable.of(
        name, Arrays.stream(values).mapToObj(value -> Optional.of(Value.measured(value))).toList());
  }

  /** An asset sampled every thirty days. */
  static AssetSeries asset(String name, Variable... variables) {
    List<Double> days = new ArrayList<>();
    int samples = variables.length == 0 ? 0 : variables[0].size();
    for (int i = 0; i < samples; i++) {
      days.add(i * 30.0);
    }
    return new AssetSeries(name, days, List.of(variables));
  }

  static PairCorrelation find(List<PairCorrelation> tests, String x, String y, int lag, Form form) {
    return tests.stream()
        .filter(test -> test.x().equals(x) && test.y().equals(y))
        .filter(test -> test.lag() == lag && test.form() == form)
        .findFirst()
        .orElseThrow();
  }
}
