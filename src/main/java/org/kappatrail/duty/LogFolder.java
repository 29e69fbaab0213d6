package org.kappatrail.duty;

import java.io.IOException;
import java.nio.file.DirectoryIteratorException;
import java.nio.file.DirectoryStream;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.PathMatcher;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.Problem;
import org.kappatrail.history.SourceLine;
import org.kappatrail.history.UnusableInputException;

/** Finds the files of readings of a history folder and the settings block of each. */
final class LogFolder {
  private static final String FOLDER = "temperatures";
  private static final int DEEPEST = 6;

  /** One block for all files without one of their own, so that one scan reads them. */
  private static final ExportMapping CANONICAL = ExportMapping.canonical(FOLDER + "/*");

  private final List<LogFile> files = new ArrayList<>();
  private final List<Problem> problems = new ArrayList<>();

  /**
   * Looks through the folder.
   *
   * @param history the history folder
   * @param mappings blocks of the settings, first match wins
   */
  LogFolder(Path history, List<ExportMapping> mappings) {
    List<ExportMapping> blocks =
        mappings.stream().filter(mapping -> mapping.jdbc().isEmpty()).toList();
    boolean[] matched = new boolean[blocks.size()];
    boolean anywhere = blocks.stream().anyMatch(block -> !block.files().startsWith(FOLDER + "/"));
    SortedMap<String, Path> entries = new TreeMap<>();
    list(history, anywhere ? history : history.resolve(FOLDER), 0, entries);
    for (var entry : entries.entrySet()) {
      String name = entry.getKey();
      int block = matching(blocks, name);
      if (block >= 0) {
        matched[block] = true;
        add(new LogFile(name, entry.getValue(), blocks.get(block)));
      } else if (isDirectlyInFolder(name)) {
        add(new LogFile(name, entry.getValue(), CANONICAL));
      }
    }
    for (int block = 0; block < matched.length; block++) {
      if (!matched[block]) {
        problems.add(
            new Problem(
                new SourceLine("kappatrail.yaml", 0),
                "temperatures",
                blocks.get(block).files(),
                "no file has such a name; correct files: or take the block out"));
      }
    }
  }

  /** Files in the order of their names. */
  List<LogFile> files() {
    return List.copyOf(files);
  }

  List<Problem> problems() {
    return List.copyOf(problems);
  }

  private void add(LogFile file) {
    Optional<LogFile.Format> format = LogFile.formatOf(file.name());
    boolean isFolder = Files.isDirectory(file.path());
    if (format.isEmpty()) {
      if (!isFolder) {
        problems.add(
            new Problem(
                new SourceLine(file.name(), 0),
                "",
                "",
                "not read; readings are taken from .csv, .csv.gz and .parquet files"));
      }
      return;
    }
    if (isFolder) {
      throw new UnusableInputException(
          file.name() + ": is a folder with the name of a file of readings; rename or move it");
    }
    if (!Files.isRegularFile(file.path()) || !Files.isReadable(file.path())) {
      throw new UnusableInputException(
          file.name()
              + ": cannot be read; it must be a file with read permission, or a link that leads to"
              + " one");
    }
    files.add(file);
  }

  private static boolean isDirectlyInFolder(String name) {
    return name.startsWith(FOLDER + "/") && name.indexOf('/', FOLDER.length() + 1) < 0;
  }

  private static int matching(List<ExportMapping> blocks, String name) {
    for (int block = 0; block < blocks.size(); block++) {
      PathMatcher matcher =
          FileSystems.getDefault().getPathMatcher("glob:" + blocks.get(block).files());
      if (matcher.matches(Path.of(name))) {
        return block;
      }
    }
    return -1;
  }

  /**
   * All entries below a folder; behind a link only those of the first level, so that none loops.
   */
  private static void list(Path history, Path folder, int depth, SortedMap<String, Path> found) {
    if (!Files.isDirectory(folder)) {
      return;
    }
    try (DirectoryStream<Path> entries = Files.newDirectoryStream(folder)) {
      for (Path entry : entries) {
        if (isHidden(entry.getFileName().toString())) {
          continue;
        }
        found.put(relativeName(history, entry), entry);
        if (depth < DEEPEST && Files.isDirectory(entry, LinkOption.NOFOLLOW_LINKS)) {
          list(history, entry, depth + 1, found);
        }
      }
    } catch (IOException | DirectoryIteratorException e) {
      throw new UnusableInputException(
          folder + ": the folder cannot be listed (" + e.getMessage() + ")", e);
    }
  }

  private static String relativeName(Path history, Path path) {
    return history.relativize(path).toString().replace('\\', '/');
  }

  /** Leftovers of editors and file managers. */
  private static boolean isHidden(String name) {
    return name.startsWith(".") || name.startsWith("~");
  }
}
