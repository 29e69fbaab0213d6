package org.kappatrail.report.workbook;

import java.util.ArrayList;
import java.util.List;
import org.kappatrail.review.Review;

/** What the workbook holds and how to read it. */
final class AboutSheet {
  private AboutSheet() {}

  static List<String> lines(Review review) {
    String site = review.settings().site();
    List<String> lines = new ArrayList<>();
    lines.add((site.isEmpty() ? "Review" : site) + ", state of " + review.asOf());
    lines.add(
        "Sheet fleet has a row per asset, worst first, seen from its worst bearing. Every other sheet"
            + " is the table of the same name in the pack, with the same columns.");
    lines.add(
        "κ is the viscosity ratio ν/ν1 of ISO 281; low and high bound its 95 % interval. Level ■"
            + " alarm: κ is below the bearing's floor; ◈ alert: its interval reaches below; ○ clear.");
    lines.add(
        "Units stand at the end of a column's name: _cst mm²/s, _c °C, _rpm r/min, _h hours, _ppm"
            + " mg/kg. Numbers carry six significant digits, whatever the cell shows. An empty cell"
            + " is unknown, never zero.");
    lines.add(
        "attribution: parts of the change of ln κ. drift: slopes of ln κ per 30 days. verdicts and"
            + " remedies: whether a change of oil is worth its price, and what else could be done.");
    lines.add(
        "Decision support. It does not replace the machine maker's manual, the site's rules or a"
            + " qualified lubrication engineer. ISO 281 assumes clean mounting, no overload, and κ"
            + " from 0.1 to 4.");
    return lines;
  }
}
