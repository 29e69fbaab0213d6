package org.kappatrail.duty;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import java.util.function.ToDoubleFunction;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.IntStream;

/**
 * Times the packaged program's review of a made-up fleet against the bare statement over the same
 * files, each in a process of its own, in turn; prints the median times, the median of the ratios
 * pair by pair, in time and in processor time, the throughput and the peak memory of the review. On
 * a machine that others use too, the ratio in processor time is the steadier one. Options: {@code
 * --bearings 100 --days 365 --interval-seconds 60 --format csv|parquet --runs 3 --seed 1 --folder
 * target/bench}. Peak memory needs Linux.
 */
public final class WholeRun {
  private static final Pattern PEAK = Pattern.compile("VmHWM:\\s+(\\d+) kB");

  private record Timed(double seconds, double cpuSeconds, long peakKib) {}

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
    double cpuSeconds = 0;
    while (!process.waitFor(20, TimeUnit.MILLISECONDS)) {
      peak = Math.max(peak, peak(status));
      cpuSeconds =
          process.info().totalCpuDuration().map(time -> time.toMillis() / 1e3).orElse(cpuSeconds);
    }
    double seconds = (System.nanoTime() - start) / 1e9;
    if (process.exitValue() != 0) {
      throw new IllegalStateException(
          "exit " + process.exitValue() + ": " + Files.readString(Path.of("target/bench.log")));
    }
    return new Timed(seconds, cpuSeconds, peak);
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
    double wholeSeconds = median(whole, Timed::seconds);
    System.out.printf(
        Locale.ROOT,
        "%,d readings, %s%nbare statement %.1f s, processor %.1f s, peak memory %.0f MiB%n"
            + "review %.1f s, processor %.1f s, peak memory %.0f MiB%n"
            + "review over bare statement: %.2f in time, %.2f in processor time%n"
            + "%.2f million readings a second%n",
        fleet.readings(),
        fleet.parquet() ? "Parquet" : "CSV",
        median(bare, Timed::seconds),
        median(bare, Timed::cpuSeconds),
        peakMib(bare),
        wholeSeconds,
        median(whole, Timed::cpuSeconds),
        peakMib(whole),
        medianRatio(whole, bare, Timed::seconds),
        medianRatio(whole, bare, Timed::cpuSeconds),
        fleet.readings() / wholeSeconds / 1e6);
  }

  private static double peakMib(List<Timed> runs) {
    return runs.stream().mapToLong(Timed::peakKib).max().orElse(0) / 1024.0;
  }

  private static double median(List<Timed> runs, ToDoubleFunction<Timed> figure) {
    return median(runs.stream().mapToDouble(figure).toArray());
  }

  private static double medianRatio(
      List<Timed> over, List<Timed> under, ToDoubleFunction<Timed> figure) {
    return median(
        IntStream.range(0, over.size())
            .mapToDouble(
                run -> figure.applyAsDouble(over.get(run)) / figure.applyAsDouble(under.get(run)))
            .toArray());
  }

  private static double median(double[] figures) {
    double[] sorted = figures.clone();
    Arrays.sort(sorted);
    int middle = sorted.length / 2;
    return sorted.length % 2 == 1 ? sorted[middle] : (sorted[middle - 1] + sorted[middle]) / 2;
  }
}
