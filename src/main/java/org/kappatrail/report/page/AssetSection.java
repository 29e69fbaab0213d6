package org.kappatrail.report.page;

import java.util.Optional;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Finding;
import org.kappatrail.review.KappaPoint;

/**
 * One asset: story, chart, verdict, findings, and for every bearing what moved κ, its samples and
 * the working of its latest κ. The bearings that do not govern are folded away.
 */
final class AssetSection {
  private final AssetReview asset;
  private final String name;
  private final Optional<Picture> picture;
  private final boolean earlierSamples;
  private final CorrelationSection correlations;

  AssetSection(
      AssetReview asset,
      String name,
      Optional<Picture> picture,
      boolean earlierSamples,
      CorrelationSection correlations) {
    this.asset = asset;
    this.name = name;
    this.picture = picture;
    this.earlierSamples = earlierSamples;
    this.correlations = correlations;
  }

  void write(Html html) {
    String id = asset.asset().id();
    html.raw("<section class=\"asset\" id=\"a-").text(name).raw("\">\n<h2><bdi>");
    html.text(id).raw("</bdi>");
    if (!asset.asset().name().equals(id)) {
      html.raw(" <bdi class=\"quiet\">").text(asset.asset().name()).raw("</bdi>");
    }
    html.raw("</h2>\n").element("p class=\"note\"", facts()).raw("\n");
    if (!asset.story().isEmpty()) {
      html.element("p class=\"story\"", String.join(" ", asset.story())).raw("\n");
    }
    picture.ifPresent(found -> new ChartFigure(asset, found, name).write(html));
    findings(html);
    new DecisionSection(asset).write(html);
    Optional<String> governing = asset.governing().map(bearing -> bearing.bearing().id());
    for (BearingReview bearing : asset.bearings()) {
      if (governing.isEmpty() || governing.get().equals(bearing.bearing().id())) {
        html.element("h3", "Bearing " + bearing.bearing().id()).raw("\n");
        bearing(html, bearing);
      }
    }
    TrendSection.lastChange(html, asset);
    for (BearingReview bearing : asset.bearings()) {
      if (governing.isPresent() && !governing.get().equals(bearing.bearing().id())) {
        html.raw("<details><summary>").text(summary(bearing)).raw("</summary>\n");
        bearing(html, bearing);
        html.raw("</details>\n");
      }
    }
    html.element("h3", "What goes with what").raw("\n");
    correlations.write(html, id, name + "-correlation");
    html.raw("</section>\n");
  }

  private void bearing(Html html, BearingReview bearing) {
    if (bearing.trail().isEmpty()) {
      html.element("p", "No samples.").raw("\n");
      return;
    }
    TrendSection.write(html, bearing);
    SampleTable.write(html, bearing, earlierSamples);
    working(html, bearing);
  }

  private static String summary(BearingReview bearing) {
    return "Bearing "
        + bearing.bearing().id()
        + bearing
            .latestFilm()
            .flatMap(KappaPoint::film)
            .map(
                film ->
                    ": κ "
                        + Numbers.significant(film.kappa(), 3)
                        + " ("
                        + FleetTable.interval(film)
                        + "), "
                        + film.level().label())
            .orElse(": no κ known");
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
                  .raw("</summary>\n<div class=\"scroll\"><table data-name=\"working\"><tbody>\n");
              for (Working.Line line : Working.of(bearing, point)) {
                html.raw("<tr>")
                    .element("th scope=\"row\"", line.quantity())
                    .element("td", line.value())
                    .element("td", line.from())
                    .raw("</tr>\n");
              }
              html.raw("</tbody></table></div></details>\n");
            });
  }
}
