package org.kappatrail.intake;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Problem;

/** The account of a history folder: what was found, what was left out and why, what is missing. */
public final class HistoryCheck {
  private static final int MOST_PROBLEMS_OF_A_FILE = 20;

  private final Intake intake;
  private final LogAccount logs;
  private final List<FileAccount> files;
  private final List<Problem> problems;
  private final StringBuilder out = new StringBuilder();

  private HistoryCheck(Intake intake, LogAccount logs) {
    this.intake = intake;
    this.logs = logs;
    this.files = new ArrayList<>(intake.files());
    this.files.addAll(logs.files());
    this.problems = new ArrayList<>(intake.problems());
    this.problems.addAll(logs.problems());
    this.problems.sort(null);
  }

  /** The account as text. */
  public static String text(Intake intake, LogAccount logs) {
    HistoryCheck check = new HistoryCheck(intake, logs);
    check.files();
    check.section(
        "Columns of the samples",
        ColumnCount.of(SampleTable.of(intake.history())).stream().map(ColumnCount::text).toList());
    Coverage coverage = new Coverage(intake.history(), logs);
    check.section("Spans", coverage.spans());
    check.section("Missing", coverage.missing());
    check.problems();
    check.summary();
    return check.out.toString();
  }

  private void files() {
    List<String> lines = new ArrayList<>();
    for (FileAccount file : files) {
      lines.add(account(file));
      if (!file.rejected().isEmpty()) {
        lines.add("  rejected: " + reasons(file));
      }
      if (!file.unusedColumns().isEmpty()) {
        lines.add("  columns not used: " + String.join(", ", file.unusedColumns()));
      }
    }
    intake.notes().forEach(note -> lines.add("note: " + note));
    section("Files", lines);
  }

  private static String account(FileAccount file) {
    String rows =
        file.fileRows().isPresent()
            ? counted(file.fileRows().getAsLong(), "row")
                + " with "
                + counted(file.rowsRead(), "reading")
            : counted(file.rowsRead(), "row");
    String span =
        file.from().isPresent() && file.to().isPresent()
            ? ", " + file.from().get() + " to " + file.to().get()
            : "";
    return String.format(
        Locale.ROOT,
        "%s: %s, %d used, %d rejected%s",
        file.file(),
        rows,
        file.rowsUsed(),
        file.rowsRejected(),
        span);
  }

  /** The reasons, the most frequent first. */
  private static String reasons(FileAccount file) {
    return file.rejected().entrySet().stream()
        .sorted(
            Map.Entry.<String, Long>comparingByValue()
                .reversed()
                .thenComparing(Map.Entry.comparingByKey()))
        .map(entry -> entry.getValue() + " " + entry.getKey())
        .collect(Collectors.joining(", "));
  }

  private void problems() {
    List<String> lines = new ArrayList<>();
    Map<String, Integer> shown = new LinkedHashMap<>();
    for (Problem problem : problems) {
      String file = problem.source().file();
      if (shown.merge(file, 1, Integer::sum) <= MOST_PROBLEMS_OF_A_FILE) {
        lines.add(problem.toString());
      }
    }
    shown.forEach(
        (file, count) -> {
          if (count > MOST_PROBLEMS_OF_A_FILE) {
            int more = count - MOST_PROBLEMS_OF_A_FILE;
            lines.add(file + ": " + more + " more; problems.csv of a review has each");
          }
        });
    section("Problems", lines);
  }

  private void summary() {
    PlantHistory history = intake.history();
    String found = problems.isEmpty() ? "no problems" : counted(problems.size(), "problem");
    out.append(
        String.join(
            ", ",
            counted(history.assets().size(), "asset"),
            counted(history.bearings().size(), "bearing"),
            counted(history.oils().size(), "oil"),
            counted(history.samples().size(), "sample"),
            counted(logs.files().size(), "log") + "; " + found + ".\n"));
  }

  private void section(String title, List<String> lines) {
    if (!lines.isEmpty()) {
      out.append(title).append('\n');
      lines.forEach(line -> out.append("  ").append(line).append('\n'));
      out.append('\n');
    }
  }

  static String counted(long number, String what) {
    return number + " " + what + (number == 1 ? "" : "s");
  }
}
