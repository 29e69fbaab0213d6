package org.kappatrail.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.kappatrail.intake.ExportAdoption;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** {@code adopt}: writes the settings block that reads a foreign export. */
@Command(
    name = "adopt",
    description = {
      "Reads a foreign lab or log export and prints the block for kappatrail.yaml that reads it.",
      "Lines that begin with # say what the file does not settle, and how its first rows are read."
    },
    mixinStandardHelpOptions = true,
    versionProvider = ProgramVersion.class)
final class AdoptCommand implements Callable<Integer> {
  private final Terminal terminal;

  @Parameters(
      index = "0",
      paramLabel = "FILE",
      description = "A .csv, .csv.gz, .txt or .xlsx file as the laboratory or historian sent it.")
  @SuppressWarnings("NullAway.Init")
  private Path file;

  @SuppressWarnings("NullAway.Init") // picocli fills the file
  AdoptCommand(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public Integer call() {
    terminal.out().print(ExportAdoption.adopt(file));
    return ExitCodes.DONE;
  }
}
