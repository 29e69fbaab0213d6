package org.kappatrail.demo;

import static org.kappatrail.demo.Laboratory.FELL;
import static org.kappatrail.demo.Laboratory.NORTH;
import static org.kappatrail.demo.Laboratory.decimals;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.kappatrail.tribology.Iso4406;

/** The laboratories' reports of thirty months, as files of their own layouts. */
final class SampleSheets {
  private static final String NORTH_HEADER =
      "sample,asset,sampled_at,received_on,laboratory,oil_hours,viscosity_40c_cst,"
          + "viscosity_100c_cst,water_ppm,particles_4um_per_ml,particles_6um_per_ml,"
          + "particles_14um_per_ml,iron_ppm,copper_ppm,silicon_ppm,zinc_ppm,phosphorus_ppm,"
          + "calcium_ppm,boron_ppm,acid_number_mg_koh_g";
  private static final String FELL_HEADER =
      "sample,asset,sampled_at,received_on,laboratory,oil_hours,viscosity_40c_cst,water_ppm,"
          + "iso_4406,iron_ppm,copper_ppm,silicon_ppm,zinc_ppm,phosphorus_ppm,calcium_ppm,"
          + "boron_ppm,acid_number_mg_koh_g,temperature_c";
  private static final LocalDate STOCK_PUMPS_MOVE_NORTH = LocalDate.of(2026, 1, 1);

  private final Map<String, Running> running = new LinkedHashMap<>();
  private final Map<String, OilTruth> truths = new LinkedHashMap<>();

  SampleSheets() {
    for (AssetStory story : Stories.all()) {
      Running times = new Running(story.asset());
      running.put(story.asset(), times);
      truths.put(story.asset(), new OilTruth(story, times));
    }
  }

  /** Text of each file by its name. */
  Map<String, String> files() {
    Map<String, Map<String, String>> rows = new TreeMap<>();
    for (int round = 0; round < Timeline.MONTHS; round++) {
      for (AssetStory story : Stories.all()) {
        if (!Rounds.forgotten(story.asset(), round)) {
          add(rows, story, round);
        }
      }
    }
    Map<String, String> files = new TreeMap<>();
    rows.forEach(
        (file, lines) -> {
          String header = file.startsWith("fell") ? FELL_HEADER : NORTH_HEADER;
          files.put(file, header + "\n" + String.join("\n", lines.values()) + "\n");
        });
    return files;
  }

  static Laboratory laboratory(String asset, LocalDate day) {
    boolean moves = asset.equals("SP-P3") || asset.equals("UT-WP1");
    boolean north =
        asset.startsWith("PM-")
            || asset.equals("SP-CRP")
            || asset.equals("UT-SCR")
            || (moves && !day.isBefore(STOCK_PUMPS_MOVE_NORTH));
    return north ? NORTH : FELL;
  }

  private void add(Map<String, Map<String, String>> files, AssetStory story, int round) {
    LocalDate day = Rounds.of(story.asset()).get(round);
    Noise noise = Noise.named("report", story.asset(), Integer.toString(round));
    boolean north = laboratory(story.asset(), day).equals(NORTH);
    String file =
        north
            ? (day.getYear() < 2026 ? "north-lab-2024-2025.csv" : "north-lab-2026.csv")
            : "fell-lab.csv";
    Map<String, String> rows = files.computeIfAbsent(file, key -> new TreeMap<>());
    String received = received(day, noise);
    int place = Stories.all().indexOf(story) + 1;
    String id =
        north
            ? String.format(
                Locale.ROOT, "N%02d-%03d%02d", day.getYear() % 100, day.getDayOfYear(), place)
            : String.format(Locale.ROOT, "F%d%02d", day.toEpochDay(), place);
    Bottle bottle = bottle(story, day, round);
    rows.put(
        day + id,
        north
            ? northRow(id, story.asset(), day, received, bottle, noise)
            : fellRow(id, story, day, received, bottle, noise));
  }

