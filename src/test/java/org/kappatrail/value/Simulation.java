package org.kappatrail.value;

import java.util.SplittableRandom;
import org.kappatrail.tribology.AstmD445Precision;
import org.kappatrail.tribology.Iso281RatedViscosity;
import org.kappatrail.tribology.Iso281Reliability;
import org.kappatrail.tribology.OilViscosity;

/** Runs one machine for five years under one policy. */
final class Simulation {
  private static final int WINDOW = 7;
  private static final double YEARS = 5;

  private Simulation() {}

  /**
   * What it cost.
   *
   * @param perYear expected cost a year: failures at their probability, and deeds
   * @param changes oil changes in five years
   * @param coolings times the cooler was put right
   */
  record Cost(double perYear, int changes, int coolings) {}

  static Cost run(Machine machine, Policy policy, long seed) {
    SplittableRandom random = new SplittableRandom(seed ^ machine.name.hashCode());
    Samples samples = new Samples();
    String oil = machine.registered;
    int filledOn = -1;
    int cooledOn = -1;
    double used = 0;
    double cost = 0;
    int changes = 0;
    int coolings = 0;
    for (int day = 0; day < Machine.DAYS; day++) {
      boolean monthEnd = day % Machine.MONTH == Machine.MONTH - 1;
      if (monthEnd) {
        samples.add(measure(machine, day, oil, filledOn, cooledOn, random));
      }
      if (monthEnd && day >= Machine.BEFORE) {
        Policy.Deed deed =
            policy.decide(machine, new Policy.State(day, oil, filledOn, cooledOn, used), samples);
        if (deed.kind() == Policy.Kind.CHANGE) {
          oil = deed.oil();
          filledOn = day;
          samples.changed(day, oil);
          cost += machine.changeCost;
          changes++;
        } else if (deed.kind() == Policy.Kind.COOL) {
          cooledOn = day;
          samples.cooled(day);
          cost += machine.coolingCost;
          coolings++;
        }
      }
      double added = machine.damage(day, oil, filledOn, cooledOn);
      if (day >= Machine.BEFORE) {
        cost += machine.failureCost * Iso281Reliability.failureProbabilityOfAddedLife(used, added);
      }
      used += added;
    }
    return new Cost(cost / YEARS, changes, coolings);
  }

  private static Samples.Result measure(
      Machine machine, int day, String oil, int filledOn, int cooledOn, SplittableRandom random) {
    OilViscosity truth = machine.oil(day, oil, filledOn);
    double sigma =
        AstmD445Precision.sigmaLn(
            AstmD445Precision.reproducibilityPercent(truth.viscosity40Cst()) / 100);
    double v40 = truth.viscosity40Cst() * Math.exp(sigma * Machine.gaussian(random));
    double warmth = 0;
    for (int back = 0; back < WINDOW; back++) {
      warmth += machine.temperatureC(day - back, cooledOn) + machine.temperatureBias;
    }
    double rated =
        Iso281RatedViscosity.ratedViscosityCst(
            machine.bearing.speedRpm(), machine.bearing.pitchMm());
    OilViscosity measured = OilViscosity.withIndexOf(v40, machine.oil(oil).viscosity());
    return new Samples.Result(day, v40, measured.viscosityCst(warmth / WINDOW) / rated);
  }
}
