package org.kappatrail.duty;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;

/**
 * Times the packaged program's review of a made-up fleet against the bare statement over the same
 * files, each in a process of its own, in turn; prints every run, the median times, the median of
 * the ratios pair by pair, in time and in processor time, the throughput and the peak memory. On a
 * machine that others use too, the ratio in processor time is the steadier one. Options: {@code
 * --bearings 100 --days 365 --interval-seconds 60 --format csv|parquet --runs 3 --seed 1 --folder
 * target/bench}.
 */
public final class WholeRun {
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
    List<TimedProcess> bare = new ArrayList<>();
    List<TimedProcess> whole = new ArrayList<>();
    for (int run = 0; run < runs; run++) {
      bare.add(TimedProcess.of(bareCommand(fleet, folder)));
      whole.add(TimedProcess.of(TimedProcess.review(folder)));
      System.out.printf(
          Locale.ROOT,
          "run %d: bare %.1f s (processor %.1f s), review %.1f s (processor %.1f s)%n",
          run + 1,
          bare.get(run).seconds(),
          bare.get(run).cpuSeconds(),
          whole.get(run).seconds(),
          whole.get(run).cpuSeconds());
    }
    print(fleet, bare, whole);
  }

  private static List<String> bareCommand(Fleet fleet, Path folder) {
    return List.of(
        TimedProcess.java(),
        "-cp",
        System.getProperty("java.class.path"),
        BareStatement.class.getName(),
        folder.toString(),
        Integer.toString(fleet.bearings()),
        fleet.lastDay().toString());
  }

  private static void print(Fleet fleet, List<TimedProcess> bare, List<TimedProcess> whole) {
    double wholeSeconds = TimedProcess.median(whole, TimedProcess::seconds);
    System.out.printf(
        Locale.ROOT,
        "%,d readings, %s%nbare statement %.1f s, processor %.1f s, peak memory %.0f MiB%n"
            + "review %.1f s, processor %.1f s, peak memory %.0f MiB%n"
            + "review over bare statement: %.2f in time, %.2f in processor time%n"
            + "%.2f million readings a second%n",
        fleet.readings(),
        fleet.parquet() ? "Parquet" : "CSV",
        TimedProcess.median(bare, TimedProcess::seconds),
        TimedProcess.median(bare, TimedProcess::cpuSeconds),
        TimedProcess.mostMib(bare),
        wholeSeconds,
        TimedProcess.median(whole, TimedProcess::cpuSeconds),
        TimedProcess.mostMib(whole),
        medianRatio(whole, bare, TimedProcess::seconds),
        medianRatio(whole, bare, TimedProcess::cpuSeconds),
        fleet.readings() / wholeSeconds / 1e6);
  }

  private static double medianRatio(
      List<TimedProcess> over, List<TimedProcess> under, ToDoubleFunction<TimedProcess> figure) {
    return TimedProcess.median(
        IntStream.range(0, over.size())
            .mapToDouble(
                run -> figure.applyAsDouble(over.get(run)) / figure.applyAsDouble(under.get(run)))
            .toArray());
  }
}
