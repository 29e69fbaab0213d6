package org.kappatrail.report;

import static org.assertj.core.api.Assertions.assertThat;

import de.siegmar.fastcsv.writer.CsvWriter;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.kappatrail.cli.Run;

/** A small history folder with machines of any names; every third one's oil thins. */
final class FleetFiles {
  /** Names that must stand as text wherever they are shown. */
  static final List<String> HOSTILE =
      List.of(
          "<img src=x onerror=alert(1)>",
          "=cmd|'/C calc'!A1",
          "Long " + "machine hall roller ".repeat(14) + "and its end",
          "Unbroken" + "x".repeat(292),
          "מכונת נייר 7",
          "ضخ\u202Egnp.exe",
          "-2+3",
          "@sum(A1)",
          "a&b\"c'd]]>&amp;<!--");

  private static final int SAMPLES = 14;

  private FleetFiles() {}

  /** Machines P01, P02… with these names. */
  static void write(Path folder, List<String> names) throws IOException {
    List<String> ids = new ArrayList<>();
    for (int i = 0; i < names.size(); i++) {
      ids.add(String.format(Locale.ROOT, "P%02d", i + 1));
    }
    write(folder, ids, names);
  }

  /** Reviews a folder without charts and gives the pack's place. */
  static Path review(Path site, Path out) throws IOException {
    Run run = Run.of("review", site.toString(), "--no-charts", "--out", out.toString());
    assertThat(run.err()).isEmpty();
    try (Stream<Path> packs = Files.list(out)) {
      return packs.findFirst().orElseThrow();
    }
  }

  static void write(Path folder, List<String> ids, List<String> names) throws IOException {
    Files.createDirectories(folder.resolve("samples"));
    Files.writeString(
        folder.resolve("kappatrail.yaml"),
        """
        site: Tarn Hollow
        limits: {kappa-floor: 1.0, water-ppm: 300, iso-4406: 18/16/13}
        """);
    Files.writeString(
        folder.resolve("oils.csv"),
        """
        oil,viscosity_40c_cst,viscosity_index,grade_vg
        circulating-150,150,96,150
        circulating-220,220,96,220
        """);
    try (CsvWriter assets = CsvWriter.builder().build(folder.resolve("assets.csv"));
        CsvWriter bearings = CsvWriter.builder().build(folder.resolve("bearings.csv"));
        CsvWriter events = CsvWriter.builder().build(folder.resolve("events.csv"));
        CsvWriter samples = CsvWriter.builder().build(folder.resolve("samples/lab.csv"))) {
      assets.writeRecord("asset", "name", "area", "oil", "change_cost", "failure_cost");
      bearings.writeRecord(
          "asset",
          "bearing",
          "type",
          "speed_rpm",
          "pitch_mm",
          "dynamic_rating_kn",
          "static_rating_kn",
          "equivalent_load_kn");
      events.writeRecord("asset", "date", "event", "oil");
      samples.writeRecord(
          "sample",
          "asset",
          "sampled_at",
          "viscosity_40c_cst",
          "temperature_c",
          "water_ppm",
          "iso_4406");
      for (int i = 0; i < ids.size(); i++) {
        String id = ids.get(i);
        assets.writeRecord(id, names.get(i), names.get(i), "circulating-150", "400", "90000");
        for (String end : List.of("DE", "NDE")) {
          bearings.writeRecord(
              id,
              end,
              "radial-roller",
              end.equals("DE") ? "300" : "420",
              "200",
              "550",
              "800",
              "90");
        }
        events.writeRecord(id, "2025-02-03", "oil-change", "circulating-150");
        for (int month = 0; month < SAMPLES; month++) {
          samples.writeRecord(sample(i, id, month));
        }
      }
    }
  }

  private static String[] sample(int machine, String id, int month) {
    LocalDate day = LocalDate.of(2025, 2, 10).plusMonths(month).plusDays(machine % 5);
    double thinning = machine % 3 == 0 ? 1 - 0.025 * month : 1 - 0.002 * (month % 2);
    return new String[] {
      "S-" + machine + "-" + month,
      id,
      day.toString(),
      String.format(Locale.ROOT, "%.1f", 150 * thinning),
      String.format(Locale.ROOT, "%.1f", 62 + 4.0 * (machine % 5) + (month % 3)),
      month % 4 == 0 ? "<20" : Integer.toString(60 + 7 * month),
      15 + month % 3 + "/" + (13 + month % 2) + "/11"
    };
  }
}
