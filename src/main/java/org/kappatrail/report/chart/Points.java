package org.kappatrail.report.chart;

import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

/** Days and values of a series; records without a value are left out. */
final class Points {
  private final double[] days;
  private final double[] values;

  private Points(double[] days, double[] values) {
    this.days = days;
    this.values = values;
  }

  static <R> Points of(
      List<R> records, ToDoubleFunction<R> day, Function<R, OptionalDouble> value) {
    List<R> known = records.stream().filter(item -> value.apply(item).isPresent()).toList();
    return new Points(
        known.stream().mapToDouble(day).toArray(),
        known.stream().mapToDouble(item -> value.apply(item).getAsDouble()).toArray());
  }

  double[] days() {
    return days.clone();
  }

  double[] values() {
    return values.clone();
  }

  boolean isEmpty() {
    return days.length == 0;
  }

  double least() {
    return Arrays.stream(values).min().orElseThrow();
  }

  double most() {
    return Arrays.stream(values).max().orElseThrow();
  }
}
