package org.kappatrail.intake;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.kappatrail.history.Measurement;
import org.kappatrail.history.SampleColumns;

/** Doubts about a unit that no header states, from the size of the values (tool convention). */
final class UnitGuess {
  /** Below this, water in ppm would be drier than oil ever is. */
  private static final double DRY_PPM = 2;

  /** Above this, a temperature in °C would be hotter than oil is run. */
  private static final double HOT_C = 120;

  /** Above this, a temperature is hardly in °F either. */
  private static final double KELVIN = 290;

  /** Above this, a count is hardly per millilitre. */
  private static final double MANY_PER_ML = 200_000;

  private UnitGuess() {}

  /** What to say about the unit of a column; empty where its values fit the one used inside. */
  static Optional<String> doubt(String column, List<String> values) {
    NumberText numbers =
        new NumberText(values.stream().anyMatch(value -> value.contains(",")), Optional.empty());
    List<Double> sorted =
        values.stream()
            .flatMap(value -> MeasurementText.parse(value.replace("%", ""), numbers).stream())
            .map(Measurement::stated)
            .sorted(Comparator.naturalOrder())
            .toList();
    if (sorted.isEmpty()) {
      return Optional.empty();
    }
    double median = sorted.get(sorted.size() / 2);
    if (column.equals(SampleColumns.WATER) && median < DRY_PPM) {
      return Optional.of(
          "unit of water_ppm is not sure: half of the values lie at or below "
              + Limit.plain(median)
              + "; for percent write units: {water_ppm: percent}");
    }
    if (column.equals(SampleColumns.TEMPERATURE) && median > HOT_C) {
      return Optional.of(
          "unit of temperature_c is not sure: half of the values lie at or above "
              + Limit.plain(median)
              + "; write units: {temperature_c: "
              + (median > KELVIN ? "kelvin}" : "fahrenheit}"));
    }
    if (column.startsWith("particles_") && median > MANY_PER_ML) {
      return Optional.of(
          "unit of "
              + column
              + " is not sure: half of the values lie at or above "
              + Limit.plain(median)
              + "; write units: {"
              + column
              + ": per-100-ml} where they are");
    }
    return Optional.empty();
  }
}
