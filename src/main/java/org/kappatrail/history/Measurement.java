package org.kappatrail.history;

/**
 * A laboratory's number: exact, or censored at a limit of detection or of range. A missing value is
 * the absence of a measurement, never a number.
 */
public sealed interface Measurement {

  /** The number that stands in the report: the value, or the limit. */
  double stated();

  /**
   * The number to calculate with: the value; half the limit for a value below it; the limit for a
   * value above it (tool convention).
   */
  double forArithmetic();

  /** True unless the value is exact. */
  default boolean censored() {
    return !(this instanceof Exact);
  }

  static Measurement of(double value) {
    return new Exact(value);
  }

  /** A measured value. */
  record Exact(double stated) implements Measurement {
    public Exact {
      finite(stated);
    }

    @Override
    public double forArithmetic() {
      return stated;
    }

    @Override
    public String toString() {
      return Double.toString(stated);
    }
  }

  /** Less than a limit, written {@code <20}. */
  record Below(double stated) implements Measurement {
    public Below {
      finite(stated);
    }

    @Override
    public double forArithmetic() {
      return stated / 2;
    }

    @Override
    public String toString() {
      return "<" + stated;
    }
  }

  /** More than a limit, written {@code >5000}. */
  record Above(double stated) implements Measurement {
    public Above {
      finite(stated);
    }

    @Override
    public double forArithmetic() {
      return stated;
    }

    @Override
    public String toString() {
      return ">" + stated;
    }
  }

  private static void finite(double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException("a measurement must be a finite number, is " + value);
    }
  }
}
