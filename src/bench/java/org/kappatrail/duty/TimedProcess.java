package org.kappatrail.duty;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.function.ToDoubleFunction;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * What a process took. Peak memory needs Linux.
 *
 * @param seconds from start to end
 * @param cpuSeconds of all its threads
 * @param peakMib most memory held at a time
 */
record TimedProcess(double seconds, double cpuSeconds, double peakMib) {
  private static final Pattern PEAK = Pattern.compile("VmHWM:\\s+(\\d+) kB");
  private static final Path LOG = Path.of("target/bench.log");
  private static final int LOOK_EVERY_MS = 20;

  /** Runs a command to its end. */
  static TimedProcess of(List<String> command) throws IOException, InterruptedException {
    long start = System.nanoTime();
    Process process =
        new ProcessBuilder(command)
            .redirectErrorStream(true)
            .redirectOutput(new File(LOG.toString()))
            .start();
    Path status = Path.of("/proc", Long.toString(process.pid()), "status");
    double peak = 0;
    double cpuSeconds = 0;
    while (!process.waitFor(LOOK_EVERY_MS, TimeUnit.MILLISECONDS)) {
      peak = Math.max(peak, peakMib(status));
      cpuSeconds =
          process.info().totalCpuDuration().map(time -> time.toMillis() / 1e3).orElse(cpuSeconds);
    }
    double seconds = (System.nanoTime() - start) / 1e9;
    if (process.exitValue() != 0) {
      throw new IllegalStateException("exit " + process.exitValue() + ": " + Files.readString(LOG));
    }
    return new TimedProcess(seconds, cpuSeconds, peak);
  }

  /** The packaged program's review of a history, without charts. */
  static List<String> review(Path folder) {
    return List.of(
        java(),
        "-jar",
        "target/kappatrail.jar",
        "review",
        folder.toString(),
        "--out",
        folder.resolveSibling(folder.getFileName() + "-pack").toString(),
        "--no-charts");
  }

  static String java() {
    return Path.of(System.getProperty("java.home"), "bin", "java").toString();
  }

  static double median(List<TimedProcess> runs, ToDoubleFunction<TimedProcess> figure) {
    return median(runs.stream().mapToDouble(figure).toArray());
  }

  static double median(double[] figures) {
    double[] sorted = figures.clone();
    Arrays.sort(sorted);
    int middle = sorted.length / 2;
    return sorted.length % 2 == 1 ? sorted[middle] : (sorted[middle - 1] + sorted[middle]) / 2;
  }

  static double mostMib(List<TimedProcess> runs) {
    return runs.stream().mapToDouble(TimedProcess::peakMib).max().orElse(0);
  }

  private static double peakMib(Path status) {
    try {
      Matcher peak = PEAK.matcher(Files.readString(status));
      return peak.find() ? Long.parseLong(peak.group(1)) / 1024.0 : 0;
    } catch (IOException ended) {
      return 0;
    }
  }
}
