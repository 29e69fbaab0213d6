package org.kappatrail.tribology;

import java.util.OptionalDouble;

/** Palmgren-Miner sum over a duty: 1/L = Σ (share of hours / L of that part). */
public final class PalmgrenMiner {
  private double hours;
  private double damage;

  /**
   * Adds a part of the duty.
   *
   * @param partHours hours of it, at least 0
   * @param lifeHours rating life under it, hours, above 0
   */
  public void add(double partHours, double lifeHours) {
    Require.within("hours", partHours, "h", 0, Double.MAX_VALUE);
    Require.positive("life", lifeHours, "h");
    hours += partHours;
    damage += partHours / lifeHours;
  }

  public double hours() {
    return hours;
  }

  /** Life used, as a fraction of the rating life. */
  public double damage() {
    return damage;
  }

  /** Rating life under the whole duty, hours; empty for no duty. */
  public OptionalDouble equivalentLifeHours() {
    return damage > 0 ? OptionalDouble.of(hours / damage) : OptionalDouble.empty();
  }
}
