package org.kappatrail.duty;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import org.kappatrail.history.ExportMapping;

/**
 * A file of readings and the way it is to be read.
 *
 * @param name path within the history folder, with forward slashes
 * @param path where it lies
 * @param mapping block of the settings that applies
 */
record LogFile(String name, Path path, ExportMapping mapping) {

  /** Kinds of files that hold readings. */
  enum Format {
    CSV(".csv"),
    GZIPPED_CSV(".csv.gz"),
    PARQUET(".parquet");

    private final String ending;

    Format(String ending) {
      this.ending = ending;
    }
  }

  /** The format that a file name stands for; empty where it stands for none. */
  static Optional<Format> formatOf(String fileName) {
    String lower = fileName.toLowerCase(Locale.ROOT);
    for (Format format : Format.values()) {
      if (lower.endsWith(format.ending)) {
        return Optional.of(format);
      }
    }
    return Optional.empty();
  }

  Format format() {
    return formatOf(name).orElseThrow();
  }
}
