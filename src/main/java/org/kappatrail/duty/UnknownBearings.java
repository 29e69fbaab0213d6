package org.kappatrail.duty;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.kappatrail.history.BearingKey;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.NearestName;
import org.kappatrail.history.Problem;
import org.kappatrail.history.SourceLine;

/** Bearings of the logs that the register does not have: one problem for each. */
final class UnknownBearings {
  private record Seen(SourceLine first, long readings) {}

  private final List<String> register;
  private final Map<String, Seen> seen = new LinkedHashMap<>();

  UnknownBearings(List<BearingKey> register) {
    this.register = register.stream().map(BearingKey::toString).toList();
  }

  /** Adds readings of a bearing; the place where it was seen first is kept. */
  void add(String name, SourceLine place, long readings) {
    seen.merge(
        name,
        new Seen(place, readings),
        (first, next) -> new Seen(first.first(), first.readings() + next.readings()));
  }

  Map<String, Long> readings() {
    Map<String, Long> readings = new TreeMap<>();
    seen.forEach((name, found) -> readings.put(name, found.readings()));
    return readings;
  }

  List<Problem> problems() {
    return seen.entrySet().stream()
        .map(entry -> problem(entry.getKey(), entry.getValue()))
        .toList();
  }

  private Problem problem(String name, Seen found) {
    String nearest =
        NearestName.of(name, register)
            .map(known -> "; the nearest name there is '" + known + "'")
            .orElse("");
    return new Problem(
        found.first(),
        LogLayout.BEARING,
        name,
        CellFault.BEARING.explain(name, found.readings(), ExportMapping.canonical("*"))
            + nearest
            + "; correct bearings.csv or the log");
  }
}
