package org.kappatrail.report.page;

import java.util.List;
import java.util.Optional;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Film;
import org.kappatrail.review.KappaPoint;

/** Samples of one bearing, latest first, the earlier ones folded away. */
final class SampleTable {
  private static final int SHOWN = 12;

  private SampleTable() {}

  /**
   * Writes the table.
   *
   * @param earlier false to leave the earlier samples to the pack's own table
   */
  static void write(Html html, BearingReview bearing, boolean earlier) {
    List<KappaPoint> trail = bearing.trail();
    int from = Math.max(0, trail.size() - SHOWN);
    table(html, trail.subList(from, trail.size()));
    if (from > 0 && !earlier) {
      html.element("p class=\"note\"", from + " earlier samples are in kappa-history.csv.");
    } else if (from > 0) {
      html.raw("<details><summary>")
          .text(from + (from == 1 ? " earlier sample" : " earlier samples"))
          .raw("</summary>\n");
      table(html, trail.subList(0, from));
      html.raw("</details>\n");
    }
  }

  private static void table(Html html, List<KappaPoint> points) {
    html.raw("<div class=\"scroll\"><table class=\"samples\" data-name=\"samples\">\n<thead><tr>")
        .raw("<th>sample</th><th>drawn</th><th class=\"n\">charge</th>")
        .raw("<th class=\"n\">oil hours</th><th class=\"n\">ν40, mm²/s</th>")
        .raw("<th class=\"n\">T, °C</th><th class=\"n\">n, r/min</th>")
        .raw("<th class=\"n\">ν, mm²/s</th><th class=\"n\">κ</th>")
        .raw("<th class=\"n\">95 % interval</th><th>level</th><th class=\"n\">water, mg/kg</th>")
        .raw("<th>code</th><th class=\"n\">iron, mg/kg</th><th class=\"n\">a_ISO</th>")
        .raw("<th class=\"n\">L10mh, h</th></tr></thead>\n<tbody>\n");
    for (int i = points.size() - 1; i >= 0; i--) {
      row(html, points.get(i));
    }
    html.raw("</tbody></table></div>\n");
  }

  private static void row(Html html, KappaPoint point) {
    Sample sample = point.sample();
    Optional<Film> film = point.film();
    html.raw("<tr>")
        .element("td class=\"any\"", sample.id())
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
        .element("td class=\"word\"", sample.cleanliness().map(Object::toString).orElse(""))
        .element("td class=\"n\"", Measured.text(sample, SampleColumns.IRON, 3))
        .element("td class=\"n\"", Numbers.significant(point.life().lifeModification(), 3))
        .element("td class=\"n\"", Numbers.grouped(point.life().ratingLifeH()))
        .raw("</tr>\n");
  }
}
