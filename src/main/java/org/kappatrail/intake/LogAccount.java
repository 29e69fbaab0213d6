package org.kappatrail.intake;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Problem;

/**
 * What the logs of a history gave.
 *
 * @param files accounts of the files and tables
 * @param problems what could not be used
 * @param spans days that the used readings of each bearing cover
 * @param unknown readings of bearings that the register does not have, by the name in the log
 */
public record LogAccount(
    List<FileAccount> files,
    List<Problem> problems,
    List<LogSpan> spans,
    Map<String, Long> unknown) {
  /** A history without logs. */
  public static final LogAccount NONE = new LogAccount(List.of(), List.of(), List.of(), Map.of());

  public LogAccount {
    files = List.copyOf(files);
    problems = List.copyOf(problems);
    spans = List.copyOf(spans);
    unknown = java.util.Collections.unmodifiableMap(new TreeMap<>(unknown));
  }
}
