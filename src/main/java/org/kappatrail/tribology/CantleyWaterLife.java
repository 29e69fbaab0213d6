package org.kappatrail.tribology;

import java.util.OptionalDouble;

/**
 * Relative fatigue life of a bearing whose oil carries water: (100/X)^0.6, so 1 at 100 ppm.
 *
 * <p>Units: ppm water by mass. Range: 25…400 ppm, where the tests were made; empty outside.
 *
 * <p>Source: Cantley, The Effect of Water in Lubricating Oil on Bearing Fatigue Life, ASLE
 * Transactions 20 (1977) 244.
 */
public final class CantleyWaterLife {
  /** Lowest water content that was tested, ppm. */
  public static final double LOWEST_PPM = 25;

  /** Highest water content that was tested, ppm. */
  public static final double HIGHEST_PPM = 400;

  private CantleyWaterLife() {}

  public static OptionalDouble factor(double waterPpm) {
    Require.notNegative("water", waterPpm, "ppm");
    return waterPpm < LOWEST_PPM || waterPpm > HIGHEST_PPM
        ? OptionalDouble.empty()
        : OptionalDouble.of(Math.pow(100 / waterPpm, 0.6));
  }
}
