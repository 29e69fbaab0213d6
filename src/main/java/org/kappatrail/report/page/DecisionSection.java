package org.kappatrail.report.page;

import java.util.List;
import java.util.OptionalDouble;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.decision.Decision;
import org.kappatrail.review.decision.FollowUp;
import org.kappatrail.review.decision.OilCause;
import org.kappatrail.review.decision.Outcome;
import org.kappatrail.review.decision.Remedy;
import org.kappatrail.review.decision.Reply;

/** The five questions, the verdict, the remedies, and what past acts did. */
final class DecisionSection {
  private static final int OPEN_REMEDIES = 6;
  private static final int OPEN_CAUSES = 3;

  private final AssetReview asset;

  DecisionSection(AssetReview asset) {
    this.asset = asset;
  }

  void write(Html html) {
    asset.decision().ifPresent(decision -> decision(html, decision));
    causes(html);
    followUps(html);
  }

  private void decision(Html html, Decision decision) {
    html.element("h3", "Does the viscosity justify an oil change?");
    html.raw("<p class=\"verdict\"><b>")
        .text(decision.verdict().label())
        .raw("</b>: ")
        .text(decision.reason())
        .raw(".</p>\n");
    html.raw("<div class=\"scroll\"><table class=\"questions\"><tbody>\n");
    question(html, "Is the drop real?", decision.real());
    question(html, "Does it matter?", decision.matters());
    question(html, "Is it the oil's doing?", decision.oilToBlame());
    question(html, "Would fresh oil cure it?", decision.curable());
    question(html, "Is it urgent?", decision.urgent());
    html.raw("</tbody></table></div>\n");
    remedies(html, decision);
    new OtherBearings(decision).write(html);
    html.element(
        "p class=\"note\"", "Rests on: " + String.join("; ", decision.assumptions()) + ".");
  }

  private static void question(Html html, String question, Reply reply) {
    html.raw("<tr>")
        .element("th scope=\"row\"", question)
        .element("td class=\"answer\"", reply.answer().label())
        .element("td", reply.why())
        .raw("</tr>\n");
  }

  private void remedies(Html html, Decision decision) {
    List<Remedy> remedies = decision.remedies();
    int open = Math.min(OPEN_REMEDIES, remedies.size());
    int stay = 0;
    while (stay < remedies.size() && remedies.get(stay).price().orElse(-1) != 0) {
      stay++;
    }
    open = Math.max(open, Math.min(remedies.size(), stay + 1));
    table(html, decision, remedies.subList(0, open), 1);
    if (open < remedies.size()) {
      html.raw("<details><summary>")
          .text(remedies.size() - open + " remedies that are worth less")
          .raw("</summary>\n");
      table(html, decision, remedies.subList(open, remedies.size()), open + 1);
      html.raw("</details>\n");
    }
  }

  private static void table(Html html, Decision decision, List<Remedy> remedies, int firstRank) {
    html.raw("<div class=\"scroll\"><table class=\"remedies\" data-name=\"remedies\">\n<thead><tr>")
        .raw("<th class=\"n\">rank</th><th>remedy</th><th class=\"n\">κ</th>")
        .raw("<th class=\"n\">95 % interval</th><th class=\"n\">κ below floor, %</th>")
        .raw("<th class=\"n\">a_ISO</th><th class=\"n\">L10mh, h</th>")
        .raw("<th class=\"n\">fails, %</th><th class=\"n\">price</th>")
        .raw("<th class=\"n\">net saving</th><th>pays if a failure costs more than</th>")
        .raw("</tr></thead>\n<tbody>\n");
    int rank = firstRank;
    for (Remedy remedy : remedies) {
      row(html, remedy, rank++, decision.bearing());
    }
    html.raw("</tbody></table></div>\n");
  }

  private static void row(Html html, Remedy remedy, int rank, String bearing) {
    Outcome outcome = remedy.outcome(bearing).orElseThrow();
    html.raw("<tr>")
        .element("td class=\"n\"", Integer.toString(rank))
        .element("td", remedy.name() + (remedy.pays() ? " (pays)" : ""))
        .element("td class=\"n\"", Numbers.significant(outcome.kappa(), 3))
        .element(
            "td class=\"n\"",
            Numbers.significant(outcome.kappaLow(), 3)
                + " – "
                + Numbers.significant(outcome.kappaHigh(), 3))
        .element("td class=\"n\"", percent(OptionalDouble.of(outcome.probabilityBelowFloor())))
        .element("td class=\"n\"", Numbers.significant(outcome.lifeModification(), 3))
        .element("td class=\"n\"", Numbers.grouped(outcome.ratingLifeH()))
        .element("td class=\"n\"", percent(remedy.failureProbability()))
        .element("td class=\"n\"", Numbers.grouped(remedy.price()))
        .element(
            remedy.netSaving().isPresent() ? "td class=\"n deciding\"" : "td class=\"n\"",
            Numbers.grouped(remedy.netSaving()).replace('-', '−'))
        .element(
            remedy.netSaving().isPresent() ? "td class=\"word\"" : "td class=\"word deciding\"",
            remedy.breakEvenRatio().isPresent()
                ? Numbers.significant(remedy.breakEvenRatio(), 2) + " times its price"
                : "")
        .raw("</tr>\n");
  }

  static String percent(OptionalDouble share) {
    if (share.isEmpty()) {
      return "";
    }
    double value = share.getAsDouble();
    return value < 0.001
        ? "below 0.1"
        : value > 0.999 ? "above 99.9" : Numbers.significant(value * 100, value < 0.99 ? 2 : 3);
  }

  private void causes(Html html) {
    List<OilCause> causes = asset.oilCauses();
    if (causes.isEmpty()) {
      return;
    }
    html.element("h3", "What may have happened to the oil");
    html.element("p class=\"note\"", "Likeliest first by the evidence; none is certain.");
    html.raw("<ol class=\"causes\">\n");
    causes.stream().limit(OPEN_CAUSES).forEach(cause -> cause(html, cause));
    html.raw("</ol>\n");
  }

  private static void cause(Html html, OilCause cause) {
    html.raw("<li><b>").text(cause.name()).raw("</b>");
    if (!cause.support().isEmpty()) {
      html.text("; for it: " + String.join(", ", cause.support()));
    }
    if (!cause.objections().isEmpty()) {
      html.text("; against it: " + String.join(", ", cause.objections()));
    }
    html.raw("</li>\n");
  }

  private void followUps(Html html) {
    if (asset.followUps().isEmpty()) {
      return;
    }
    html.element("h3", "What past acts did");
    html.raw("<ul class=\"findings\">\n");
    for (FollowUp item : asset.followUps()) {
      html.raw("<li><span class=\"date\">")
          .text(item.date().toString())
          .raw("</span> <b>")
          .text(item.act())
          .raw("</b>: ")
          .text(item.sentence())
          .raw("</li>\n");
    }
    html.raw("</ul>\n");
  }
}
