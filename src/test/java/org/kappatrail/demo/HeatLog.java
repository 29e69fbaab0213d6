package org.kappatrail.demo;

import java.time.LocalDate;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.kappatrail.demo.AssetStory.BearingHeat;

/** Hourly readings of one bearing, in tenths of a degree and of a revolution per minute. */
final class HeatLog {
  private static final double TRACKING_PER_HOUR = 0.3;
  private static final double UNREST_C = 0.55;
  private static final double READING_C = 0.12;
  private static final double STEAM_C = 1.7;

  final int[] temperatureTenths = new int[Timeline.HOURS];
  final int[] speedTenths = new int[Timeline.HOURS];
  final boolean[] logged = new boolean[Timeline.HOURS];

  HeatLog(AssetStory story, String bearing, Running running) {
    Arrays.fill(logged, true);
    Noise noise = Noise.named("heat", story.asset(), bearing);
    double nominal = Rows.number(registered(story.asset(), bearing), "speed_rpm");
    double[] share = speedShare(story, running);
    double[] unrest = noise.series(Timeline.HOURS, UNREST_C, 0.92);
    double[] rise = riseC(story);
    BearingHeat heat = story.heat(bearing);
    Ambient ambient = Ambient.of(story.asset());
    double oilC = ambient.meanC() + ambient.deviationC(0);
    for (int hour = 0; hour < Timeline.HOURS; hour++) {
      double air = ambient.deviationC(hour);
      double target =
          running.at(hour)
              ? heat.baseC()
                  + heat.ambientShare() * air
                  - heat.speedC() * (1 - share[hour])
                  + rise[hour]
                  + unrest[hour]
              : ambient.meanC() + air;
      oilC = hour == 0 ? target : oilC + TRACKING_PER_HOUR * (target - oilC);
      temperatureTenths[hour] = (int) Math.round(10 * (oilC + READING_C * noise.gaussian()));
      double slip = 1 + 0.0015 * noise.gaussian();
      speedTenths[hour] =
          running.at(hour) ? (int) Math.round(10 * nominal * share[hour] * slip) : 0;
    }
    stick(story, bearing);
    lose(story.asset(), bearing);
  }

  static Map<String, String> registered(String asset, String bearing) {
    return Rows.of(Register.BEARINGS).stream()
        .filter(row -> Rows.text(row, "asset").equals(asset))
        .filter(row -> Rows.text(row, "bearing").equals(bearing))
        .findFirst()
        .orElseThrow();
  }

  private static double[] speedShare(AssetStory story, Running running) {
    Noise noise = Noise.named("speed", story.asset());
    AssetStory.Speed speed = story.speed();
    double[] share = new double[Timeline.HOURS];
    double now = noise.uniform(speed.low(), speed.high());
    for (int hour = 0; hour < share.length; hour++) {
      if (noise.chance(1 / (24 * speed.holdDays()))) {
        now = noise.uniform(speed.low(), speed.high());
      }
      share[hour] = running.at(hour) ? now : 0;
    }
    return share;
  }

  /** Warmth of fouled coolers and of steam that finds its way in. */
  private static double[] riseC(AssetStory story) {
    List<LocalDate> rounds = Rounds.of(story.asset());
    double[] rise = new double[Timeline.HOURS];
    int round = 0;
    for (int hour = 0; hour < rise.length; hour++) {
      LocalDate day = Timeline.day(hour);
      while (round < rounds.size() - 1 && day.isAfter(rounds.get(round))) {
        round++;
      }
      for (Influence.FouledCooler cooler : story.influences(Influence.FouledCooler.class)) {
        rise[hour] += cooler.riseC() * Timeline.passed(day, cooler.from(), cooler.until());
      }
      for (Influence.Steam steam : story.influences(Influence.Steam.class)) {
        double before = steam.strength(round - 1);
        LocalDate since = round == 0 ? Timeline.FIRST : rounds.get(round - 1);
        double share = Timeline.passed(day, since, rounds.get(round).minusDays(10));
        rise[hour] += STEAM_C * (before + share * (steam.strength(round) - before));
      }
    }
    return rise;
  }

  private void stick(AssetStory story, String bearing) {
    for (Influence.StuckSensor stuck : story.influences(Influence.StuckSensor.class)) {
      if (stuck.bearing().equals(bearing)) {
        int from = Timeline.hour(stuck.from());
        Arrays.fill(temperatureTenths, from, from + stuck.hours(), temperatureTenths[from]);
      }
    }
  }

  /** Gaps: of the sensor, of the whole data server once, and before a sensor was fitted. */
  private void lose(String asset, String bearing) {
    Noise noise = Noise.named("gaps", asset, bearing);
    double hour = noise.exponential(1500);
    while (hour < Timeline.HOURS) {
      int length = 2 + (int) noise.exponential(14);
      lose((int) hour, (int) hour + length);
      hour += length + noise.exponential(1500);
    }
    lose(Timeline.hour("2025-02-08") + 3, Timeline.hour("2025-02-09") + 9);
    if (asset.equals("UT-WP1")) {
      lose(0, Timeline.hour("2024-07-08") + 11);
    }
    if (asset.equals("PM-HXF") && bearing.equals("NDE")) {
      int[] broken = {4711, 4712, 9310, 13337, 13338, 13340};
      Arrays.stream(broken).forEach(at -> temperatureTenths[at] = 9999);
    }
  }

  private void lose(int from, int until) {
    Arrays.fill(logged, from, Math.min(until, logged.length), false);
  }
}
