package org.kappatrail.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.time.Clock;
import java.util.concurrent.CancellationException;
import org.kappatrail.review.Progress;

/**
 * Where a command prints.
 *
 * @param out results
 * @param err progress and diagnostics
 * @param interactive true on a terminal: only there a progress bar is drawn
 * @param clock tells which sampling dates lie in the future; nothing else depends on it
 */
record Terminal(PrintWriter out, PrintWriter err, boolean interactive, Clock clock) {

  /** Work that reports its progress. */
  interface Work {
    void run(Progress progress) throws IOException;
  }

  /**
   * Runs something with a progress bar on a terminal, silently elsewhere. Work whose thread is
   * interrupted ends at its next report.
   */
  void withProgress(Work work) throws IOException {
    if (!interactive) {
      work.run(untilInterrupted(Progress.SILENT));
      return;
    }
    try (ProgressBars bars = ProgressBars.onStandardError()) {
      work.run(untilInterrupted(bars));
    }
  }

  /** Reports from other threads go through: theirs is not the work that ends. */
  private static Progress untilInterrupted(Progress progress) {
    Thread worker = Thread.currentThread();
    return (phase, done, total) -> {
      if (Thread.currentThread() == worker && worker.isInterrupted()) {
        throw new CancellationException("stopped");
      }
      progress.at(phase, done, total);
    };
  }
}
