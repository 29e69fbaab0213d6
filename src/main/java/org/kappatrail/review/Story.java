package org.kappatrail.review;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.review.decision.Decision;
import org.kappatrail.review.decision.RemedyKind;
import org.kappatrail.review.decision.Verdict;
import org.kappatrail.review.trend.Attribution;
import org.kappatrail.review.trend.ChargeDrift;
import org.kappatrail.review.trend.Crossing;
import org.kappatrail.review.trend.Direction;
import org.kappatrail.review.trend.Outlook;
import org.kappatrail.review.trend.SampleAttribution;

/** The story of an asset in three sentences: where κ stands, what moved it, what is worth doing. */
final class Story {
  private Story() {}

  /** Three sentences; one where no κ is known. */
  static List<String> of(
      List<BearingReview> bearings,
      Optional<BearingReview> governing,
      Optional<Decision> decision,
      boolean trusted) {
    if (governing.isEmpty() || decision.isEmpty()) {
      return List.of(
          bearings.isEmpty()
              ? "The register has no bearing of this asset, so no κ is known."
              : "No κ is known: see the findings for what is missing.");
    }
    BearingReview bearing = governing.get();
    KappaPoint latest = bearing.latestFilm().orElseThrow();
    return List.of(
        stands(bearing, latest, bearings.size()),
        moved(bearing, latest, trusted),
        worthDoing(bearing, decision.get()));
  }

  private static String stands(BearingReview bearing, KappaPoint latest, int count) {
    Film film = latest.film().orElseThrow();
    String which = count > 1 ? bearing.bearing().id() + ", the worst of " + count + "," : "It";
    return Say.text(
        "%s stood at κ %s (%s to %s) on %s, %s its floor of %s: %s.",
        which,
        Say.kappa(film.kappa()),
        Say.kappa(film.uncertainty().low()),
        Say.kappa(film.uncertainty().high()),
        latest.sample().day(),
        film.level() == Level.ALARM
            ? "below"
            : film.level() == Level.ALERT ? "with an interval that reaches below" : "clear of",
        Say.kappa(bearing.floor()),
        film.regime().label());
  }

  private static String moved(BearingReview bearing, KappaPoint latest, boolean trusted) {
    List<String> parts = new ArrayList<>();
    Optional<Attribution> since =
        bearing.trend().attribution(latest.sample().id(), SampleAttribution.CHARGE_START);
    Optional<Attribution> fresh =
        bearing.trend().attribution(latest.sample().id(), SampleAttribution.FRESH_OIL);
    if (since.isPresent()) {
      parts.add("Since the charge began " + Moved.words(since.get()));
    } else {
      fresh.ifPresent(found -> parts.add("Against fresh oil " + Moved.words(found)));
    }
    Optional<Direction> oil =
        bearing
            .trend()
            .drift(latest.charge().number())
            .map(ChargeDrift::reference)
            .map(drift -> drift.direction());
    if (trusted && oil.isPresent()) {
      parts.add(
          switch (oil.get()) {
            case FALLING -> "the oil itself thins";
            case RISING -> "the oil itself thickens";
            case STEADY -> "the oil itself is steady";
            case UNKNOWN -> "too few samples to say whether the oil drifts";
          });
    }
    bearing.trend().outlook().flatMap(Story::yearAgo).ifPresent(parts::add);
    return parts.isEmpty()
        ? "What moved κ is not known yet: this is its first sample."
        : String.join("; ", parts) + ".";
  }

  private static Optional<String> yearAgo(Outlook outlook) {
    OptionalDouble then = outlook.yearAgoC();
    return then.isPresent()
        ? Optional.of("a year ago it ran at " + Say.oneDecimal(then.getAsDouble()) + " °C")
        : Optional.empty();
  }

  private static String worthDoing(BearingReview bearing, Decision decision) {
    Optional<Outlook> outlook = bearing.trend().outlook();
    String next = outlook.map(found -> "; next sample by " + found.nextSample()).orElse("");
    String crossing =
        outlook
            .map(Outlook::atPresentPoint)
            .filter(found -> !found.equals(Crossing.NONE))
            .filter(found -> decision.verdict() != Verdict.CHANGE_NOW)
            .flatMap(Crossing::likely)
            .map(Story::reached)
            .orElse("");
    return act(decision) + crossing + next + ".";
  }

  private static String reached(LocalDate day) {
    return "; at the present rate it reaches the floor on " + day;
  }

  private static String act(Decision decision) {
    return switch (decision.verdict()) {
      case KEEP -> "Keep the oil: " + decision.reason();
      case RESAMPLE -> "Draw another sample first: " + decision.real().why();
      case FIX_CAUSE_FIRST ->
          "Put the cause right before touching the oil: "
              + decision.remedies().stream()
                  .filter(
                      remedy ->
                          remedy.pays()
                              && (remedy.kind() == RemedyKind.RESTORE_TEMPERATURE
                                  || decision.reason().contains(remedy.name())))
                  .findFirst()
                  .map(remedy -> remedy.name())
                  .orElse("see the remedies");
      case PLAN_CHANGE -> "Plan an oil change: " + decision.curable().why();
      case CHANGE_NOW -> "Change the oil now: " + decision.curable().why();
    };
  }
}
