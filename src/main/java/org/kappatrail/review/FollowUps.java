package org.kappatrail.review;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.kappatrail.history.Event;
import org.kappatrail.history.EventKind;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.review.decision.Answer;
import org.kappatrail.review.decision.FollowUp;
import org.kappatrail.tribology.CleanlinessCode;

/**
 * What recorded oil changes, filter changes and bearing replacements did: κ, water and code at the
 * last sample before and the first after. An oil change should lift κ, or dry or clean the oil; a
 * filter change should clean it; a replacement is not judged by oil.
 */
final class FollowUps {
  private static final Set<EventKind> JUDGED =
      Set.of(EventKind.OIL_CHANGE, EventKind.FILTER_CHANGED, EventKind.BEARING_REPLACED);

  /** A change of water beyond this factor counts (tool convention). */
  private static final double WATER_FACTOR = 1.3;

  /** 95 % limit of the difference of two values in standard deviations. */
  private static final double DIFFERENCE_95 = 1.96 * Math.sqrt(2);

  private FollowUps() {}

  /** Follow-ups, latest first. */
  static List<FollowUp> of(List<Event> events, List<Sample> samples, List<BearingReview> bearings) {
    List<FollowUp> found = new ArrayList<>();
    for (Event event : events) {
      if (JUDGED.contains(event.kind())) {
        found.add(followUp(event, samples, bearing(event, bearings)));
      }
    }
    found.sort(Comparator.comparing(FollowUp::date).reversed().thenComparing(FollowUp::act));
    return found;
  }

  /** The bearing of the event, else the one with the least κ over its floor. */
  private static Optional<BearingReview> bearing(Event event, List<BearingReview> bearings) {
    return bearings.stream()
        .filter(item -> item.latestFilm().isPresent())
        .filter(item -> event.bearing().map(id -> id.equals(item.bearing().id())).orElse(true))
        .min(
            Comparator.comparingDouble(
                    (BearingReview item) ->
                        item.latestFilm().flatMap(KappaPoint::film).orElseThrow().kappa()
                            / item.floor())
                .thenComparing(item -> item.bearing().id()));
  }

  private static FollowUp followUp(
      Event event, List<Sample> samples, Optional<BearingReview> bearing) {
    LocalDate day = event.date();
    Optional<Sample> before =
        samples.stream().filter(sample -> !sample.day().isAfter(day)).reduce((a, b) -> b);
    Optional<Sample> after = samples.stream().filter(s -> s.day().isAfter(day)).findFirst();
    Optional<Film> filmBefore =
        bearing.flatMap(item -> film(item, point -> !point.sample().day().isAfter(day), true));
    Optional<Film> filmAfter =
        bearing.flatMap(item -> film(item, point -> point.sample().day().isAfter(day), false));
    OptionalDouble waterBefore = value(before);
    OptionalDouble waterAfter = value(after);
    Optional<CleanlinessCode> codeBefore = before.flatMap(Sample::cleanliness);
    Optional<CleanlinessCode> codeAfter = after.flatMap(Sample::cleanliness);
    Answer worked =
        after.isEmpty()
            ? Answer.UNKNOWN
            : worked(
                event.kind(),
                lifted(filmBefore, filmAfter),
                drier(waterBefore, waterAfter),
                cleaner(codeBefore, codeAfter));
    List<String> parts = new ArrayList<>();
    if (filmBefore.isPresent() && filmAfter.isPresent()) {
      parts.add(
          Say.text(
              "κ %s → %s (%s)",
              Say.kappa(filmBefore.get().kappa()),
              Say.kappa(filmAfter.get().kappa()),
              bearing.orElseThrow().bearing().id()));
    }
    if (waterBefore.isPresent() && waterAfter.isPresent()) {
      parts.add(
          Say.text(
              "water %s → %s mg/kg",
              Say.significant(waterBefore.getAsDouble(), 3),
              Say.significant(waterAfter.getAsDouble(), 3)));
    }
    if (codeBefore.isPresent() && codeAfter.isPresent()) {
      parts.add("code " + codeBefore.get() + " → " + codeAfter.get());
    }
    return new FollowUp(
        day,
        name(event),
        kappa(filmBefore),
        kappa(filmAfter),
        waterBefore,
        waterAfter,
        codeBefore.map(Object::toString),
        codeAfter.map(Object::toString),
        worked,
        sentence(event, before.isPresent(), after.isPresent(), parts, worked));
  }

