package org.kappatrail.duty;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Times the packaged program's review of a made-up fleet against the bare statement over the same
 * files, each in a process of its own, in turn; prints the median times, their ratio, the
 * throughput and the peak memory of the review. Options: {@code --bearings 100 --days 365
 * --interval-seconds 60 --format csv|parquet --runs 3 --seed 1 --folder target/bench}. Peak memory
 * needs Linux.
 */
public final class WholeRun {
  private static final Pattern PEAK = Pattern.compile("VmHWM:\\s+(\\d+) kB");

  private record Timed(double seconds, long peakKib) {}

  private WholeRun() {}

  public static void main(String[] args) throws Exception {
    Map<String, String> options = new TreeMap<>();
    for (int index = 0; index + 1 < args.length; index += 2) {
      options.put(args[index], args[index + 1]);
    }
    Fleet fleet =
        new Fleet(
            Integer.parseInt(options.getOrDefault("--bearings", "100")),
            Integer.parseInt(options.getOrDefault("--days", "365")),
            Integer.parseInt(options.getOrDefault("--interval-seconds", "60")),
            options.getOrDefault("--format", "csv").equals("parquet"),
            Long.parseLong(options.getOrDefault("--seed", "1")));
    Path folder =
        Path.of(options.getOrDefault("--folder", "target/bench"))
            .resolve(
                String.format(
                    Locale.ROOT,
                    "%d-%d-%d-%s-%d",
                    fleet.bearings(),
                    fleet.days(),
                    fleet.intervalSeconds(),
                    fleet.parquet() ? "parquet" : "csv",
                    fleet.seed()));
    if (!Files.exists(folder)) {
      fleet.write(folder);
    }
    int runs = Integer.parseInt(options.getOrDefault("--runs", "3"));
    List<Timed> bare = new ArrayList<>();
    List<Timed> whole = new ArrayList<>();
    for (int run = 0; run < runs; run++) {
      bare.add(time(bareCommand(fleet, folder)));
      whole.add(time(reviewCommand(folder)));
    }
    print(fleet, bare, whole);
  }

  private static List<String> bareCommand(Fleet fleet, Path folder) {
    return List.of(
        java(),
        "-cp",
        System.getProperty("java.class.path"),
        BareStatement.class.getName(),
        folder.toString(),
        Integer.toString(fleet.bearings()),
        fleet.lastDay().toString());
  }

  private static List<String> reviewCommand(Path folder) {
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

  private static String java() {
    return Path.of(System.getProperty("java.home"), "bin", "java").toString();
  }

  private static Timed time(List<String> command) throws IOException, InterruptedException {
    long start = System.nanoTime();
    Process process =
        new ProcessBuilder(command)
            .redirectErrorStream(true)
            .redirectOutput(new File("target/bench.log"))
            .start();
    Path status = Path.of("/proc", Long.toString(process.pid()), "status");
    long peak = 0;
    while (!process.waitFor(20, TimeUnit.MILLISECONDS)) {
      peak = Math.max(peak, peak(status));
    }
    double seconds = (System.nanoTime() - start) / 1e9;
    if (process.exitValue() != 0) {
      throw new IllegalStateException(
          "exit " + process.exitValue() + ": " + Files.readString(Path.of("target/bench.log")));
    }
    return new Timed(seconds, peak);
  }

  private static long peak(Path status) {
    try {
      Matcher peak = PEAK.matcher(Files.readString(status));
      return peak.find() ? Long.parseLong(peak.group(1)) : 0;
    } catch (IOException ended) {
      return 0;
    }
  }

  private static void print(Fleet fleet, List<Timed> bare, List<Timed> whole) {
    double bareSeconds = median(bare);
    double wholeSeconds = median(whole);
    long peakKib = whole.stream().mapToLong(Timed::peakKib).max().orElse(0);
    System.out.printf(
        Locale.ROOT,
        "%,d readings, %s%nbare statement %.1f s%nreview %.1f s, %.2f times the bare statement,"
            + " %.2f million readings a second, peak memory %.0f MiB%n",
        fleet.readings(),
        fleet.parquet() ? "Parquet" : "CSV",
        bareSeconds,
        wholeSeconds,
        wholeSeconds / bareSeconds,
        fleet.readings() / wholeSeconds / 1e6,
        peakKib / 1024.0);
  }

  private static double median(List<Timed> runs) {
    double[] seconds = runs.stream().mapToDouble(Timed::seconds).sorted().toArray();
    int middle = seconds.length / 2;
    return seconds.length % 2 == 1 ? seconds[middle] : (seconds[middle - 1] + seconds[middle]) / 2;
  }
}
