package org.kappatrail.review.correlation;

/**
 * A value of a variable at one sample.
 *
 * @param arithmetic number to calculate with: for one below a limit half that limit
 * @param range where it lies against what the laboratory can measure
 */
public record Value(double arithmetic, Range range) {

  /** Against the laboratory's limits; in the order of rank. */
  public enum Range {
    BELOW,
    MEASURED,
    ABOVE
  }

  public Value {
    if (!Double.isFinite(arithmetic)) {
      throw new IllegalArgumentException("a value must be a finite number, is " + arithmetic);
    }
  }

  /** A measured value. */
  public static Value measured(double value) {
    return new Value(value, Range.MEASURED);
  }
}
