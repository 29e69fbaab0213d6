package org.kappatrail.report.page;

import org.kappatrail.history.Measurement;
import org.kappatrail.history.Sample;

/** A laboratory's number as people read it: with its sign where censored, empty where missing. */
final class Measured {
  private Measured() {}

  static String text(Sample sample, String column, int digits) {
    return sample
        .find(column)
        .map(value -> sign(value) + Numbers.significant(value.stated(), digits))
        .orElse("");
  }

  private static String sign(Measurement value) {
    if (value instanceof Measurement.Below) {
      return "<";
    }
    return value instanceof Measurement.Above ? ">" : "";
  }
}
