package org.kappatrail.demo;

import java.time.ZoneOffset;
import java.util.Map;
import java.util.TreeMap;

/** The areas' temperature and speed logs as text, bearing by bearing. */
final class LogSheets {
  private LogSheets() {}

  /** Text of each file by its name without the ending of the compression. */
  static Map<String, String> files() {
    Map<String, StringBuilder> texts = new TreeMap<>();
    for (AssetStory story : Stories.all()) {
      StringBuilder text =
          texts.computeIfAbsent(
              file(story.asset()),
              key -> new StringBuilder("time,asset,bearing,temperature_c,speed_rpm\n"));
      Running running = new Running(story.asset());
      for (AssetStory.BearingHeat bearing : story.bearings()) {
        append(
            text, story.asset(), bearing.bearing(), new HeatLog(story, bearing.bearing(), running));
      }
    }
    Map<String, String> files = new TreeMap<>();
    texts.forEach((file, text) -> files.put(file, text.toString()));
    return files;
  }

  private static String file(String asset) {
    return switch (asset.substring(0, 2)) {
      case "PM" -> "paper-machine.csv";
      case "SP" -> "stock-preparation.csv";
      default -> "utilities.csv";
    };
  }

  /** The paper machine's server stamps local time without an offset, the others universal time. */
  private static void append(StringBuilder text, String asset, String bearing, HeatLog log) {
    boolean local = asset.startsWith("PM-");
    boolean withSpeed = !bearing.equals("GUIDE");
    for (int hour = 0; hour < Timeline.HOURS; hour++) {
      if (log.logged[hour]) {
        text.append(
            local
                ? Timeline.instant(hour).atZone(Timeline.ZONE).toLocalDateTime().toString()
                : Timeline.instant(hour).atOffset(ZoneOffset.UTC).toString());
        text.append(',').append(asset).append(',').append(bearing).append(',');
        tenths(text, log.temperatureTenths[hour]).append(',');
        if (withSpeed) {
          tenths(text, log.speedTenths[hour]);
        }
        text.append('\n');
      }
    }
  }

  private static StringBuilder tenths(StringBuilder text, int tenths) {
    if (tenths < 0) {
      text.append('-');
    }
    return text.append(Math.abs(tenths) / 10).append('.').append(Math.abs(tenths) % 10);
  }
}
