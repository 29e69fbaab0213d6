package org.kappatrail.demo;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;

/** Something that happens to one asset and that the records do not say. */
sealed interface Influence {

  /** An influence on the oil, which ends with the charge that it began in. */
  sealed interface OnOil extends Influence {
    LocalDate from();

    OilState change(OilState oil, LocalDate day);
  }

  /** A thin liquid of 2.5 mm²/s at 40 °C leaks into the oil. */
  record Dilution(LocalDate from, LocalDate until, double fraction) implements OnOil {
    private static final OilState THIN = new OilState(2.5, 1.05, Map.of(), 0);

    @Override
    public OilState change(OilState oil, LocalDate day) {
      return oil.mixedWith(THIN, fraction * Timeline.passed(day, from, until));
    }
  }

  /** Another oil of the register went in. */
  record WrongTopUp(LocalDate from, String oil, double fraction) implements OnOil {
    @Override
    public OilState change(OilState state, LocalDate day) {
      return state.mixedWith(OilTruth.fresh(oil), fraction);
    }
  }

  /** The polymer of a VI-improved oil breaks, fast at first. */
  record Shear(LocalDate from, LocalDate until, double loss, double indexLoss) implements OnOil {
    @Override
    public OilState change(OilState oil, LocalDate day) {
      double done = Math.pow(Timeline.passed(day, from, until), 0.8);
      return oil.thickened(1 - loss * done, -indexLoss * done);
    }
  }

  /** The oil ages in heat: thicker and sourer, slowly at first. */
  record Oxidation(LocalDate from, LocalDate until, double rise, double acidRise) implements OnOil {
    @Override
    public OilState change(OilState oil, LocalDate day) {
      double done = Math.pow(Timeline.passed(day, from, until), 1.3);
      return oil.thickened(1 + rise * done, -6 * done).soured(acidRise * done);
    }
  }

  /** The oil was changed; nobody wrote an event, and the hours went on or were put back. */
  record SilentChange(LocalDate day, boolean hoursPutBack) implements Influence {}

  /** The cooler loses its effect. */
  record FouledCooler(LocalDate from, LocalDate until, double riseC) implements Influence {}

  /** Water by sample, mg/kg; warmth comes with it, particles and wear one sample later. */
  record Steam(List<Integer> waterPpm) implements Influence {
    double waterAt(int sample) {
      return waterPpm.get(Math.max(0, Math.min(waterPpm.size() - 1, sample)));
    }

    double strength(int sample) {
      return Math.log(waterAt(sample) / 150);
    }
  }

  /** A temperature reading that stands still for a number of hours. */
  record StuckSensor(String bearing, LocalDate from, int hours) implements Influence {}

  /** The bottle of a round was filled at another asset, and the other way round. */
  record Swap(LocalDate month, String other) implements Influence {}
}
