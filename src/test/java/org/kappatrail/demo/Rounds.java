package org.kappatrail.demo;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;

/** The days on which an area's samples are drawn: once a month, a working day near its end. */
final class Rounds {
  private static final double FORGOTTEN = 0.025;

  private Rounds() {}

  /** Round days of the area to which an asset belongs. */
  static List<LocalDate> of(String asset) {
    String area = asset.substring(0, 2);
    Noise noise = Noise.named("rounds", area);
    List<LocalDate> days = new ArrayList<>();
    for (int month = 0; month < Timeline.MONTHS; month++) {
      LocalDate first = Timeline.FIRST.plusMonths(month);
      int day = 22 + (int) (noise.uniform() * 7);
      if (first.getMonthValue() == 12) {
        day -= 9;
      } else if (month == Timeline.MONTHS - 1) {
        day = area.equals("PM") ? 26 : area.equals("SP") ? 27 : 28;
      }
      LocalDate round = first.withDayOfMonth(day);
      days.add(round.minusDays(Math.max(0, round.getDayOfWeek().getValue() - 5)));
    }
    return List.copyOf(days);
  }

  /** True where the asset was left out of that round. */
  static boolean forgotten(String asset, int round) {
    boolean free = round > 1 && round < Timeline.MONTHS - 6;
    return free && Noise.named("forgotten", asset, Integer.toString(round)).chance(FORGOTTEN);
  }
}
