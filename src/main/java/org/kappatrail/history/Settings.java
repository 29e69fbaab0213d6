package org.kappatrail.history;

import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.tribology.CleanlinessCode;

/**
 * What the site has settled; every part has defaults.
 *
 * @param site name of the site
 * @param zone zone of local times and of the calendar day
 * @param limits the site's own limits
 * @param outlookDays how far ahead the outlook looks
 * @param decision how acts are weighed
 * @param duty how the logs are read
 * @param laboratory measuring scatter
 * @param sampleExports blocks for sample files, first match wins
 * @param logExports blocks for temperature logs, first match wins
 */
public record Settings(
    String site,
    ZoneId zone,
    Limits limits,
    int outlookDays,
    Decision decision,
    Duty duty,
    Laboratory laboratory,
    List<ExportMapping> sampleExports,
    List<ExportMapping> logExports) {

  public Settings {
    Quantity.within("outlook.horizon-days", outlookDays, 1, 3660);
    sampleExports = List.copyOf(sampleExports);
    logExports = List.copyOf(logExports);
  }

  /** Settings of a history folder that has none: UTC and every default. */
  public static Settings defaults() {
    return new Settings(
        "",
        ZoneOffset.UTC,
        Limits.DEFAULT,
        120,
        Decision.DEFAULT,
        Duty.DEFAULT,
        Laboratory.DEFAULT,
        List.of(),
        List.of());
  }

  /**
   * Limits; one that is empty gives no judgement.
   *
   * @param kappaFloor least κ where the bearing has none of its own
   * @param waterPpm most water, mg/kg
   * @param cleanliness dirtiest code
   * @param acidNumberRise most rise of the acid number within a charge, mg KOH/g
   */
  public record Limits(
      double kappaFloor,
      OptionalDouble waterPpm,
      Optional<CleanlinessCode> cleanliness,
      OptionalDouble acidNumberRise) {
    static final Limits DEFAULT =
        new Limits(1.0, OptionalDouble.empty(), Optional.empty(), OptionalDouble.empty());

    public Limits {
      Quantity.within("limits.kappa-floor", kappaFloor, 0.1, 10);
      Quantity.positive("limits.water-ppm", waterPpm);
      Quantity.positive("limits.acid-number-rise", acidNumberRise);
    }
  }

  /**
   * How acts are weighed.
   *
   * @param horizonDays days over which a failure counts
   * @param failureCostRatio how many times its price an act may need a failure to cost, and still
   *     pay
   */
  public record Decision(int horizonDays, double failureCostRatio) {
    static final Decision DEFAULT = new Decision(365, 60);

    public Decision {
      Quantity.within("decision.horizon-days", horizonDays, 1, 36_600);
      Quantity.positive("decision.failure-cost-ratio", failureCostRatio);
    }
  }

  /**
   * How temperature and speed logs are read.
   *
   * @param windowDays whole days that end with the day of sampling
   * @param gapMinutes longest time that a reading counts for
   * @param runningSpeedPercent speed above which a bearing runs, % of nominal
   * @param uncertaintyC standard uncertainty of the temperature, °C
   */
  public record Duty(
      int windowDays, int gapMinutes, double runningSpeedPercent, double uncertaintyC) {
    public static final Duty DEFAULT = new Duty(7, 60, 10, 1.5);

    public Duty {
      Quantity.within("temperature.window-days", windowDays, 1, 366);
      Quantity.within("temperature.gap-minutes", gapMinutes, 1, 527_040);
      Quantity.within("temperature.running-speed-percent", runningSpeedPercent, 0, 100);
      Quantity.within("temperature.uncertainty-c", uncertaintyC, 0, 50);
    }
  }

  /**
   * Measuring scatter of viscosity at 40 °C, in % of the value.
   *
   * @param reproducibilityPercent 95 % limit between laboratories; ASTM D445 where empty
   * @param sameLaboratoryPercent 95 % limit within one laboratory; the reproducibility where empty
   */
  public record Laboratory(
      OptionalDouble reproducibilityPercent, OptionalDouble sameLaboratoryPercent) {
    static final Laboratory DEFAULT =
        new Laboratory(OptionalDouble.empty(), OptionalDouble.empty());

    public Laboratory {
      Quantity.positive("laboratory.viscosity-reproducibility-percent", reproducibilityPercent);
      Quantity.positive("laboratory.same-laboratory-percent", sameLaboratoryPercent);
    }
  }
}
