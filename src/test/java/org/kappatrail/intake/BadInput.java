package org.kappatrail.intake;

import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import java.util.stream.Stream;
import java.util.zip.GZIPOutputStream;

/**
 * A case of the folder of bad inputs. Its {@code expected.txt} says, a line each:
 *
 * <ul>
 *   <li>{@code through: review} for a case of the logs, which goes through the whole command
 *   <li>{@code exit:} the exit code, 0 or 3
 *   <li>{@code message:} a part of the message of exit 3
 *   <li>{@code problem:} {@code file|line|column|part of the text}; there are these and no others
 *   <li>{@code samples:} number of samples that are used
 *   <li>{@code make:} a step that makes what cannot live in a repository: {@code remove FILE},
 *       {@code folder FILE}, {@code link FILE -> TARGET}, {@code unreadable FILE}, {@code line FILE
 *       LENGTH}, {@code empty FILE}, {@code gzip FILE} and {@code parquet FILE} in place of the CSV
 *       file, {@code cut FILE BYTES}, {@code today DATE}
 * </ul>
 *
 * <p>The files of the case lie over those of {@code base}.
 */
record BadInput(
    String name,
    boolean throughReview,
    int exit,
    List<String> messages,
    List<String> problems,
    OptionalInt samples,
    List<String> steps) {
  static final Path ROOT = Path.of("src", "test", "resources", "bad-inputs");

  /** Cases of register, settings and samples. */
  static Stream<BadInput> ofRecords() throws IOException {
    return all().filter(input -> !input.throughReview());
  }

  /** Cases of logs. */
  static Stream<BadInput> ofLogs() throws IOException {
    return all().filter(BadInput::throughReview);
  }

  private static Stream<BadInput> all() throws IOException {
    try (Stream<Path> folders = Files.list(ROOT)) {
      return folders
          .filter(folder -> Files.exists(folder.resolve("expected.txt")))
          .sorted()
          .map(BadInput::read)
          .toList()
          .stream();
    }
  }

  private static BadInput read(Path folder) {
    int exit = -1;
    boolean throughReview = false;
    List<String> messages = new ArrayList<>();
    List<String> problems = new ArrayList<>();
    List<String> steps = new ArrayList<>();
    OptionalInt samples = OptionalInt.empty();
    try {
      for (String line : Files.readAllLines(folder.resolve("expected.txt"))) {
        int colon = line.indexOf(": ");
        if (line.startsWith("#")) {
          continue;
        }
        String rest = line.substring(colon + 2);
        switch (line.substring(0, colon)) {
          case "through" -> throughReview = rest.equals("review");
          case "exit" -> exit = Integer.parseInt(rest);
          case "message" -> messages.add(rest);
          case "problem" -> problems.add(rest);
          case "samples" -> samples = OptionalInt.of(Integer.parseInt(rest));
          case "make" -> steps.add(rest);
          default -> throw new IllegalArgumentException(folder + ": " + line);
        }
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    String name = folder.getFileName().toString();
    return new BadInput(name, throughReview, exit, messages, problems, samples, steps);
  }

  /** Puts the case together in a folder. */
  void make(Path folder) throws IOException {
    copy(ROOT.resolve("base"), folder);
    copy(ROOT.resolve(name), folder);
    Files.deleteIfExists(folder.resolve("expected.txt"));
    for (String step : steps) {
      String[] words = step.split(" ", -1);
      Path path = folder.resolve(words[1]);
      switch (words[0]) {
        case "remove" -> Files.delete(path);
        case "folder" -> Files.createDirectories(path);
        case "link" -> Files.createSymbolicLink(path, Path.of(words[3]));
        case "unreadable" -> Files.setPosixFilePermissions(path, Set.of());
        case "line" -> appendLine(path, Integer.parseInt(words[2]));
        case "empty" -> Files.write(path, new byte[0]);
        case "gzip" -> gzip(path);
        case "parquet" -> parquet(path);
        case "cut" -> cut(path, Integer.parseInt(words[2]));
        case "today" -> {}
        default -> throw new IllegalArgumentException(name + ": " + step);
      }
    }
  }

  Optional<LocalDate> today() {
    return steps.stream()
        .filter(step -> step.startsWith("today "))
        .map(step -> LocalDate.parse(step.substring(6)))
        .findFirst();
  }

  /** True where the machine cannot make the case: an administrator may read everything. */
  boolean isBeyondThisMachine(Path folder) {
    return steps.stream()
        .filter(step -> step.startsWith("unreadable "))
        .anyMatch(step -> Files.isReadable(folder.resolve(step.substring(11))));
  }

  @Override
  public String toString() {
    return name;
  }

  static void copy(Path from, Path to) throws IOException {
    try (Stream<Path> paths = Files.walk(from)) {
      for (Path path : paths.toList()) {
        Path target = to.resolve(from.relativize(path).toString());
        if (Files.isDirectory(path)) {
          Files.createDirectories(target);
        } else {
          Files.deleteIfExists(target);
          Files.copy(path, target);
        }
      }
    }
  }

  private static void gzip(Path path) throws IOException {
    Path packed = path.resolveSibling(path.getFileName() + ".gz");
    try (OutputStream out = new GZIPOutputStream(Files.newOutputStream(packed))) {
      Files.copy(path, out);
    }
    Files.delete(path);
  }

  private static void parquet(Path path) throws IOException {
    String target = path.toString().replace(".csv", ".parquet");
    try (Connection engine = DriverManager.getConnection("jdbc:duckdb:");
        Statement statement = engine.createStatement()) {
      statement.execute("COPY (FROM '" + path + "') TO '" + target + "' (FORMAT parquet)");
    } catch (SQLException e) {
      throw new IOException(e);
    }
    Files.delete(path);
  }

  private static void cut(Path path, int bytes) throws IOException {
    Files.write(path, Arrays.copyOf(Files.readAllBytes(path), bytes));
  }

  private static void appendLine(Path path, int length) throws IOException {
    try (Writer writer =
        Files.newBufferedWriter(path, StandardCharsets.UTF_8, StandardOpenOption.APPEND)) {
      for (int written = 0; written < length; written += 10) {
        writer.write("0123456789");
      }
    }
  }
}
