package org.kappatrail.review.decision;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Weighs what could be done about an asset's oil and gives the verdict. */
public final class Weighing {
  private Weighing() {}

  /** The decision for an asset. */
  public static Decision of(AssetCase asset) {
    List<Remedy> remedies = Weights.of(asset);
    Questions questions = new Questions(asset, remedies);
    Reply real = questions.real();
    Reply matters = questions.matters();
    Reply blame = questions.oilToBlame();
    Reply curable = questions.curable();
    Reply urgent = questions.urgent();
    Verdict verdict =
        DecisionTable.verdict(
            real.answer(),
            matters.answer(),
            blame.answer(),
            questions.fresh().pays(),
            questions.causePays(),
            questions.causeWorthMore(),
            urgent.answer());
    return new Decision(
        asset.governing().bearing().id(),
        asset.sample(),
        verdict,
        reason(asset, verdict, questions, real, curable, urgent),
        real,
        matters,
        blame,
        curable,
        urgent,
        remedies,
        assumptions(asset),
        asset);
  }

  private static String reason(
      AssetCase asset,
      Verdict verdict,
      Questions questions,
      Reply real,
      Reply curable,
      Reply urgent) {
    String main =
        switch (verdict) {
          case KEEP -> keep(asset);
          case RESAMPLE ->
              "an oil change would pay if the viscosity were what the sample says, which is not"
                  + " shown: "
                  + real.why();
          case FIX_CAUSE_FIRST ->
              cause(questions)
                  + "; "
                  + questions.cure().map(cure -> put(cure, asset)).orElse("")
                  + ". Fresh oil does not cure it: "
                  + curable.why();
          case PLAN_CHANGE -> "fresh oil pays: " + put(questions.fresh(), asset);
          case CHANGE_NOW ->
              "fresh oil pays: " + put(questions.fresh(), asset) + "; " + urgent.why();
        };
    return asset.otherGrounds().isEmpty() ? main : main + grounds(asset, verdict);
  }

  private static String keep(AssetCase asset) {
    BearingCase governing = asset.governing();
    String film =
        governing.kappa() < governing.floor()
            ? "κ stands below the floor, yet no act on the oil pays"
            : "no act on the oil pays";
    return "viscosity gives no reason to change the oil: " + film;
  }

  private static String grounds(AssetCase asset, Verdict verdict) {
    String which = String.join("; ", asset.otherGrounds());
    return verdict == Verdict.KEEP || verdict == Verdict.RESAMPLE
        ? ". Something else may: " + which
        : ". Beside it: " + which;
  }

  private static String cause(Questions questions) {
    return switch (questions.cause()) {
      case TEMPERATURE -> "the temperature is to blame, not the oil";
      case SPEED -> "the speed is to blame, not the oil's condition";
      case GRADE -> "the grade is to blame, not the oil's condition";
      case NONE -> "something other than the oil is to blame";
    };
  }

  private static String put(Remedy remedy, AssetCase asset) {
    Optional<Outcome> outcome = remedy.outcome(asset.governing().bearing().id());
    String kappa =
        outcome
            .map(
                found ->
                    Phrases.text(
                        " gives κ %s (%s to %s)",
                        Phrases.kappa(found.kappa()),
                        Phrases.kappa(found.kappaLow()),
                        Phrases.kappa(found.kappaHigh())))
            .orElse("");
    return remedy.name() + kappa + " and " + Phrases.worth(remedy, asset);
  }

  private static List<String> assumptions(AssetCase asset) {
    List<String> found = new ArrayList<>();
    found.add("horizon " + asset.settings().horizonDays() + " days");
    for (BearingCase bearing : asset.bearings()) {
      found.add(
          bearing.bearing().id()
              + ": duty by "
              + bearing.duty().basis()
              + Phrases.text(", %.0f running hours a year", bearing.duty().hours())
              + bearing.usedLife().stream()
                  .mapToObj(
                      used ->
                          "; "
                              + Phrases.significant(used * 100)
                              + " % of L10mh used "
                              + bearing.runningSince())
                  .findFirst()
                  .orElse("; loads or cleanliness missing, so no life"));
    }
    return found;
  }
}
