package org.kappatrail.duty;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.OffsetDateTime;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.BearingKey;

/** Day cells by plain loops over exact decimals, as the method describes them; shares no code. */
final class BruteForce {
  /** A cell's place; the order is that of the rows. */
  private record Place(LocalDate day, boolean stopped, int temperature, int speed) {
    static final Comparator<Place> ORDER =
        Comparator.comparing(Place::day)
            .thenComparing(Place::stopped)
            .thenComparing(Place::temperature)
            .thenComparing(Place::speed);
  }

  private record Good(Instant at, BigDecimal temperature, BigDecimal speed) {}

  private static final BigDecimal NONE = BigDecimal.valueOf(-1);
  private static final Comparator<Good> ORDER =
      Comparator.comparing(Good::at).thenComparing(Good::speed).thenComparing(Good::temperature);

  private final ZoneId zone;
  private final LocalDate asOf;
  private final int gapMinutes;
  private final double runningPercent;

  BruteForce(ZoneId zone, LocalDate asOf, int gapMinutes, double runningPercent) {
    this.zone = zone;
    this.asOf = asOf;
    this.gapMinutes = gapMinutes;
    this.runningPercent = runningPercent;
  }

  /** The bearing's cells and dropped readings, as lines of text. */
  List<String> of(Bearing bearing, List<RawReading> rows) {
    long[] dropped = new long[4];
    List<Good> good = new ArrayList<>();
    for (RawReading row : rows) {
      if (row.bearing().equals(bearing.key())) {
        sort(row, dropped, good);
      }
    }
    good.sort(ORDER);
    Map<Place, List<BigDecimal>> cells = new TreeMap<>(Place.ORDER);
    for (int index = 0; index < good.size(); index++) {
      count(bearing, good, index, cells);
    }
    List<String> lines = new ArrayList<>();
    cells.forEach((place, sums) -> lines.add(line(bearing, place, sums)));
    lines.add("dropped " + List.of(dropped[0], dropped[1], dropped[2], dropped[3]));
    return lines;
  }

  private void sort(RawReading row, long[] dropped, List<Good> good) {
    Instant at = instant(row.time());
    if (at.atZone(zone).toLocalDate().isAfter(asOf)) {
      return;
    }
    BigDecimal temperature = number(row.temperature());
    BigDecimal speed = number(row.speed());
    if (!List.of("", "good", "192").contains(row.quality().toLowerCase(Locale.ROOT))) {
      dropped[1]++;
    } else if (temperature == null) {
      dropped[0]++;
    } else if (temperature.doubleValue() < -40 || temperature.doubleValue() > 200) {
      dropped[2]++;
    } else if (speed != null && speed.signum() < 0) {
      dropped[3]++;
    } else {
      good.add(new Good(at, temperature, speed == null ? NONE : speed));
    }
  }

  private void count(
      Bearing bearing, List<Good> good, int index, Map<Place, List<BigDecimal>> cells) {
    Good reading = good.get(index);
    long gapMs = gapMinutes * 60_000L;
    long ms = gapMs;
    if (index + 1 < good.size()) {
      ms = Math.min(gapMs, good.get(index + 1).at().toEpochMilli() - reading.at().toEpochMilli());
    }
    if (ms == 0) {
      return;
    }
    boolean logged = reading.speed().signum() >= 0;
    BigDecimal limit =
        BigDecimal.valueOf(bearing.speedRpm()).multiply(BigDecimal.valueOf(runningPercent / 100));
    boolean stopped = logged && reading.speed().compareTo(limit) <= 0;
    BigDecimal percent = BigDecimal.valueOf(bearing.speedRpm()).movePointLeft(2);
    Place place =
        new Place(
            reading.at().atZone(zone).toLocalDate(),
            stopped,
            stopped ? 0 : floor(reading.temperature().divide(new BigDecimal("0.5"))),
            stopped || !logged
                ? -1
                : reading.speed().divide(percent, 0, RoundingMode.FLOOR).intValueExact());
    BigDecimal weight = BigDecimal.valueOf(ms);
    BigDecimal speed = logged ? reading.speed() : BigDecimal.valueOf(bearing.speedRpm());
    List<BigDecimal> next =
        List.of(
            weight,
            BigDecimal.ONE,
            reading.temperature().multiply(weight),
            reading.temperature(),
            reading.temperature(),
            speed.multiply(weight),
            logged ? BigDecimal.ONE : BigDecimal.ZERO);
    cells.merge(place, next, BruteForce::merge);
  }

