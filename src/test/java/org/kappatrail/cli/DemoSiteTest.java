package org.kappatrail.cli;

import static org.assertj.core.api.Assertions.assertThat;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The stories of the invented site, each found by the right findings and verdict, and no more. */
@Tag("slow")
class DemoSiteTest {
  private static final Map<String, Set<String>> FINDINGS =
      new TreeMap<>(
          Map.ofEntries(
              Map.entry("PM-DRY", Set.of("water-high", "outside-precision-range")),
              Map.entry("PM-PRS", Set.of("below-floor", "film-drift", "heat", "log-gap")),
              Map.entry(
                  "PM-WGB",
                  Set.of(
                      "below-floor",
                      "off-grade",
                      "oil-drift",
                      "film-drift",
                      "log-gap",
                      "outside-precision-range")),
              Map.entry("PM-RGB", Set.of("outside-precision-range")),
              Map.entry("PM-VP1", Set.of("stuck-sensor")),
              Map.entry("PM-HXF", Set.of("unrecorded-oil-change", "dropped-readings")),
              Map.entry("PM-SUF", Set.of()),
              Map.entry("SP-CRP", Set.of("below-floor", "off-grade", "oil-drift", "film-drift")),
              Map.entry("SP-P3", Set.of("inferred-charge")),
              Map.entry("SP-AG4", Set.of("below-floor")),
              Map.entry(
                  "SP-AG1", Set.of("swapped-samples", "off-grade", "outside-precision-range")),
              Map.entry("SP-PGB", Set.of("below-floor", "swapped-samples", "off-grade", "log-gap")),
              Map.entry("UT-AG2", Set.of("seasonal-dip")),
              Map.entry("UT-SCR", Set.of("oil-drift", "film-drift", "off-grade")),
              Map.entry("UT-WP1", Set.of())));

  private static final Map<String, String> VERDICTS =
      Map.ofEntries(
          Map.entry("PM-DRY", "keep"),
          Map.entry("PM-PRS", "fix-cause-first"),
          Map.entry("PM-WGB", "change-now"),
          Map.entry("PM-RGB", "keep"),
          Map.entry("PM-VP1", "keep"),
          Map.entry("PM-HXF", "keep"),
          Map.entry("PM-SUF", "keep"),
          Map.entry("SP-CRP", "change-now"),
          Map.entry("SP-P3", "keep"),
          Map.entry("SP-AG4", "fix-cause-first"),
          Map.entry("SP-AG1", "keep"),
          Map.entry("SP-PGB", "resample"),
          Map.entry("UT-AG2", "keep"),
          Map.entry("UT-SCR", "keep"),
          Map.entry("UT-WP1", "keep"));

  /** Half a unit of the sixth digit, as a fraction of the number. */
  private static final double SIX_DIGITS = 5e-6;

  @TempDir static Path folder;
  private static Path pack;

  @BeforeAll
  static void review() {
    Run run = Run.of("review", "sample-history", "--no-charts", "--out", folder.toString());
    assertThat(run.err()).isEmpty();
    assertThat(run.code()).isEqualTo(ExitCodes.DONE);
    pack = folder.resolve("2026-10-28");
  }

  @Test
  void everyStoryIsFoundAndNothingElse() throws IOException {
    Map<String, Set<String>> found = new TreeMap<>();
    FINDINGS.keySet().forEach(asset -> found.put(asset, new TreeSet<>()));
    for (NamedCsvRecord row : rows("findings")) {
      found
          .computeIfAbsent(row.getField("asset"), asset -> new TreeSet<>())
          .add(row.getField("finding"));
    }
    assertThat(found).isEqualTo(FINDINGS);
  }

  @Test
  void noFindingStandsTwice() throws IOException {
    List<String> keys =
        rows("findings").stream()
            .map(
                row ->
                    row.getField("asset")
                        + row.getField("bearing")
                        + row.getField("sample")
                        + row.getField("finding"))
            .toList();
    assertThat(keys).doesNotHaveDuplicates();
  }

  @Test
  void everyAssetGetsTheRightVerdict() throws IOException {
    Map<String, String> found = new TreeMap<>();
    rows("verdicts").forEach(row -> found.put(row.getField("asset"), row.getField("verdict")));
    assertThat(found).isEqualTo(VERDICTS);
  }

  @Test
  void attributionsAddUpInTheTableToo() throws IOException {
    for (NamedCsvRecord row : rows("attribution")) {
      double sum = number(row, "oil") + number(row, "temperature") + number(row, "speed");
      double total = number(row, "total");
      double sizes =
          Math.abs(number(row, "oil"))
              + Math.abs(number(row, "temperature"))
              + Math.abs(number(row, "speed"))
              + Math.abs(total);
      assertThat(Math.abs(sum - total)).isLessThanOrEqualTo(SIX_DIGITS * sizes);
    }
  }

  @Test
  void whatWasKnownEarlierIsComparedWithToday() {
    Run run =
        Run.of(
            "review",
            "sample-history",
            "--no-charts",
            "--out",
            folder.resolve("since").toString(),
            "--since",
            "2026-09-01");
    assertThat(run.out())
        .contains("Since 2026-09-01:")
        .containsPattern("worse +alarm PM-PRS P1-DS below-floor")
        .containsPattern("new +alert SP-PGB swapped-samples")
        .containsPattern("settled +alert UT-AG2 LOW near-floor");
  }

  @Test
  void aDayThatIsNotBeforeTheStateReviewedIsAUsageError() {
    Run run = Run.of("review", "sample-history", "--since", "2026-10-28");
    assertThat(run.code()).isEqualTo(ExitCodes.USAGE);
    assertThat(run.err()).contains("--since 2026-10-28 is not before");
  }

  @Test
  void theVerdictOfOneAssetAloneIsThatOfTheWholeReview() {
    Run run = Run.of("weigh", "sample-history", "--asset", "SP-PGB");
    assertThat(run.code()).isEqualTo(ExitCodes.DONE);
    assertThat(run.out()).contains("Verdict: resample").contains("the bottles look swapped");
  }

  @Test
  void whatIfQuestionsAreAnswered() {
    Run cooler = Run.of("weigh", "sample-history", "--asset", "PM-PRS", "--temperature", "61");
    assertThat(cooler.out()).contains("what if at 61.0 °C?").contains("Verdict: keep");
    Run other = Run.of("weigh", "sample-history", "--asset", "SP-CRP", "--oil", "ashless-68");
    assertThat(other.out()).contains("fresh charge of ashless-68");
    Run unknown = Run.of("weigh", "sample-history", "--asset", "SP-CRP", "--oil", "ashles-68");
    assertThat(unknown.code()).isEqualTo(ExitCodes.UNUSABLE_INPUT);
    assertThat(unknown.err()).contains("nearest is 'ashless-68'");
    Run none = Run.of("weigh", "sample-history", "--asset", "SP-CPR");
    assertThat(none.err()).contains("no asset 'SP-CPR'").contains("nearest is 'SP-CRP'");
  }

  private static List<NamedCsvRecord> rows(String table) throws IOException {
    try (CsvReader<NamedCsvRecord> reader =
        CsvReader.builder().ofNamedCsvRecord(Files.readString(pack.resolve(table + ".csv")))) {
      return reader.stream().toList();
    }
  }

  private static double number(NamedCsvRecord row, String column) {
    return Double.parseDouble(row.getField(column));
  }
}
