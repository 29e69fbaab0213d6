package org.kappatrail.review.trend;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import org.kappatrail.statistics.TheilSen;
import org.kappatrail.tribology.OilSensitivity;
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
  private final OilSensitivity sensitivity;
  private final double start;

  /** By day of last year; 0 is the present point. */
  private final @Nullable Pull[] pulls = new Pull[YEAR_DAYS + 1];

  /**
   * What the oil's drift does at an operating point.
   *
   * @param lnKappa ln κ of the oil as it is
   * @param weight how much a drift at reference conditions counts there
   */
  private record Pull(double lnKappa, double weight) {
    /** ln κ some days after the latest sample, the oil drifting on from a start by a slope. */
    double lnKappaAfter(double days, double start, double slope) {
      return lnKappa + (start + slope * days) * weight;
    }
  }

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
    this.sensitivity = OilSensitivity.of(present.oil());
    this.start =
        drift.line().isPresent()
            ? drift.line().get().at((double) lastSample.toEpochDay()) - reference.lnKappa(pitchMm)
            : 0;
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
    Pull pull = pullAtPresent();
    double above = pull.lnKappaAfter(0, start, slope) - lnFloor;
    if (above <= 0) {
      return Optional.of(lastSample);
    }
    double perDay = slope * pull.weight();
    if (perDay >= 0 || above / -perDay > FARTHEST_DAYS) {
      return Optional.empty();
    }
    return Optional.of(lastSample.plusDays((long) Math.ceil(above / -perDay)));
  }

  private Optional<LocalDate> reachedWithLastYear(double slope) {
    for (int ahead = 0; ahead <= FARTHEST_DAYS; ahead++) {
      Pull then = ahead == 0 ? pullAtPresent() : pullOfLastYear(ahead);
      if (then != null && then.lnKappaAfter(ahead, start, slope) <= lnFloor) {
        return Optional.of(lastSample.plusDays(ahead));
      }
    }
    return Optional.empty();
  }

  private Pull pullAtPresent() {
    return pull(0, present);
  }

  private @Nullable Pull pullOfLastYear(int ahead) {
    FilmState then = ofLastYear(ahead);
    return then == null ? null : pull(back(ahead), then);
  }

  /** Every state comes up again for every year ahead and every slope. */
  private Pull pull(int place, FilmState state) {
    Pull known = pulls[place];
    if (known == null) {
      known =
          new Pull(
              state.lnKappa(pitchMm),
              sensitivity.at(state.temperatureC()) / sensitivity.at(reference.temperatureC()));
      pulls[place] = known;
    }
    return known;
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
              Math.exp(pullAtPresent().lnKappaAfter(ahead, start, line.slope())),
              fan(ahead, line.slopeHigh())));
    }
    return fan;
  }

  private OptionalDouble fan(int ahead, OptionalDouble slope) {
    return slope.isPresent()
        ? OptionalDouble.of(
            Math.exp(pullAtPresent().lnKappaAfter(ahead, start, slope.getAsDouble())))
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
    return lastYear.get(lastSample.toEpochDay() - YEAR_DAYS + back(ahead));
  }

  /** Day of last year that stands for a day ahead, from 1. */
  private static int back(int ahead) {
    return Math.floorMod(ahead - 1, YEAR_DAYS) + 1;
  }

  private OptionalDouble readLastYear(List<DayPoint> days) {
    long last = lastSample.toEpochDay();
    long from = last - YEAR_DAYS;
    int first = firstFrom(days, from);
    boolean reachesBack = !days.isEmpty() && days.get(0).epochDay() <= from + SMOOTH_DAYS;
    if (!reachesBack || days.size() - first < LEAST_RUNNING_DAYS) {
      return OptionalDouble.empty();
    }
    OptionalDouble then = median(days, from, SEASON_DAYS);
    if (then.isEmpty()) {
      return then;
    }
    for (DayPoint day : days.subList(first, days.size())) {
      if (day.epochDay() > from && day.speedRpm() > 0) {
        double temperature = median(days, day.epochDay(), SMOOTH_DAYS).getAsDouble();
        lastYear.put(day.epochDay(), present.at(temperature, day.speedRpm()));
      }
    }
    return then;
  }

  /** Place of the first day from a day on; the days are in time. */
  private static int firstFrom(List<DayPoint> days, long epochDay) {
    int low = 0;
    int high = days.size();
    while (low < high) {
      int middle = (low + high) / 2;
      if (days.get(middle).epochDay() < epochDay) {
        low = middle + 1;
      } else {
        high = middle;
      }
    }
    return low;
  }

  private static OptionalDouble median(List<DayPoint> days, long centre, int width) {
    int from = firstFrom(days, centre - width / 2);
    int to = firstFrom(days, centre + width / 2 + 1);
    double[] around = new double[to - from];
    for (int i = from; i < to; i++) {
      around[i - from] = days.get(i).temperatureC();
    }
    Arrays.sort(around);
    int half = around.length / 2;
    return around.length == 0
        ? OptionalDouble.empty()
        : OptionalDouble.of(
            around.length % 2 == 1 ? around[half] : (around[half - 1] + around[half]) / 2);
  }
}
