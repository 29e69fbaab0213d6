package org.kappatrail.duty;

import java.io.BufferedWriter;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.Locale;
import java.util.Random;

/**
 * A made-up fleet that is sampled and has no logs, the same for the same numbers: every asset has
 * two bearings and a sample a month, whose oil thins, takes up water and wear, and is changed every
 * two years.
 *
 * @param assets number of assets
 * @param samplesPerAsset samples of each
 * @param seed changes every result
 */
record SampleFleet(int assets, int samplesPerAsset, long seed) {
  private static final LocalDate START = LocalDate.of(2021, 1, 4);
  private static final int DAYS_BETWEEN = 30;
  private static final int SAMPLES_PER_CHARGE = 24;
  private static final int ASSETS_PER_FILE = 500;
  private static final String HEADER =
      "sample,asset,sampled_at,received_on,laboratory,oil_hours,viscosity_40c_cst,water_ppm,"
          + "iso_4406,iron_ppm,copper_ppm,silicon_ppm,zinc_ppm,acid_number_mg_koh_g,"
          + "temperature_c\n";

  long samples() {
    return (long) assets * samplesPerAsset;
  }

  /** Writes the history folder. */
  void write(Path folder) throws IOException {
    Files.createDirectories(folder.resolve("samples"));
    Files.writeString(folder.resolve("kappatrail.yaml"), "site: Bench\ntimezone: Europe/London\n");
    Files.writeString(
        folder.resolve("oils.csv"),
        "oil,viscosity_40c_cst,viscosity_index,zinc_ppm\nVG 150,150,97,400\nVG 220,220,96,400\n");
    writeRegister(folder);
    for (int first = 0; first < assets; first += ASSETS_PER_FILE) {
      writeSamples(folder, first, Math.min(first + ASSETS_PER_FILE, assets));
    }
  }

  private void writeRegister(Path folder) throws IOException {
    StringBuilder register = new StringBuilder("asset,oil,oil_volume_l\n");
    StringBuilder bearings =
        new StringBuilder(
            "asset,bearing,type,pitch_mm,speed_rpm,dynamic_rating_kn,static_rating_kn,"
                + "equivalent_load_kn\n");
    StringBuilder events = new StringBuilder("asset,date,event\n");
    for (int asset = 0; asset < assets; asset++) {
      register.append(id(asset)).append(',').append(oil(asset)).append(",40\n");
      for (String bearing : new String[] {"DE", "NDE"}) {
        bearings.append(
            String.format(
                Locale.ROOT,
                "%s,%s,radial-roller,%d,%d,300,400,25%n",
                id(asset),
                bearing,
                bearing.equals("DE") ? 140 : 120,
                300 + 10 * (asset % 150)));
      }
      for (int sample = SAMPLES_PER_CHARGE;
          sample < samplesPerAsset;
          sample += SAMPLES_PER_CHARGE) {
        events
            .append(id(asset))
            .append(',')
            .append(START.plusDays((long) sample * DAYS_BETWEEN - DAYS_BETWEEN / 2))
            .append(",oil-change\n");
      }
    }
    Files.writeString(folder.resolve("assets.csv"), register);
    Files.writeString(folder.resolve("bearings.csv"), bearings);
    Files.writeString(folder.resolve("events.csv"), events);
  }

  private void writeSamples(Path folder, int from, int to) throws IOException {
    String name = String.format(Locale.ROOT, "samples/north-%04d.csv", from);
    try (BufferedWriter out = Files.newBufferedWriter(folder.resolve(name))) {
      out.write(HEADER);
      for (int asset = from; asset < to; asset++) {
        Random random = new Random(seed * 1_000_003 + asset);
        double thinning = asset % 3 == 0 ? 0.004 : 0.0005;
        for (int sample = 0; sample < samplesPerAsset; sample++) {
          out.write(row(asset, sample, thinning, random));
        }
      }
    }
  }

  private static String row(int asset, int sample, double thinning, Random random) {
    int age = sample % SAMPLES_PER_CHARGE;
    LocalDate day = START.plusDays((long) sample * DAYS_BETWEEN + asset % 7);
    double fresh = asset % 2 == 0 ? 150 : 220;
    return String.format(
        Locale.ROOT,
        "N%05d-%03d,%s,%s,%s,North Lab,%d,%.1f,%.0f,%d/%d/%d,%.0f,%.0f,%.0f,%.0f,%.2f,%.1f%n",
        asset,
        sample,
        id(asset),
        day,
        day.plusDays(5),
        age * 500 + 100,
        fresh * (1 - thinning * age) * (1 + 0.005 * random.nextGaussian()),
        60 + 4 * age + 30 * random.nextDouble(),
        18 + random.nextInt(3),
        16 + random.nextInt(2),
        12 + random.nextInt(2),
        4 + 0.5 * age + 2 * random.nextDouble(),
        2 + 0.1 * age + random.nextDouble(),
        3 + 2 * random.nextDouble(),
        400 - age + 8 * random.nextGaussian(),
        0.3 + 0.01 * age + 0.02 * random.nextDouble(),
        62
            + asset % 29
            + 5 * Math.sin(2 * Math.PI * day.getDayOfYear() / 365.25)
            + random.nextGaussian());
  }

  private static String id(int asset) {
    return String.format(Locale.ROOT, "A%05d", asset);
  }

  private static String oil(int asset) {
    return asset % 2 == 0 ? "VG 150" : "VG 220";
  }
}
