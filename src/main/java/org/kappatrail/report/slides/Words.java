package org.kappatrail.report.slides;

import java.util.Optional;
import org.kappatrail.report.office.ShownText;
import org.kappatrail.report.page.Numbers;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Film;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.Moved;
import org.kappatrail.review.decision.Answer;
import org.kappatrail.review.decision.Decision;
import org.kappatrail.review.decision.Verdict;
import org.kappatrail.review.trend.Attribution;
import org.kappatrail.review.trend.Outlook;
import org.kappatrail.review.trend.SampleAttribution;

/** Phrases of the slides, made from the results. */
final class Words {
  /** Characters of a name within a sentence; more would hide what the sentence says. */
  private static final int LONGEST_NAME = 60;

  /** Change of κ in % below which nothing is said to have moved it. */
  private static final int WORTH_SAYING_PERCENT = 5;

  private Words() {}

  static String verdict(Verdict verdict) {
    return switch (verdict) {
      case KEEP -> "keep the oil";
      case RESAMPLE -> "draw another sample";
      case FIX_CAUSE_FIRST -> "put the cause right first";
      case PLAN_CHANGE -> "plan an oil change";
      case CHANGE_NOW -> "change the oil now";
    };
  }

  /** A name, its beginning only where it is very long. */
  static String name(String name) {
    String shown = ShownText.of(name);
    if (shown.codePointCount(0, shown.length()) <= LONGEST_NAME) {
      return shown;
    }
    return ShownText.of(shown.substring(0, shown.offsetByCodePoints(0, LONGEST_NAME - 1)) + "…");
  }

  static String kappa(double kappa) {
    return Numbers.significant(kappa, 3);
  }

  static String interval(Film film) {
    return kappa(film.uncertainty().low()) + " to " + kappa(film.uncertainty().high());
  }

  /** Name, κ against the floor, what moved it, and the verdict: one sentence. */
  static String headline(AssetReview asset) {
    StringBuilder line = new StringBuilder(name(asset.asset().name()));
    Optional<BearingReview> governing = asset.governing();
    Optional<KappaPoint> latest = governing.flatMap(BearingReview::latestFilm);
    if (governing.isEmpty() || latest.isEmpty()) {
      return line.append(": no κ is known").toString();
    }
    Film film = latest.get().film().orElseThrow();
    line.append(": κ ").append(kappa(film.kappa()));
    line.append(
        switch (film.level()) {
          case ALARM -> ", below its floor of ";
          case ALERT -> ", perhaps below its floor of ";
          case CLEAR -> ", clear of its floor of ";
        });
    line.append(Numbers.significant(governing.get().floor(), 2));
    sinceFresh(governing.get(), latest.get()).flatMap(Words::taken).ifPresent(line::append);
    asset.decision().ifPresent(found -> line.append(": ").append(verdict(found.verdict())));
    return line.toString();
  }

  static Optional<Attribution> sinceFresh(BearingReview bearing, KappaPoint point) {
    return bearing.trend().attribution(point.sample().id(), SampleAttribution.FRESH_OIL);
  }

  private static Optional<String> taken(Attribution moved) {
    Moved.Percentages parts = Moved.percentages(moved);
    int most = Math.min(parts.oil(), Math.min(parts.temperature(), parts.speed()));
    if (most > -WORTH_SAYING_PERCENT) {
      return Optional.empty();
    }
    String what =
        most == parts.temperature() ? "temperature" : most == parts.oil() ? "the oil" : "speed";
    return Optional.of(", " + what + " took " + -most + " %");
  }

  /** When the act is due. */
  static String due(AssetReview asset, Decision decision) {
    Optional<Outlook> outlook = asset.governing().flatMap(bearing -> bearing.trend().outlook());
    String next = outlook.map(found -> found.nextSample().toString()).orElse("");
    boolean urgent = decision.urgent().answer() == Answer.YES;
    return switch (decision.verdict()) {
      case KEEP -> next.isEmpty() ? "" : "next sample by " + next;
      case RESAMPLE, CHANGE_NOW -> "now";
      case FIX_CAUSE_FIRST, PLAN_CHANGE ->
          urgent
              ? "now"
              : outlook
                  .flatMap(Outlook::firstCrossing)
                  .map(day -> "before " + day)
                  .orElse(next.isEmpty() ? "" : "by " + next);
    };
  }
}
