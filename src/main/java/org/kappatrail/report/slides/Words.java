package org.kappatrail.report.slides;

import java.util.Locale;
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
    return name(name, LONGEST_NAME);
  }

  /** A name of at most so many characters, cut at a blank where that costs little. */
  static String name(String name, int longest) {
    String shown = ShownText.of(name);
    if (shown.codePointCount(0, shown.length()) <= longest) {
      return shown;
    }
    String kept = shown.substring(0, shown.offsetByCodePoints(0, longest - 1));
    int blank = kept.lastIndexOf(' ');
    return ShownText.of((blank > longest * 2 / 3 ? kept.substring(0, blank) : kept) + "…");
  }

  /** A phrase as a sentence. */
  static String sentence(String phrase) {
    if (phrase.isEmpty()) {
      return phrase;
    }
    int first = phrase.offsetByCodePoints(0, 1);
    String begun = phrase.substring(0, first).toUpperCase(Locale.ROOT) + phrase.substring(first);
    return begun.endsWith(".") ? begun : begun + ".";
  }

  /** A text whose numbers stay with their unit when its lines break. */
  static String joined(String text) {
    return text.replace(" %", "\u00A0%").replace(" °C", "\u00A0°C").replace("κ ", "κ\u00A0");
  }

  static String floor(double floor) {
    boolean tenths = Math.abs(floor * 10 - Math.rint(floor * 10)) < 1e-9;
    return Numbers.fixed(floor, tenths ? 1 : 2);
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
    line.append(floor(governing.get().floor()));
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

  /** The next sample that is asked for; empty where none is. */
  static String nextSample(AssetReview asset) {
    return asset
        .governing()
        .flatMap(bearing -> bearing.trend().outlook())
        .map(outlook -> "next sample by " + outlook.nextSample())
        .orElse("");
  }

  /** When the act is due; empty where nothing is to be done. */
  static String due(AssetReview asset, Decision decision) {
    Optional<Outlook> outlook = asset.governing().flatMap(bearing -> bearing.trend().outlook());
    boolean urgent = decision.urgent().answer() == Answer.YES;
    return switch (decision.verdict()) {
      case KEEP -> "";
      case RESAMPLE, CHANGE_NOW -> "now";
      case FIX_CAUSE_FIRST, PLAN_CHANGE ->
          urgent
              ? "now"
              : outlook
                  .flatMap(Outlook::firstCrossing)
                  .map(day -> "before " + day)
                  .orElse("at the next planned stop");
    };
  }
}
