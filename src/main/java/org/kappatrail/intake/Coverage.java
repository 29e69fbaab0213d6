package org.kappatrail.intake;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.kappatrail.history.Asset;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.BearingKey;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Sample;

/** Which days samples and logs cover, and what is missing between register, samples and logs. */
final class Coverage {
  private final PlantHistory history;
  private final LogAccount logs;
  private final Map<BearingKey, LogSpan> spans = new TreeMap<>();

  Coverage(PlantHistory history, LogAccount logs) {
    this.history = history;
    this.logs = logs;
    for (LogSpan span : logs.spans()) {
      spans.merge(span.bearing(), span, Coverage::both);
    }
  }

  /** A line per asset: its samples and its bearings' logs. */
  List<String> spans() {
    List<String> lines = new ArrayList<>();
    for (Asset asset : history.assets()) {
      List<Sample> samples = history.samplesOf(asset.id());
      StringBuilder line = new StringBuilder(asset.id()).append(": ");
      line.append(HistoryCheck.counted(samples.size(), "sample"));
      if (!samples.isEmpty()) {
        LocalDate last = samples.get(samples.size() - 1).day();
        line.append(", ").append(samples.get(0).day()).append(" to ").append(last);
      }
      for (Bearing bearing : history.bearingsOf(asset.id())) {
        line.append("; log of ").append(bearing.id()).append(' ');
        line.append(
            Optional.ofNullable(spans.get(bearing.key()))
                .map(span -> span.from() + " to " + span.to())
                .orElse("none"));
      }
      lines.add(line.toString());
    }
    return lines;
  }

  /** A line per kind of what is missing. */
  List<String> missing() {
    Map<String, List<String>> missing = new LinkedHashMap<>();
    missing.put("Assets without samples", assets(asset -> history.samplesOf(asset.id()).isEmpty()));
    missing.put(
        "Assets without bearings", assets(asset -> history.bearingsOf(asset.id()).isEmpty()));
    missing.put("Bearings without logs", bearings(bearing -> !spans.containsKey(bearing.key())));
    missing.put(
        "Bearings without loads, so without a rating life",
        bearings(bearing -> !bearing.hasLoads()));
    missing.put(
        "Logs without a bearing of the register",
        logs.unknown().entrySet().stream()
            .map(log -> log.getKey() + " " + HistoryCheck.counted(log.getValue(), "reading"))
            .toList());
    missing.put("Samples outside the days of their asset's logs", outside());
    List<String> lines = new ArrayList<>();
    missing.forEach(
        (what, names) -> {
          if (!names.isEmpty()) {
            lines.add(what + " (" + names.size() + "): " + String.join(", ", names));
          }
        });
    return lines;
  }

  private List<String> assets(java.util.function.Predicate<Asset> wanted) {
    return history.assets().stream().filter(wanted).map(Asset::id).toList();
  }

  private List<String> bearings(java.util.function.Predicate<Bearing> wanted) {
    return history.bearings().stream().filter(wanted).map(b -> b.key().toString()).toList();
  }

  private List<String> outside() {
    List<String> outside = new ArrayList<>();
    for (Asset asset : history.assets()) {
      List<LogSpan> ofAsset =
          spans.values().stream()
              .filter(span -> span.bearing().asset().equals(asset.id()))
              .toList();
      for (Sample sample : history.samplesOf(asset.id())) {
        boolean covered = ofAsset.stream().anyMatch(span -> covers(span, sample.day()));
        if (!ofAsset.isEmpty() && !covered) {
          outside.add(sample.id());
        }
      }
    }
    return outside;
  }

  private static boolean covers(LogSpan span, LocalDate day) {
    return !day.isBefore(span.from()) && !day.isAfter(span.to());
  }

  private static LogSpan both(LogSpan a, LogSpan b) {
    return new LogSpan(
        a.bearing(),
        a.from().isBefore(b.from()) ? a.from() : b.from(),
        a.to().isAfter(b.to()) ? a.to() : b.to());
  }
}
