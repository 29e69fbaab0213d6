package org.kappatrail.duty;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/**
 * The file that DuckDB's driver unpacks its native library to, anew in every process. It is meant
 * to go when the program ends, and stays after a kill; on Linux it can go as soon as it is loaded.
 */
final class UnpackedLibrary {
  private static final Path LOADED = Path.of("/proc/self/maps");
  private static final String PREFIX = "libduckdb_java";

  private UnpackedLibrary() {}

  /** Takes the file away where the system lets a loaded one go. */
  static void remove() {
    try {
      for (Path library : loaded()) {
        if (library.startsWith(Path.of(System.getProperty("java.io.tmpdir")))) {
          Files.deleteIfExists(library);
        }
      }
    } catch (IOException e) {
      // It goes when the program ends.
      return;
    }
  }

  private static List<Path> loaded() throws IOException {
    if (!Files.isReadable(LOADED)) {
      return List.of();
    }
    return Files.readAllLines(LOADED).stream()
        .filter(line -> line.contains(PREFIX) && line.indexOf('/') > 0)
        .map(line -> Path.of(line.substring(line.indexOf('/'))))
        .filter(path -> path.getFileName().toString().startsWith(PREFIX))
        .distinct()
        .toList();
  }
}
