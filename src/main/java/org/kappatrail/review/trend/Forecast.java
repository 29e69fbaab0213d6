package org.kappatrail.review.trend;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.NavigableMap;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.apache.commons.math3.stat.descriptive.rank.Median;
import org.jspecify.annotations.Nullable;
import org.kappatrail.statistics.TheilSen;
import org.kappatrail.tribology.OilViscosity;

/**
 * Carries the oil's own drift forward: the reference trail goes on by its Theil–Sen slope, and κ
 * follows at the present operating point, or day by day at last year's. A drift of ln κ at
 * reference conditions is one of ln ν40 times the sensitivity there; at another temperature it
 * counts with the sensitivity that holds there.
 */
public final class Forecast {
  private static final int FARTHEST_DAYS = 3653;
  private static final int FAN_STEP_DAYS = 7;
  private static final int YEAR_DAYS = 365;

  /** Last year's temperature of a day is the median of this many days around it. */
  private static final int SMOOTH_DAYS = 7;

  /** The temperature a year ago is the median of this many days around that day. */
  private static final int SEASON_DAYS = 31;

  /** Running days of the last year that must be there for a seasonal outlook. */
  private static final int LEAST_RUNNING_DAYS = 120;

  /** 95 % limit of the difference of two values in standard deviations. */
  private static final double DIFFERENCE_95 = 1.96 * Math.sqrt(2);

  private final double pitchMm;
  private final double lnFloor;
  private final FilmState present;
  private final LocalDate lastSample;
  private final FilmState reference;
  private final Drift drift;
  private final OilViscosity fresh;
  private final double sigmaC;
  private final TreeMap<Long, FilmState> lastYear = new TreeMap<>();
  private final OptionalDouble yearAgoC;

  /**
   * Prepares a forecast.
   *
   * @param pitchMm pitch diameter, mm
   * @param floor least κ
   * @param lastSample day of the latest sample
   * @param present its oil at its operating point
   * @param reference its oil at reference conditions
   * @param drift drift of the reference trail over the present charge
   * @param fresh the registered oil when fresh
   * @param days the log's days in time
   * @param sigmaC standard uncertainty of temperature, °C
   */
  public Forecast(
      double pitchMm,
      double floor,
      LocalDate lastSample,
      FilmState present,
      FilmState reference,
      Drift drift,
      OilViscosity fresh,
      List<DayPoint> days,
      double sigmaC) {
    this.pitchMm = pitchMm;
    this.lnFloor = Math.log(floor);
    this.lastSample = lastSample;
    this.present = present;
    this.reference = reference;
    this.drift = drift;
    this.fresh = fresh;
    this.sigmaC = sigmaC;
    this.yearAgoC = readLastYear(days);
  }

  /**
   * The outlook.
   *
   * @param horizonDays how far the fan reaches
   * @param usualIntervalDays usual days between samples
   */
  public Outlook outlook(int horizonDays, int usualIntervalDays) {
    boolean falls = drift.direction() == Direction.FALLING;
    Crossing atPresent = falls ? crossing(this::reachedAtPresentPoint) : Crossing.NONE;
    Optional<Crossing> seasonal =
        yearAgoC.isEmpty()
            ? Optional.empty()
            : Optional.of(falls ? crossing(this::reachedWithLastYear) : Crossing.NONE);
    return new Outlook(
        atPresent,
        seasonal,
        dip(),
        fan(horizonDays),
        nextSample(Outlook.earlier(atPresent, seasonal), usualIntervalDays),
        yearAgoC);
  }

  /** True where this is no warmer or colder than a year ago beyond what measuring can say. */
  public static boolean asLastYear(double nowC, double yearAgoC, double sigmaC) {
    return Math.abs(nowC - yearAgoC) <= DIFFERENCE_95 * sigmaC;
  }

  private LocalDate nextSample(Optional<LocalDate> crossing, int usualIntervalDays) {
    long days = usualIntervalDays;
    if (crossing.isPresent()) {
      days = Math.min(days, (crossing.get().toEpochDay() - lastSample.toEpochDay()) / 2);
    }
    return lastSample.plusDays(Math.max(1, days));
  }

  private interface Reach {
    Optional<LocalDate> by(double slopePerDay);
  }

  private Crossing crossing(Reach reach) {
    TheilSen.Line line = drift.line().orElseThrow();
    return new Crossing(
        limit(reach, line.slopeLow()), reach.by(line.slope()), limit(reach, line.slopeHigh()));
  }

  private static Optional<LocalDate> limit(Reach reach, OptionalDouble slope) {
    return slope.isPresent() ? reach.by(slope.getAsDouble()) : Optional.empty();
  }

  private Optional<LocalDate> reachedAtPresentPoint(double slope) {
    double above = lnKappaOn(present, 0, slope) - lnFloor;
    if (above <= 0) {
      return Optional.of(lastSample);
    }
    double perDay = slope * weight(present);
    if (perDay >= 0 || above / -perDay > FARTHEST_DAYS) {
      return Optional.empty();
    }
    return Optional.of(lastSample.plusDays((long) Math.ceil(above / -perDay)));
  }

