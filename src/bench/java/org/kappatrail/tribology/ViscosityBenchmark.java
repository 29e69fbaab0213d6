package org.kappatrail.tribology;

import java.util.OptionalDouble;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** κ of one cell, and the viscosity at 100 °C that gives an index. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class ViscosityBenchmark {
  private final OilViscosity oil = OilViscosity.measured(220, 18.9);
  private double temperatureC = 60;
  private double viscosity40Cst = 180;

  /** Temperatures walk, so that nothing can be computed once. */
  @Benchmark
  public double kappaOfOneCell() {
    temperatureC = temperatureC > 90 ? 60 : temperatureC + 0.01;
    return ViscosityRatio.kappa(
        oil.viscosityCst(temperatureC), Iso281RatedViscosity.ratedViscosityCst(1480, 120));
  }

  @Benchmark
  public OptionalDouble viscosity100FromIndex() {
    viscosity40Cst = viscosity40Cst > 240 ? 180 : viscosity40Cst + 0.1;
    return AstmD2270.viscosity100Cst(viscosity40Cst, 96);
  }
}
