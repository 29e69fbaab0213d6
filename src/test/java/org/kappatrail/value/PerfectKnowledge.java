package org.kappatrail.value;

import java.util.ArrayList;
import java.util.List;
import org.kappatrail.tribology.Iso281Reliability;

/**
 * Knows the true oil, temperature, life used and all that is to come in the next year, and does
 * what saves most over it.
 */
final class PerfectKnowledge implements Policy {
  private static final int HORIZON = 365;
  private static final int STEP = 5;

  @Override
  public Deed decide(Machine machine, State state, Samples samples) {
    double staying = failing(machine, state, state.oil(), state.filledOn(), state.cooledOn());
    Deed best = Deed.NOTHING;
    double saved = 0;
    List<Deed> deeds = new ArrayList<>();
    deeds.add(Deed.change(state.oil()));
    if (machine.tooThinByDesign(state)) {
      machine.oils.keySet().forEach(oil -> deeds.add(Deed.change(oil)));
    }
    deeds.add(Deed.COOL);
    for (Deed deed : deeds) {
      boolean cool = deed.kind() == Kind.COOL;
      double after =
          failing(
              machine,
              state,
              cool ? state.oil() : deed.oil(),
              cool ? state.filledOn() : state.day(),
              cool ? state.day() : state.cooledOn());
      double price = cool ? machine.coolingCost : machine.changeCost;
      double net = (staying - after) * machine.failureCost - price;
      if (net > saved) {
        saved = net;
        best = deed;
      }
    }
    return best;
  }

  private static double failing(
      Machine machine, State state, String oil, int filledOn, int cooledOn) {
    double added = 0;
    for (int ahead = 0; ahead < HORIZON; ahead += STEP) {
      int day = Math.min(Machine.DAYS - 1, state.day() + ahead);
      added += STEP * machine.damage(day, oil, filledOn, cooledOn);
    }
    return Iso281Reliability.failureProbabilityOfAddedLife(state.used(), added);
  }
}
