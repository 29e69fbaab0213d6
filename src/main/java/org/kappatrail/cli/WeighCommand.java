package org.kappatrail.cli;

import java.io.IOException;
import java.time.LocalDate;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.NearestName;
import org.kappatrail.history.Oil;
import org.kappatrail.history.UnusableInputException;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.Review;
import org.kappatrail.review.decision.AssetCase;
import org.kappatrail.review.decision.Decision;
import org.kappatrail.review.decision.Weighing;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code weigh}: does the viscosity drop of one asset justify an oil change? */
@Command(
    name = "weigh",
    description = "Weighs an oil change of one asset against the other remedies.",
    mixinStandardHelpOptions = true,
    versionProvider = ProgramVersion.class)
final class WeighCommand implements Callable<Integer> {
  private static final double COLDEST_C = -40;
  private static final double HOTTEST_C = 200;
  private static final int LONGEST_DAYS = 36_600;

  private final Terminal terminal;

  @Spec private CommandSpec spec;

  @Parameters(index = "0", paramLabel = "HISTORY", description = "The history folder.")
  private java.nio.file.Path folder;

  @Option(names = "--asset", paramLabel = "ID", required = true, description = "The asset.")
  private String asset;

  @Option(
      names = "--as-of",
      paramLabel = "DATE",
      description = "Last day that counts; default: the latest sampling date.")
  private @Nullable LocalDate asOf;

  @Option(
      names = "--temperature",
      paramLabel = "C",
      description = "What if its worst bearing ran at this temperature, °C?")
  private @Nullable Double temperatureC;

  @Option(
      names = "--oil",
      paramLabel = "OIL",
      description = "What if it were changed to this oil of the register?")
  private @Nullable String oil;

  @Option(
      names = "--horizon-days",
      paramLabel = "N",
      description = "Days over which a failure counts; default: the site's setting.")
  private @Nullable Integer horizonDays;

  @SuppressWarnings("NullAway.Init") // picocli fills the options
  WeighCommand(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public Integer call() throws IOException {
    check();
    HistoryLoad load =
        new HistoryLoad(
            HistoryOptions.of(folder, asOf, java.util.List.of(asset)), terminal.clock());
    Review[] made = new Review[1];
    terminal.withProgress(progress -> made[0] = load.review(progress));
    AssetReview found = made[0].assets().get(0);
    Optional<Decision> decision = found.decision().map(known -> whatIf(known, load));
    WeighScreen.print(found, decision, what(), terminal.out());
    return ExitCodes.DONE;
  }

  private void check() {
    Double temperature = temperatureC;
    if (temperature != null && !(temperature >= COLDEST_C && temperature <= HOTTEST_C)) {
      throw new ParameterException(
          spec.commandLine(), "--temperature " + temperature + ": must be within -40 and 200 °C");
    }
    Integer days = horizonDays;
    if (days != null && (days < 1 || days > LONGEST_DAYS)) {
      throw new ParameterException(
          spec.commandLine(), "--horizon-days " + days + ": must be within 1 and " + LONGEST_DAYS);
    }
  }

  private Decision whatIf(Decision decision, HistoryLoad load) {
    AssetCase asked = decision.basis();
    String wanted = oil;
    if (wanted != null) {
      asked = asked.changingTo(oil(wanted, load));
    }
    Double temperature = temperatureC;
    if (temperature != null) {
      asked = asked.atTemperature(temperature);
    }
    Integer days = horizonDays;
    if (days != null) {
      asked = asked.over(days);
    }
    return Weighing.of(asked);
  }

  private static Oil oil(String id, HistoryLoad load) {
    return load.intake()
        .history()
        .findOil(id)
        .orElseThrow(
            () ->
                new UnusableInputException(
                    "no oil '"
                        + id
                        + "' in oils.csv"
                        + NearestName.of(
                                id, load.intake().history().oils().stream().map(Oil::id).toList())
                            .map(name -> "; nearest is '" + name + "'")
                            .orElse("")));
  }

  private String what() {
    StringBuilder text = new StringBuilder();
    if (temperatureC != null) {
      text.append(" at ").append(temperatureC).append(" °C");
    }
    if (oil != null) {
      text.append(" changed to ").append(oil);
    }
    if (horizonDays != null) {
      text.append(" over ").append(horizonDays).append(" days");
    }
    return text.toString();
  }
}
