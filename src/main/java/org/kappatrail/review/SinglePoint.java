package org.kappatrail.review;

import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.Settings;
import org.kappatrail.tribology.Iso281RatedViscosity;
import org.kappatrail.tribology.OilViscosity;

/**
 * One κ from bare numbers, by the same steps as in a review and with its default uncertainty.
 *
 * @param oil the oil
 * @param temperatureC operating temperature, °C
 * @param speedRpm speed, r/min
 * @param pitchMm pitch diameter, mm
 * @param film κ and what belongs to it
 */
public record SinglePoint(
    OilViscosity oil, double temperatureC, double speedRpm, double pitchMm, Film film) {

  /**
   * Computes the point.
   *
   * @param viscosity40Cst kinematic viscosity at 40 °C, mm²/s
   * @param viscosity100Cst kinematic viscosity at 100 °C, mm²/s, or empty
   * @param viscosityIndex viscosity index, used without the former
   * @param temperatureC operating temperature, °C
   * @param speedRpm speed, r/min
   * @param pitchMm pitch diameter, mm
   * @throws IllegalArgumentException where a number is outside its range
   */
  public static SinglePoint of(
      double viscosity40Cst,
      OptionalDouble viscosity100Cst,
      OptionalDouble viscosityIndex,
      double temperatureC,
      double speedRpm,
      double pitchMm) {
    Bearing bearing =
        new Bearing(
            "point",
            "point",
            Optional.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            pitchMm,
            speedRpm,
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            0);
    OilViscosity oil = OilViscosity.register(viscosity40Cst, viscosity100Cst, viscosityIndex);
    Film film = new Films(bearing, Settings.defaults()).film(oil, temperatureC, speedRpm);
    return new SinglePoint(oil, temperatureC, speedRpm, pitchMm, film);
  }

  /** Pitch diameter as given, else the mean of bore and outside diameter, mm. */
  public static double pitchMm(
      OptionalDouble pitchMm, OptionalDouble boreMm, OptionalDouble outsideMm) {
    return pitchMm.isPresent()
        ? pitchMm.getAsDouble()
        : Iso281RatedViscosity.pitchMm(boreMm.orElseThrow(), outsideMm.orElseThrow());
  }
}
