package org.kappatrail.report.page;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Film;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.Level;
import org.kappatrail.review.Review;
import org.kappatrail.review.decision.Decision;
import org.kappatrail.review.decision.Verdict;

/**
 * The fleet, worst first: a row per asset with its governing bearing. A cell that is sorted by
 * something else than what it shows carries that in {@code data-v}.
 */
final class FleetTable {
  /** Level of an asset without a κ. */
  static final String NO_KAPPA = "no κ";

  private static final List<Level> LEVELS = List.of(Level.values());
  private static final List<Verdict> VERDICTS = List.of(Verdict.values());

  private final Review review;
  private final Map<String, String> links;

  FleetTable(Review review, Map<String, String> links) {
    this.review = review;
    this.links = links;
  }

  void write(Html html) {
    html.around(
        "section id=\"fleet\"",
        () -> {
          html.element("h2", "The fleet, worst first").raw("\n");
          new FleetControls(review).write(html);
          html.raw("<div class=\"scroll\"><table class=\"fleet\" data-name=\"fleet\">\n<thead><tr>")
              .raw("<th data-sort=\"text\">asset</th><th data-sort=\"text\">bearing</th>")
              .raw("<th>κ over its samples</th><th class=\"n\" data-sort=\"number\">κ</th>")
              .raw("<th class=\"n\">95 % interval</th><th data-sort=\"number\">level</th>")
              .raw("<th data-sort=\"number\">verdict</th>")
              .raw("<th class=\"n\" data-sort=\"number\">change of κ</th>")
              .raw("<th class=\"n\" data-sort=\"number\">water, mg/kg</th>")
              .raw("<th data-sort=\"text\">code</th>")
              .raw("<th class=\"n\" data-sort=\"number\">mixed regime, h</th>")
              .raw("<th data-sort=\"text\">last sample</th></tr></thead>\n<tbody>\n");
          review.worstFirst().forEach(asset -> row(html, asset));
          html.raw("</tbody></table></div>\n")
              .element(
                  "p class=\"note\"",
                  "The bearing is the one with the least κ over its floor (dashed). Mixed regime:"
                      + " hours with κ below 1 between the last sample and the one before it. κ"
                      + " stands for the latest sample that has one, its change for that since the"
                      + " one before.");
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
    begin(html, asset);
    html.raw("<td class=\"name\" data-v=\"")
        .text(asset.asset().id())
        .raw("\"><a href=\"")
        .text(links.getOrDefault(asset.asset().id(), "#fleet"))
        .raw("\"><bdi>")
        .text(asset.asset().id())
        .raw("</bdi></a>");
    if (!asset.asset().name().equals(asset.asset().id())) {
      html.raw(" <bdi class=\"quiet\">").text(asset.asset().name()).raw("</bdi>");
    }
    html.raw("</td>")
        .element("td class=\"any\"", governing.map(bearing -> bearing.bearing().id()).orElse(""))
        .raw("<td>" + governing.map(Sparkline::of).orElse("") + "</td>")
        .element(
            "td class=\"n deciding\"",
            film.map(known -> Numbers.significant(known.kappa(), 3)).orElse(""))
        .element("td class=\"n\"", film.map(FleetTable::interval).orElse(""))
        .raw("<td data-v=\"" + film.map(known -> LEVELS.indexOf(known.level())).orElse(-1) + "\">")
        .raw(film.map(known -> LevelMark.of(known.level())).orElse(NO_KAPPA) + "</td>")
        .raw("<td class=\"word\" data-v=\"")
        .raw(asset.decision().map(found -> VERDICTS.indexOf(found.verdict())).orElse(-1) + "\">")
        .text(verdict(asset))
        .raw("</td>");
    OptionalDouble change = governing.map(FleetTable::change).orElse(OptionalDouble.empty());
    html.raw("<td class=\"n\" data-v=\"")
        .raw(change.isPresent() ? Numbers.significant(change.getAsDouble(), 6) : "")
        .raw("\">")
        .text(change.isPresent() ? Numbers.percent(change.getAsDouble()) : "")
        .raw("</td>")
        .element(
            "td class=\"n\"",
            sample.map(known -> Measured.text(known, SampleColumns.WATER, 3)).orElse(""))
        .element(
            "td class=\"word\"",
            sample.flatMap(Sample::cleanliness).map(Object::toString).orElse(""))
        .element(
            "td class=\"n\"", latest.map(point -> Numbers.fixed(point.mixedHours(), 0)).orElse(""))
        .element("td class=\"date\"", sample.map(known -> known.day().toString()).orElse("none"))
        .raw("</tr>\n");
  }

  /** What a row is filtered and found by. */
  private static void begin(Html html, AssetReview asset) {
    html.raw("<tr data-level=\"")
        .text(level(asset))
        .raw("\" data-area=\"")
        .text(asset.asset().area())
        .raw("\" data-verdict=\"")
        .text(verdict(asset))
        .raw("\" data-find=\"")
        .text(
            String.join(
                " ",
                asset.asset().id(),
                asset.asset().name(),
                asset.asset().area(),
                asset.oil().id(),
                asset.governing().map(bearing -> bearing.bearing().id()).orElse("")))
        .raw("\">");
  }

  static String level(AssetReview asset) {
    return asset.level().map(Level::label).orElse(NO_KAPPA);
  }

  static String verdict(AssetReview asset) {
    return asset.decision().map(Decision::verdict).map(found -> found.label()).orElse("");
  }

  static String interval(Film film) {
    return Numbers.significant(film.uncertainty().low(), 3)
        + " – "
        + Numbers.significant(film.uncertainty().high(), 3);
  }

  private static OptionalDouble change(BearingReview bearing) {
    Optional<Film> now = bearing.latestFilm().flatMap(KappaPoint::film);
    Optional<Film> before = bearing.previousFilm().flatMap(KappaPoint::film);
    return now.isPresent() && before.isPresent()
        ? OptionalDouble.of(now.get().kappa() / before.get().kappa() - 1)
        : OptionalDouble.empty();
  }
}
