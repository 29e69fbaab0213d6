package org.kappatrail.review;

import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.Settings;
import org.kappatrail.tribology.AstmD341;
import org.kappatrail.tribology.AstmD445Precision;
import org.kappatrail.tribology.Iso281RatedViscosity;
import org.kappatrail.tribology.KappaUncertainty;
import org.kappatrail.tribology.LubricationRegime;
import org.kappatrail.tribology.OilViscosity;
import org.kappatrail.tribology.ViscosityRatio;

/** The film of one bearing for an oil at a temperature and speed, with its uncertainty. */
final class Films {
  private final Bearing bearing;
  private final double floor;
  private final Settings settings;

  Films(Bearing bearing, Settings settings) {
    this.bearing = bearing;
    this.floor = bearing.kappaFloor().orElse(settings.limits().kappaFloor());
    this.settings = settings;
  }

  double floor() {
    return floor;
  }

  /** κ alone. */
  double kappa(OilViscosity oil, double temperatureC, double speedRpm) {
    return ViscosityRatio.kappa(
        oil.viscosityCst(temperatureC),
        Iso281RatedViscosity.ratedViscosityCst(speedRpm, bearing.pitchMm()));
  }

  /** κ at reference conditions; empty where the law does not reach there. */
  OptionalDouble kappa(OilViscosity oil, Reference reference) {
    try {
      return OptionalDouble.of(kappa(oil, reference.temperatureC(), reference.speedRpm()));
    } catch (IllegalArgumentException outsideTheLaw) {
      return OptionalDouble.empty();
    }
  }

  /** The film; empty where the temperature is unknown or the law does not reach there. */
  Optional<Film> film(OilViscosity oil, OperatingPoint point) {
    if (point.temperatureC().isEmpty() || !(point.speedRpm() > 0)) {
      return Optional.empty();
    }
    try {
      return Optional.of(film(oil, point.temperatureC().getAsDouble(), point.speedRpm()));
    } catch (IllegalArgumentException outsideTheLaw) {
      return Optional.empty();
    }
  }

  Film film(OilViscosity oil, double temperatureC, double speedRpm) {
    double operating = oil.viscosityCst(temperatureC);
    double rated = Iso281RatedViscosity.ratedViscosityCst(speedRpm, bearing.pitchMm());
    double kappa = ViscosityRatio.kappa(operating, rated);
    double sigmaLnV40 = sigmaLnV40(oil.viscosity40Cst());
    double toV40 = oil.sensitivityToV40(temperatureC);
    double toTemperature = oil.sensitivityToTemperature(temperatureC);
    KappaUncertainty uncertainty =
        KappaUncertainty.of(
            kappa, sigmaLnV40, toV40, toTemperature, settings.duty().uncertaintyC());
    return new Film(
        operating,
        rated,
        kappa,
        uncertainty,
        toV40,
        toTemperature,
        sigmaLnV40,
        uncertainty.probabilityBelow(floor),
        LubricationRegime.of(kappa),
        level(uncertainty),
        AstmD341.extrapolated(temperatureC));
  }

  private Level level(KappaUncertainty uncertainty) {
    if (uncertainty.kappa() < floor) {
      return Level.ALARM;
    }
    return uncertainty.low() < floor ? Level.ALERT : Level.CLEAR;
  }

  /** Standard uncertainty of ln ν40 by the site's setting, else by ASTM D445. */
  double sigmaLnV40(double viscosity40Cst) {
    OptionalDouble percent = settings.laboratory().reproducibilityPercent();
    return AstmD445Precision.sigmaLn(
        percent.isPresent()
            ? percent.getAsDouble() / 100
            : AstmD445Precision.reproducibilityPercent(viscosity40Cst) / 100);
  }
}
