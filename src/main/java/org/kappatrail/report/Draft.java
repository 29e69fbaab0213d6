package org.kappatrail.report;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.LocalDate;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;

/**
 * A hidden folder beside the place of a pack, in which the pack is made. It goes when closed; what
 * a killed program left is taken away by the next one, which knows it by its lock that nobody
 * holds.
 */
final class Draft implements AutoCloseable {
  private static final String INFIX = ".new-";
  private static final String ALL = ".????-??-??" + INFIX + "*";
  private static final String LOCK = "in-use";
  private static final String EARLIER = "earlier";

  private final Path folder;
  private final Path place;
  private final FileChannel channel;

  /** A draft of the pack of a day, {@code directory/<day>}. */
  Draft(Path directory, LocalDate day) throws IOException {
    Files.createDirectories(directory);
    removeAbandoned(directory);
    place = directory.resolve(day.toString());
    folder = Files.createTempDirectory(directory, "." + day + INFIX);
    channel =
        FileChannel.open(folder.resolve(LOCK), StandardOpenOption.CREATE, StandardOpenOption.WRITE);
    try {
      channel.lock();
      Files.createDirectory(pack());
    } catch (IOException e) {
      close();
      throw e;
    }
  }

  /** Where the pack is made. */
  Path pack() {
    return folder.resolve("pack");
  }

  /** Moves the complete pack to its place, in which an earlier one may stand. */
  Path publish() throws IOException {
    if (!Files.exists(place)) {
      return Files.move(pack(), place);
    }
    Path aside = folder.resolve(EARLIER);
    Files.move(place, aside);
    try {
      return Files.move(pack(), place);
    } catch (IOException e) {
      Files.move(aside, place);
      throw e;
    }
  }

  @Override
  public void close() throws IOException {
    channel.close();
    remove(folder);
  }

  private static void removeAbandoned(Path directory) throws IOException {
    try (DirectoryStream<Path> drafts = Files.newDirectoryStream(directory, ALL)) {
      for (Path draft : drafts) {
        if (isAbandoned(draft)) {
          putBack(directory, draft);
          remove(draft);
        }
      }
    }
  }

  private static boolean isAbandoned(Path draft) {
    Path lock = draft.resolve(LOCK);
    if (!Files.isRegularFile(lock)) {
      return false;
    }
    try (FileChannel channel = FileChannel.open(lock, StandardOpenOption.WRITE);
        FileLock held = channel.tryLock()) {
      return held != null;
    } catch (IOException | OverlappingFileLockException inUse) {
      return false;
    }
  }

  /** An earlier pack is lost to none that was never finished. */
  private static void putBack(Path directory, Path draft) throws IOException {
    String name = draft.getFileName().toString();
    Path place = directory.resolve(name.substring(1, name.indexOf(INFIX)));
    Path earlier = draft.resolve(EARLIER);
    if (Files.exists(earlier) && !Files.exists(place)) {
      Files.move(earlier, place);
    }
  }

  /** The lock goes last, so that a folder which cannot be emptied is still known to the next. */
  private static void remove(Path folder) throws IOException {
    Path lock = folder.resolve(LOCK);
    List<Path> deepestFirst;
    try (Stream<Path> tree = Files.walk(folder)) {
      deepestFirst =
          tree.filter(path -> !path.equals(lock) && !path.equals(folder))
              .sorted(Comparator.reverseOrder())
              .toList();
    }
    for (Path path : deepestFirst) {
      Files.deleteIfExists(path);
    }
    Files.deleteIfExists(lock);
    Files.deleteIfExists(folder);
  }
}
