package org.kappatrail.report.page;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.TreeSet;
import org.kappatrail.review.Level;
import org.kappatrail.review.Review;
import org.kappatrail.review.decision.Verdict;

/** Search and filters of the fleet table; hidden until the script that serves them runs. */
final class FleetControls {
  private final Review review;

  FleetControls(Review review) {
    this.review = review;
  }

  void write(Html html) {
    html.raw("<div class=\"controls\" role=\"search\" hidden>")
        .raw("<label>find <input type=\"search\" id=\"find\" autocomplete=\"off\"></label>");
    choice(html, "level", levels());
    choice(html, "area", areas());
    choice(html, "verdict", verdicts());
    html.raw("<span id=\"shown\" role=\"status\"></span></div>\n");
  }

  /** Levels that occur, gravest first. */
  private Collection<String> levels() {
    List<String> words = new ArrayList<>();
    Level[] all = Level.values();
    for (int i = all.length - 1; i >= 0; i--) {
      words.add(all[i].label());
    }
    words.add(FleetTable.NO_KAPPA);
    words.removeIf(
        word -> review.assets().stream().noneMatch(a -> FleetTable.level(a).equals(word)));
    return words;
  }

  private Collection<String> areas() {
    Collection<String> areas = new TreeSet<>();
    review.assets().forEach(asset -> areas.add(asset.asset().area()));
    areas.remove("");
    return areas;
  }

  /** Verdicts that occur, gravest first. */
  private Collection<String> verdicts() {
    List<String> words = new ArrayList<>();
    Verdict[] all = Verdict.values();
    for (int i = all.length - 1; i >= 0; i--) {
      words.add(all[i].label());
    }
    words.removeIf(
        word -> review.assets().stream().noneMatch(a -> FleetTable.verdict(a).equals(word)));
    return words;
  }

  private static void choice(Html html, String what, Collection<String> words) {
    if (words.isEmpty()) {
      return;
    }
    html.raw("<label>" + what + " <select data-filter=\"" + what + "\">")
        .raw("<option value=\"\">any</option>");
    for (String word : words) {
      html.raw("<option>").text(word).raw("</option>");
    }
    html.raw("</select></label>");
  }
}
