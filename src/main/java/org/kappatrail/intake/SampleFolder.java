package org.kappatrail.intake;

import java.io.IOException;
import java.nio.file.DirectoryStream;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.PathMatcher;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.Problem;
import org.kappatrail.history.SourceLine;
import org.kappatrail.history.UnusableInputException;

/** Finds the sample files of a history folder and the settings block of each. */
final class SampleFolder {
  private static final String FOLDER = "samples";
  private static final int DEEPEST = 6;

  private final Path history;
  private final List<ExportMapping> blocks;
  private final List<Problem> problems;

  /**
   * A file with the way it is read.
   *
   * @param name path within the history folder, with forward slashes
   * @param path where it lies
   * @param mapping block of the settings that applies
   */
  record Found(String name, Path path, ExportMapping mapping) {
    boolean isWorkbook() {
      return name.toLowerCase(Locale.ROOT).endsWith(".xlsx");
    }
  }

  SampleFolder(Path history, List<ExportMapping> blocks, List<Problem> problems) {
    this.history = history;
    this.blocks = blocks;
    this.problems = problems;
  }

  /** The files in the order of their names. */
  List<Found> files() {
    SortedMap<String, Path> paths = new TreeMap<>();
    boolean anywhere = blocks.stream().anyMatch(block -> !block.files().startsWith(FOLDER + "/"));
    list(anywhere ? history : history.resolve(FOLDER), 0, paths);
    boolean[] matched = new boolean[blocks.size()];
    List<Found> found = new ArrayList<>();
    for (Map.Entry<String, Path> entry : paths.entrySet()) {
      String name = entry.getKey();
      int block = matching(name);
      if (block >= 0) {
        matched[block] = true;
        add(found, new Found(name, entry.getValue(), blocks.get(block)));
      } else if (isDirectlyInFolder(name)) {
        add(found, new Found(name, entry.getValue(), ExportMapping.canonical(name)));
      }
    }
    for (int block = 0; block < matched.length; block++) {
      if (!matched[block]) {
        problems.add(
            new Problem(
                new SourceLine(SettingsReader.FILE, 0),
                FOLDER,
                blocks.get(block).files(),
                "no file has such a name that an earlier block does not take; correct files: or"
                    + " take the block out"));
      }
    }
    return found;
  }

  private void add(List<Found> found, Found file) {
    String lower = file.name().toLowerCase(Locale.ROOT);
    boolean readable = lower.endsWith(".csv") || lower.endsWith(".xlsx");
    boolean mapped = !file.mapping().files().equals(file.name());
    if (readable || (mapped && (lower.endsWith(".txt") || lower.endsWith(".tsv")))) {
      RegisterFolder.checkReadable(file.path(), file.name());
      found.add(file);
    } else if (!Files.isDirectory(file.path())) {
      problems.add(
          new Problem(
              new SourceLine(file.name(), 0),
              "",
              "",
              "not read; samples are taken from .csv and .xlsx files; save it as one of them"));
    }
  }

  private int matching(String name) {
    Path path = Path.of(name);
    for (int block = 0; block < blocks.size(); block++) {
      PathMatcher matcher =
          FileSystems.getDefault().getPathMatcher("glob:" + blocks.get(block).files());
      if (matcher.matches(path)) {
        return block;
      }
    }
    return -1;
  }

  private static boolean isDirectlyInFolder(String name) {
    return name.startsWith(FOLDER + "/") && name.indexOf('/', FOLDER.length() + 1) < 0;
  }

  /** Goes through a folder; of folders behind links only the first level, so that none loops. */
  private void list(Path folder, int depth, SortedMap<String, Path> paths) {
    if (!Files.isDirectory(folder)) {
      return;
    }
    try (DirectoryStream<Path> entries = Files.newDirectoryStream(folder)) {
      for (Path entry : entries) {
        String name = entry.getFileName().toString();
        if (name.startsWith(".") || name.startsWith("~")) {
          continue;
        }
        paths.put(history.relativize(entry).toString().replace('\\', '/'), entry);
        if (depth < DEEPEST && Files.isDirectory(entry, LinkOption.NOFOLLOW_LINKS)) {
          list(entry, depth + 1, paths);
        }
      }
    } catch (IOException | java.nio.file.DirectoryIteratorException e) {
      throw new UnusableInputException(
          history.relativize(folder)
              + ": the folder cannot be listed ("
              + e.getMessage()
              + "); give read permission",
          e);
    }
  }
}
