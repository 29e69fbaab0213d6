package org.kappatrail.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
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
  private static final String[] SPLINTERS = {
    "\"",
    ",",
    "\n",
    "\r",
    ";",
    "\0",
    "\uFEFF",
    "1e308",
    "-",
    "<",
    ">",
    "2024-02-31",
    "999999999999",
    "{",
    "}",
    "[",
    ": ",
    "- ",
    "\t",
    "é",
    "NaN",
    "%",
    "sample",
    "asset",
    "''",
    "&a",
    "*a",
    "|",
    "#"
  };

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
      Files.write(target, mutate(Files.readAllBytes(source), random));
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
      Files.write(file, mutate(export, random));
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

  private static byte[] mutate(byte[] bytes, Random random) {
    byte[] mutated = bytes.clone();
    int changes = 1 + random.nextInt(4);
    for (int change = 0; change < changes && mutated.length > 0; change++) {
      int at = random.nextInt(mutated.length);
      switch (random.nextInt(4)) {
        case 0 -> mutated[at] = (byte) random.nextInt(256);
        case 1 -> {
          int end = Math.min(mutated.length, at + 1 + random.nextInt(12));
          mutated = splice(mutated, at, end, new byte[0]);
        }
        case 2 -> {
          String splinter = SPLINTERS[random.nextInt(SPLINTERS.length)];
          byte[] inserted = splinter.getBytes(StandardCharsets.UTF_8);
          mutated = splice(mutated, at, at, inserted);
        }
        default -> {
          int end = Math.min(mutated.length, at + 1 + random.nextInt(60));
          byte[] part = java.util.Arrays.copyOfRange(mutated, at, end);
          int to = random.nextInt(mutated.length);
          mutated = splice(mutated, to, to, part);
        }
      }
    }
    return mutated;
  }

  private static byte[] splice(byte[] whole, int from, int to, byte[] put) {
    byte[] result = new byte[whole.length - (to - from) + put.length];
    System.arraycopy(whole, 0, result, 0, from);
    System.arraycopy(put, 0, result, from, put.length);
    System.arraycopy(whole, to, result, from + put.length, whole.length - to);
    return result;
  }
}
