package org.kappatrail.review;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.kappatrail.history.Asset;
import org.kappatrail.history.Charge;
import org.kappatrail.history.Event;
import org.kappatrail.history.Oil;
import org.kappatrail.history.Sample;
import org.kappatrail.review.decision.Decision;
import org.kappatrail.review.decision.FollowUp;
import org.kappatrail.review.decision.OilCause;
import org.kappatrail.review.trend.ViscosityChange;

/**
 * What the review found for one asset.
 *
 * @param asset the asset
 * @param oil its registered oil
 * @param charges its oil charges in time
 * @param samples its samples in time
 * @param events its events in time
 * @param bearings its bearings in the order of the register
 * @param lastChange last change of viscosity within the present charge
 * @param decision the five questions and the verdict; empty where no κ is known
 * @param oilCauses what may have happened to the oil, likeliest first; empty without a real shift
 * @param followUps what past acts did, latest first
 * @param story where κ stands, what moved it, what is worth doing: a sentence each
 * @param findings what was found, worst first
 */
public record AssetReview(
    Asset asset,
    Oil oil,
    List<Charge> charges,
    List<Sample> samples,
    List<Event> events,
    List<BearingReview> bearings,
    Optional<ViscosityChange> lastChange,
    Optional<Decision> decision,
    List<OilCause> oilCauses,
    List<FollowUp> followUps,
    List<String> story,
    List<Finding> findings) {

  private static final Comparator<BearingReview> WORST_FIRST =
      Comparator.comparingDouble(AssetReview::filmOverFloor)
          .thenComparing(review -> review.bearing().id());

  public AssetReview {
    charges = List.copyOf(charges);
    samples = List.copyOf(samples);
    events = List.copyOf(events);
    bearings = List.copyOf(bearings);
    oilCauses = List.copyOf(oilCauses);
    followUps = List.copyOf(followUps);
    story = List.copyOf(story);
    findings = List.copyOf(findings);
  }

  /** The bearing with the least κ over its floor at its latest sample; empty where none has a κ. */
  public Optional<BearingReview> governing() {
    return bearings.stream().filter(review -> review.latestFilm().isPresent()).min(WORST_FIRST);
  }

  /** Level of the governing bearing; empty where no κ is known. */
  public Optional<Level> level() {
    return governing()
        .flatMap(BearingReview::latestFilm)
        .flatMap(KappaPoint::film)
        .map(Film::level);
  }

  private static double filmOverFloor(BearingReview review) {
    return review
        .latestFilm()
        .flatMap(KappaPoint::film)
        .map(film -> film.kappa() / review.floor())
        .orElse(Double.POSITIVE_INFINITY);
  }
}
