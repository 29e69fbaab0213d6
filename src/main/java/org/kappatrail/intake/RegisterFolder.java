package org.kappatrail.intake;

import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.NearestName;
import org.kappatrail.history.Problem;
import org.kappatrail.history.SourceLine;
import org.kappatrail.history.UnusableInputException;

/** The folder that is read, and what the readers of its files have in common. */
final class RegisterFolder {
  private final Path folder;
  private final List<Problem> problems;
  private final List<FileAccount> accounts;
  private final List<Path> inputs = new ArrayList<>();

  RegisterFolder(Path folder, List<Problem> problems, List<FileAccount> accounts) {
    this.folder = folder;
    this.problems = problems;
    this.accounts = accounts;
  }

  List<FileAccount> accounts() {
    return accounts;
  }

  List<Problem> problems() {
    return problems;
  }

  List<Path> inputs() {
    return inputs;
  }

  /** True where a file of that name is there, readable or not. */
  boolean has(String file) {
    return Files.exists(folder.resolve(file), LinkOption.NOFOLLOW_LINKS);
  }

  /** Notes a file as read, after a look whether it can be. */
  Path input(String file) {
    Path path = folder.resolve(file);
    checkReadable(path, file);
    inputs.add(path);
    return path;
  }

  /** The table of a register file. */
  RegisterTable table(
      String file, FileAccount.Kind kind, Collection<String> known, Collection<String> required) {
    if (!has(file)) {
      throw new UnusableInputException(
          file + ": is required and not there; put it into the history folder");
    }
    return new RegisterTable(input(file), file, kind, known, required, problems);
  }

  /** Refuses what is no readable file. */
  static void checkReadable(Path path, String file) {
    if (Files.isDirectory(path)) {
      throw new UnusableInputException(
          file + ": is a folder with the name of a file; rename or move it");
    }
    if (!Files.isRegularFile(path) || !Files.isReadable(path)) {
      throw new UnusableInputException(
          file
              + ": cannot be read; it must be a file with read permission, or a link that leads to"
              + " one");
    }
  }

  /** True where the id stands in the register already; the row is then left out. */
  boolean isRepeated(Map<String, SourceLine> seen, String column, String id, Row row) {
    @Nullable SourceLine first = seen.putIfAbsent(id, row.source());
    if (first == null) {
      return false;
    }
    row.reject(
        column, id, "stands already at " + first + ", which is kept; take one of the two out");
    return true;
  }

  /**
   * Leaves a row out that names what is not in the register.
   *
   * @param left names that were in the register and left out of it, with the place
   */
  static String unknown(
      String name, Collection<String> known, Map<String, SourceLine> left, String register) {
    @Nullable SourceLine out = left.get(name);
    if (out != null) {
      return "is left out of the register, see " + out + "; put that right first";
    }
    return "is not in "
        + register
        + NearestName.of(name, known)
            .map(near -> "; the nearest there is '" + near + "'")
            .orElse("")
        + "; correct the name or add it there";
  }
}
