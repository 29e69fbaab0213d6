package org.kappatrail.review;

import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.history.Oil;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.tribology.OilViscosity;

/**
 * Numbers that fit better in another unit: a viscosity "at 40 °C" that is the fresh oil's at 40 °F
 * or at 100 °C, a water content below 1 mg/kg that looks like percent (tool convention: within 10 %
 * of the other, and off the expected one by more than a third).
 */
final class UnitSuspicion {
  private static final double FORTY_FAHRENHEIT_C = (40 - 32) / 1.8;
  private static final double NEAR = 0.10;
  private static final double FAR = 1.0 / 3;
  private static final double LEAST_WATER_PPM = 1;

  private UnitSuspicion() {}

  static Optional<String> of(Sample sample, Oil oil) {
    OptionalDouble v40 = sample.exact(SampleColumns.VISCOSITY_40C);
    OilViscosity fresh = oil.viscosity();
    if (v40.isPresent() && off(v40.getAsDouble(), fresh.viscosity40Cst(), FAR)) {
      if (!off(v40.getAsDouble(), fresh.viscosityCst(FORTY_FAHRENHEIT_C), NEAR)) {
        return Optional.of(
            Say.viscosity(v40.getAsDouble())
                + " mm²/s is what the registered oil has at 40 °F; was it measured at 40 °C?");
      }
      if (!off(v40.getAsDouble(), fresh.viscosity100Cst(), NEAR)) {
        return Optional.of(
            Say.viscosity(v40.getAsDouble())
                + " mm²/s is what the registered oil has at 100 °C; was it measured at 40 °C?");
      }
    }
    OptionalDouble water = sample.exact(SampleColumns.WATER);
    if (water.isPresent() && water.getAsDouble() > 0 && water.getAsDouble() < LEAST_WATER_PPM) {
      return Optional.of(
          "water "
              + Say.significant(water.getAsDouble(), 3)
              + " mg/kg is less than a laboratory can measure; if it is in percent, set units:"
              + " {water_ppm: percent} for this file");
    }
    return Optional.empty();
  }

  private static boolean off(double value, double expected, double share) {
    return Math.abs(value / expected - 1) > share;
  }
}
