package org.kappatrail.review.correlation;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Random;

/**
 * Times every correlation of a made-up fleet; prints the tests and the seconds of each run, the
 * first with a cold machine. Options in order: assets 300, samples 60, variables 15, runs 3.
 */
public final class FleetCorrelations {
  private static final int DAYS_APART = 30;
  private static final double PERSISTENCE = 0.5;
  private static final double MISSING = 0.05;

  private FleetCorrelations() {}

  public static void main(String[] args) {
    int[] sizes = {300, 60, 15, 3};
    for (int i = 0; i < Math.min(args.length, sizes.length); i++) {
      sizes[i] = Integer.parseInt(args[i]);
    }
    List<AssetSeries> fleet = fleet(sizes[0], sizes[1], sizes[2]);
    for (int run = 0; run < sizes[3]; run++) {
      long start = System.nanoTime();
      CorrelationResults results = Correlations.of(fleet);
      System.out.printf(
          Locale.ROOT,
          "%d tests in %.2f s%n",
          results.assets().size() + results.fleet().size(),
          (System.nanoTime() - start) / 1e9);
    }
  }

  private static List<AssetSeries> fleet(int assets, int samples, int variables) {
    Random random = new Random(1);
    List<AssetSeries> fleet = new ArrayList<>();
    for (int asset = 0; asset < assets; asset++) {
      List<Double> days = new ArrayList<>();
      for (int i = 0; i < samples; i++) {
        days.add((double) i * DAYS_APART);
      }
      List<Variable> series = new ArrayList<>();
      for (int i = 0; i < variables; i++) {
        String name = i == 0 ? Names.KAPPA : i == 1 ? Names.KAPPA_REFERENCE : "metal" + i + "_ppm";
        series.add(Variable.of(name, values(samples, random)));
      }
      fleet.add(new AssetSeries("A" + asset, days, series));
    }
    return fleet;
  }

  private static List<Optional<Value>> values(int samples, Random random) {
    List<Optional<Value>> values = new ArrayList<>();
    double state = random.nextGaussian();
    for (int i = 0; i < samples; i++) {
      state = PERSISTENCE * state + random.nextGaussian();
      values.add(
          random.nextDouble() < MISSING ? Optional.empty() : Optional.of(Value.measured(state)));
    }
    return values;
  }
}
