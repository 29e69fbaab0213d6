package org.kappatrail.duty;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * Times the packaged program's review of a made-up fleet that has samples and no logs, without
 * charts. Arguments: assets, samples of each, runs; 5000, 60 and 3 where they are left out.
 */
public final class SampleRun {
  private SampleRun() {}

  public static void main(String[] args) throws Exception {
    SampleFleet fleet = new SampleFleet(number(args, 0, 5000), number(args, 1, 60), 1);
    Path folder =
        Path.of("target/bench")
            .resolve("samples-" + fleet.assets() + "-" + fleet.samplesPerAsset());
    if (!Files.exists(folder)) {
      fleet.write(folder);
    }
    List<TimedProcess> runs = new ArrayList<>();
    for (int run = 0; run < number(args, 2, 3); run++) {
      runs.add(TimedProcess.of(TimedProcess.review(folder)));
    }
    System.out.printf(
        Locale.ROOT,
        "%,d assets, %,d samples: %.1f s, processor %.1f s, peak memory %.0f MiB%n",
        fleet.assets(),
        fleet.samples(),
        TimedProcess.median(runs, TimedProcess::seconds),
        TimedProcess.median(runs, TimedProcess::cpuSeconds),
        TimedProcess.mostMib(runs));
  }

  private static int number(String[] args, int index, int otherwise) {
    return index < args.length ? Integer.parseInt(args[index]) : otherwise;
  }
}
