package org.kappatrail.tribology;

/**
 * ∂lnν/∂lnν40 of one oil at any temperature, with the oil's viscosity index held, or its slope
 * where the index is undefined.
 *
 * <p>No unit; temperatures in °C. Range: that of ASTM D341 for the oil; outside it temperatures are
 * refused. Taken as the difference quotient between a thicker and a thinner oil of the same index
 * (ASTM D2270, ASTM D341); the two are found once, whatever the number of temperatures.
 */
public final class OilSensitivity {
  /**
   * Half the step in ln ν40 over which the sensitivity is taken, about one σ of a laboratory. The
   * linear interpolation in the table of ASTM D2270 has kinks; a far smaller step would show them.
   */
  private static final double HALF_STEP_LN = 0.005;

  private final OilViscosity thicker;
  private final OilViscosity thinner;

  private OilSensitivity(OilViscosity thicker, OilViscosity thinner) {
    this.thicker = thicker;
    this.thinner = thinner;
  }

  /** The sensitivity of an oil. */
  public static OilSensitivity of(OilViscosity oil) {
    double thickerV40 = oil.viscosity40Cst() * Math.exp(HALF_STEP_LN);
    double thinnerV40 = oil.viscosity40Cst() * Math.exp(-HALF_STEP_LN);
    OilViscosity thicker = OilViscosity.withIndexOf(thickerV40, oil);
    OilViscosity thinner = OilViscosity.withIndexOf(thinnerV40, oil);
    return thicker.source() == thinner.source()
        ? new OilSensitivity(thicker, thinner)
        : new OilSensitivity(
            OilViscosity.withSlope(thickerV40, oil.law().b()),
            OilViscosity.withSlope(thinnerV40, oil.law().b()));
  }

  /** ∂lnν/∂lnν40 at a temperature. */
  public double at(double temperatureC) {
    return Math.log(thicker.viscosityCst(temperatureC) / thinner.viscosityCst(temperatureC))
        / (2 * HALF_STEP_LN);
  }
}
