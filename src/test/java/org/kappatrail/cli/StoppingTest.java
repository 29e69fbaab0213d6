package org.kappatrail.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.TimeUnit;
import java.util.function.Predicate;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Ends the program from outside, as Ctrl-C and a kill do, while it works. */
@Tag("slow")
class StoppingTest {
  private static final int LONG_LOG = 6_000_000;
  private static final int SHORT_LOG = 1000;

  @TempDir Path folder;
  private Path temporary;
  private Path out;

  @BeforeEach
  void prepare() throws IOException {
    temporary = Files.createDirectory(folder.resolve("tmp"));
    out = Files.createDirectory(folder.resolve("reports"));
  }

  @Test
  void leavesNothingBehindWhenStoppedWhileTheLogsAreQueried() throws Exception {
    writeHistory(LONG_LOG);
    Process review = start("--no-charts");
    awaitQuery();

    interrupt(review);

    assertThat(review.waitFor(60, TimeUnit.SECONDS)).isTrue();
    assertThat(review.exitValue()).isEqualTo(ExitCodes.STOPPED);
    assertThat(message()).contains("kappatrail: stopped").doesNotContain("bug");
    assertThat(entries(temporary)).isEmpty();
    assertThat(entries(out)).isEmpty();
  }

  @Test
  void leavesNothingBehindWhenStoppedWhileThePackIsMade() throws Exception {
    writeHistory(SHORT_LOG);
    Process review = start();
    awaitEntry(out, name -> name.startsWith("."));

    interrupt(review);

    assertThat(review.waitFor(60, TimeUnit.SECONDS)).isTrue();
    assertThat(review.exitValue()).isEqualTo(ExitCodes.STOPPED);
    assertThat(entries(temporary)).isEmpty();
    assertThat(entries(out)).isEmpty();
  }

  @Test
  void takesAwayWhatAKilledReviewLeft() throws Exception {
    writeHistory(LONG_LOG);
    Process queried = start("--no-charts");
    awaitQuery();
    queried.destroyForcibly().waitFor();
    assertThat(entries(temporary)).hasSize(1);
    writeHistory(SHORT_LOG);
    Process written = start();
    awaitEntry(out, name -> name.startsWith("."));
    written.destroyForcibly().waitFor();
    assertThat(entries(out)).hasSize(1);

    Process next = start("--no-charts");

    assertThat(next.waitFor(120, TimeUnit.SECONDS)).isTrue();
    assertThat(next.exitValue()).isEqualTo(ExitCodes.DONE);
    assertThat(entries(temporary)).isEmpty();
    assertThat(entries(out)).containsExactly("2025-01-20");
  }

  private Process start(String... options) throws IOException {
    List<String> command =
        Stream.concat(
                Stream.of(
                    Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                    "-Djava.io.tmpdir=" + temporary,
                    "-cp",
                    System.getProperty("java.class.path"),
                    Main.class.getName(),
                    "review",
                    folder.resolve("history").toString(),
                    "--out",
                    out.toString()),
                Stream.of(options))
            .toList();
    File messages = folder.resolve("messages.txt").toFile();
    return new ProcessBuilder(command).redirectErrorStream(true).redirectOutput(messages).start();
  }

  private String message() throws IOException {
    return Files.readString(folder.resolve("messages.txt"));
  }

  /** What Ctrl-C does. */
  private static void interrupt(Process process) throws IOException, InterruptedException {
    assumeTrue(File.separatorChar == '/', "there is no such signal elsewhere");
    new ProcessBuilder("kill", "-INT", Long.toString(process.pid())).start().waitFor();
  }

  /** Until the engine is loaded and at work. */
  private void awaitQuery() throws IOException, InterruptedException {
    awaitEntry(temporary, name -> name.startsWith("libduckdb"));
    for (int i = 0; i < 6000 && entries(temporary).size() > 1; i++) {
      TimeUnit.MILLISECONDS.sleep(10);
    }
    TimeUnit.MILLISECONDS.sleep(500);
  }

  private static void awaitEntry(Path directory, Predicate<String> name)
      throws IOException, InterruptedException {
    for (int i = 0; i < 6000 && entries(directory).stream().noneMatch(name); i++) {
      TimeUnit.MILLISECONDS.sleep(10);
    }
    assertThat(entries(directory)).anyMatch(name);
  }

  private static List<String> entries(Path directory) throws IOException {
    try (Stream<Path> entries = Files.list(directory)) {
      return entries.map(path -> path.getFileName().toString()).sorted().toList();
    }
  }

  private void writeHistory(int rows) throws IOException, SQLException {
    Path history = Files.createDirectories(folder.resolve("history"));
    Files.createDirectories(history.resolve("temperatures"));
    Files.createDirectories(history.resolve("samples"));
    Files.writeString(
        history.resolve("oils.csv"), "oil,viscosity_40c_cst,viscosity_index\nVG 220,220,96\n");
    StringBuilder assets = new StringBuilder("asset,oil\n");
    StringBuilder bearings = new StringBuilder("asset,bearing,pitch_mm,speed_rpm\n");
    StringBuilder samples = new StringBuilder("sample,asset,sampled_at,viscosity_40c_cst\n");
    for (int asset = 0; asset < 30; asset++) {
      assets.append('F').append(asset).append(",VG 220\n");
      bearings.append('F').append(asset).append(",DE,120,990\n");
      for (int day = 10; day <= 20; day += 5) {
        samples.append(
            String.format(Locale.ROOT, "S%d-%d,F%d,2025-01-%d,219%n", asset, day, asset, day));
      }
    }
    Files.writeString(history.resolve("assets.csv"), assets);
    Files.writeString(history.resolve("bearings.csv"), bearings);
    Files.writeString(history.resolve("samples/samples.csv"), samples);
    try (Connection duck = DriverManager.getConnection("jdbc:duckdb:");
        Statement statement = duck.createStatement()) {
      statement.execute(
          "COPY (SELECT strftime(TIMESTAMP '2025-01-01' + INTERVAL 1 SECOND * (i // 30), "
              + "'%Y-%m-%dT%H:%M:%S') AS time, 'F' || (i % 30) AS asset, 'DE' AS bearing, "
              + "60 + i % 7 AS temperature_c FROM range("
              + rows
              + ") r(i)) TO '"
              + history.resolve("temperatures/log.csv").toString().replace("'", "''")
              + "' (HEADER)");
    }
  }
}