  private static String name(Event event) {
    return event.kind().label().replace('-', ' ')
        + event.oil().map(oil -> " to " + oil).orElse("")
        + event.bearing().map(id -> " at " + id).orElse("");
  }

  private static String sentence(
      Event event, boolean before, boolean after, List<String> parts, Answer worked) {
    if (!after) {
      return "no sample since";
    }
    if (!before) {
      return "no sample before it to compare with";
    }
    String figures = parts.isEmpty() ? "nothing was measured before and after" : join(parts);
    return figures
        + switch (worked) {
          case YES -> ": it helped";
          case NO ->
              event.kind() == EventKind.OIL_CHANGE
                  ? ": it changed nothing that was measured"
                  : ": no cleaner for it";
          default -> "";
        };
  }

  private static String join(List<String> parts) {
    return String.join(", ", parts);
  }

  private static Answer worked(EventKind kind, Answer lifted, Answer drier, Answer cleaner) {
    if (kind == EventKind.BEARING_REPLACED) {
      return Answer.UNKNOWN;
    }
    if (kind == EventKind.FILTER_CHANGED) {
      return cleaner;
    }
    if (lifted == Answer.YES || drier == Answer.YES || cleaner == Answer.YES) {
      return Answer.YES;
    }
    boolean nothingKnown =
        lifted == Answer.UNKNOWN && drier == Answer.UNKNOWN && cleaner == Answer.UNKNOWN;
    return nothingKnown ? Answer.UNKNOWN : Answer.NO;
  }

  private static Answer lifted(Optional<Film> before, Optional<Film> after) {
    if (before.isEmpty() || after.isEmpty()) {
      return Answer.UNKNOWN;
    }
    double rise = Math.log(after.get().kappa() / before.get().kappa());
    return rise > DIFFERENCE_95 * after.get().uncertainty().sigmaLn() ? Answer.YES : Answer.NO;
  }

  private static Answer drier(OptionalDouble before, OptionalDouble after) {
    if (before.isEmpty() || after.isEmpty()) {
      return Answer.UNKNOWN;
    }
    return before.getAsDouble() > WATER_FACTOR * after.getAsDouble() ? Answer.YES : Answer.NO;
  }

  private static Answer cleaner(Optional<CleanlinessCode> before, Optional<CleanlinessCode> after) {
    if (before.isEmpty() || after.isEmpty()) {
      return Answer.UNKNOWN;
    }
    boolean better =
        before.get().dirtierThan(after.get()) && !after.get().dirtierThan(before.get());
    return better ? Answer.YES : Answer.NO;
  }

  private static Optional<Film> film(
      BearingReview bearing, java.util.function.Predicate<KappaPoint> which, boolean last) {
    var films =
        bearing.trail().stream().filter(which).filter(point -> point.film().isPresent()).toList();
    if (films.isEmpty()) {
      return Optional.empty();
    }
    return films.get(last ? films.size() - 1 : 0).film();
  }

  private static OptionalDouble kappa(Optional<Film> film) {
    return film.isPresent() ? OptionalDouble.of(film.get().kappa()) : OptionalDouble.empty();
  }

  private static OptionalDouble value(Optional<Sample> sample) {
    return sample.isPresent()
        ? sample.get().arithmetic(SampleColumns.WATER)
        : OptionalDouble.empty();
  }
}