  private Optional<LocalDate> reachedWithLastYear(double slope) {
    for (int ahead = 0; ahead <= FARTHEST_DAYS; ahead++) {
      FilmState then = ahead == 0 ? present : ofLastYear(ahead);
      if (then != null && lnKappaOn(then, ahead, slope) <= lnFloor) {
        return Optional.of(lastSample.plusDays(ahead));
      }
    }
    return Optional.empty();
  }

  /** ln κ of a state some days after the latest sample, the oil drifting on by a slope. */
  private double lnKappaOn(FilmState state, double ahead, double slope) {
    double start = 0;
    if (drift.line().isPresent()) {
      double onLine = drift.line().get().at((double) lastSample.toEpochDay());
      start = onLine - reference.lnKappa(pitchMm);
    }
    return state.lnKappa(pitchMm) + (start + slope * ahead) * weight(state);
  }

  /** How much a drift at reference conditions counts at another temperature. */
  private double weight(FilmState state) {
    return state.oil().sensitivityToV40(state.temperatureC())
        / reference.oil().sensitivityToV40(reference.temperatureC());
  }

  private List<FanPoint> fan(int horizonDays) {
    List<FanPoint> fan = new ArrayList<>();
    if (drift.line().isEmpty()) {
      return fan;
    }
    TheilSen.Line line = drift.line().get();
    for (int ahead = 0; ahead <= horizonDays; ahead += FAN_STEP_DAYS) {
      fan.add(
          new FanPoint(
              lastSample.plusDays(ahead),
              fan(ahead, line.slopeLow()),
              Math.exp(lnKappaOn(present, ahead, line.slope())),
              fan(ahead, line.slopeHigh())));
    }
    return fan;
  }

  private OptionalDouble fan(int ahead, OptionalDouble slope) {
    return slope.isPresent()
        ? OptionalDouble.of(Math.exp(lnKappaOn(present, ahead, slope.getAsDouble())))
        : OptionalDouble.empty();
  }

  /** The season's own dip: fresh oil would go below the floor in it too. */
  private Optional<SeasonalDip> dip() {
    if (yearAgoC.isEmpty() || !asLastYear(present.temperatureC(), yearAgoC.getAsDouble(), sigmaC)) {
      return Optional.empty();
    }
    boolean below = under(present);
    boolean season = below && under(present.with(fresh));
    LocalDate from = lastSample;
    LocalDate to = lastSample;
    double least = below ? present.kappa(pitchMm) : Double.POSITIVE_INFINITY;
    boolean inside = below;
    for (int ahead = 1; ahead <= YEAR_DAYS; ahead++) {
      FilmState then = ofLastYear(ahead);
      if (then == null) {
        continue;
      }
      double kappa = then.kappa(pitchMm);
      if (under(then)) {
        from = inside ? from : lastSample.plusDays(ahead);
        to = lastSample.plusDays(ahead);
        least = Math.min(least, kappa);
        season |= under(then.with(fresh));
        inside = true;
      } else if (inside) {
        return season ? Optional.of(new SeasonalDip(from, to, least, below)) : Optional.empty();
      }
    }
    return Optional.empty();
  }

  private boolean under(FilmState state) {
    return state.lnKappa(pitchMm) < lnFloor;
  }

  private @Nullable FilmState ofLastYear(int ahead) {
    int back = Math.floorMod(ahead - 1, YEAR_DAYS) + 1;
    return lastYear.get(lastSample.toEpochDay() - YEAR_DAYS + back);
  }

  private OptionalDouble readLastYear(List<DayPoint> days) {
    long last = lastSample.toEpochDay();
    long from = last - YEAR_DAYS;
    TreeMap<Long, DayPoint> byDay = new TreeMap<>();
    days.forEach(day -> byDay.put(day.epochDay(), day));
    var before = byDay.headMap(from + SMOOTH_DAYS, true);
    if (before.isEmpty() || byDay.subMap(from, last + 1).size() < LEAST_RUNNING_DAYS) {
      return OptionalDouble.empty();
    }
    OptionalDouble then = median(byDay, from, SEASON_DAYS);
    if (then.isEmpty()) {
      return then;
    }
    for (Map.Entry<Long, DayPoint> day : byDay.subMap(from + 1, last + 1).entrySet()) {
      double temperature = median(byDay, day.getKey(), SMOOTH_DAYS).getAsDouble();
      if (day.getValue().speedRpm() > 0) {
        lastYear.put(day.getKey(), present.at(temperature, day.getValue().speedRpm()));
      }
    }
    return then;
  }

  private static OptionalDouble median(NavigableMap<Long, DayPoint> days, long centre, int width) {
    double[] around =
        days.subMap(centre - width / 2, centre + width / 2 + 1).values().stream()
            .mapToDouble(DayPoint::temperatureC)
            .toArray();
    return around.length == 0
        ? OptionalDouble.empty()
        : OptionalDouble.of(new Median().evaluate(around));
  }
}
