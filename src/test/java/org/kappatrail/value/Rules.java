package org.kappatrail.value;

/** Rules of thumb (common practice, no source). */
final class Rules {
  private Rules() {}

  static Policy never() {
    return (machine, state, samples) -> Policy.Deed.NOTHING;
  }

  static Policy yearly() {
    return (machine, state, samples) ->
        state.day() - state.filledOn() >= 365
            ? Policy.Deed.change(state.oil())
            : Policy.Deed.NOTHING;
  }

  /** Change where the viscosity is off the fresh oil's by more than a share. */
  static Policy offFresh(double share) {
    return (machine, state, samples) -> {
      double fresh = machine.oil(state.oil()).viscosity().viscosity40Cst();
      boolean fallen = samples.latest().day() > state.filledOn();
      return fallen && Math.abs(samples.latest().v40() / fresh - 1) > share
          ? Policy.Deed.change(state.oil())
          : Policy.Deed.NOTHING;
    };
  }

  /** Change where κ is below 1. */
  static Policy belowOne() {
    return (machine, state, samples) ->
        samples.latest().kappa() < 1 ? Policy.Deed.change(state.oil()) : Policy.Deed.NOTHING;
  }
}
