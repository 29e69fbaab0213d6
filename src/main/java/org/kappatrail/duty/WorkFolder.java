package org.kappatrail.duty;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;
import org.kappatrail.history.UnusableInputException;

/**
 * A private folder for spilled data. It goes when closed and when the program ends; what a killed
 * program left is taken away by the next one, which knows it by its lock that nobody holds.
 */
final class WorkFolder implements AutoCloseable {
  private static final String PREFIX = "kappatrail-";
  private static final String LOCK = "in-use";

  private final Path path;
  private final FileChannel channel;
  private final Thread atExit;

  WorkFolder(Path parent) {
    removeAbandoned(parent);
    try {
      path = Files.createTempDirectory(parent, PREFIX + ProcessHandle.current().pid() + "-");
      channel =
          FileChannel.open(path.resolve(LOCK), StandardOpenOption.CREATE, StandardOpenOption.WRITE);
      channel.lock();
    } catch (IOException e) {
      throw new UnusableInputException(
          parent + ": no temporary folder can be made there (" + e.getMessage() + ")", e);
    }
    atExit = new Thread(() -> remove(path), "work-folder-removal");
    Runtime.getRuntime().addShutdownHook(atExit);
  }

  Path path() {
    return path;
  }

  @Override
  public void close() {
    try {
      channel.close();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    } finally {
      remove(path);
      forgetHook();
    }
  }

  private void forgetHook() {
    try {
      Runtime.getRuntime().removeShutdownHook(atExit);
    } catch (IllegalStateException endingAlready) {
      // The hook is running or has run; the folder is gone either way.
      return;
    }
  }

  private static void removeAbandoned(Path parent) {
    try (DirectoryStream<Path> folders = Files.newDirectoryStream(parent, PREFIX + "*")) {
      for (Path folder : folders) {
        if (isAbandoned(folder)) {
          remove(folder);
        }
      }
    } catch (IOException e) {
      // Housekeeping for others: a folder that cannot be listed is left to its owner.
      return;
    }
  }

  private static boolean isAbandoned(Path folder) {
    Path lock = folder.resolve(LOCK);
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

  /**
   * The lock goes last, so that a folder which cannot be emptied is still known to the next run.
   */
  private static void remove(Path folder) {
    Path lock = folder.resolve(LOCK);
    try (Stream<Path> paths = Files.walk(folder)) {
      List<Path> deepestFirst =
          paths
              .filter(path -> !path.equals(lock) && !path.equals(folder))
              .sorted(Comparator.reverseOrder())
              .toList();
      for (Path each : deepestFirst) {
        Files.deleteIfExists(each);
      }
      Files.deleteIfExists(lock);
      Files.deleteIfExists(folder);
    } catch (IOException | UncheckedIOException e) {
      // The next run finds the lock unheld and tries again.
      return;
    }
  }
}
