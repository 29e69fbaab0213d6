package org.kappatrail.cli;

import java.io.PrintWriter;
import java.util.function.Consumer;
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
 */
record Terminal(PrintWriter out, PrintWriter err, boolean interactive) {

  /** Runs something with a progress bar on a terminal, silently elsewhere. */
  void withProgress(Consumer<Progress> work) {
    if (!interactive) {
      work.accept(Progress.SILENT);
      return;
    }
    try (Bars bars = new Bars()) {
      work.accept(bars);
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
