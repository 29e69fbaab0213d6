package org.kappatrail.report.page;

import java.util.Map;
import java.util.Optional;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Film;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.Review;

/** The fleet, worst first: a row per asset with its governing bearing. */
final class FleetTable {
  private final Review review;
  private final Map<String, String> anchors;

  FleetTable(Review review, Map<String, String> anchors) {
    this.review = review;
    this.anchors = anchors;
  }

  void write(Html html) {
    html.around(
        "section id=\"fleet\"",
        () -> {
          html.element("h2", "The fleet, worst first");
          html.raw("<div class=\"scroll\"><table class=\"fleet\">\n<thead><tr>")
              .raw("<th>asset</th><th>bearing</th><th class=\"n\">κ</th>")
              .raw("<th class=\"n\">95 % interval</th><th>regime</th><th>level</th>")
              .raw("<th>κ over its samples</th><th>verdict</th>")
              .raw(
                  "<th class=\"n\">κ since the sample before</th><th class=\"n\">water, mg/kg</th>")
              .raw("<th>code</th><th class=\"n\">mixed regime, h</th><th>last sample</th>")
              .raw("</tr></thead>\n<tbody>\n");
          review.worstFirst().forEach(asset -> row(html, asset));
          html.raw("</tbody></table></div>\n")
              .element(
                  "p class=\"note\"",
                  "The bearing is the one with the least κ over its floor. Mixed regime: hours with"
                      + " κ below 1 between the last sample and the one before it. κ stands for the"
                      + " latest sample that has one.");
        });
  }

  private void row(Html html, AssetReview asset) {
    Optional<BearingReview> governing = asset.governing();
    Optional<KappaPoint> latest = governing.flatMap(BearingReview::latestFilm);
    Optional<Film> film = latest.flatMap(KappaPoint::film);
    Optional<Sample> sample =
        asset.samples().isEmpty()
            ? Optional.empty()
            : Optional.of(asset.samples().get(asset.samples().size() - 1));
    html.raw("<tr><td class=\"name\"><a href=\"#")
        .text(anchors.getOrDefault(asset.asset().id(), ""))
        .raw("\">")
        .text(asset.asset().id())
        .raw("</a> <span class=\"quiet\">")
        .text(asset.asset().name().equals(asset.asset().id()) ? "" : asset.asset().name())
        .raw("</span></td>")
        .element("td", governing.map(bearing -> bearing.bearing().id()).orElse(""))
        .element(
            "td class=\"n deciding\"",
            film.map(known -> Numbers.significant(known.kappa(), 3)).orElse(""))
        .element("td class=\"n\"", film.map(FleetTable::interval).orElse(""))
        .element("td class=\"word\"", film.map(known -> known.regime().label()).orElse(""))
        .raw("<td>" + film.map(known -> LevelMark.of(known.level())).orElse("no κ") + "</td>")
        .raw("<td>" + governing.map(Sparkline::of).orElse("") + "</td>")
        .element(
            "td class=\"word\"",
            asset.decision().map(decision -> decision.verdict().label()).orElse(""))
        .element("td class=\"n\"", governing.map(FleetTable::change).orElse(""))
        .element(
            "td class=\"n\"",
            sample.map(known -> Measured.text(known, SampleColumns.WATER, 3)).orElse(""))
        .element("td", sample.flatMap(Sample::cleanliness).map(Object::toString).orElse(""))
        .element(
            "td class=\"n\"", latest.map(point -> Numbers.fixed(point.mixedHours(), 0)).orElse(""))
        .element("td class=\"date\"", sample.map(known -> known.day().toString()).orElse("none"))
        .raw("</tr>\n");
  }

  static String interval(Film film) {
    return Numbers.significant(film.uncertainty().low(), 3)
        + " – "
        + Numbers.significant(film.uncertainty().high(), 3);
  }

  private static String change(BearingReview bearing) {
    Optional<Film> now = bearing.latestFilm().flatMap(KappaPoint::film);
    Optional<Film> before = bearing.previousFilm().flatMap(KappaPoint::film);
    return now.isPresent() && before.isPresent()
        ? Numbers.percent(now.get().kappa() / before.get().kappa() - 1)
        : "";
  }
}