  private static List<BigDecimal> merge(List<BigDecimal> a, List<BigDecimal> b) {
    return List.of(
        a.get(0).add(b.get(0)),
        a.get(1).add(b.get(1)),
        a.get(2).add(b.get(2)),
        a.get(3).min(b.get(3)),
        a.get(4).max(b.get(4)),
        a.get(5).add(b.get(5)),
        a.get(6));
  }

  private static String line(Bearing bearing, Place place, List<BigDecimal> sums) {
    BigDecimal ms = sums.get(0);
    boolean logged = sums.get(6).signum() > 0;
    return text(
        place.day().toEpochDay(),
        !place.stopped(),
        ms.longValueExact(),
        sums.get(1).longValueExact(),
        sums.get(2).divide(ms, 20, RoundingMode.HALF_EVEN).doubleValue(),
        sums.get(3).doubleValue(),
        sums.get(4).doubleValue(),
        logged,
        logged
            ? sums.get(5).divide(ms, 20, RoundingMode.HALF_EVEN).doubleValue()
            : bearing.speedRpm());
  }

  /** The same lines from what the program found. */
  static List<String> lines(BearingDuty duty) {
    List<String> lines = new ArrayList<>();
    DutyCells cells = duty.cells();
    for (int row = 0; row < cells.size(); row++) {
      lines.add(
          text(
              cells.epochDay(row),
              cells.running(row),
              cells.millis(row),
              cells.readings(row),
              cells.temperatureC(row),
              cells.lowestC(row),
              cells.highestC(row),
              cells.speedLogged(row),
              cells.speedRpm(row)));
    }
    DroppedReadings dropped = duty.dropped();
    lines.add(
        "dropped "
            + List.of(
                dropped.noTemperature(),
                dropped.badQuality(),
                dropped.implausible(),
                dropped.negativeSpeed()));
    return lines;
  }

  /** Bearings with readings, each with its lines. */
  Map<BearingKey, List<String>> all(List<Bearing> bearings, List<RawReading> rows) {
    Map<BearingKey, List<String>> all = new TreeMap<>();
    bearings.forEach(bearing -> all.put(bearing.key(), of(bearing, rows)));
    return all;
  }

  /** Nine digits: two roundings of one exact quotient differ in the sixteenth at most. */
  private static String text(
      long day,
      boolean running,
      long ms,
      long readings,
      double temperature,
      double lowest,
      double highest,
      boolean logged,
      double speed) {
    return String.format(
        Locale.ROOT,
        "%s %s %d ms %d readings %.9f (%.3f to %.3f) C %s %.9f rpm",
        LocalDate.ofEpochDay(day),
        running ? "running" : "stopped",
        ms,
        readings,
        temperature,
        lowest,
        highest,
        logged ? "logged" : "nominal",
        speed);
  }

  private Instant instant(String time) {
    return time.matches(".*(Z|[+-]\\d\\d:\\d\\d)")
        ? OffsetDateTime.parse(time).toInstant()
        : LocalDateTime.parse(time).atZone(zone).toInstant();
  }

  private static int floor(BigDecimal number) {
    return number.setScale(0, RoundingMode.FLOOR).intValueExact();
  }

  @org.jspecify.annotations.Nullable
  private static BigDecimal number(String text) {
    return text.matches("-?\\d+(\\.\\d+)?") ? new BigDecimal(text) : null;
  }
}
