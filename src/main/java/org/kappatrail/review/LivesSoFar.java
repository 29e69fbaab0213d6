package org.kappatrail.review;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.kappatrail.duty.DutyCells;
import org.kappatrail.history.Asset;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.Event;
import org.kappatrail.history.EventKind;
import org.kappatrail.history.Sample;
import org.kappatrail.review.decision.BearingLife;
import org.kappatrail.review.decision.Cleanliness;
import org.kappatrail.review.decision.DutyYear;
import org.kappatrail.review.trend.FilmState;
import org.kappatrail.review.trend.Forecast;
import org.kappatrail.review.trend.Outlook;
import org.kappatrail.tribology.PalmgrenMiner;

/**
 * Duty of the last year and life used so far, from the log. A year of log gives the duty as it was;
 * a shorter one, or one in which the bearing ran at other temperatures than now beyond what
 * measuring can say, gives the present operating point for the hours that were run.
 */
final class LivesSoFar {
  private static final double MS_PER_HOUR = 3_600_000.0;
  private static final int YEAR_DAYS = 365;

  /** A log that reaches back this far counts as a year. */
  private static final int NEARLY_A_YEAR = 358;

  private static final double CELL_C = 0.5;
  private static final double CELL_SPEED_SHARE = 0.01;
  private static final double HOURS_PER_DAY = 24;

  private final Asset asset;
  private final Bearing bearing;
  private final DutyCells cells;
  private final List<DayKappa> days;
  private final List<Event> events;
  private final List<Sample> samples;
  private final double sigmaC;

  LivesSoFar(
      Asset asset,
      Bearing bearing,
      DutyCells cells,
      List<DayKappa> days,
      List<Event> events,
      List<Sample> samples,
      double sigmaC) {
    this.asset = asset;
    this.bearing = bearing;
    this.cells = cells;
    this.days = days;
    this.events = events;
    this.samples = samples;
    this.sigmaC = sigmaC;
  }

  /** Contamination at a sample. */
  static Cleanliness cleanliness(Asset asset, Optional<Sample> sample) {
    return new Cleanliness(
        asset.contaminationFactor(), sample.flatMap(Sample::cleanliness), asset.supply());
  }

  /** Life so far, seen from the latest sample with a κ; empty without one. */
  Optional<LifeSoFar> at(Optional<KappaPoint> latest, Optional<Outlook> outlook) {
    return latest.map(
        point -> {
          FilmState now = TrendOfTrail.state(point);
          DutyYear duty = duty(now, outlook.map(Outlook::yearAgoC).orElse(OptionalDouble.empty()));
          return used(now, point, duty);
        });
  }

  private DutyYear duty(FilmState now, OptionalDouble yearAgoC) {
    int size = cells.size();
    if (size == 0) {
      return DutyYear.steady(
          YEAR_DAYS * HOURS_PER_DAY,
          now.temperatureC(),
          now.speedRpm(),
          "the present operating point, day and night, as it has no log");
    }
    int last = cells.epochDay(size - 1);
    int first = cells.epochDay(0);
    int from = Math.max(first, last - YEAR_DAYS + 1);
    double scale = YEAR_DAYS / (double) (last - from + 1);
    DutyYear logged = logged(DayRows.firstAtOrAfter(cells, from), scale);
    if (logged.cells().isEmpty()) {
      return DutyYear.steady(
          YEAR_DAYS * HOURS_PER_DAY,
          now.temperatureC(),
          now.speedRpm(),
          "the present operating point, day and night, as it did not run in its log");
    }
    if (last - first + 1 < NEARLY_A_YEAR) {
      return DutyYear.steady(
          logged.hours(),
          now.temperatureC(),
          now.speedRpm(),
          "the present operating point, as the log is shorter than a year");
    }
    boolean changed =
        yearAgoC.isPresent()
            && !Forecast.asLastYear(now.temperatureC(), yearAgoC.getAsDouble(), sigmaC);
    return changed
        ? logged.allAt(
            now.temperatureC(),
            "the present temperature with last year's speeds, as a year ago it ran at another")
        : logged;
  }

