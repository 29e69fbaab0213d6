package org.kappatrail.intake;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import org.kappatrail.history.Asset;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.BearingKey;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Problem;
import org.kappatrail.history.Sample;

/** The account of a history folder: what was found, what was left out and why, what is missing. */
public final class HistoryCheck {
  private static final int MOST_PROBLEMS_OF_A_FILE = 20;

  private final Intake intake;
  private final List<FileAccount> files;
  private final List<Problem> problems;
  private final Map<BearingKey, LogSpan> spans = new TreeMap<>();
  private final StringBuilder out = new StringBuilder();

  private HistoryCheck(
      Intake intake, List<FileAccount> logs, List<Problem> logProblems, List<LogSpan> logSpans) {
    this.intake = intake;
    this.files = new ArrayList<>(intake.files());
    this.files.addAll(logs);
    this.problems = new ArrayList<>(intake.problems());
    this.problems.addAll(logProblems);
    this.problems.sort(null);
    for (LogSpan span : logSpans) {
      spans.merge(span.bearing(), span, HistoryCheck::both);
    }
  }

  /**
   * The account as text.
   *
   * @param intake what the folder gave
   * @param logs accounts of the logs
   * @param logProblems what could not be used in the logs
   * @param logSpans bearings that the logs name, of the register or not
   */
  public static String text(
      Intake intake, List<FileAccount> logs, List<Problem> logProblems, List<LogSpan> logSpans) {
    HistoryCheck check = new HistoryCheck(intake, logs, logProblems, logSpans);
    check.files();
    check.columns();
    check.missing();
    check.problems();
    check.summary();
    return check.out.toString();
  }

  private void files() {
    line("Files");
    for (FileAccount file : files) {
      line(
          String.format(
              Locale.ROOT,
              "  %s: %d rows, %d used, %d rejected%s",
              file.file(),
              file.rowsRead(),
              file.rowsUsed(),
              file.rowsRejected(),
              span(file)));
      if (!file.unusedColumns().isEmpty()) {
        line("    not used: " + String.join(", ", file.unusedColumns()));
      }
    }
    for (String note : intake.notes()) {
      line("  note: " + note);
    }
    line("");
  }

  private void columns() {
    List<ColumnCount> counts = ColumnCount.of(SampleTable.of(intake.history()));
    if (counts.isEmpty()) {
      return;
    }
    line("Columns of the samples");
    counts.forEach(count -> line("  " + count.text()));
    line("");
  }

  private void missing() {
    Map<String, List<String>> missing = new LinkedHashMap<>();
    PlantHistory history = intake.history();
    List<String> unsampled = new ArrayList<>();
    List<String> bare = new ArrayList<>();
    for (Asset asset : history.assets()) {
      if (history.samplesOf(asset.id()).isEmpty()) {
        unsampled.add(asset.id());
      }
      if (history.bearingsOf(asset.id()).isEmpty()) {
        bare.add(asset.id());
      }
    }
    missing.put("Assets without samples", unsampled);
    missing.put("Assets without bearings", bare);
    List<String> unlogged = new ArrayList<>();
    List<String> loadless = new ArrayList<>();
    for (Bearing bearing : history.bearings()) {
      if (!spans.containsKey(bearing.key())) {
        unlogged.add(bearing.key().toString());
      }
      if (!bearing.hasLoads()) {
        loadless.add(bearing.key().toString());
      }
    }
    missing.put("Bearings without logs", unlogged);
    missing.put("Bearings without loads, so without a rating life", loadless);
    List<BearingKey> known = history.bearings().stream().map(Bearing::key).toList();
    missing.put(
        "Logs without a bearing of the register",
        spans.keySet().stream()
            .filter(key -> !known.contains(key))
            .map(BearingKey::toString)
            .toList());
    missing.put("Samples outside the days of their asset's logs", outside(history));
    if (missing.values().stream().allMatch(List::isEmpty)) {
      return;
    }
    line("Missing");
    missing.forEach(
        (what, names) -> {
          if (!names.isEmpty()) {
            line("  " + what + " (" + names.size() + "): " + String.join(", ", names));
          }
        });
    line("");
  }

  private List<String> outside(PlantHistory history) {
    List<String> outside = new ArrayList<>();
    for (Asset asset : history.assets()) {
      List<LogSpan> logs =
          spans.values().stream()
              .filter(span -> span.bearing().asset().equals(asset.id()))
              .toList();
      if (logs.isEmpty()) {
        continue;
      }
      for (Sample sample : history.samplesOf(asset.id())) {
        if (logs.stream().noneMatch(span -> covers(span, sample.day()))) {
          outside.add(sample.id());
        }
      }
    }
    return outside;
  }

  private void problems() {
    if (problems.isEmpty()) {
      return;
    }
    line("Problems");
    Map<String, Integer> shown = new LinkedHashMap<>();
    for (Problem problem : problems) {
      String file = problem.source().file();
      if (shown.merge(file, 1, Integer::sum) <= MOST_PROBLEMS_OF_A_FILE) {
        line("  " + problem);
      }
    }
    shown.forEach(
        (file, count) -> {
          if (count > MOST_PROBLEMS_OF_A_FILE) {
            line("  " + file + ": " + (count - MOST_PROBLEMS_OF_A_FILE) + " more");
          }
        });
    line("");
  }

  private void summary() {
    PlantHistory history = intake.history();
    line(
        String.format(
            Locale.ROOT,
            "%d assets, %d bearings, %d oils, %d samples, %d log files; %s.",
            history.assets().size(),
            history.bearings().size(),
            history.oils().size(),
            history.samples().size(),
            files.stream().filter(f -> f.kind() == FileAccount.Kind.TEMPERATURES).count(),
            problems.isEmpty() ? "no problems" : problems.size() + " problems"));
  }

  private void line(String text) {
    out.append(text).append('\n');
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

  private static String span(FileAccount file) {
    return file.from().isPresent() && file.to().isPresent()
        ? ", " + file.from().get() + " to " + file.to().get()
        : "";
  }
}
