package org.kappatrail.value;

import java.time.LocalDate;
import java.util.Optional;
import org.kappatrail.history.Settings;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.OneBearing;
import org.kappatrail.review.decision.Decision;
import org.kappatrail.review.decision.Remedy;
import org.kappatrail.review.decision.RemedyKind;
import org.kappatrail.review.decision.Verdict;

/** Does what the program's own verdict says, from samples and log alone. */
final class ProgramVerdicts implements Policy {
  private static final LocalDate FIRST = LocalDate.of(2020, 1, 1);

  private final boolean costsKnown;

  ProgramVerdicts(boolean costsKnown) {
    this.costsKnown = costsKnown;
  }

  @Override
  public Deed decide(Machine machine, State state, Samples samples) {
    OneBearing made = machine.made.copy();
    if (!costsKnown) {
      made.withoutCosts();
    }
    for (int day = 0; day <= state.day(); day++) {
      made.day(
          date(day),
          machine.temperatureC(day, samples.cooledBefore(day)) + machine.temperatureBias);
    }
    for (int i = 0; i < samples.changes().size(); i++) {
      made.oilChange(date(samples.changes().get(i)), samples.oilOf(i));
    }
    for (Samples.Result result : samples.results()) {
      made.sample(date(result.day()), result.v40());
    }
    AssetReview review = made.review(Settings.defaults());
    return review.decision().map(found -> deed(found, machine, state)).orElse(Deed.NOTHING);
  }

  private static Deed deed(Decision decision, Machine machine, State state) {
    Verdict verdict = decision.verdict();
    if (verdict == Verdict.CHANGE_NOW || verdict == Verdict.PLAN_CHANGE) {
      return Deed.change(state.oil());
    }
    if (verdict != Verdict.FIX_CAUSE_FIRST) {
      return Deed.NOTHING;
    }
    Optional<Remedy> cure =
        decision.remedies().stream()
            .filter(remedy -> decision.reason().contains("; " + remedy.name() + " gives"))
            .findFirst();
    if (cure.isEmpty()) {
      return Deed.NOTHING;
    }
    RemedyKind kind = cure.get().kind();
    if (kind == RemedyKind.OTHER_OIL) {
      return Deed.change(cure.get().name().split(" ", -1)[2]);
    }
    if (kind == RemedyKind.GRADE) {
      String grade = "mineral-" + cure.get().name().split(" ", -1)[2];
      return Deed.change(machine.oils.containsKey(grade) ? grade : machine.thickest());
    }
    return Deed.COOL;
  }

  private static LocalDate date(int day) {
    return FIRST.plusDays(day);
  }
}
