package org.kappatrail.report.page;

import java.util.List;
import java.util.Map;
import org.kappatrail.report.chart.FleetRow;
import org.kappatrail.review.Moved;
import org.kappatrail.review.Review;

/** The fleet picture, every row of which leads to its asset. */
final class FleetFigure {
  private final Review review;
  private final Map<String, String> links;

  FleetFigure(Review review, Map<String, String> links) {
    this.review = review;
    this.links = links;
  }

  void write(Html html, Picture picture) {
    List<FleetRow> rows = FleetRow.of(review);
    html.around(
        "section id=\"picture\"",
        () -> {
          html.element("h2", "Who is low, and what brought them there").raw("\n");
          new Figure(picture, "fleet")
              .withLinks(
                  html,
                  "κ of every bearing, worst first; the numbers are in the table of the fleet",
                  "bearings on the picture",
                  i -> links.getOrDefault(rows.get(i).asset(), "#fleet"),
                  i -> label(rows.get(i)));
        });
  }

  private static String label(FleetRow row) {
    return row.asset()
        + " · "
        + row.bearing()
        + "\nκ "
        + Numbers.significant(row.film().kappa(), 3)
        + " ("
        + FleetTable.interval(row.film())
        + "), "
        + row.film().regime().label()
        + ", "
        + row.film().level().label()
        + row.moved()
            .map(
                parts ->
                    "\nfrom fresh oil, κ "
                        + Numbers.significant(row.fresh(), 3)
                        + ", where the charge began:\n"
                        + Moved.words(parts))
            .orElse("");
  }
}
