package org.kappatrail.review;

import java.util.List;
import java.util.Optional;
import org.kappatrail.duty.DroppedReadings;
import org.kappatrail.history.Bearing;
import org.kappatrail.review.trend.Trend;

/**
 * What the review found for one bearing.
 *
 * @param bearing the bearing
 * @param floor its least κ: its own, else the site's
 * @param reference conditions at which its oils are compared
 * @param trail its samples in time
 * @param days its days with running hours, in time
 * @param trend drift, what moved κ, and the outlook
 * @param life duty and life used so far; empty where no κ is known
 * @param dropped readings left out of its log
 */
public record BearingReview(
    Bearing bearing,
    double floor,
    Optional<Reference> reference,
    List<KappaPoint> trail,
    List<DayKappa> days,
    Trend trend,
    Optional<LifeSoFar> life,
    DroppedReadings dropped) {

  public BearingReview {
    trail = List.copyOf(trail);
    days = List.copyOf(days);
  }

  /** The latest sample, with or without κ. */
  public Optional<KappaPoint> latest() {
    return trail.isEmpty() ? Optional.empty() : Optional.of(trail.get(trail.size() - 1));
  }

  /** The latest sample that has a κ. */
  public Optional<KappaPoint> latestFilm() {
    return film(0);
  }

  /** The sample with a κ before the latest one that has one. */
  public Optional<KappaPoint> previousFilm() {
    return film(1);
  }

  private Optional<KappaPoint> film(int back) {
    int left = back;
    for (int i = trail.size() - 1; i >= 0; i--) {
      if (trail.get(i).film().isPresent() && left-- == 0) {
        return Optional.of(trail.get(i));
      }
    }
    return Optional.empty();
  }
}
