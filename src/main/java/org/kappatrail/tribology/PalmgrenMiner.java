package org.kappatrail.tribology;

import java.util.OptionalDouble;

/**
 * Linear damage sum over a changing duty: 1/L = Σ (share of hours / L of that duty).
 *
 * <p>Units: h. Range: hours not below 0, lives above 0; others are refused. Not for use by several
 * threads at once.
 *
 * <p>Source: Palmgren 1924, Miner 1945; ISO 281:2007 leaves changing duty to this rule.
 */
public final class PalmgrenMiner {
  private double hours;
  private double damage;

  /** Adds hours run under a duty whose life is known. */
  public void add(double hours, double lifeHours) {
    Require.notNegative("hours", hours, "h");
    Require.positive("rating life", lifeHours, "h");
    this.hours += hours;
    damage += hours / lifeHours;
  }

  /** The life used up so far, as a fraction of the rating life. */
  public double damage() {
    return damage;
  }

  /** The hours added so far. */
  public double hours() {
    return hours;
  }

  /** The one life that does the same damage in the same hours; empty while nothing was added. */
  public OptionalDouble equivalentLifeHours() {
    return damage > 0 ? OptionalDouble.of(hours / damage) : OptionalDouble.empty();
  }
}
