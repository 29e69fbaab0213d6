package org.kappatrail.cli;

import java.time.Duration;
import java.util.Locale;
import java.util.Optional;

/** The line that shows how far a phase has come: its name, a bar, done of total, time left. */
final class ProgressLine {
  private static final int SHORTEST_BAR = 8;
  private static final int LONGEST_BAR = 30;

  private ProgressLine() {}

  /**
   * The line.
   *
   * @param phase what is being done and counted
   * @param done units done
   * @param total units in all; 0 where not known
   * @param left time left; empty where not known
   * @param width characters that fit; what does not is cut
   */
  static String text(String phase, long done, long total, Optional<Duration> left, int width) {
    if (total <= 0) {
      return cut(phase + "  " + grouped(done), width);
    }
    long within = Math.min(done, total);
    String numbers =
        String.format(
            Locale.ROOT,
            "%3d %%  %s of %s%s",
            100 * within / total,
            grouped(within),
            grouped(total),
            left.map(time -> "  " + clock(time) + " left").orElse(""));
    int room = width - phase.length() - numbers.length() - 6;
    String bar = room < SHORTEST_BAR ? "" : bar(within, total, Math.min(room, LONGEST_BAR)) + " ";
    return cut(phase + "  " + bar + numbers, width);
  }

  private static String bar(long done, long total, int length) {
    int full = (int) (length * done / total);
    return "[" + "=".repeat(full) + " ".repeat(length - full) + "]";
  }

  private static String clock(Duration time) {
    return String.format(
        Locale.ROOT, "%d:%02d:%02d", time.toHours(), time.toMinutesPart(), time.toSecondsPart());
  }

  private static String grouped(long number) {
    return String.format(Locale.ROOT, "%,d", number);
  }

  private static String cut(String text, int width) {
    return text.substring(0, Math.min(text.length(), Math.max(0, width)));
  }
}
