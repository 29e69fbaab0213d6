package org.kappatrail.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.kappatrail.report.Pack;
import org.kappatrail.review.Level;
import org.kappatrail.review.Review;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** {@code review}: the monthly review. */
@Command(
    name = "review",
    description =
        "Computes κ of every sample and bearing, judges it, and writes the pack to DIR/<as-of>/.",
    mixinStandardHelpOptions = true,
    versionProvider = ProgramVersion.class)
final class ReviewCommand implements Callable<Integer> {
  private final Terminal terminal;

  @Mixin private HistoryOptions options;

  @Spec private CommandSpec spec;

  @Option(
      names = "--out",
      paramLabel = "DIR",
      defaultValue = "reports",
      description = "Where the pack goes; default: ${DEFAULT-VALUE}.")
  private Path out;

  @Option(
      names = "--since",
      paramLabel = "DATE",
      description = "Say what is new, worse, better and settled since that day.")
  private @Nullable LocalDate since;

  @Option(names = "--no-charts", description = "Leave the charts out.")
  private boolean noCharts;

  @Option(
      names = "--fail-on",
      paramLabel = "WHAT",
      description = "Exit with 1 where there is an ${COMPLETION-CANDIDATES}; alert includes alarm.")
  private @Nullable FailOn failOn;

  /** What makes a review end with exit code 1. */
  enum FailOn {
    alarm,
    alert,
    problem
  }

  @SuppressWarnings("NullAway.Init") // picocli fills the options
  ReviewCommand(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public Integer call() throws IOException {
    HistoryLoad load = new HistoryLoad(options, terminal.clock());
    LocalDate earlier = since;
    if (earlier != null && !earlier.isBefore(load.asOf())) {
      throw new ParameterException(
          spec.commandLine(),
          "--since " + earlier + " is not before the state reviewed, " + load.asOf());
    }
    Path[] place = new Path[1];
    Review[] made = new Review[1];
    terminal.withProgress(
        progress -> {
          Review review = load.review(Optional.ofNullable(earlier), progress);
          made[0] = review;
          place[0] = new Pack(review, load.manifest(review), !noCharts, progress).writeTo(out);
        });
    Review review = made[0];
    new ReviewSummary(review).print(terminal.out());
    terminal.out().println("Page: " + place[0].resolve("index.html"));
    return met(review) ? ExitCodes.FOUND : ExitCodes.DONE;
  }

  private boolean met(Review review) {
    if (failOn == null) {
      return false;
    }
    return switch (failOn) {
      case problem -> !review.problems().isEmpty();
      case alert -> reaches(review, Level.ALERT);
      case alarm -> reaches(review, Level.ALARM);
    };
  }

  private static boolean reaches(Review review, Level least) {
    return review.assets().stream()
        .anyMatch(asset -> asset.level().filter(found -> found.compareTo(least) >= 0).isPresent());
  }
}
