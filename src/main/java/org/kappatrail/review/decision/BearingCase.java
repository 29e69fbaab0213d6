package org.kappatrail.review.decision;

import java.time.LocalDate;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.history.Bearing;
import org.kappatrail.review.trend.Attribution;
import org.kappatrail.review.trend.FilmState;

/**
 * What the decision needs to know of one bearing.
 *
 * @param bearing the bearing
 * @param floor its least κ
 * @param now present oil at the present operating point
 * @param freshAtStart registered oil when fresh, at the operating point the charge began with
 * @param yearAgoC temperature a year ago at this season, °C; empty where the log is too short
 * @param duty how it runs over a year
 * @param cleanliness contamination at the latest sample
 * @param usedLife fraction of L10mh used up so far; empty without loads
 * @param runningSince what the used life counts from, in words
 * @param firstCrossing earliest day on which κ may reach the floor
 */
public record BearingCase(
    Bearing bearing,
    double floor,
    FilmState now,
    Optional<FilmState> freshAtStart,
    OptionalDouble yearAgoC,
    DutyYear duty,
    Cleanliness cleanliness,
    OptionalDouble usedLife,
    String runningSince,
    Optional<LocalDate> firstCrossing) {

  /** What moved κ from the registered oil when fresh; empty where unknown. */
  public Optional<Attribution> fromFresh() {
    return freshAtStart.map(fresh -> Attribution.between(fresh, now));
  }

  /** Temperature that the charge began with, °C. */
  public OptionalDouble startC() {
    return freshAtStart.isPresent()
        ? OptionalDouble.of(freshAtStart.get().temperatureC())
        : OptionalDouble.empty();
  }

  /** The same bearing at another temperature, all year round; no crossing is foreseen for it. */
  BearingCase at(double temperatureC) {
    return new BearingCase(
        bearing,
        floor,
        now.at(temperatureC, now.speedRpm()),
        freshAtStart,
        yearAgoC,
        duty.allAt(temperatureC, "the temperature asked about, with the speeds of its log"),
        cleanliness,
        usedLife,
        runningSince,
        Optional.empty());
  }

  /** κ now. */
  public double kappa() {
    return now.kappa(bearing.pitchMm());
  }
}
