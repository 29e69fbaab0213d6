package org.kappatrail.browser;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/** A history whose every name tries to be more than text. */
final class HostileSite {
  static final String MARKUP = "<img src=x onerror=alert(1)>";
  static final String FORMULA = "=cmd|' /C calc'!A0";
  static final String LONG = "roll ".repeat(60).strip();

  /** Arabic for pump, and an override that would turn all that follows it. */
  static final String LEFTWARD = "\u0645\u0636\u062E\u0629 \u202Egnp.elif";

  static final List<String> ASSETS = List.of(MARKUP, FORMULA, LONG, LEFTWARD);
  static final String AREA = "</style><script>window.ran = 1</script>";

  private static final String BEARING = "'\"><svg onload=alert(2)>";
  private static final String OIL = "68\" onmouseover=\"alert(3)";
  private static final String NOTE = "</text><script>alert(4)</script>";

  private HostileSite() {}

  static void write(Path folder) throws IOException {
    StringBuilder assets = new StringBuilder("asset,name,area,oil\n");
    StringBuilder bearings = new StringBuilder("asset,bearing,pitch_mm,speed_rpm\n");
    StringBuilder events = new StringBuilder("asset,date,event,note\n");
    StringBuilder samples =
        new StringBuilder("sample,asset,sampled_at,viscosity_40c_cst,temperature_c,water_ppm\n");
    for (String asset : ASSETS) {
      String id = cell(asset);
      assets.append(id).append(',').append(cell("]]>" + asset + "&amp;")).append(',');
      assets.append(cell(AREA)).append(',').append(cell(OIL)).append('\n');
      bearings.append(id).append(',').append(cell(BEARING)).append(",100,600\n");
      events.append(id).append(",2026-03-15,other,").append(cell(NOTE)).append('\n');
      for (int month = 1; month <= 6; month++) {
        samples.append(cell("<b>" + asset.length() + "-" + month + "</b>")).append(',').append(id);
        samples.append(",2026-0" + month + "-10," + (68 - month) + "," + (60 + month) + ",50\n");
      }
    }
    samples.append("<i>late</i>,<i>unknown asset</i>,2026-06-01,68,60,50\n");
    Files.createDirectories(folder.resolve("samples"));
    Files.writeString(folder.resolve("assets.csv"), assets);
    Files.writeString(folder.resolve("bearings.csv"), bearings);
    Files.writeString(folder.resolve("events.csv"), events);
    Files.writeString(folder.resolve("samples/lab.csv"), samples);
    Files.writeString(
        folder.resolve("oils.csv"),
        "oil,viscosity_40c_cst,viscosity_index\n" + cell(OIL) + ",68,98\n");
    Files.writeString(
        folder.resolve("kappatrail.yaml"), "site: '<script>window.ran = 1</script>'\n");
  }

  /** What is shown of a name: overrides of the writing direction go. */
  static String shown(String name) {
    return name.replace("\u202E", "");
  }

  private static String cell(String text) {
    return '"' + text.replace("\"", "\"\"") + '"';
  }
}
