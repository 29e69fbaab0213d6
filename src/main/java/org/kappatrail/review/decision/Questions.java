package org.kappatrail.review.decision;

import static org.kappatrail.review.decision.Phrases.percent;
import static org.kappatrail.review.decision.Phrases.text;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import org.kappatrail.review.trend.Attribution;
import org.kappatrail.review.trend.Direction;
import org.kappatrail.tribology.LubricationRegime;

/** Answers the five questions, each with the figures that made the answer. */
final class Questions {
  private static final double TWICE = 2;

  private final AssetCase asset;
  private final BearingCase governing;
  private final List<Remedy> remedies;
  private final Remedy stay;
  private final Remedy fresh;
  private final Cause cause;
  private final Optional<Remedy> cure;

  Questions(AssetCase asset, List<Remedy> remedies) {
    this.asset = asset;
    this.governing = asset.governing();
    this.remedies = remedies;
    this.stay = Weights.find(remedies, RemedyKind.STAY).orElseThrow();
    this.fresh = Weights.find(remedies, RemedyKind.FRESH_OIL).orElseThrow();
    this.cause = Cause.of(asset, remedies);
    this.cure = cause.cure(remedies, governing.bearing().id());
  }

  Remedy fresh() {
    return fresh;
  }

  Cause cause() {
    return cause;
  }

  Optional<Remedy> cure() {
    return cure;
  }

  boolean causePays() {
    return cure.filter(Remedy::pays).isPresent();
  }

  boolean causeWorthMore() {
    return cure.filter(this::worthMoreThanFreshOil).isPresent();
  }

  /** By net saving where both have one, else by worth, else by κ. */
  private boolean worthMoreThanFreshOil(Remedy act) {
    if (act.netSaving().isPresent() && fresh.netSaving().isPresent()) {
      return act.netSaving().getAsDouble() > fresh.netSaving().getAsDouble();
    }
    String bearing = governing.bearing().id();
    return Cause.value(act, bearing) > Cause.value(fresh, bearing);
  }

  /** 1. Is the drop real? */
  Reply real() {
    OilRecord record = asset.record();
    List<Double> shifts = record.lastShifts();
    if (shifts.isEmpty()) {
      return new Reply(
          Answer.UNKNOWN, "no viscosity at 40 °C was measured in this charge; have it measured");
    }
    double limit = record.limitPercent() / 100;
    double shift = record.shift().getAsDouble();
    String against =
        text(
            "%s of the registered oil, limit ± %s %% (%s)",
            percent(shift, 1), Acts.number(record.limitPercent(), 1), record.basis());
    if (!record.suspect().isEmpty()) {
      return new Reply(Answer.NO, record.suspect());
    }
    if (record.trend() == Direction.FALLING || record.trend() == Direction.RISING) {
      return new Reply(
          Answer.YES,
          text(
              "the trail %s over the charge; last two samples %s",
              record.trend() == Direction.FALLING ? "falls" : "rises", against));
    }
    if (shifts.size() == 1) {
      return Math.abs(shift) > limit
          ? new Reply(
              Answer.UNKNOWN, "one sample of this charge only: " + against + "; draw another")
          : new Reply(Answer.NO, "the charge's only sample: " + against);
    }
    boolean together =
        shifts.get(0) * shifts.get(1) > 0
            && Math.min(Math.abs(shifts.get(0)), Math.abs(shifts.get(1))) > limit / 2;
    if (Math.abs(shift) > limit && !together) {
      return new Reply(
          Answer.NO,
          text(
              "one odd sample against a steady trail: %s after %s; draw another",
              percent(shifts.get(1), 1), percent(shifts.get(0), 1)));
    }
    return new Reply(
        Math.abs(shift) > limit ? Answer.YES : Answer.NO,
        "mean of the last two samples " + against);
  }

  /** 2. Does it matter: does some act pay? */
  Reply matters() {
    boolean pays = fresh.pays() || causePays();
    String how;
    if (stay.failureProbability().isEmpty()) {
      how =
          text(
              "by κ alone, as loads or cleanliness are missing: κ %s (%s to %s), floor %s",
              Phrases.kappa(governing.kappa()),
              Phrases.kappa(outcome(stay).kappaLow()),
              Phrases.kappa(outcome(stay).kappaHigh()),
              Phrases.kappa(governing.floor()));
    } else {
      how =
          text(
              "chance of a failure within %d days %s %%",
              asset.settings().horizonDays(),
              Phrases.significant(stay.failureProbability().getAsDouble() * 100));
    }
    Remedy best = causeWorthMore() && causePays() ? cure.orElseThrow() : fresh;
    return new Reply(
        pays ? Answer.YES : Answer.NO,
        how + "; " + best.name() + ": " + Phrases.worth(best, asset));
  }

