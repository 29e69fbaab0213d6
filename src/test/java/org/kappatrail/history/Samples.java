package org.kappatrail.history;

import java.time.LocalDate;
import java.util.Map;
import java.util.Optional;

/** Samples for tests. */
final class Samples {
  private Samples() {}

  static Sample of(String id, LocalDate day, Map<String, Measurement> values) {
    return new Sample(
        id,
        "press-1",
        day.atStartOfDay(),
        false,
        Optional.empty(),
        "",
        values,
        Optional.empty(),
        new SourceLine("samples/a.csv", 2));
  }

  static Map<String, Measurement> value(String column, double value) {
    return Map.of(column, Measurement.of(value));
  }
}
