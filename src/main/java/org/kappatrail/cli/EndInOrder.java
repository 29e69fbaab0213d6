package org.kappatrail.cli;

import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.function.IntSupplier;

/**
 * Lets a command clean up when the program is told to end, as by Ctrl-C: its thread is interrupted,
 * and the program waits a while for it.
 */
final class EndInOrder {
  private static final long PATIENCE_SECONDS = 20;

  private EndInOrder() {}

  /** Runs a command on this thread. */
  static int run(IntSupplier command) {
    Thread worker = Thread.currentThread();
    CountDownLatch done = new CountDownLatch(1);
    Thread atExit = new Thread(() -> end(worker, done), "end-in-order");
    Runtime.getRuntime().addShutdownHook(atExit);
    try {
      return command.getAsInt();
    } finally {
      done.countDown();
      forget(atExit);
    }
  }

  private static void end(Thread worker, CountDownLatch done) {
    worker.interrupt();
    try {
      if (!done.await(PATIENCE_SECONDS, TimeUnit.SECONDS)) {
        // The next run takes away what is left.
        return;
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  private static void forget(Thread atExit) {
    try {
      Runtime.getRuntime().removeShutdownHook(atExit);
    } catch (IllegalStateException endingAlready) {
      // The hook has seen this command end.
      return;
    }
  }
}
