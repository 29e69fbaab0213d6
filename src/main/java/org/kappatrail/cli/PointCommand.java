package org.kappatrail.cli;

import java.util.Locale;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.kappatrail.report.page.Working;
import org.kappatrail.review.SinglePoint;
import picocli.CommandLine.ArgGroup;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** {@code point}: one κ from the command line, with its working. */
@Command(
    name = "point",
    description = "Computes one κ from numbers on the command line and prints its working.",
    mixinStandardHelpOptions = true,
    versionProvider = ProgramVersion.class)
final class PointCommand implements Callable<Integer> {
  private final Terminal terminal;

  @Spec private CommandSpec spec;

  @Option(
      names = "--v40",
      required = true,
      paramLabel = "CST",
      description = "Kinematic viscosity at 40 °C, mm²/s.")
  private double v40;

  @ArgGroup(multiplicity = "1")
  private SecondPoint second;

  @Option(
      names = "--temperature",
      required = true,
      paramLabel = "C",
      description = "Operating temperature, °C.")
  private double temperatureC;

  @Option(names = "--speed", required = true, paramLabel = "RPM", description = "Speed, r/min.")
  private double speedRpm;

  @ArgGroup(exclusive = true, multiplicity = "1")
  private Size size;

  @SuppressWarnings("NullAway.Init") // picocli fills them
  PointCommand(Terminal terminal) {
    this.terminal = terminal;
  }

  /** Viscosity at 100 °C, or viscosity index. */
  static final class SecondPoint {
    @Option(
        names = "--v100",
        paramLabel = "CST",
        description = "Kinematic viscosity at 100 °C, mm²/s.")
    private @Nullable Double v100;

    @Option(names = "--vi", paramLabel = "VI", description = "Viscosity index.")
    private @Nullable Double vi;
  }

  /** Pitch diameter, or bore and outside. */
  static final class Size {
    @Option(
        names = "--pitch",
        required = true,
        paramLabel = "MM",
        description = "Pitch diameter Dpw, mm.")
    private @Nullable Double pitchMm;

    @ArgGroup(exclusive = false)
    private @Nullable Rings rings;
  }

  /** Both ring diameters. */
  static final class Rings {
    @Option(
        names = "--bore",
        required = true,
        paramLabel = "MM",
        description = "Bore diameter, mm.")
    private double boreMm;

    @Option(
        names = "--outside",
        required = true,
        paramLabel = "MM",
        description = "Outside diameter, mm.")
    private double outsideMm;
  }

  @Override
  public Integer call() {
    try {
      double pitchMm =
          SinglePoint.pitchMm(
              optional(size.pitchMm),
              size.rings == null ? OptionalDouble.empty() : OptionalDouble.of(size.rings.boreMm),
              size.rings == null
                  ? OptionalDouble.empty()
                  : OptionalDouble.of(size.rings.outsideMm));
      SinglePoint point =
          SinglePoint.of(
              v40, optional(second.v100), optional(second.vi), temperatureC, speedRpm, pitchMm);
      for (Working.Line line : Working.of(point)) {
        terminal
            .out()
            .printf(Locale.ROOT, "%-14s %-22s %s%n", line.quantity(), line.value(), line.from());
      }
      return ExitCodes.DONE;
    } catch (IllegalArgumentException e) {
      throw new ParameterException(spec.commandLine(), String.valueOf(e.getMessage()), e);
    }
  }

  private static OptionalDouble optional(@Nullable Double value) {
    return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
  }
}
