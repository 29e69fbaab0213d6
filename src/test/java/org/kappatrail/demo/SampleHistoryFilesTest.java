package org.kappatrail.demo;

import static org.assertj.core.api.Assertions.assertThat;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.OffsetDateTime;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import java.util.zip.GZIPInputStream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.kappatrail.history.EventKind;
import org.kappatrail.tribology.BearingType;
import org.kappatrail.tribology.CleanlinessCode;
import org.kappatrail.tribology.Iso3448;
import org.kappatrail.tribology.OilSupply;

class SampleHistoryFilesTest {
  private static final Path FOLDER = Path.of("sample-history");
  private static final long MOST_BYTES = 8_000_000;
  private static final String NUMBER = "[<>]?-?\\d+(\\.\\d+)?";

  @Test
  void makingTheTablesAgainGivesTheCommittedBytes() throws IOException {
    for (Map.Entry<String, byte[]> table : TarnHollow.tables().entrySet()) {
      assertThat(text(Files.readAllBytes(FOLDER.resolve(table.getKey()))))
          .as(table.getKey())
          .isEqualTo(text(table.getValue()));
    }
  }

  /** Compression may differ from one build of the compressor to another; what it holds may not. */
  @Test
  @Tag("slow")
  void makingTheLogsAgainGivesTheCommittedReadings() throws IOException {
    for (Map.Entry<String, byte[]> log : TarnHollow.logs().entrySet()) {
      byte[] committed = Files.readAllBytes(FOLDER.resolve(log.getKey()));
      assertThat(Arrays.equals(unpacked(committed), unpacked(log.getValue())))
          .as(log.getKey())
          .isTrue();
    }
  }

  @Test
  @Tag("slow")
  void compressedLogsCarryNoTimeAndComeOutTheSameTwice() {
    Map<String, byte[]> first = TarnHollow.logs();
    Map<String, byte[]> second = TarnHollow.logs();
    assertThat(first.keySet()).isEqualTo(second.keySet()).hasSize(3);
    first.forEach(
        (name, bytes) -> {
          assertThat(bytes).as(name).isEqualTo(second.get(name));
          // RFC 1952, 2.3: bytes 4 to 7 are the time of modification
          assertThat(Arrays.copyOfRange(bytes, 4, 8)).as(name).containsOnly(0);
        });
  }

  @Test
  void theFolderHoldsWhatTheGeneratorMakesAndStaysSmall() throws IOException {
    Map<String, Long> sizes = new TreeMap<>();
    try (Stream<Path> paths = Files.walk(FOLDER)) {
      for (Path path : paths.filter(Files::isRegularFile).toList()) {
        String name = FOLDER.relativize(path).toString().replace('\\', '/');
        sizes.put(name, Files.size(path));
      }
    }
    assertThat(sizes.keySet())
        .containsExactlyInAnyOrder(
            "README.md",
            "kappatrail.yaml",
            "assets.csv",
            "bearings.csv",
            "oils.csv",
            "events.csv",
            "samples/fell-lab.csv",
            "samples/north-lab-2024-2025.csv",
            "samples/north-lab-2026.csv",
            "temperatures/paper-machine.csv.gz",
            "temperatures/stock-preparation.csv.gz",
            "temperatures/utilities.csv.gz");
    assertThat(sizes.values().stream().mapToLong(Long::longValue).sum()).isLessThan(MOST_BYTES);
  }

  @Test
  void everyRegisterRowIsOfTheKindsThatTheProgramKnows() {
    List<String> oils = column("oils.csv", "oil");
    List<String> assets = column("assets.csv", "asset");
    assertThat(assets).hasSize(15).doesNotHaveDuplicates();
    assertThat(column("assets.csv", "oil")).allMatch(oils::contains);
    assertThat(column("assets.csv", "supply")).allMatch(text -> OilSupply.parse(text).isPresent());
    assertThat(rows("bearings.csv")).hasSize(23);
    assertThat(column("bearings.csv", "asset")).allMatch(assets::contains);
    assertThat(column("bearings.csv", "type").stream().map(BearingType::parse))
        .doesNotContain(Optional.empty())
        .extracting(Optional::get)
        .contains(BearingType.values());
    assertThat(column("events.csv", "asset")).allMatch(assets::contains);
    assertThat(column("events.csv", "event")).allMatch(text -> EventKind.find(text).isPresent());
    assertThat(column("events.csv", "date")).isSorted().allMatch(day -> !day.isBlank());
    assertThat(column("events.csv", "oil")).allMatch(oil -> oil.isEmpty() || oils.contains(oil));
  }

