package org.kappatrail.demo;

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
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.cli.Kappatrail;

/**
 * The review of the whole demo site finds the story of PM-DRY: steam brings water and warmth, which
 * thins the film at once; particles and iron follow one sample later.
 */
@Tag("slow")
class SteamAtTheDryersTest {
  private static final Clock CLOCK =
      Clock.fixed(Instant.parse("2026-11-02T08:00:00Z"), ZoneOffset.UTC);

  @TempDir static Path out;

  private static Path pack;

  @BeforeAll
  static void review() {
    StringWriter said = new StringWriter();
    PrintWriter writer = new PrintWriter(said);
    int code =
        new Kappatrail(writer, writer, false, CLOCK)
            .run("review", "sample-history", "--out", out.toString(), "--no-charts");
    assertThat(code).as(said.toString()).isZero();
    pack = out.resolve("2026-10-28");
  }

  @Test
  void waterComesWithThinFilmsAndIronAndParticlesFollowByOneSample() throws IOException {
    List<NamedCsvRecord> dryers =
        rows().stream().filter(row -> is(row, "asset", "PM-DRY")).toList();
    assertThat(called(dryers, "kappa", "water_ppm")).containsExactly("0");
    assertThat(called(dryers, "kappa", "iron_ppm")).containsExactly("1");
    assertThat(called(dryers, "kappa", "particles_6um_per_ml")).containsExactly("1");
    assertThat(called(dryers, "temperature_c", "water_ppm")).containsExactly("0");
    assertThat(coefficient(dryers, "kappa", "water_ppm", "0")).isLessThan(-0.5);
    assertThat(coefficient(dryers, "kappa", "iron_ppm", "1")).isLessThan(-0.5);
    assertThat(coefficient(dryers, "temperature_c", "water_ppm", "0")).isGreaterThan(0.5);
    assertThat(page())
        .contains("<li>Water moves against κ (")
        .contains("<li>Iron follows κ by one sample (");
  }

  /** The bottles of SP-AG1 and SP-PGB were swapped once; that is one sample, not a link. */
  @Test
  void theSwappedBottlesMakeNoLinkBetweenAdditivesInTheFleet() throws IOException {
    List<NamedCsvRecord> fleet = rows().stream().filter(row -> is(row, "scope", "fleet")).toList();
    assertThat(coefficient(fleet, "boron_ppm", "zinc_ppm", "0")).isLessThan(-0.9);
    assertThat(called(fleet, "boron_ppm", "zinc_ppm")).isEmpty();
  }

  /** PM-RGB, PM-VP1 and UT-WP1 are plainly healthy: κ there goes with nothing but its own parts. */
  @Test
  void nothingGoesWithKappaWhereNothingHappens() throws IOException {
    for (String asset : List.of("PM-RGB", "PM-VP1", "UT-WP1")) {
      assertThat(rows())
          .filteredOn(row -> is(row, "asset", asset) && is(row, "form", "measured"))
          .filteredOn(row -> row.getField("x").startsWith("kappa"))
          .filteredOn(SteamAtTheDryersTest::sure)
          .isEmpty();
    }
  }

  private static List<String> called(List<NamedCsvRecord> rows, String x, String y) {
    return rows.stream()
        .filter(row -> is(row, "x", x) && is(row, "y", y) && is(row, "form", "measured"))
        .filter(SteamAtTheDryersTest::sure)
        .map(row -> row.getField("lag"))
        .toList();
  }

  private static double coefficient(List<NamedCsvRecord> rows, String x, String y, String lag) {
    return rows.stream()
        .filter(row -> is(row, "x", x) && is(row, "y", y) && is(row, "lag", lag))
        .filter(row -> is(row, "form", "measured"))
        .mapToDouble(row -> Double.parseDouble(row.getField("coefficient")))
        .findFirst()
        .orElseThrow();
  }

  private static boolean sure(NamedCsvRecord row) {
    String q = row.getField("q");
    return !q.isEmpty() && Double.parseDouble(q) <= 0.05;
  }

  private static boolean is(NamedCsvRecord row, String column, String value) {
    return row.getField(column).equals(value);
  }

  private static List<NamedCsvRecord> rows() throws IOException {
    try (CsvReader<NamedCsvRecord> reader =
        CsvReader.builder().ofNamedCsvRecord(pack.resolve("correlations.csv"))) {
      return reader.stream().toList();
    }
  }

  private static String page() throws IOException {
    return Files.readString(pack.resolve("index.html"));
  }
}
