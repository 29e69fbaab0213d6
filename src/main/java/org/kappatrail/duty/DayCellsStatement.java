package org.kappatrail.duty;

import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.Settings;

/** The statement that turns readings into day cells, the same for every engine. */
final class DayCellsStatement {
  private static final String TEXT = Resources.sql("day-cells.sql");

  /** Speeds above this are not speeds of a bearing, r/min. */
  private static final long FASTEST_RPM = 1_000_000;

  private DayCellsStatement() {}

  /**
   * The statement over a relation of readings.
   *
   * @param readings query with the columns that the statement's header describes
   * @param bearings the register; a bearing's key is its place in this list, from 1
   * @param settings zone, gap limit and running speed
   * @param asOf last local day that is used
   */
  static String over(String readings, List<Bearing> bearings, Settings settings, LocalDate asOf) {
    Instant end = asOf.plusDays(1).atStartOfDay(settings.zone()).toInstant();
    long gapMs = settings.duty().gapMinutes() * 60_000L;
    String register =
        bearings.isEmpty()
            ? "(0, 1, 0)"
            : IntStream.range(0, bearings.size())
                .mapToObj(index -> row(index + 1, bearings.get(index), settings))
                .collect(Collectors.joining(", "));
    return TEXT.replace("{register}", register)
        .replace("{end_ms}", Long.toString(end.toEpochMilli()))
        .replace("{fastest}", Long.toString(fastest(gapMs)))
        .replace("{gap_ms}", Long.toString(gapMs))
        .replace("{day_shift}", "(" + shift(settings.zone(), asOf).atInstant("instant_ms") + ")")
        .replace("{readings}", readings);
  }

  /** The zone's offsets as far as readings are used. */
  static ZoneShift shift(ZoneId zone, LocalDate asOf) {
    return new ZoneShift(zone, asOf.plusDays(3).atStartOfDay(ZoneOffset.UTC).toInstant());
  }

  /** Highest speed in thousandths whose product with a cell's longest time is a 64-bit number. */
  private static long fastest(long gapMs) {
    return Math.min(FASTEST_RPM * 1000, Long.MAX_VALUE / (gapMs + 90_000_000L));
  }

  private static String row(int key, Bearing bearing, Settings settings) {
    double nominal = bearing.speedRpm() * 1000;
    long step = Math.max(1, Math.round(nominal / 100));
    long standstill = (long) Math.floor(nominal * settings.duty().runningSpeedPercent() / 100);
    return "(" + key + ", " + step + ", " + standstill + ")";
  }
}
