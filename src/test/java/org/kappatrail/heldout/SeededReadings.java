package org.kappatrail.heldout;

import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;

/** Raw readings of the bearings, each with habits of its own, and with faults. */
final class SeededReadings {
  private static final String GOOD = "good";

  private final Random random;
  private final List<Site.Reading> readings = new ArrayList<>();

  SeededReadings(Random random) {
    this.random = random;
  }

  /**
   * How a bearing runs.
   *
   * @param minutes between readings
   * @param meanC mean temperature
   * @param swingC daily swing
   * @param least least share of the nominal speed
   * @param speed whether speed is logged
   */
  private record Habit(int minutes, double meanC, double swingC, double least, boolean speed) {}

  List<Site.Reading> of(List<Site.Ring> rings) {
    for (Site.Ring ring : rings) {
      if (!ring.asset().equals("form-pump")) {
        log(ring, habit(ring));
      }
    }
    return readings;
  }

  private static Habit habit(Site.Ring ring) {
    return switch (ring.asset()) {
      case "dryer" -> new Habit(20, 74, 3, 0.97, true);
      case "press" -> new Habit(15, 52, 6, 0.96, true);
      case "spindle" -> new Habit(30, 44, 5, 0.6, true);
      case "agitator" -> new Habit(20, 48, 9, 1, false);
      case "fan" -> new Habit(10, 58, 8, 0.4, true);
      case "sieve" -> new Habit(150, 61, 4, 0.98, true);
      case "oven" -> new Habit(20, 104, 6, 0.98, true);
      case "roof-fan" -> new Habit(60, 22, 14, 0.95, true);
      default -> new Habit(30, 55, 5, 0.97, true);
    };
  }

  private void log(Site.Ring ring, Habit habit) {
    long step = habit.minutes() * 60L;
    Instant end = SeededSite.AS_OF.plusDays(4).atStartOfDay(ZoneOffset.UTC).toInstant();
    Instant at = SeededSite.START.atStartOfDay(ZoneOffset.UTC).toInstant();
    double wander = 0;
    boolean stopped = false;
    for (; at.isBefore(end); at = at.plusSeconds(step + random.nextInt(30))) {
      long day = at.getEpochSecond() / 86400 - SeededSite.START.toEpochDay();
      if (random.nextInt(150) == 0) {
        stopped = !stopped && random.nextBoolean();
      }
      wander = 0.98 * wander + 0.35 * random.nextGaussian();
      if (missing(ring, day) || random.nextInt(60) == 0) {
        continue;
      }
      boolean still = stopped || standstill(ring, day);
      double hour = at.getEpochSecond() % 86400 / 3600.0;
      double temperature =
          habit.meanC()
              + habit.swingC() * Math.sin((hour - 9) / 24 * 2 * Math.PI)
              + 4 * Math.sin(day / 60.0)
              + wander
              - (still ? 20 : 0);
      double share = still ? 0.04 : habit.least() + (1 - habit.least()) * wave(day, hour);
      reading(at, ring, temperature, habit.speed() ? ring.rpm() * share : -1);
    }
  }

  private double wave(long day, double hour) {
    return 0.5 + 0.35 * Math.sin(day / 4.0) + 0.1 * Math.sin(hour) + 0.05 * random.nextDouble();
  }

  /** Days without any reading. */
  private static boolean missing(Site.Ring ring, long day) {
    return switch (ring.asset()) {
      case "press" -> day >= 40 && day < 52;
      case "roof-fan" -> day < 35;
      default -> day == 71;
    };
  }

  /** Days of standstill. */
  private static boolean standstill(Site.Ring ring, long day) {
    return (ring.asset().equals("fan") && day >= 50 && day < 75)
        || (ring.asset().equals("dryer") && day >= 60 && day < 64);
  }

  private void reading(Instant at, Site.Ring ring, double temperature, double rpm) {
    String quality = random.nextInt(3) == 0 ? "" : GOOD;
    String heat = SeededSite.text(temperature, 1);
    String speed = rpm < 0 || random.nextInt(200) == 0 ? "" : SeededSite.text(rpm, 1);
    boolean spoiled = ring.asset().equals("stone-roll") && ring.id().equals("OUT");
    switch (spoiled ? random.nextInt(6) : random.nextInt(250)) {
      case 0 -> heat = "";
      case 1 -> heat = "999.9";
      case 2 -> heat = "-60";
      case 3 -> quality = "bad";
      case 4 -> quality = "64";
      case 5 -> speed = "-5";
      case 6 -> add(at, ring, SeededSite.text(temperature - 7, 1), speed, quality);
      case 7 -> add(at, ring, heat, speed, quality);
      default -> {}
    }
    add(at, ring, heat, speed, quality);
  }

  private void add(Instant at, Site.Ring ring, String heat, String speed, String quality) {
    readings.add(new Site.Reading(at, ring.asset(), ring.id(), heat, speed, quality));
  }
}
