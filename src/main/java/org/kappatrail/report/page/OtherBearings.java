package org.kappatrail.report.page;

import java.util.OptionalDouble;
import org.kappatrail.review.decision.Decision;
import org.kappatrail.review.decision.Outcome;
import org.kappatrail.review.decision.Remedy;

/** What the remedies do to the bearings that do not govern, folded away. */
final class OtherBearings {
  private final Decision decision;

  OtherBearings(Decision decision) {
    this.decision = decision;
  }

  void write(Html html) {
    boolean any =
        decision.remedies().stream()
            .anyMatch(remedy -> remedy.outcomes().stream().anyMatch(this::other));
    if (!any) {
      return;
    }
    html.raw("<details><summary>What the remedies do to the other bearings</summary>\n")
        .raw("<div class=\"scroll\"><table data-name=\"outcomes\">\n<thead><tr>")
        .raw("<th>remedy</th><th>bearing</th><th class=\"n\">κ</th>")
        .raw("<th class=\"n\">95 % interval</th><th class=\"n\">κ below floor, %</th>")
        .raw("<th class=\"n\">a_ISO</th><th class=\"n\">L10mh, h</th>")
        .raw("<th class=\"n\">fails, %</th></tr></thead>\n<tbody>\n");
    for (Remedy remedy : decision.remedies()) {
      remedy.outcomes().stream()
          .filter(this::other)
          .forEach(outcome -> row(html, remedy.name(), outcome));
    }
    html.raw("</tbody></table></div></details>\n");
  }

  private boolean other(Outcome outcome) {
    return !outcome.bearing().equals(decision.bearing());
  }

  private static void row(Html html, String remedy, Outcome outcome) {
    html.raw("<tr>")
        .element("td", remedy)
        .element("td class=\"any\"", outcome.bearing())
        .element("td class=\"n deciding\"", Numbers.significant(outcome.kappa(), 3))
        .element(
            "td class=\"n\"",
            Numbers.significant(outcome.kappaLow(), 3)
                + " – "
                + Numbers.significant(outcome.kappaHigh(), 3))
        .element(
            "td class=\"n\"",
            DecisionSection.percent(OptionalDouble.of(outcome.probabilityBelowFloor())))
        .element("td class=\"n\"", Numbers.significant(outcome.lifeModification(), 3))
        .element("td class=\"n\"", Numbers.grouped(outcome.ratingLifeH()))
        .element("td class=\"n\"", DecisionSection.percent(outcome.failureProbability()))
        .raw("</tr>\n");
  }
}
