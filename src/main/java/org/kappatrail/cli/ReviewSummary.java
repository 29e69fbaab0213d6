package org.kappatrail.cli;

import java.io.PrintWriter;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.kappatrail.history.Problem;
import org.kappatrail.report.page.Numbers;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Film;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.Level;
import org.kappatrail.review.Review;
import org.kappatrail.review.Since;

/** The review in a few lines for the terminal. */
final class ReviewSummary {
  private static final int MOST_ASSETS = 20;
  private static final int MOST_ITEMS = 30;

  private final Review review;

  ReviewSummary(Review review) {
    this.review = review;
  }

  void print(PrintWriter out) {
    String site = review.settings().site();
    List<AssetReview> assets = review.assets();
    out.println(
        (site.isEmpty() ? "Review" : site)
            + ", state of "
            + review.asOf()
            + ": "
            + count(assets.size(), "asset")
            + ", "
            + count(assets.stream().mapToInt(asset -> asset.bearings().size()).sum(), "bearing")
            + ", "
            + count(assets.stream().mapToInt(asset -> asset.samples().size()).sum(), "sample"));
    review.since().ifPresent(since -> since(out, since));
    List<AssetReview> troubled =
        review.worstFirst().stream()
            .filter(asset -> asset.level().filter(level -> level != Level.CLEAR).isPresent())
            .toList();
    for (AssetReview asset : troubled.subList(0, Math.min(MOST_ASSETS, troubled.size()))) {
      asset.governing().ifPresent(bearing -> line(out, asset, bearing));
    }
    if (troubled.size() > MOST_ASSETS) {
      out.println("  and " + (troubled.size() - MOST_ASSETS) + " more");
    }
    long clear =
        review.assets().stream()
            .filter(asset -> asset.level().filter(level -> level == Level.CLEAR).isPresent())
            .count();
    long unknown = review.assets().stream().filter(asset -> asset.level().isEmpty()).count();
    out.println("  " + clear + " clear" + (unknown == 0 ? "" : ", " + unknown + " without a κ"));
    problems(out);
  }

  private static void line(PrintWriter out, AssetReview asset, BearingReview bearing) {
    Optional<Film> film = bearing.latestFilm().flatMap(KappaPoint::film);
    film.ifPresent(
        known ->
            out.printf(
                Locale.ROOT,
                "  %-6s %s %s: κ %s (%s to %s), %s%s%n",
                known.level().label(),
                asset.asset().id(),
                bearing.bearing().id(),
                Numbers.significant(known.kappa(), 3),
                Numbers.significant(known.uncertainty().low(), 3),
                Numbers.significant(known.uncertainty().high(), 3),
                known.regime().label(),
                asset.decision().map(found -> ": " + found.verdict().label()).orElse("")));
  }

  private static String count(int number, String thing) {
    return number + " " + thing + (number == 1 ? "" : "s");
  }

  private static void since(PrintWriter out, Since since) {
    out.println("Since " + since.date() + ":");
    if (since.items().isEmpty()) {
      out.println("  nothing changed");
    }
    for (Since.Item item : since.items().subList(0, Math.min(MOST_ITEMS, since.items().size()))) {
      out.printf(
          Locale.ROOT,
          "  %-7s %-5s %s%s %s%n",
          item.change().label(),
          item.finding().level().label(),
          item.finding().asset(),
          item.finding().bearing().map(id -> " " + id).orElse(""),
          item.finding().kind().label());
    }
    if (since.items().size() > MOST_ITEMS) {
      out.println("  and " + (since.items().size() - MOST_ITEMS) + " more (on the page)");
    }
    out.println("State of the fleet:");
  }

  private void problems(PrintWriter out) {
    if (review.problems().isEmpty()) {
      return;
    }
    Map<String, Long> byFile = new TreeMap<>();
    for (Problem problem : review.problems()) {
      byFile.merge(problem.source().file(), 1L, Long::sum);
    }
    out.println(
        review.problems().size()
            + (review.problems().size() == 1 ? " problem" : " problems")
            + " in the inputs, left out (problems.csv has each):");
    byFile.forEach((file, count) -> out.println("  " + file + ": " + count));
  }
}
