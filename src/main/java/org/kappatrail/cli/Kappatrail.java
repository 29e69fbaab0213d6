package org.kappatrail.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.time.Clock;
import org.kappatrail.history.UnusableInputException;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import picocli.CommandLine.ScopeType;
import picocli.CommandLine.Spec;

/** The program's top command; without a subcommand it prints its usage. */
@Command(
    name = "kappatrail",
    description =
        "Reviews the oil film of rolling bearings from oil-analysis results and temperature logs.",
    mixinStandardHelpOptions = true,
    versionProvider = ProgramVersion.class,
    synopsisSubcommandLabel = "COMMAND",
    footer = {
      "",
      "Exit codes: 0 done; 1 done and --fail-on was met, or problems were found by check;",
      "2 usage; 3 an input cannot be used; 70 a bug.",
      "Decision support: it does not replace the maker's manual, the site's rules or a qualified"
          + " engineer."
    })
public final class Kappatrail implements Runnable {
  private final PrintWriter out;
  private final PrintWriter err;
  private final Terminal terminal;

  @Spec private CommandSpec spec;

  @Option(
      names = "--debug",
      scope = ScopeType.INHERIT,
      description = "Print the stack trace of a bug.")
  private boolean debug;

  /**
   * The program with its streams.
   *
   * @param out results
   * @param err progress and diagnostics
   * @param interactive true on a terminal
   * @param clock tells which sampling dates lie in the future
   */
  @SuppressWarnings("NullAway.Init") // picocli fills the spec
  public Kappatrail(PrintWriter out, PrintWriter err, boolean interactive, Clock clock) {
    this.out = out;
    this.err = err;
    this.terminal = new Terminal(out, err, interactive, clock);
  }

  /** Runs a command line and gives the exit code. */
  public int run(String... args) {
    CommandLine line =
        new CommandLine(this)
            .addSubcommand(new ReviewCommand(terminal))
            .addSubcommand(new CheckCommand(terminal))
            .addSubcommand(new SlidesCommand(terminal))
            .addSubcommand(new WeighCommand(terminal))
            .addSubcommand(new AdoptCommand(terminal))
            .addSubcommand(new PointCommand(terminal))
            .setOut(out)
            .setErr(err)
            .setCaseInsensitiveEnumValuesAllowed(true)
            .setUsageHelpAutoWidth(false)
            .setParameterExceptionHandler(Kappatrail::usageError)
            .setExecutionExceptionHandler(this::failure);
    int code = line.execute(args);
    out.flush();
    err.flush();
    return code;
  }

  @Override
  public void run() {
    spec.commandLine().usage(out);
  }

  private static int usageError(ParameterException problem, String[] args) {
    CommandLine line = problem.getCommandLine();
    line.getErr().println("kappatrail: " + problem.getMessage());
    if (!CommandLine.UnmatchedArgumentException.printSuggestions(problem, line.getErr())) {
      line.getErr().println("Try '" + line.getCommandSpec().qualifiedName() + " --help'.");
    }
    return ExitCodes.USAGE;
  }

  private int failure(Exception problem, CommandLine line, ParseResult parsed) {
    if (Thread.currentThread().isInterrupted()) {
      err.println("kappatrail: stopped");
      return ExitCodes.STOPPED;
    }
    if (problem instanceof UnusableInputException) {
      err.println("kappatrail: " + problem.getMessage());
      return ExitCodes.UNUSABLE_INPUT;
    }
    if (problem instanceof IOException failure) {
      err.println("kappatrail: " + reason(failure));
      return ExitCodes.UNUSABLE_INPUT;
    }
    err.println(
        "kappatrail: this is a bug ("
            + problem
            + "). Please report it with the command line"
            + (debug ? "." : "; --debug prints where it happened."));
    if (debug) {
      problem.printStackTrace(err);
    }
    return ExitCodes.BUG;
  }

  private static String reason(IOException problem) {
    if (problem instanceof AccessDeniedException denied) {
      return denied.getFile() + ": access denied; check the permissions";
    }
    if (problem instanceof FileSystemException file) {
      String why = file.getReason();
      return file.getFile() + ": " + (why == null ? "cannot be used" : why);
    }
    return String.valueOf(problem.getMessage());
  }
}