  /** 3. Is it the oil's doing? */
  Reply oilToBlame() {
    Optional<Attribution> found = governing.fromFresh();
    if (found.isEmpty()) {
      return new Reply(
          Answer.UNKNOWN,
          "what moved κ is unknown: no temperature is known for the charge's first sample");
    }
    Attribution parts = found.get();
    boolean oil =
        shifted() && parts.oil() < 0 && parts.oil() <= Math.min(parts.temperature(), parts.speed());
    String moved =
        text(
            "since fresh oil at the charge's first operating point: oil %s, temperature %s,"
                + " speed %s",
            percent(parts.share(parts.oil()), 0),
            percent(parts.share(parts.temperature()), 0),
            percent(parts.share(parts.speed()), 0));
    if (!oil && cause == Cause.GRADE) {
      return new Reply(
          Answer.NO,
          text(
              "fresh %s has κ %s here too, below the floor %s: the grade is to blame (%s)",
              asset.candidate().id(),
              Phrases.kappa(outcome(fresh).kappa()),
              Phrases.kappa(governing.floor()),
              moved));
    }
    return new Reply(oil ? Answer.YES : Answer.NO, moved);
  }

  /** The latest sample is off the registered oil by more than measuring alone makes. */
  private boolean shifted() {
    List<Double> shifts = asset.record().lastShifts();
    return !shifts.isEmpty()
        && Math.abs(shifts.get(shifts.size() - 1)) > asset.record().limitPercent() / 100;
  }

  /** 4. Would fresh oil cure it? */
  Reply curable() {
    Outcome after = outcome(fresh);
    Outcome before = outcome(stay);
    String what =
        text(
            "fresh oil gives κ %s (%s to %s) after %s",
            Phrases.kappa(after.kappa()),
            Phrases.kappa(after.kappaLow()),
            Phrases.kappa(after.kappaHigh()),
            Phrases.kappa(before.kappa()));
    if (fresh.pays()) {
      Optional<Remedy> better = twiceAsGood();
      return better.isPresent()
          ? new Reply(
              Answer.PARTLY, what + "; " + better.get().name() + " is worth twice as much or more")
          : new Reply(Answer.YES, what + " and pays");
    }
    boolean clears = before.kappa() < governing.floor() && after.kappaLow() >= governing.floor();
    return clears
        ? new Reply(Answer.YES, what + ", clear of the floor, though by cost it does not pay")
        : new Reply(
            Answer.NO,
            what + (before.kappa() < governing.floor() ? " and does not clear the floor" : ""));
  }

  private Optional<Remedy> twiceAsGood() {
    if (fresh.worth().isEmpty()) {
      return Optional.empty();
    }
    return remedies.stream()
        .filter(remedy -> remedy.kind().onFilm())
        .filter(Remedy::pays)
        .filter(
            remedy ->
                remedy.worth().isPresent()
                    && remedy.worth().getAsDouble() >= TWICE * fresh.worth().getAsDouble())
        .max(java.util.Comparator.comparingDouble(remedy -> remedy.worth().getAsDouble()));
  }

  /** 5. Is it urgent? */
  Reply urgent() {
    LocalDate planned = asset.sampled().plusDays(asset.asset().samplingDays());
    for (BearingCase bearing : asset.bearings()) {
      if (bearing.kappa() < LubricationRegime.FULL_FILM_FROM) {
        return new Reply(
            Answer.YES,
            text(
                "%s runs in the %s regime already, κ %s",
                bearing.bearing().id(),
                LubricationRegime.of(bearing.kappa()).label(),
                Phrases.kappa(bearing.kappa())));
      }
    }
    for (BearingCase bearing : asset.bearings()) {
      Optional<LocalDate> crossing = bearing.firstCrossing();
      if (crossing.isPresent() && !crossing.get().isAfter(planned)) {
        return new Reply(
            Answer.YES,
            text(
                "%s may reach its floor on %s, before the next planned sample on %s",
                bearing.bearing().id(), crossing.get(), planned));
      }
    }
    return asset.record().trend() == Direction.UNKNOWN
        ? new Reply(
            Answer.UNKNOWN,
            "full film now, and fewer than four samples of this charge to foresee a crossing")
        : new Reply(
            Answer.NO,
            "full film now, and no crossing before the next planned sample on " + planned);
  }

  private Outcome outcome(Remedy remedy) {
    return remedy.outcome(governing.bearing().id()).orElseThrow();
  }
}
