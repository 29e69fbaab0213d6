package org.kappatrail.value;

import java.util.ArrayList;
import java.util.List;

/** What was measured under one policy: samples, and the deeds in between. */
final class Samples {
  /**
   * One result.
   *
   * @param day day of sampling
   * @param v40 viscosity at 40 °C as measured, mm²/s
   * @param kappa κ computed from it and the measured temperature of the week
   */
  record Result(int day, double v40, double kappa) {}

  private final List<Result> results = new ArrayList<>();
  private final List<Integer> changes = new ArrayList<>();
  private final List<String> oils = new ArrayList<>();
  private final List<Integer> coolings = new ArrayList<>();

  void add(Result result) {
    results.add(result);
  }

  void changed(int day, String oil) {
    changes.add(day);
    oils.add(oil);
  }

  void cooled(int day) {
    coolings.add(day);
  }

  List<Result> results() {
    return List.copyOf(results);
  }

  Result latest() {
    return results.get(results.size() - 1);
  }

  List<Integer> changes() {
    return List.copyOf(changes);
  }

  String oilOf(int change) {
    return oils.get(change);
  }

  /** Day of the latest putting right of the cooler on or before a day; −1 for none. */
  int cooledBefore(int day) {
    return coolings.stream().filter(cooled -> cooled <= day).reduce((a, b) -> b).orElse(-1);
  }
}
