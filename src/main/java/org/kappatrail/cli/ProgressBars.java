package org.kappatrail.cli;

import java.io.PrintStream;
import me.tongfei.progressbar.ConsoleProgressBarConsumer;
import me.tongfei.progressbar.ProgressBar;
import me.tongfei.progressbar.ProgressBarBuilder;
import me.tongfei.progressbar.ProgressBarRenderer;
import org.jspecify.annotations.Nullable;
import org.kappatrail.review.Progress;

/** A progress bar for each phase in turn, on one line that is empty in the end. */
final class ProgressBars implements Progress, AutoCloseable {
  private static final int UPDATE_MS = 200;

  private final PrintStream terminal;
  private @Nullable ProgressBar bar;

  ProgressBars(PrintStream terminal) {
    this.terminal = terminal;
  }

  static ProgressBars onStandardError() {
    return new ProgressBars(System.err);
  }

  @Override
  public synchronized void at(String phase, long done, long total) {
    ProgressBar present = bar;
    if (present == null || !present.getTaskName().equals(phase)) {
      close();
      present =
          new ProgressBarBuilder()
              .setTaskName(phase)
              .setInitialMax(total)
              .setUpdateIntervalMillis(UPDATE_MS)
              .setRenderer(renderer())
              .clearDisplayOnFinish()
              .setConsumer(new ConsoleProgressBarConsumer(terminal))
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

  private static ProgressBarRenderer renderer() {
    Pace pace = new Pace();
    return (state, width) -> {
      long done = state.getCurrent();
      long total = state.getMax();
      return ProgressLine.text(
          state.getTaskName(), done, total, pace.left(state.getTotalElapsed(), done, total), width);
    };
  }
}
