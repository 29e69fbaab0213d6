package org.kappatrail.heldout;

import static org.assertj.core.api.Assertions.assertThat;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.kappatrail.cli.Kappatrail;

/** The tolerances are the ones that the program promises: they are not widened to pass. */
@Tag("slow")
class HeldOutHistoryTest {
  private static final Clock CLOCK =
      Clock.fixed(Instant.parse("2025-07-20T12:00:00Z"), ZoneOffset.UTC);

  private static final Map<String, Double> OF_SAMPLES =
      Map.ofEntries(
          Map.entry("temperature_c", 0.006),
          Map.entry("speed_rpm", 0.005),
          Map.entry("viscosity_40c_cst", 1e-5),
          Map.entry("viscosity_100c_cst", 0.02),
          Map.entry("operating_viscosity_cst", 0.02),
          Map.entry("rated_viscosity_cst", 0.02),
          Map.entry("kappa", 0.02),
          Map.entry("kappa_reference", 0.02),
          Map.entry("kappa_low", 0.03),
          Map.entry("kappa_high", 0.03),
          Map.entry("contamination_factor", 0.02),
          Map.entry("life_modification", 0.08),
          Map.entry("rating_life_h", 0.08),
          Map.entry("running_hours", 1e-5),
          Map.entry("water_life_factor", 1e-5));

  private static final Map<String, Double> OF_DAYS =
      Map.of(
          "temperature_c",
          0.006,
          "speed_rpm",
          0.005,
          "running_hours",
          1e-5,
          "kappa",
          0.02,
          "kappa_p05",
          0.02,
          "kappa_p95",
          0.02);

  @TempDir Path folder;

  @ParameterizedTest
  @ValueSource(longs = {1, 20250610, 77})
  void everyNumberAgreesWithBruteForceOnTheRawReadings(long seed) throws IOException {
    Site site = SeededSite.of(seed);
    Path pack = review(site);
    Deviations samples = new Deviations();
    Deviations days = new Deviations();
    Map<String, Map<String, NamedCsvRecord>> history =
        byBearing(rows(pack, "kappa-history"), "sample");
    Map<String, Map<String, NamedCsvRecord>> daily = byBearing(rows(pack, "kappa-daily"), "date");
    int films = 0;
    for (Site.Ring ring : site.bearings()) {
      String key = ring.asset() + " " + ring.id();
      PlainTrail plain = new PlainTrail(site, asset(site, ring), ring);
      Map<String, Map<String, String>> expected = plain.samples();
      Map<String, NamedCsvRecord> found = history.getOrDefault(key, Map.of());
      assertThat(found.keySet()).as(key).isEqualTo(expected.keySet());
      expected.forEach((id, row) -> compareSample(samples, key + " " + id, row(found, id), row));
      films += (int) expected.values().stream().filter(row -> row.containsKey("sigma")).count();
      Map<String, Map<String, String>> expectedDays = plain.days();
      Map<String, NamedCsvRecord> foundDays = daily.getOrDefault(key, Map.of());
      assertThat(foundDays.keySet()).as(key).isEqualTo(expectedDays.keySet());
      expectedDays.forEach(
          (day, row) -> compare(days, key + " " + day, row(foundDays, day), row, OF_DAYS));
    }
    keep(seed, samples, days);
    assertThat(films).isGreaterThan(50);
    assertThat(samples.beyond()).isEmpty();
    assertThat(days.beyond()).isEmpty();
  }

  @ParameterizedTest
  @ValueSource(longs = 5)
  void noFilmIsInventedWithoutATemperature(long seed) throws IOException {
    Site site = SeededSite.of(seed);
    Path pack = review(site);
    List<NamedCsvRecord> none =
        rows(pack, "kappa-history").stream()
            .filter(row -> row.getField("temperature_source").equals("none"))
            .toList();
    assertThat(none).isNotEmpty();
    List<NamedCsvRecord> findings = rows(pack, "findings");
    for (NamedCsvRecord row : none) {
      assertThat(row.getField("temperature_c")).isEmpty();
      for (String column : Deviations.OF_A_FILM) {
        assertThat(row.getField(column)).as(row + " " + column).isEmpty();
      }
      assertThat(findings)
          .as(row.toString())
          .anySatisfy(
              finding -> {
                assertThat(finding.getField("finding")).isEqualTo("no-temperature");
                assertThat(finding.getField("asset")).isEqualTo(row.getField("asset"));
                assertThat(finding.getField("bearing")).isEqualTo(row.getField("bearing"));
                assertThat(finding.getField("sample")).isIn("", row.getField("sample"));
              });
    }
  }

