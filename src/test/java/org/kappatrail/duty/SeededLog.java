package org.kappatrail.duty;

import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.zip.GZIPOutputStream;
import org.kappatrail.history.Bearing;

/** Logs with everything that goes wrong in logs, made from a seed. */
final class SeededLog {
  static final String HEADER = "time,asset,bearing,temperature_c,speed_rpm,quality";

  private static final DateTimeFormatter LOCAL =
      DateTimeFormatter.ofPattern("uuuu-MM-dd'T'HH:mm:ss", Locale.ROOT);

  private SeededLog() {}

  /** How the times are written. */
  enum Clock {
    LOCAL,
    OFFSET,
    UTC
  }

  /** Readings of every bearing from a local start, in the order of a shuffled file. */
  static List<RawReading> of(
      long seed, List<Bearing> bearings, ZoneId zone, LocalDateTime start, int days, Clock clock) {
    Random random = new Random(seed);
    List<RawReading> rows = new ArrayList<>();
    for (Bearing bearing : bearings) {
      Instant now = start.atZone(zone).toInstant();
      Instant end = start.plusDays(days).atZone(zone).toInstant();
      boolean logsSpeed = random.nextInt(4) > 0;
      boolean stopped = false;
      while (now.isBefore(end)) {
        stopped = random.nextInt(20) == 0 ? !stopped : stopped;
        String speed = logsSpeed && random.nextInt(15) > 0 ? speed(random, bearing, stopped) : "";
        RawReading row =
            new RawReading(
                write(now, zone, clock),
                bearing.key(),
                temperature(random),
                speed,
                quality(random));
        rows.add(row);
        if (random.nextInt(12) == 0) {
          rows.add(
              new RawReading(
                  row.time(),
                  row.bearing(),
                  temperature(random),
                  random.nextBoolean() ? speed : "",
                  quality(random)));
        }
        now = now.plus(step(random), ChronoUnit.SECONDS);
      }
    }
    Collections.shuffle(rows, random);
    return rows;
  }

  private static long step(Random random) {
    return random.nextInt(40) == 0 ? random.nextInt(20_000) + 1 : random.nextInt(900) + 60;
  }

  private static String temperature(Random random) {
    return switch (random.nextInt(40)) {
      case 0 -> "";
      case 1 -> "I/O Timeout";
      case 2 -> "Bad";
      case 3 -> "71.3.1";
      case 4 -> "250.5";
      case 5 -> "-41";
      case 6 -> "-0.25";
      default -> String.format(Locale.ROOT, "%.2f", 55 + 20 * random.nextGaussian());
    };
  }

  private static String speed(Random random, Bearing bearing, boolean stopped) {
    double share = stopped ? random.nextDouble() * 0.1 : 0.9 + 0.1 * random.nextDouble();
    return switch (random.nextInt(60)) {
      case 0 -> "-3";
      case 1 -> "No Data";
      case 2 -> "12O0";
      case 3 -> String.format(Locale.ROOT, "%.3f", bearing.speedRpm() / 10);
      default -> String.format(Locale.ROOT, "%.1f", bearing.speedRpm() * share);
    };
  }

  private static String quality(Random random) {
    return switch (random.nextInt(30)) {
      case 0 -> "Bad";
      case 1 -> "64";
      case 2 -> "192";
      case 3 -> "";
      case 4 -> "GOOD";
      case 5 -> "so-so";
      default -> "Good";
    };
  }

  private static String write(Instant instant, ZoneId zone, Clock clock) {
    return switch (clock) {
      case LOCAL -> LOCAL.format(instant.atZone(zone));
      case OFFSET -> DateTimeFormatter.ISO_OFFSET_DATE_TIME.format(instant.atZone(zone));
      case UTC -> LOCAL.format(instant.atOffset(ZoneOffset.UTC)) + "Z";
    };
  }

  /** Writes a file of readings; packed where its name ends so. */
  static void write(Path file, List<RawReading> rows) {
    StringBuilder text = new StringBuilder(HEADER).append('\n');
    rows.forEach(row -> text.append(row.csv()).append('\n'));
    write(file, text.toString());
  }

  static void write(Path file, String text) {
    try {
      Files.createDirectories(file.getParent());
      byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
      if (!file.toString().endsWith(".gz")) {
        Files.write(file, bytes);
        return;
      }
      try (OutputStream out = new GZIPOutputStream(Files.newOutputStream(file))) {
        out.write(bytes);
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
