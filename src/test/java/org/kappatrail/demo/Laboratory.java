package org.kappatrail.demo;

import java.util.Locale;
import org.kappatrail.tribology.AstmD445Precision;

/**
 * A laboratory with its habits.
 *
 * @param label name on the report
 * @param bias its lasting share of the scatter between laboratories, in standard deviations
 * @param leastWaterPpm water below which it states only the limit, mg/kg
 * @param missing how it writes what it did not measure
 */
record Laboratory(String label, double bias, int leastWaterPpm, String missing) {
  static final Laboratory NORTH = new Laboratory("North Lab", 0.3, 10, "");
  static final Laboratory FELL = new Laboratory("Fell Lab", -0.3, 20, "-");

  private static final double WATER_SCATTER = 0.08;
  private static final double ELEMENT_SCATTER = 0.025;

  /** ν40 as reported: this laboratory's bias, and the repeatability of a single result. */
  String viscosity40(double trueCst, Noise noise) {
    double reproducibility = AstmD445Precision.reproducibilityPercent(trueCst) / 277;
    double repeatability = AstmD445Precision.repeatabilityPercent(trueCst) / 277;
    double between = Math.sqrt(reproducibility * reproducibility - repeatability * repeatability);
    double value = trueCst * Math.exp(bias * between + repeatability * noise.gaussian());
    return decimals(value, value >= 100 ? 1 : 2);
  }

  /** ν100 as reported, with half the relative scatter that the reports show at 40 °C. */
  String viscosity100(double trueCst, Noise noise) {
    return decimals(trueCst * Math.exp(0.001 * bias + 0.0017 * noise.gaussian()), 2);
  }

  String water(double truePpm, Noise noise) {
    double value = truePpm * Math.exp(WATER_SCATTER * noise.gaussian());
    return value < leastWaterPpm ? "<" + leastWaterPpm : decimals(value, 0);
  }

  String element(double truePpm, Noise noise) {
    double value = truePpm * Math.exp(ELEMENT_SCATTER * noise.gaussian());
    return value < 1 ? "<1" : decimals(value, 0);
  }

  String acidNumber(double trueValue, Noise noise) {
    return decimals(Math.max(0.02, trueValue + 0.02 * noise.gaussian()), 2);
  }

  static String decimals(double value, int digits) {
    return String.format(Locale.ROOT, "%." + digits + "f", value);
  }
}