  private static void compareSample(
      Deviations deviations, String where, NamedCsvRecord found, Map<String, String> expected) {
    for (String column : List.of("charge", "oil", "temperature_source", "viscosity_100c_source")) {
      deviations.same(where, column, found.getField(column), text(expected, column));
    }
    compare(deviations, where, found, expected, OF_SAMPLES);
    if (!expected.containsKey("sigma")) {
      return;
    }
    double kappa = Double.parseDouble(text(expected, "kappa"));
    double sigma = Double.parseDouble(text(expected, "sigma"));
    double chance = Double.parseDouble(text(expected, "probability_below_floor"));
    // κ may be 2 % off, which moves the probability by at most φ(0)·0.02/σ
    assertThat(Double.parseDouble(found.getField("probability_below_floor")))
        .as(where)
        .isBetween(chance - 0.4 * 0.02 / sigma, chance + 0.4 * 0.02 / sigma);
    if (Math.abs(kappa - 1) > 0.02 && Math.abs(kappa - 0.1) > 0.002) {
      deviations.same(where, "regime", found.getField("regime"), text(expected, "regime"));
    }
    double low = Double.parseDouble(text(expected, "kappa_low"));
    if (List.of(1.0, 0.8, 1.3, 1.5).stream()
        .noneMatch(floor -> near(kappa, floor) || near(low, floor))) {
      deviations.same(where, "level", found.getField("level"), text(expected, "level"));
    }
  }

  private static boolean near(double kappa, double floor) {
    return Math.abs(kappa / floor - 1) < 0.03;
  }

  private static void compare(
      Deviations deviations,
      String where,
      NamedCsvRecord found,
      Map<String, String> expected,
      Map<String, Double> tolerances) {
    tolerances.forEach(
        (column, tolerance) ->
            deviations.compare(
                where, column, found.getField(column), text(expected, column), tolerance));
    String mixed = found.getField("mixed_hours");
    if (text(expected, "mixed_hours_known").isEmpty()) {
      deviations.same(where, "mixed_hours", mixed, "");
    } else {
      deviations.between(
          where,
          "mixed_hours",
          mixed,
          text(expected, "mixed_hours_least"),
          text(expected, "mixed_hours_most"));
    }
  }

  private static String text(Map<String, String> row, String column) {
    return row.getOrDefault(column, "");
  }

  private Path review(Site site) throws IOException {
    Path history = folder.resolve("history");
    SiteFiles.write(site, history);
    StringWriter err = new StringWriter();
    int code =
        new Kappatrail(new PrintWriter(new StringWriter()), new PrintWriter(err), false, CLOCK)
            .run(
                "review",
                history.toString(),
                "--no-charts",
                "--out",
                folder.resolve("out").toString(),
                "--as-of",
                site.asOf().toString());
    assertThat(err.toString()).isEmpty();
    assertThat(code).isZero();
    return folder.resolve("out").resolve(site.asOf().toString());
  }

  /** Leaves the worst deviations beside the test reports, to be stated as they are. */
  private static void keep(long seed, Deviations samples, Deviations days) throws IOException {
    String text = "samples " + samples.worst() + "\ndays " + days.worst() + "\n";
    Files.writeString(Path.of("target", "held-out-" + seed + ".txt"), text);
  }

  private static Site.Asset asset(Site site, Site.Ring ring) {
    return site.assets().stream()
        .filter(asset -> asset.id().equals(ring.asset()))
        .findFirst()
        .orElseThrow();
  }

  private static List<NamedCsvRecord> rows(Path pack, String table) throws IOException {
    try (CsvReader<NamedCsvRecord> reader =
        CsvReader.builder().ofNamedCsvRecord(pack.resolve(table + ".csv"))) {
      return reader.stream().toList();
    }
  }

  private static NamedCsvRecord row(Map<String, NamedCsvRecord> rows, String id) {
    return Optional.ofNullable(rows.get(id)).orElseThrow();
  }

  private static Map<String, Map<String, NamedCsvRecord>> byBearing(
      List<NamedCsvRecord> rows, String id) {
    Map<String, Map<String, NamedCsvRecord>> byBearing = new TreeMap<>();
    for (NamedCsvRecord row : rows) {
      byBearing
          .computeIfAbsent(
              row.getField("asset") + " " + row.getField("bearing"), key -> new TreeMap<>())
          .put(row.getField(id), row);
    }
    return byBearing;
  }
}
