package org.kappatrail.report.page;

import java.util.ArrayList;
import java.util.List;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.Level;
import org.kappatrail.review.Review;
import org.kappatrail.review.decision.Verdict;

/** The page's head: the state in two sentences, and where to find what. */
final class Opening {
  private final Review review;
  private final String title;

  Opening(Review review, String title) {
    this.review = review;
    this.title = title;
  }

  void write(Html html) {
    html.element("h1", title).raw("\n");
    html.element("p class=\"lead\"", state() + " " + verdicts()).raw("\n");
    if (!review.problems().isEmpty()) {
      int problems = review.problems().size();
      html.raw("<p><a href=\"#problems\">")
          .text(problems + (problems == 1 ? " problem" : " problems") + " in the inputs")
          .raw(problems == 1 ? "</a> was" : "</a> were")
          .raw(" left out of what follows.</p>\n");
    }
    html.raw("<nav aria-label=\"sections\">");
    review.since().ifPresent(since -> html.raw("<a href=\"#since\">what is new</a> "));
    html.raw("<a href=\"#fleet\">the fleet</a> <a href=\"#correlations\">what goes with what</a>")
        .raw(" <a href=\"#method\">method</a> <a href=\"#cautions\">cautions</a></nav>\n");
  }

  private String state() {
    long alarms = count(Level.ALARM);
    long alerts = count(Level.ALERT);
    long unknown = review.assets().stream().filter(asset -> asset.level().isEmpty()).count();
    return "State of "
        + review.asOf()
        + ". Of "
        + review.assets().size()
        + (review.assets().size() == 1 ? " asset, " : " assets, ")
        + alarms
        + (alarms == 1 ? " has" : " have")
        + " a bearing below its κ floor, "
        + alerts
        + (alerts == 1 ? " has" : " have")
        + " one whose interval reaches below it"
        + (unknown == 0 ? "." : ", and of " + unknown + " no κ is known.");
  }

  /** Verdicts by number, gravest first. */
  private String verdicts() {
    List<String> parts = new ArrayList<>();
    Verdict[] all = Verdict.values();
    for (int i = all.length - 1; i >= 0; i--) {
      Verdict verdict = all[i];
      long count = review.assets().stream().filter(asset -> has(asset, verdict)).count();
      if (count > 0) {
        parts.add(count + " " + verdict.label());
      }
    }
    return parts.isEmpty() ? "" : "Verdicts: " + String.join(", ", parts) + ".";
  }

  private static boolean has(AssetReview asset, Verdict verdict) {
    return asset.decision().filter(decision -> decision.verdict() == verdict).isPresent();
  }

  private long count(Level level) {
    return review.assets().stream()
        .filter(asset -> asset.level().filter(found -> found == level).isPresent())
        .count();
  }
}
