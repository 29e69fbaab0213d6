package org.kappatrail.cli;

import java.time.Duration;
import java.util.ArrayDeque;
import java.util.Optional;

/**
 * Tells the time left from the pace of the last third of the time: a query goes through stages that
 * differ in speed.
 */
final class Pace {
  private static final double WINDOW = 1.0 / 3;

  private final ArrayDeque<Mark> marks = new ArrayDeque<>();

  private record Mark(Duration elapsed, long done) {}

  /**
   * The time left; empty before a hundredth is done.
   *
   * @param elapsed since the phase began, not falling from call to call
   * @param done units done
   * @param total units in all
   */
  Optional<Duration> left(Duration elapsed, long done, long total) {
    marks.addLast(new Mark(elapsed, done));
    double from = elapsed.toMillis() * (1 - WINDOW);
    while (marks.size() > 2 && marks.getFirst().elapsed().toMillis() < from) {
      marks.removeFirst();
    }
    long lately = done - marks.getFirst().done();
    Duration time = elapsed.minus(marks.getFirst().elapsed());
    if (lately <= 0 || time.isZero()) {
      lately = done;
      time = elapsed;
    }
    return done * 100 < total || lately <= 0
        ? Optional.empty()
        : Optional.of(
            Duration.ofMillis((long) ((double) time.toMillis() / lately * (total - done))));
  }
}
