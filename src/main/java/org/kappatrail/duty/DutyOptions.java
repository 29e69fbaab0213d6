package org.kappatrail.duty;

import java.nio.file.Path;

/**
 * Means that the reading of logs may use; none of them changes a result.
 *
 * @param threads threads of the query engine
 * @param memoryMib memory of the query engine, MiB; beyond it the engine uses the temporary folder
 * @param temporaryFolder where a private folder for spilled data is made and removed
 */
public record DutyOptions(int threads, int memoryMib, Path temporaryFolder) {
  private static final int MOST_THREADS_BY_DEFAULT = 8;

  public DutyOptions {
    if (threads < 1 || memoryMib < 64) {
      throw new IllegalArgumentException(
          "threads "
              + threads
              + " must be at least 1 and memory "
              + memoryMib
              + " MiB at least 64");
    }
  }

  /** The machine's cores, at most 8, 1 GiB and the system's temporary folder. */
  public static DutyOptions defaults() {
    int cores = Runtime.getRuntime().availableProcessors();
    return new DutyOptions(
        Math.min(cores, MOST_THREADS_BY_DEFAULT),
        1024,
        Path.of(System.getProperty("java.io.tmpdir")));
  }

  public DutyOptions withThreads(int number) {
    return new DutyOptions(number, memoryMib, temporaryFolder);
  }
}
