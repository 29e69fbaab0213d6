package org.kappatrail.heldout;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.TreeMap;

/** Writes a site as a history folder; half of the logs stamp local time. */
final class SiteFiles {
  static final ZoneId ZONE = ZoneId.of("Europe/London");

  private SiteFiles() {}

  static void write(Site site, Path folder) throws IOException {
    put(folder, "kappatrail.yaml", "site: Held out\ntimezone: " + ZONE + "\n");
    StringBuilder oils =
        new StringBuilder("oil,viscosity_40c_cst,viscosity_100c_cst,viscosity_index\n");
    for (Site.Oil oil : site.oils()) {
      line(oils, oil.id(), oil.v40(), cell(oil.v100()), cell(oil.index()));
    }
    put(folder, "oils.csv", oils.toString());
    StringBuilder assets = new StringBuilder("asset,oil,supply,contamination_factor\n");
    for (Site.Asset asset : site.assets()) {
      String supply = asset.filtered() ? "inline-filter" : "bath";
      line(assets, asset.id(), asset.oil(), supply, cell(asset.contamination()));
    }
    put(folder, "assets.csv", assets.toString());
    put(folder, "bearings.csv", bearings(site));
    put(folder, "samples/laboratory.csv", samples(site));
    StringBuilder events = new StringBuilder("asset,date,event,oil\n");
    for (Site.Change change : site.changes()) {
      line(events, change.asset(), change.day(), "oil-change", change.oil());
    }
    put(folder, "events.csv", events.toString());
    Map<String, StringBuilder> logs = new TreeMap<>();
    for (Site.Reading reading : site.readings()) {
      boolean local = reading.asset().compareTo("g") > 0;
      StringBuilder log =
          logs.computeIfAbsent(
              reading.asset(),
              key -> new StringBuilder("time,asset,bearing,temperature_c,speed_rpm,quality\n"));
      line(
          log,
          local ? localTime(reading.at()) : reading.at(),
          reading.asset(),
          reading.bearing(),
          reading.temperature(),
          reading.speed(),
          reading.quality());
    }
    for (Map.Entry<String, StringBuilder> log : logs.entrySet()) {
      put(folder, "temperatures/" + log.getKey() + ".csv", log.getValue().toString());
    }
  }

  private static LocalDateTime localTime(Instant at) {
    return at.atZone(ZONE).toLocalDateTime();
  }

  private static String bearings(Site site) {
    StringBuilder text =
        new StringBuilder(
            "asset,bearing,type,bore_mm,outside_mm,pitch_mm,speed_rpm,dynamic_rating_kn,"
                + "static_rating_kn,fatigue_limit_kn,equivalent_load_kn,kappa_floor,"
                + "temperature_offset_c\n");
    for (Site.Ring ring : site.bearings()) {
      line(
          text,
          ring.asset(),
          ring.id(),
          ring.type(),
          cell(ring.bore()),
          cell(ring.outside()),
          cell(ring.pitch()),
          ring.rpm(),
          cell(ring.c()),
          cell(ring.c0()),
          cell(ring.cu()),
          cell(ring.p()),
          cell(ring.floor()),
          ring.offset());
    }
    return text.toString();
  }

  private static String samples(Site site) {
    StringBuilder text =
        new StringBuilder(
            "sample,asset,sampled_at,oil_hours,viscosity_40c_cst,viscosity_100c_cst,water_ppm,"
                + "iso_4406,particles_4um_per_ml,particles_6um_per_ml,particles_14um_per_ml,"
                + "temperature_c\n");
    for (Site.Bottle bottle : site.samples()) {
      line(
          text,
          bottle.id(),
          bottle.asset(),
          bottle.day(),
          bottle.oilHours(),
          bottle.v40(),
          bottle.v100(),
          bottle.water(),
          bottle.code(),
          bottle.count4(),
          bottle.count6(),
          bottle.count14(),
          bottle.temperature());
    }
    return text.toString();
  }

  private static void line(StringBuilder text, Object... cells) {
    for (int i = 0; i < cells.length; i++) {
      text.append(i == 0 ? "" : ",").append(cells[i]);
    }
    text.append('\n');
  }

  private static String cell(OptionalDouble value) {
    return value.isPresent() ? Double.toString(value.getAsDouble()) : "";
  }

  private static void put(Path folder, String name, String text) throws IOException {
    Path file = folder.resolve(name);
    Files.createDirectories(file.getParent());
    Files.writeString(file, text);
  }
}
