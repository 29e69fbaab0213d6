package org.kappatrail.intake;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.kappatrail.cli.Run;

/**
 * Bad logs through the whole review: a pack and the expected problems, or a message and nothing.
 */
@Tag("slow")
class BadLogsTest {
  @TempDir Path folder;
  @TempDir Path packs;

  @ParameterizedTest
  @MethodSource("org.kappatrail.intake.BadInput#ofLogs")
  void everyBadLogHasItsExpectedOutcome(BadInput input) throws IOException {
    input.make(folder);
    Assumptions.assumeFalse(input.isBeyondThisMachine(folder));
    Run run = Run.of("review", folder.toString(), "--no-charts", "--out", packs.toString());
    assertThat(run.code()).as(run.err()).isEqualTo(input.exit());
    if (input.exit() == 3) {
      assertThat(run.err()).startsWith("kappatrail: ").contains(input.messages());
      assertThat(run.err().lines()).hasSize(1);
      assertThat(run.out()).isEmpty();
      assertThat(entries(packs)).isEmpty();
      return;
    }
    assertThat(run.err()).isEmpty();
    assertThat(entries(packs)).containsExactly("2024-02-11");
    assertProblems(input);
    assertRows();
  }

  private void assertProblems(BadInput input) throws IOException {
    List<String> left = new ArrayList<>();
    for (NamedCsvRecord row : rows("problems.csv")) {
      left.add(
          String.join(
              "|",
              row.getField("file"),
              row.getField("line").isEmpty() ? "0" : row.getField("line"),
              row.getField("column"),
              row.getField("problem")));
    }
    for (String expected : input.problems()) {
      String[] parts = expected.split("\\|", 4);
      String place = String.join("|", parts[0], parts[1], parts[2]) + '|';
      List<String> found =
          left.stream()
              .filter(problem -> problem.startsWith(place) && problem.contains(parts[3]))
              .toList();
      assertThat(found).as("%s among %s", expected, left).isNotEmpty();
      left.remove(found.get(0));
    }
    assertThat(left).as("problems nobody expected").isEmpty();
  }

  private void assertRows() throws IOException {
    JsonNode manifest =
        new ObjectMapper().readTree(packs.resolve("2024-02-11/manifest.json").toFile());
    for (JsonNode file : manifest.get("rows")) {
      assertThat(file.get("used").asLong() + file.get("rejected").asLong())
          .isEqualTo(file.get("read").asLong());
    }
  }

  private List<NamedCsvRecord> rows(String table) throws IOException {
    Path file = packs.resolve("2024-02-11").resolve(table);
    try (CsvReader<NamedCsvRecord> rows = CsvReader.builder().ofNamedCsvRecord(file)) {
      return rows.stream().toList();
    }
  }

  private static List<String> entries(Path folder) throws IOException {
    try (Stream<Path> entries = Files.list(folder)) {
      return entries.map(entry -> entry.getFileName().toString()).sorted().toList();
    }
  }
}
