package org.kappatrail.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.UnusableInputException;
import org.kappatrail.report.slides.Slides;
import org.kappatrail.review.Review;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** {@code slides}: the reliability meeting's slides. */
@Command(
    name = "slides",
    description =
        "Writes the reliability meeting's slides: the fleet, what needs a decision, a slide per"
            + " asset. Without --asset: the assets at alarm or alert or with something to do, at"
            + " most twelve.",
    mixinStandardHelpOptions = true,
    versionProvider = ProgramVersion.class)
final class SlidesCommand implements Callable<Integer> {
  private static final String NAME = "slides.pptx";

  private final Terminal terminal;

  @Mixin private HistoryOptions options;

  @Option(
      names = "--template",
      paramLabel = "FILE.pptx",
      description = "The site's own template; its master and layouts are used.")
  private @Nullable Path template;

  @Option(
      names = "--out",
      paramLabel = "FILE.pptx",
      description = "Where the slides go; default: reports/<as-of>/slides.pptx.")
  private @Nullable Path out;

  @SuppressWarnings("NullAway.Init") // picocli fills the options
  SlidesCommand(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public Integer call() throws IOException {
    HistoryLoad load = HistoryLoad.ofWholeFleet(options, terminal.clock());
    Path given = out;
    Path file = given != null ? given : Path.of("reports", load.asOf().toString()).resolve(NAME);
    Optional<Path> own = Optional.ofNullable(template);
    if (own.isPresent() && Files.exists(file) && Files.isSameFile(file, own.get())) {
      throw new UnusableInputException(
          file + ": is the template itself, which is not written to; give another --out");
    }
    Slides[] made = new Slides[1];
    terminal.withProgress(
        progress -> {
          Review review = load.review(progress);
          made[0] = new Slides(review, options.assets(), own);
          made[0].write(file);
        });
    int more = made[0].more();
    terminal
        .out()
        .println(
            "Slides: "
                + file
                + " ("
                + made[0].assets()
                + (made[0].assets() == 1 ? " asset" : " assets")
                + (more == 0 ? "" : ", " + more + " more need a decision")
                + ")");
    return ExitCodes.DONE;
  }
}
