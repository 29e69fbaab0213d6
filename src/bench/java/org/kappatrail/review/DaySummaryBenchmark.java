package org.kappatrail.review;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.kappatrail.duty.DutyCells;
import org.kappatrail.history.Asset;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.Charge;
import org.kappatrail.history.Oil;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.tribology.OilSupply;
import org.kappatrail.tribology.OilViscosity;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** A year of one bearing: 365 days of 200 cells to daily κ. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class DaySummaryBenchmark {
  private static final LocalDate START = LocalDate.of(2025, 1, 1);

  private final Bearing bearing = bearing();
  private final OilTimeline oil = oil();
  private final DutyCells cells = cells();

  @Benchmark
  public List<DayKappa> yearOfDays() {
    return DailyKappa.of(bearing, cells, oil);
  }

  private static DutyCells cells() {
    Random random = new Random(1);
    DutyCells.Builder cells = new DutyCells.Builder();
    for (int day = 0; day < 365; day++) {
      for (int cell = 0; cell < 200; cell++) {
        double temperatureC = 55 + 0.1 * cell + random.nextDouble() * 0.1;
        cells.add(
            Math.toIntExact(START.plusDays(day).toEpochDay()),
            true,
            432_000,
            7,
            temperatureC,
            temperatureC - 0.1,
            temperatureC + 0.1,
            true,
            1400 + random.nextInt(80));
      }
    }
    return cells.build();
  }

  private static OilTimeline oil() {
    Oil oil =
        new Oil(
            "VG 220",
            OptionalInt.of(220),
            OilViscosity.measured(220, 18.9),
            false,
            false,
            OptionalDouble.empty(),
            Map.of());
    Asset asset =
        new Asset(
            "Mill",
            "Mill",
            "",
            oil.id(),
            OilSupply.BATH,
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalInt.empty());
    PlantHistory history =
        new PlantHistory(List.of(oil), List.of(asset), List.of(), List.of(), List.of());
    Charge charge =
        new Charge(
            "Mill",
            1,
            oil.id(),
            Charge.Origin.RECORDED,
            Optional.of(START),
            Optional.empty(),
            List.of());
    return new OilTimeline(List.of(charge), history);
  }

  private static Bearing bearing() {
    return new Bearing(
        "Mill",
        "DE",
        Optional.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        120,
        1480,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        0);
  }
}
