package org.kappatrail.tribology;

import java.util.OptionalDouble;

/**
 * Relative fatigue life of a bearing whose oil holds water, Cantley, ASLE Transactions 20 (1977):
 * (100/X)^0.6 with X in mg/kg, tested at 25, 100 and 400 mg/kg. Relative to 100 mg/kg; reported
 * beside a rating life and never multiplied into it.
 */
public final class CantleyWaterLife {
  private static final double LEAST_PPM = 25;
  private static final double MOST_PPM = 400;

  private CantleyWaterLife() {}

  /** Relative life; empty outside the tested 25…400 mg/kg. */
  public static OptionalDouble factor(double waterPpm) {
    return waterPpm >= LEAST_PPM && waterPpm <= MOST_PPM
        ? OptionalDouble.of(Math.pow(100 / waterPpm, 0.6))
        : OptionalDouble.empty();
  }
}
