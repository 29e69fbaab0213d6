package org.kappatrail.browser;

import static org.assertj.core.api.Assertions.fail;

import java.io.BufferedReader;
import java.io.File;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.URI;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.Assumptions;

/**
 * A headless Chromium of its own profile. Where none is installed, tests are skipped with that
 * said, unless {@code KAPPATRAIL_TEST_CHROMIUM=required}: then they fail.
 */
public final class Chromium implements AutoCloseable {
  private static final String VARIABLE = "KAPPATRAIL_TEST_CHROMIUM";
  private static final List<String> NAMES =
      List.of("chromium", "chromium-browser", "google-chrome");
  private static final String LISTENING = "DevTools listening on ";

  private final Process process;
  private final Path profile;
  private final DevTools tools;

  private Chromium(Process process, Path profile, DevTools tools) {
    this.process = process;
    this.profile = profile;
    this.tools = tools;
  }

  /** Starts one. */
  public static Chromium start() throws IOException {
    Path profile = Files.createTempDirectory("chromium");
    Process process =
        new ProcessBuilder(
                executable().toString(),
                "--headless",
                "--no-sandbox",
                "--disable-gpu",
                "--disable-dev-shm-usage",
                "--no-first-run",
                "--disable-background-networking",
                "--remote-debugging-port=0",
                "--user-data-dir=" + profile,
                "about:blank")
            .redirectErrorStream(true)
            .start();
    return new Chromium(process, profile, DevTools.connect(address(process)));
  }

  private static Path executable() {
    Optional<Path> found =
        Arrays.stream(System.getenv().getOrDefault("PATH", "").split(File.pathSeparator))
            .flatMap(folder -> NAMES.stream().map(name -> Path.of(folder, name)))
            .filter(Files::isExecutable)
            .findFirst();
    if (found.isEmpty() && "required".equals(System.getenv(VARIABLE))) {
      fail(VARIABLE + "=required, and there is no Chromium on the path");
    }
    Assumptions.assumeTrue(found.isPresent(), "no Chromium on the path: page tests are skipped");
    return found.orElseThrow();
  }

  private static URI address(Process process) throws IOException {
    BufferedReader lines = process.inputReader(StandardCharsets.UTF_8);
    StringBuilder said = new StringBuilder();
    for (String line = lines.readLine(); line != null; line = lines.readLine()) {
      said.append(line).append('\n');
      if (line.startsWith(LISTENING)) {
        drain(lines);
        return URI.create(line.substring(LISTENING.length()).strip());
      }
    }
    throw new IOException("Chromium ended: " + said);
  }

  /** So that a full pipe never stops the browser. */
  private static void drain(BufferedReader lines) {
    Thread thread =
        new Thread(
            () -> {
              try {
                while (lines.readLine() != null) {
                  Thread.onSpinWait();
                }
              } catch (IOException closed) {
                return;
              }
            },
            "chromium's messages");
    thread.setDaemon(true);
    thread.start();
  }

  /** Opens a file in a tab of its own of a width, as by day, and waits until it is there. */
  public Tab open(Path file, int width, int height) {
    String target =
        tools
            .call("", "Target.createTarget", Map.of("url", "about:blank"))
            .get("targetId")
            .asText();
    String session =
        tools
            .call("", "Target.attachToTarget", Map.of("targetId", target, "flatten", true))
            .get("sessionId")
            .asText();
    Tab tab = new Tab(tools, session, target);
    tab.prepare(width, height);
    tab.go(file);
    return tab;
  }

  @Override
  public void close() throws IOException {
    try {
      tools.call("", "Browser.close", Map.of());
      if (!process.waitFor(10, TimeUnit.SECONDS)) {
        process.destroyForcibly();
        process.waitFor(10, TimeUnit.SECONDS);
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    } finally {
      process.destroyForcibly();
      removeProfile();
    }
  }

  private void removeProfile() throws IOException {
    try (Stream<Path> tree = Files.walk(profile)) {
      for (Path path : tree.sorted(Comparator.reverseOrder()).toList()) {
        Files.deleteIfExists(path);
      }
    } catch (UncheckedIOException e) {
      throw e.getCause();
    }
  }
}
