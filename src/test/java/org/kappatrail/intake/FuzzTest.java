package org.kappatrail.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.history.UnusableInputException;

/** Mutated inputs give a result or a message, never anything else. The seed makes runs alike. */
@Tag("slow")
class FuzzTest {
  private static final long SEED = 20240305;
  private static final int RUNS = 4_000;
  @TempDir Path temporary;

  @Test
  void mutatedInputsGiveAResultOrAMessage() throws IOException {
    List<Path> sources = sources();
    List<Path> register =
        sources.stream().filter(path -> path.startsWith(BadInput.ROOT.resolve("base"))).toList();
    Random random = new Random(SEED);
    int results = 0;
    for (int run = 0; run < RUNS; run++) {
      BadInput.copy(BadInput.ROOT.resolve("base"), temporary);
      List<Path> from = random.nextInt(3) > 0 ? register : sources;
      Path source = from.get(random.nextInt(from.size()));
      Path target = temporary.resolve(BadInput.ROOT.resolve("base").relativize(source).toString());
      if (!source.startsWith(BadInput.ROOT.resolve("base"))) {
        target = temporary.resolve(source.getFileName().toString());
      }
      Files.write(target, Mutation.of(Files.readAllBytes(source), random));
      try {
        Intake intake = HistoryReader.read(temporary);
        HistoryCheck.text(intake, LogAccount.NONE);
        results++;
      } catch (UnusableInputException e) {
        assertThat(e.getMessage()).as("run %d", run).isNotBlank();
      } catch (RuntimeException e) {
        throw new AssertionError("run " + run + " of " + source, e);
      }
      Files.deleteIfExists(temporary.resolve("kappatrail.yaml"));
    }
    assertThat(results).isBetween(RUNS / 4, RUNS - 1);
  }

  @Test
  void mutatedExportsAreAdoptedOrRefused() throws IOException {
    byte[] export = Files.readAllBytes(BadInput.ROOT.resolve("base/samples/lab.csv"));
    Random random = new Random(SEED);
    Path file = temporary.resolve("export.csv");
    for (int run = 0; run < RUNS / 2; run++) {
      Files.write(file, Mutation.of(export, random));
      try {
        assertThat(ExportAdoption.adopt(file)).contains("columns:");
      } catch (UnusableInputException e) {
        assertThat(e.getMessage()).isNotBlank();
      } catch (RuntimeException e) {
        throw new AssertionError("run " + run, e);
      }
    }
  }

  private static List<Path> sources() throws IOException {
    List<Path> sources = new ArrayList<>();
    try (Stream<Path> paths = Files.walk(BadInput.ROOT)) {
      paths
          .filter(Files::isRegularFile)
          .filter(
              path ->
                  path.startsWith(BadInput.ROOT.resolve("base"))
                      || (path.endsWith("kappatrail.yaml") && !path.toString().contains("log-")))
          .sorted()
          .forEach(sources::add);
    }
    return sources;
  }
}
