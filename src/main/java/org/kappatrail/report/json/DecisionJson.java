package org.kappatrail.report.json;

import java.io.IOException;
import org.kappatrail.review.decision.Decision;
import org.kappatrail.review.decision.Outcome;
import org.kappatrail.review.decision.Remedy;
import org.kappatrail.review.decision.Reply;

/** Verdict, questions and acts of an asset. */
final class DecisionJson {
  private final JsonOut json;
  private final Decision decision;

  DecisionJson(JsonOut json, Decision decision) {
    this.json = json;
    this.decision = decision;
  }

  void write() throws IOException {
    json.text("verdict", decision.verdict().label())
        .text("reason", decision.reason())
        .text("bearing", decision.bearing())
        .text("sample", decision.sample())
        .object("real", () -> reply(decision.real()))
        .object("matters", () -> reply(decision.matters()))
        .object("oil_to_blame", () -> reply(decision.oilToBlame()))
        .object("curable", () -> reply(decision.curable()))
        .object("urgent", () -> reply(decision.urgent()))
        .objects("remedies", decision.remedies(), this::remedy)
        .texts("assumptions", decision.assumptions());
  }

  private void reply(Reply reply) throws IOException {
    json.text("answer", reply.answer().label()).text("why", reply.why());
  }

  private void remedy(Remedy remedy) throws IOException {
    json.text("kind", remedy.kind().label())
        .text("remedy", remedy.name())
        .flag("pays", remedy.pays())
        .number("failure_probability", remedy.failureProbability())
        .number("worth", remedy.worth())
        .number("price", remedy.price())
        .number("net_saving", remedy.netSaving())
        .number("break_even_ratio", remedy.breakEvenRatio())
        .objects("outcomes", remedy.outcomes(), this::outcome);
  }

  private void outcome(Outcome outcome) throws IOException {
    json.text("bearing", outcome.bearing())
        .number("kappa", outcome.kappa())
        .number("kappa_low", outcome.kappaLow())
        .number("kappa_high", outcome.kappaHigh())
        .number("probability_below_floor", outcome.probabilityBelowFloor())
        .number("life_modification", outcome.lifeModification())
        .number("rating_life_h", outcome.ratingLifeH())
        .number("failure_probability", outcome.failureProbability());
  }
}
