package org.kappatrail.report.page;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.kappatrail.review.correlation.CorrelationSentences;
import org.kappatrail.review.correlation.Judgement;
import org.kappatrail.review.correlation.Link;
import org.kappatrail.review.correlation.Names;
import org.kappatrail.review.correlation.PairCorrelation;

/** What goes with what in one asset, or in the fleet: sentences, picture, and the numbers. */
final class CorrelationSection {
  private static final int MOST_SENTENCES = 8;
  private static final int MOST_ROWS = 20;
  private static final int LEAST_ROWS = 6;

  private final List<Link> links;
  private final Optional<Picture> picture;
  private final boolean fleet;

  CorrelationSection(List<PairCorrelation> tests, Optional<Picture> picture, boolean fleet) {
    this.links = Link.of(tests);
    this.picture = picture;
    this.fleet = fleet;
  }

  /** Writes what belongs under a heading that stands already. */
  void write(Html html, String of, String pictureId) {
    List<String> sentences = CorrelationSentences.of(links);
    html.raw("<ul class=\"findings\">\n");
    sentences.stream()
        .limit(MOST_SENTENCES)
        .forEach(sentence -> html.element("li", sentence).raw("\n"));
    if (sentences.size() > MOST_SENTENCES) {
      int more = sentences.size() - MOST_SENTENCES;
      html.element("li", more + (more == 1 ? " more is" : " more are") + " in the table below.");
    }
    html.raw("</ul>\n");
    if (links.isEmpty()) {
      return;
    }
    html.element(
            "p class=\"note\"",
            "Correlation is not cause: what goes together may both follow a third thing. N* is how"
                + " many independent pairs the samples are worth; q is p adjusted for every test of"
                + " this review.")
        .raw("\n");
    Figure.write(
        html,
        picture,
        pictureId,
        "Correlations of " + of + "; all numbers are in correlations.csv");
    table(html);
  }

  private void table(Html html) {
    List<Link> rows = rows();
    if (rows.isEmpty()) {
      return;
    }
    html.raw("<details><summary>")
        .text("The " + rows.size() + " surest pairs in numbers")
        .raw(
            "</summary>\n<div class=\"scroll\"><table data-name=\"correlations\">\n<thead><tr><th>x</th><th>y</th>")
        .raw(fleet ? "<th class=\"n\">assets</th>" : "<th class=\"n\">y later by, samples</th>")
        .raw("<th class=\"n\">n</th><th class=\"n\">N*</th><th class=\"n\">coefficient</th>")
        .raw("<th class=\"n\">95 % interval</th><th class=\"n\">p</th><th class=\"n\">q</th>")
        .raw("<th class=\"n\">detrended</th><th class=\"n\">its p</th><th>comes to</th>")
        .raw("</tr></thead>\n<tbody>\n");
    rows.forEach(link -> row(html, link));
    html.raw("</tbody></table></div></details>\n");
  }

  /** Everything spoken of, and the surest of the rest so that there is something to look at. */
  private List<Link> rows() {
    List<Link> spokenOf = CorrelationSentences.spokenOf(links);
    List<Link> rest =
        Link.surestOfPairs(links).stream()
            .filter(link -> link.judgement() == Judgement.CHANCE)
            .sorted(Comparator.comparing(Link::judgement).thenComparing(Link.SUREST))
            .limit(Math.max(0, LEAST_ROWS - spokenOf.size()))
            .toList();
    return Stream.concat(spokenOf.stream(), rest.stream()).limit(MOST_ROWS).toList();
  }

  private void row(Html html, Link link) {
    PairCorrelation pair = link.measured();
    Optional<PairCorrelation> left = link.detrended();
    html.raw("<tr>")
        .element("td", Names.of(pair.x()))
        .element("td", Names.of(pair.y()))
        .element("td class=\"n\"", fleet ? Integer.toString(pair.assets()) : lag(pair.lag()))
        .element("td class=\"n\"", Integer.toString(pair.n()))
        .element("td class=\"n\"", Numbers.fixed(pair.nEffective(), 1))
        .element(
            link.judgement() == Judgement.CALLED ? "td class=\"n deciding\"" : "td class=\"n\"",
            CorrelationSentences.coefficient(pair.coefficient()))
        .element(
            "td class=\"n\"",
            CorrelationSentences.coefficient(pair.low())
                + " to "
                + CorrelationSentences.coefficient(pair.high()))
        .element("td class=\"n\"", CorrelationSentences.probability(pair.p()))
        .element("td class=\"n\"", CorrelationSentences.probability(pair.q().orElse(1)))
        .element(
            "td class=\"n\"",
            left.map(PairCorrelation::coefficient)
                .map(CorrelationSentences::coefficient)
                .orElse(""))
        .element(
            "td class=\"n\"",
            left.map(PairCorrelation::p).map(CorrelationSentences::probability).orElse(""))
        .element("td class=\"word\"", word(link.judgement()))
        .raw("</tr>\n");
  }

  private static String lag(int lag) {
    return lag < 0 ? "−" + -lag : Integer.toString(lag);
  }

  private static String word(Judgement judgement) {
    return switch (judgement) {
      case CALLED -> "called";
      case DRIFT -> "drift";
      case CHANCE -> "could be chance";
      case BY_CONSTRUCTION -> "by construction";
    };
  }
}
