package org.kappatrail.review.trend;

import org.kappatrail.tribology.Iso281RatedViscosity;

/**
 * What moved κ from one state to another, in ln units that add up to the whole change. The oil's
 * part is the mean of the viscosity steps taken at the one and at the other temperature, the
 * temperature's part the mean of the temperature steps taken with the one and with the other oil,
 * the speed's part the step of −ln ν1. With two factors this is the Shapley value (Shapley,
 * Contributions to the Theory of Games II (1953) 307–317), so no order of steps is preferred.
 *
 * @param oil part of the oil
 * @param temperature part of the temperature
 * @param speed part of the speed
 */
public record Attribution(double oil, double temperature, double speed) {
  public Attribution {
    if (!Double.isFinite(oil + temperature + speed)) {
      throw new IllegalArgumentException(oil + ", " + temperature + ", " + speed);
    }
  }

  /** Splits the change of ln κ from a to b; the pitch diameter cancels out. */
  public static Attribution between(FilmState a, FilmState b) {
    double aAtA = a.lnViscosityAt(a.temperatureC());
    double aAtB = a.lnViscosityAt(b.temperatureC());
    double bAtA = b.lnViscosityAt(a.temperatureC());
    double bAtB = b.lnViscosityAt(b.temperatureC());
    double pitchMm = 1;
    return new Attribution(
        ((bAtA - aAtA) + (bAtB - aAtB)) / 2,
        ((aAtB - aAtA) + (bAtB - bAtA)) / 2,
        Math.log(Iso281RatedViscosity.ratedViscosityCst(a.speedRpm(), pitchMm))
            - Math.log(Iso281RatedViscosity.ratedViscosityCst(b.speedRpm(), pitchMm)));
  }

  /** The whole change of ln κ. */
  public double total() {
    return oil + temperature + speed;
  }

  /** The whole change of κ as a fraction: −0.34 for a fall by 34 %. */
  public double change() {
    return Math.expm1(total());
  }

  /** A part as a share of the change of κ; the shares add up to {@link #change()}. */
  public double share(double part) {
    double whole = total();
    return part * (Math.abs(whole) < 1e-9 ? 1 : Math.expm1(whole) / whole);
  }
}