  /** Grades of ISO 3448: the viscosity at 40 °C lies within 10 % of the number. */
  @Test
  void freshOilsLieWithinTheirGrades() {
    for (NamedCsvRecord oil : rows("oils.csv")) {
      int grade = Integer.parseInt(oil.getField("grade_vg"));
      double viscosityCst = Double.parseDouble(oil.getField("viscosity_40c_cst"));
      assertThat(Iso3448.find(grade)).as(oil.getField("oil")).isPresent();
      assertThat(Iso3448.find(grade).orElseThrow().contains(viscosityCst)).isTrue();
    }
  }

  @Test
  void everySampleRowParses() {
    List<NamedCsvRecord> samples = SampleHistory.samples();
    assertThat(samples).hasSizeBetween(420, 450);
    assertThat(samples.stream().map(row -> row.getField("sample"))).doesNotHaveDuplicates();
    for (NamedCsvRecord row : samples) {
      LocalDate drawn = LocalDate.parse(row.getField("sampled_at").substring(0, 10));
      assertThat(drawn).isBetween(Timeline.FIRST, LocalDate.of(2026, 10, 28));
      if (!row.getField("received_on").isEmpty()) {
        assertThat(LocalDate.parse(row.getField("received_on"))).isAfter(drawn);
      }
      assertThat(row.getField("viscosity_40c_cst")).matches(NUMBER);
      row.findField("iso_4406")
          .filter(code -> !code.equals("-"))
          .ifPresent(code -> assertThat(CleanlinessCode.parse(code)).hasToString(code));
      row.getFieldsAsMap().entrySet().stream()
          .skip(5)
          .filter(cell -> !cell.getKey().equals("iso_4406"))
          .forEach(cell -> assertThat(cell.getValue()).as(cell.getKey()).matches(NUMBER + "|-|"));
    }
    assertThat(samples.stream().map(row -> row.getField("sampled_at").substring(0, 10)).sorted())
        .last()
        .isEqualTo("2026-10-28");
  }

  @Test
  @Tag("slow")
  void everyReadingParsesAndEveryBearingHasALog() throws IOException {
    Map<String, Integer> counts = new TreeMap<>();
    for (String area : List.of("paper-machine", "stock-preparation", "utilities")) {
      byte[] packed = Files.readAllBytes(FOLDER.resolve("temperatures/" + area + ".csv.gz"));
      boolean local = area.equals("paper-machine");
      for (NamedCsvRecord row : csv(text(unpacked(packed)))) {
        String time = row.getField("time");
        LocalDate day =
            local
                ? LocalDateTime.parse(time).toLocalDate()
                : OffsetDateTime.parse(time).atZoneSameInstant(Timeline.ZONE).toLocalDate();
        assertThat(day.isBefore(Timeline.FIRST) || day.isAfter(Timeline.LAST)).isFalse();
        double temperatureC = Double.parseDouble(row.getField("temperature_c"));
        boolean plausible = temperatureC > -5 && temperatureC < 90;
        assertThat(plausible || temperatureC == 999.9).isTrue();
        boolean speedKnown = !row.getField("speed_rpm").isEmpty();
        assertThat(speedKnown).isEqualTo(!row.getField("bearing").equals("GUIDE"));
        counts.merge(row.getField("asset") + "/" + row.getField("bearing"), 1, Integer::sum);
      }
    }
    assertThat(counts.keySet())
        .isEqualTo(
            rows("bearings.csv").stream()
                .map(row -> row.getField("asset") + "/" + row.getField("bearing"))
                .collect(Collectors.toSet()));
    assertThat(counts.values()).allMatch(count -> count > 19_000 && count < Timeline.HOURS);
  }

  private static List<String> column(String file, String column) {
    return rows(file).stream().map(row -> row.getField(column)).toList();
  }

  private static List<NamedCsvRecord> rows(String file) {
    return SampleHistory.rows(file);
  }

  private static List<NamedCsvRecord> csv(String text) {
    return CsvReader.builder().ofNamedCsvRecord(text).stream().toList();
  }

  private static byte[] unpacked(byte[] packed) throws IOException {
    return new GZIPInputStream(new ByteArrayInputStream(packed)).readAllBytes();
  }

  private static String text(byte[] bytes) {
    return new String(bytes, StandardCharsets.UTF_8);
  }
}
