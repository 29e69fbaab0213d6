package org.kappatrail.report.page;

import java.util.List;
import java.util.Optional;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Film;
import org.kappatrail.review.Finding;
import org.kappatrail.review.KappaPoint;

/** One asset: chart, findings, samples, and the working of the latest κ of every bearing. */
final class AssetSection {
  private static final int SHOWN_SAMPLES = 12;

  private final AssetReview asset;
  private final String anchor;
  private final String picture;
  private final boolean earlierSamples;
  private final CorrelationSection correlations;

  AssetSection(
      AssetReview asset,
      String anchor,
      String picture,
      boolean earlierSamples,
      CorrelationSection correlations) {
    this.asset = asset;
    this.anchor = anchor;
    this.picture = picture;
    this.earlierSamples = earlierSamples;
    this.correlations = correlations;
  }

  void write(Html html) {
    html.raw("<section class=\"asset\" id=\"").text(anchor).raw("\">\n");
    html.raw("<h2>")
        .text(asset.asset().id())
        .raw(" <span class=\"quiet\">")
        .text(asset.asset().name().equals(asset.asset().id()) ? "" : asset.asset().name())
        .raw("</span></h2>\n");
    html.element("p class=\"note\"", facts());
    if (!asset.story().isEmpty()) {
      html.element("p class=\"story\"", String.join(" ", asset.story())).raw("\n");
    }
    new ChartFigure(asset, picture).write(html);
    findings(html);
    new DecisionSection(asset).write(html);
    TrendSection.lastChange(html, asset);
    for (BearingReview bearing : asset.bearings()) {
      samples(html, bearing);
      TrendSection.write(html, bearing);
      working(html, bearing);
    }
    html.element("h3", "What goes with what").raw("\n");
    correlations.write(html, asset.asset().id());
    html.raw("</section>\n");
  }

  private String facts() {
    String area = asset.asset().area().isEmpty() ? "" : asset.asset().area() + "; ";
    return area
        + "oil "
        + asset.oil().id()
        + ", charge "
        + Math.max(1, asset.charges().size())
        + "; "
        + asset.samples().size()
        + (asset.samples().size() == 1 ? " sample" : " samples");
  }

  private void findings(Html html) {
    if (asset.findings().isEmpty()) {
      html.element("p", "No findings.").raw("\n");
      return;
    }
    html.raw("<ul class=\"findings\">\n");
    for (Finding finding : asset.findings()) {
      html.raw("<li>")
          .raw(LevelMark.of(finding.level()))
          .raw(" <b>")
          .text(finding.kind().label())
          .raw("</b>")
          .text(finding.bearing().map(id -> " · " + id).orElse(""))
          .text(finding.sample().map(id -> " · " + id).orElse(""))
          .text(": " + finding.message())
          .raw("</li>\n");
    }
    html.raw("</ul>\n");
  }

  private void samples(Html html, BearingReview bearing) {
    List<KappaPoint> trail = bearing.trail();
    if (trail.isEmpty()) {
      return;
    }
    html.raw("<h3>").text("Bearing " + bearing.bearing().id()).raw("</h3>\n");
    int from = Math.max(0, trail.size() - SHOWN_SAMPLES);
    table(html, trail.subList(from, trail.size()));
    if (from > 0 && !earlierSamples) {
      html.element("p class=\"note\"", from + " earlier samples are in kappa-history.csv.");
    } else if (from > 0) {
      html.raw("<details><summary>").text(from + " earlier samples").raw("</summary>\n");
      table(html, trail.subList(0, from));
      html.raw("</details>\n");
    }
  }

  private static void table(Html html, List<KappaPoint> points) {
    html.raw(
            "<div class=\"scroll\"><table class=\"samples\" data-name=\"samples\">\n<thead><tr><th>sample</th>")
        .raw("<th>drawn</th><th class=\"n\">charge</th><th class=\"n\">oil hours</th>")
        .raw("<th class=\"n\">ν40, mm²/s</th><th class=\"n\">T, °C</th>")
        .raw("<th class=\"n\">n, r/min</th><th class=\"n\">ν, mm²/s</th>")
        .raw("<th class=\"n\">κ</th><th class=\"n\">95 % interval</th><th>level</th>")
        .raw("<th class=\"n\">water, mg/kg</th><th>code</th><th class=\"n\">iron, mg/kg</th>")
        .raw("<th class=\"n\">a_ISO</th><th class=\"n\">L10mh, h</th></tr></thead>\n<tbody>\n");
    for (int i = points.size() - 1; i >= 0; i--) {
      row(html, points.get(i));
    }
    html.raw("</tbody></table></div>\n");
  }

  private static void row(Html html, KappaPoint point) {
    Sample sample = point.sample();
    Optional<Film> film = point.film();
    html.raw("<tr>")
        .element("td", sample.id())
        .element("td class=\"date\"", sample.sampledAtText().replace('T', ' '))
        .element("td class=\"n\"", Integer.toString(point.charge().number()))
        .element("td class=\"n\"", Numbers.grouped(sample.exact(SampleColumns.OIL_HOURS)))
        .element("td class=\"n\"", Measured.text(sample, SampleColumns.VISCOSITY_40C, 4))
        .element("td class=\"n\"", Numbers.fixed(point.point().temperatureC(), 1))
        .element("td class=\"n\"", Numbers.fixed(point.point().speedRpm(), 0))
        .element(
            "td class=\"n\"",
            film.map(known -> Numbers.significant(known.operatingCst(), 3)).orElse(""))
        .element(
            "td class=\"n deciding\"",
            film.map(known -> Numbers.significant(known.kappa(), 3)).orElse(""))
        .element("td class=\"n\"", film.map(FleetTable::interval).orElse(""))
        .raw("<td>" + film.map(known -> LevelMark.of(known.level())).orElse("no κ") + "</td>")
        .element("td class=\"n\"", Measured.text(sample, SampleColumns.WATER, 3))
        .element("td", sample.cleanliness().map(Object::toString).orElse(""))
        .element("td class=\"n\"", Measured.text(sample, SampleColumns.IRON, 3))
        .element("td class=\"n\"", Numbers.significant(point.life().lifeModification(), 3))
        .element("td class=\"n\"", Numbers.grouped(point.life().ratingLifeH()))
        .raw("</tr>\n");
  }

  private static void working(Html html, BearingReview bearing) {
    bearing
        .latestFilm()
        .ifPresent(
            point -> {
              html.raw("<details class=\"working\"><summary>")
                  .text(
                      "How κ "
                          + Numbers.significant(point.film().orElseThrow().kappa(), 3)
                          + " of "
                          + point.sample().day()
                          + " is computed")
                  .raw("</summary>\n<div class=\"scroll\"><table><tbody>\n");
              for (Working.Line line : Working.of(bearing, point)) {
                html.raw("<tr>")
                    .element("th", line.quantity())
                    .element("td", line.value())
                    .element("td", line.from())
                    .raw("</tr>\n");
              }
              html.raw("</tbody></table></div></details>\n");
            });
  }
}