  /** The asset's own bottle, or its neighbour's where the two were mixed up. */
  private Bottle bottle(AssetStory story, LocalDate day, int round) {
    AssetStory source = story;
    for (AssetStory other : Stories.all()) {
      for (Influence.Swap swap : other.influences(Influence.Swap.class)) {
        if (swap.month().equals(day.withDayOfMonth(1))) {
          if (other.equals(story)) {
            source = Stories.of(swap.other());
          } else if (swap.other().equals(story.asset())) {
            source = other;
          }
        }
      }
    }
    return Bottle.at(source, truth(source.asset()), round);
  }

  private OilTruth truth(String asset) {
    OilTruth truth = truths.get(asset);
    if (truth == null) {
      throw new IllegalArgumentException("no asset " + asset);
    }
    return truth;
  }

  private String northRow(
      String id, String asset, LocalDate day, String received, Bottle bottle, Noise noise) {
    String clock =
        String.format(
            Locale.ROOT,
            "T%02d:%02d",
            8 + (int) (6 * noise.uniform()),
            5 * (int) (12 * noise.uniform()));
    List<String> cells = new ArrayList<>(List.of(id, asset, day + clock, received, NORTH.label()));
    cells.add(gap(NORTH, 0.02, decimals(truth(asset).countedHours(day), 0), noise));
    cells.add(NORTH.viscosity40(bottle.oil().viscosity40Cst(), noise));
    cells.add(gap(NORTH, 0.02, NORTH.viscosity100(bottle.oil().viscosity100Cst(), noise), noise));
    cells.add(gap(NORTH, 0.01, NORTH.water(bottle.waterPpm(), noise), noise));
    double counter = noise.uniform();
    for (double count :
        new double[] {bottle.particles4um(), bottle.particles6um(), bottle.particles14um()}) {
      String text = decimals(count * Math.exp(0.05 * noise.gaussian()), count < 100 ? 1 : 0);
      cells.add(counter < 0.02 ? NORTH.missing() : text);
    }
    elements(cells, NORTH, bottle, noise);
    return String.join(",", cells);
  }

  private String fellRow(
      String id, AssetStory story, LocalDate day, String received, Bottle bottle, Noise noise) {
    List<String> cells =
        new ArrayList<>(List.of(id, story.asset(), day.toString(), received, FELL.label()));
    cells.add(gap(FELL, 0.03, decimals(truth(story.asset()).countedHours(day), 0), noise));
    cells.add(FELL.viscosity40(bottle.oil().viscosity40Cst(), noise));
    cells.add(gap(FELL, 0.02, FELL.water(bottle.waterPpm(), noise), noise));
    String code =
        Iso4406.code(
                OptionalDouble.of(bottle.particles4um() * Math.exp(0.07 * noise.gaussian())),
                OptionalDouble.of(bottle.particles6um() * Math.exp(0.07 * noise.gaussian())),
                OptionalDouble.of(bottle.particles14um() * Math.exp(0.07 * noise.gaussian())))
            .toString();
    cells.add(gap(FELL, 0.02, code, noise));
    elements(cells, FELL, bottle, noise);
    double handHeldC =
        story.bearings().get(0).baseC()
            + story.bearings().get(0).ambientShare()
                * Ambient.of(story.asset()).deviationC(Timeline.hour(day) + 11)
            + 1.2 * noise.gaussian();
    cells.add(gap(FELL, 0.35, decimals(handHeldC, 0), noise));
    return String.join(",", cells);
  }

  private static void elements(
      List<String> cells, Laboratory laboratory, Bottle bottle, Noise noise) {
    cells.add(laboratory.element(bottle.ironPpm(), noise));
    cells.add(laboratory.element(bottle.copperPpm(), noise));
    cells.add(gap(laboratory, 0.02, laboratory.element(bottle.siliconPpm(), noise), noise));
    bottle.oil().additivesPpm().values().forEach(ppm -> cells.add(laboratory.element(ppm, noise)));
    String acid = laboratory.acidNumber(bottle.oil().acidNumber(), noise);
    cells.add(gap(laboratory, 0.03, acid, noise));
  }

  private static String received(LocalDate day, Noise noise) {
    double late = noise.uniform();
    int days = 4 + (int) (5 * noise.uniform()) + (late < 0.04 ? 21 : 0);
    return late > 0.98 ? "" : day.plusDays(days).toString();
  }

  private static String gap(Laboratory laboratory, double probability, String text, Noise noise) {
    return noise.chance(probability) ? laboratory.missing() : text;
  }
}
