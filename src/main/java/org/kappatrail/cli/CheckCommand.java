package org.kappatrail.cli;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import org.kappatrail.duty.BearingDuty;
import org.kappatrail.duty.DutyCells;
import org.kappatrail.duty.DutyLog;
import org.kappatrail.intake.HistoryCheck;
import org.kappatrail.intake.LogAccount;
import org.kappatrail.intake.LogSpan;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** {@code check}: reads all inputs and says what is wrong and what is missing. */
@Command(
    name = "check",
    description = "Reads all inputs, prints what is wrong and what is missing, computes nothing.",
    mixinStandardHelpOptions = true,
    versionProvider = ProgramVersion.class)
final class CheckCommand implements Callable<Integer> {
  private final Terminal terminal;

  @Mixin private HistoryOptions options;

  @SuppressWarnings("NullAway.Init") // picocli fills the options
  CheckCommand(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public Integer call() throws IOException {
    HistoryLoad load = HistoryLoad.toCheck(options, terminal.clock());
    List<LogSpan> spans = new ArrayList<>();
    LogAccount logs;
    try (DutyLog log = load.openLog()) {
      log.forEachBearing(duty -> span(duty, spans));
      logs = new LogAccount(log.accounts(), log.problems(), spans, log.unknownBearings());
    }
    terminal.out().print(HistoryCheck.text(load.intake().upTo(load.asOf()), logs));
    boolean clean = load.intake().problems().isEmpty() && logs.problems().isEmpty();
    return clean ? ExitCodes.DONE : ExitCodes.FOUND;
  }

  private static void span(BearingDuty duty, List<LogSpan> spans) {
    DutyCells cells = duty.cells();
    if (cells.size() > 0) {
      spans.add(
          new LogSpan(
              duty.bearing(),
              java.time.LocalDate.ofEpochDay(cells.epochDay(0)),
              java.time.LocalDate.ofEpochDay(cells.epochDay(cells.size() - 1))));
    }
  }
}
