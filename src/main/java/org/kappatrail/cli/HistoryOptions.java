package org.kappatrail.cli;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Options of every command that reads a history folder. */
final class HistoryOptions {
  @Parameters(
      index = "0",
      paramLabel = "HISTORY",
      description = "Folder with assets.csv, bearings.csv, oils.csv, samples/ and temperatures/.")
  @SuppressWarnings("NullAway.Init")
  private Path folder;

  @Option(
      names = "--as-of",
      paramLabel = "DATE",
      description =
          "Last day that counts, as 2026-10-31; default: the latest sampling date of the history.")
  private @Nullable LocalDate asOf;

  @Option(
      names = "--asset",
      paramLabel = "ID",
      arity = "1..*",
      split = ",",
      description = "Only these assets; default: all.")
  private List<String> assets = List.of();

  /** Options given by a command of its own. */
  static HistoryOptions of(Path folder, @Nullable LocalDate asOf, List<String> assets) {
    HistoryOptions options = new HistoryOptions();
    options.folder = folder;
    options.asOf = asOf;
    options.assets = List.copyOf(assets);
    return options;
  }

  Path folder() {
    return folder;
  }

  @Nullable LocalDate asOf() {
    return asOf;
  }

  List<String> assets() {
    return List.copyOf(assets);
  }
}
