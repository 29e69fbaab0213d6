package org.kappatrail.tribology;

import org.apache.commons.math3.distribution.NormalDistribution;

/**
 * First-order uncertainty of κ in ln κ, from the laboratory's viscosity and the temperature: σ² =
 * (s40 σ(ln ν40))² + (sT σ(T))². The interval is κ·exp(±1.96 σ).
 *
 * @param kappa κ, above 0
 * @param sigmaLn standard uncertainty of ln κ, at least 0
 */
public record KappaUncertainty(double kappa, double sigmaLn) {
  private static final double TWO_SIDED_95 = 1.96;
  private static final NormalDistribution STANDARD = new NormalDistribution(null, 0, 1);

  public KappaUncertainty {
    Require.positive("κ", kappa, "");
    Require.within("standard uncertainty of ln κ", sigmaLn, "", 0, Double.MAX_VALUE);
  }

  /**
   * Uncertainty from its two sources.
   *
   * @param kappa κ
   * @param sigmaLnV40 standard uncertainty of ln ν40
   * @param sensitivityToV40 ∂ln ν/∂ln ν40
   * @param sensitivityToTemperature ∂ln ν/∂T, 1/°C
   * @param sigmaTemperatureC standard uncertainty of the temperature, °C
   */
  public static KappaUncertainty of(
      double kappa,
      double sigmaLnV40,
      double sensitivityToV40,
      double sensitivityToTemperature,
      double sigmaTemperatureC) {
    return new KappaUncertainty(
        kappa,
        Math.hypot(sensitivityToV40 * sigmaLnV40, sensitivityToTemperature * sigmaTemperatureC));
  }

  /** Lower end of the 95 % interval. */
  public double low() {
    return kappa * Math.exp(-TWO_SIDED_95 * sigmaLn);
  }

  /** Upper end of the 95 % interval. */
  public double high() {
    return kappa * Math.exp(TWO_SIDED_95 * sigmaLn);
  }

  /** Probability that κ lies below a floor: Φ((ln floor − ln κ)/σ); 0 or 1 without uncertainty. */
  public double probabilityBelow(double floor) {
    Require.positive("κ floor", floor, "");
    if (sigmaLn == 0) {
      return kappa < floor ? 1 : 0;
    }
    return STANDARD.cumulativeProbability(Math.log(floor / kappa) / sigmaLn);
  }
}