  private record Key(long temperature, long speed) implements Comparable<Key> {
    @Override
    public int compareTo(Key other) {
      int order = Long.compare(temperature, other.temperature);
      return order != 0 ? order : Long.compare(speed, other.speed);
    }
  }

  private DutyYear logged(int fromRow, double scale) {
    double speedStep = bearing.speedRpm() * CELL_SPEED_SHARE;
    Map<Key, double[]> sums = new TreeMap<>();
    for (int row = fromRow; row < cells.size(); row++) {
      double speed = cells.speedLogged(row) ? cells.speedRpm(row) : bearing.speedRpm();
      if (cells.running(row) && speed > 0 && cells.millis(row) > 0) {
        double hours = cells.millis(row) / MS_PER_HOUR;
        double temperature = cells.temperatureC(row) + bearing.temperatureOffsetC();
        double[] sum =
            sums.computeIfAbsent(
                new Key(Math.round(temperature / CELL_C), Math.round(speed / speedStep)),
                key -> new double[3]);
        sum[0] += hours;
        sum[1] += hours * temperature;
        sum[2] += hours * speed;
      }
    }
    List<DutyYear.Cell> year = new ArrayList<>();
    sums.values()
        .forEach(
            sum -> year.add(new DutyYear.Cell(sum[0] * scale, sum[1] / sum[0], sum[2] / sum[0])));
    return new DutyYear(year, "the last year of its log");
  }

  private LifeSoFar used(FilmState now, KappaPoint latest, DutyYear duty) {
    Optional<LocalDate> replaced =
        events.stream()
            .filter(event -> event.kind() == EventKind.BEARING_REPLACED)
            .filter(event -> event.bearing().orElse(bearing.id()).equals(bearing.id()))
            .map(Event::date)
            .max(LocalDate::compareTo);
    LocalDate today = latest.sample().day();
    if (days.isEmpty()) {
      LocalDate from = replaced.orElse(samples.get(0).day());
      double hours = Math.max(0, today.toEpochDay() - from.toEpochDay()) * HOURS_PER_DAY;
      OptionalDouble life =
          new BearingLife(bearing)
              .ratingLifeH(
                  now.kappa(bearing.pitchMm()),
                  now.speedRpm(),
                  cleanliness(asset, Optional.of(latest.sample())));
      return new LifeSoFar(
          duty,
          life.isPresent() ? OptionalDouble.of(hours / life.getAsDouble()) : OptionalDouble.empty(),
          since(replaced, from) + ", taken as running day and night at the present point");
    }
    LocalDate from = replaced.orElse(days.get(0).date());
    return new LifeSoFar(duty, logged(from), since(replaced, from));
  }

  private static String since(Optional<LocalDate> replaced, LocalDate from) {
    return replaced.isPresent()
        ? "since the bearing was replaced on " + from
        : "since the history began on " + from + "; what it ran before is unknown";
  }

  private OptionalDouble logged(LocalDate from) {
    BearingLife life = new BearingLife(bearing);
    PalmgrenMiner sum = new PalmgrenMiner();
    int next = 0;
    Optional<Sample> coded = samples.stream().filter(s -> s.cleanliness().isPresent()).findFirst();
    Cleanliness cleanliness = cleanliness(asset, coded);
    for (DayKappa day : days) {
      while (next < samples.size() && !samples.get(next).day().isAfter(day.date())) {
        Sample sample = samples.get(next++);
        if (sample.cleanliness().isPresent()) {
          cleanliness = cleanliness(asset, Optional.of(sample));
        }
      }
      if (day.date().isBefore(from) || day.kappa().isEmpty() || !(day.speedRpm() > 0)) {
        continue;
      }
      OptionalDouble ofDay =
          life.ratingLifeH(day.kappa().getAsDouble(), day.speedRpm(), cleanliness);
      if (ofDay.isEmpty()) {
        return ofDay;
      }
      sum.add(day.runningHours(), ofDay.getAsDouble());
    }
    return OptionalDouble.of(sum.damage());
  }
}
