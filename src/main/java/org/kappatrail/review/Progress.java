package org.kappatrail.review;

/** Told how far a review has come. */
@FunctionalInterface
public interface Progress {
  /** Tells nobody. */
  Progress SILENT = (phase, done, total) -> {};

  /**
   * Called now and then.
   *
   * @param phase what is being done
   * @param done units done
   * @param total units in all; 0 where not known
   */
  void at(String phase, long done, long total);
}
