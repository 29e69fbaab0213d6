package org.kappatrail.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.time.Clock;
import me.tongfei.progressbar.ConsoleProgressBarConsumer;
import me.tongfei.progressbar.ProgressBar;
import me.tongfei.progressbar.ProgressBarBuilder;
import me.tongfei.progressbar.ProgressBarStyle;
import org.jspecify.annotations.Nullable;
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

  /** Runs something with a progress bar on a terminal, silently elsewhere. */
  void withProgress(Work work) throws IOException {
    if (!interactive) {
      work.run(Progress.SILENT);
      return;
    }
    try (Bars bars = new Bars()) {
      work.run(bars);
    }
  }

  /** One bar a phase. */
  private static final class Bars implements Progress, AutoCloseable {
    private @Nullable ProgressBar bar;

    @Override
    public synchronized void at(String phase, long done, long total) {
      ProgressBar present = bar;
      if (present == null || !present.getTaskName().equals(phase)) {
        close();
        present =
            new ProgressBarBuilder()
                .setTaskName(phase)
                .setInitialMax(total)
                .setStyle(ProgressBarStyle.ASCII)
                .setUpdateIntervalMillis(200)
                .clearDisplayOnFinish()
                .setConsumer(new ConsoleProgressBarConsumer(System.err))
                .build();
        bar = present;
      }
      present.maxHint(total);
      present.stepTo(done);
    }

    @Override
    public synchronized void close() {
      if (bar != null) {
        bar.close();
        bar = null;
      }
    }
  }
}
