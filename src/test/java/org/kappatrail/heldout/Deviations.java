package org.kappatrail.heldout;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;

/** Compares cells and keeps the worst relative deviation of every column. */
final class Deviations {
  /** Columns that are empty where there is no film. */
  static final List<String> OF_A_FILM =
      List.of(
          "operating_viscosity_cst",
          "rated_viscosity_cst",
          "kappa",
          "kappa_low",
          "kappa_high",
          "probability_below_floor",
          "regime",
          "level",
          "life_modification",
          "rating_life_h");

  private final Map<String, Double> worst = new TreeMap<>();
  private final List<String> beyond = new ArrayList<>();

  /** Relative difference of two numbers; both empty is none. */
  void compare(String where, String column, String found, String expected, double tolerance) {
    if (found.isEmpty() || expected.isEmpty()) {
      same(where, column, found, expected);
      return;
    }
    double wanted = Double.parseDouble(expected);
    double relative = Math.abs(Double.parseDouble(found) - wanted) / Math.abs(wanted);
    if (worst.merge(column, relative, Math::max) > tolerance && relative > tolerance) {
      beyond.add(
          String.format(
              Locale.ROOT,
              "%s %s: %s, by brute force %s, %.2f %% off",
              where,
              column,
              found,
              expected,
              100 * relative));
    }
  }

  void same(String where, String column, String found, String expected) {
    if (!found.equals(expected)) {
      beyond.add(where + " " + column + ": '" + found + "', by brute force '" + expected + "'");
    }
  }

  /** A number that must lie between two others, give or take a rounded digit. */
  void between(String where, String column, String found, String least, String most) {
    double value = Double.parseDouble(found);
    double slack = 1e-5 * Math.max(1, value);
    if (value < Double.parseDouble(least) - slack || value > Double.parseDouble(most) + slack) {
      beyond.add(where + " " + column + ": " + found + " is not within " + least + " to " + most);
    }
  }

  List<String> beyond() {
    return beyond;
  }

  /** Worst relative deviation by column, in percent. */
  Map<String, String> worst() {
    Map<String, String> text = new TreeMap<>();
    worst.forEach(
        (column, value) -> text.put(column, String.format(Locale.ROOT, "%.3f %%", 100 * value)));
    return text;
  }
}
