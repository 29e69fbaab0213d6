package org.kappatrail.review.trend;

import org.kappatrail.tribology.Iso281RatedViscosity;
import org.kappatrail.tribology.OilViscosity;

/**
 * What makes κ: an oil at a temperature and a speed.
 *
 * @param oil the oil
 * @param temperatureC its temperature in the contact, °C
 * @param speedRpm speed, r/min, above 0
 */
public record FilmState(OilViscosity oil, double temperatureC, double speedRpm) {
  public FilmState {
    if (!(speedRpm > 0) || Double.isNaN(temperatureC)) {
      throw new IllegalArgumentException("no film at " + speedRpm + " r/min, " + temperatureC);
    }
  }

  /** ln of the oil's viscosity at a temperature. */
  double lnViscosityAt(double otherC) {
    return Math.log(oil.viscosityCst(otherC));
  }

  /** ln κ in a bearing of that pitch diameter. */
  public double lnKappa(double pitchMm) {
    return lnViscosityAt(temperatureC)
        - Math.log(Iso281RatedViscosity.ratedViscosityCst(speedRpm, pitchMm));
  }

  /** κ in a bearing of that pitch diameter. */
  public double kappa(double pitchMm) {
    return Math.exp(lnKappa(pitchMm));
  }

  /** The same oil at another operating point. */
  public FilmState at(double otherC, double otherRpm) {
    return new FilmState(oil, otherC, otherRpm);
  }

  /** Another oil at the same operating point. */
  public FilmState with(OilViscosity other) {
    return new FilmState(other, temperatureC, speedRpm);
  }
}
