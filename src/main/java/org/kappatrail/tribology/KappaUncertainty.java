package org.kappatrail.tribology;

import org.apache.commons.math3.special.Erf;

/**
 * Uncertainty of a viscosity ratio from that of the viscosity at 40 °C and of the temperature, by
 * first-order propagation in ln κ.
 *
 * <p>Units: κ and σ(ln κ) none. Source: GUM (JCGM 100:2008), 5.1.2, uncorrelated inputs; ln κ taken
 * as normal.
 *
 * @param kappa the viscosity ratio, above 0
 * @param sigmaLn standard deviation of ln κ, 0 or above
 */
public record KappaUncertainty(double kappa, double sigmaLn) {
  private static final double NORMAL_95 = 1.96;

  public KappaUncertainty {
    Require.positive("viscosity ratio", kappa, "");
    Require.notNegative("σ of ln κ", sigmaLn, "");
  }

  /**
   * Propagates both inputs.
   *
   * @param sensV40 ∂lnν/∂lnν40 at the operating temperature
   * @param sensT ∂lnν/∂T at the operating temperature, per °C
   */
  public static KappaUncertainty of(
      double kappa, double sigmaLnV40, double sensV40, double sensT, double sigmaTemperatureC) {
    Require.notNegative("σ of ln ν40", sigmaLnV40, "");
    Require.notNegative("σ of temperature", sigmaTemperatureC, "°C");
    Require.finite("∂lnν/∂lnν40", sensV40, "");
    Require.finite("∂lnν/∂T", sensT, "per °C");
    return new KappaUncertainty(kappa, Math.hypot(sensV40 * sigmaLnV40, sensT * sigmaTemperatureC));
  }

  /** Lower end of the 95 % interval. */
  public double low() {
    return kappa * Math.exp(-NORMAL_95 * sigmaLn);
  }

  /** Upper end of the 95 % interval. */
  public double high() {
    return kappa * Math.exp(NORMAL_95 * sigmaLn);
  }

  /** Probability that the true ratio lies below a floor; 0 or 1 where nothing is uncertain. */
  public double probabilityBelow(double floor) {
    Require.positive("floor", floor, "");
    double distance = Math.log(floor) - Math.log(kappa);
    if (sigmaLn == 0) {
      return distance > 0 ? 1 : 0;
    }
    return Erf.erfc(-distance / (sigmaLn * Math.sqrt(2))) / 2;
  }
}
