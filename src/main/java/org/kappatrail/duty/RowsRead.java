package org.kappatrail.duty;

/** Told what share of the work is done, in readings; called now and then, from any thread. */
@FunctionalInterface
public interface RowsRead {
  /** Tells nobody. */
  RowsRead UNHEARD = (rows, total) -> {};

  /**
   * How far it has come.
   *
   * @param rows readings gone through
   * @param total readings in all; for text files an estimate by their size
   */
  void at(long rows, long total);
}
