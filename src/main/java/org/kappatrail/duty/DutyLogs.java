package org.kappatrail.duty;

import java.nio.file.Path;
import java.sql.SQLException;
import java.time.LocalDate;
import java.util.List;
import java.util.function.Consumer;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Problem;
import org.kappatrail.history.Settings;
import org.kappatrail.history.UnusableInputException;

/** Opens the logs of a history. */
public final class DutyLogs {
  private DutyLogs() {}

  /**
   * The logs of a history folder: the files in its folder {@code temperatures} and what the
   * settings name beside them. Headers are read at once, readings when they are asked for.
   *
   * @param folder the history folder
   * @param settings zone, limits and the blocks that say how exports are read
   * @param history the register
   * @param asOf last local day that is used
   * @param options means that may be used
   * @throws UnusableInputException where a file cannot be read at all
   */
  public static DutyLog open(
      Path folder, Settings settings, PlantHistory history, LocalDate asOf, DutyOptions options) {
    LogFolder found = new LogFolder(folder, settings.logExports());
    if (found.files().isEmpty()) {
      return new NoLog(found.problems());
    }
    try {
      return new FileDutyLog(found, settings, history.bearings(), asOf, options);
    } catch (SQLException e) {
      throw EngineFailure.of(e);
    }
  }

  /** A history without logs. */
  public static DutyLog empty() {
    return new NoLog(List.of());
  }

  private record NoLog(List<Problem> problems) implements DutyLog {
    @Override
    public void forEachBearing(Consumer<BearingDuty> use) {
      // There is no bearing with readings.
    }

    @Override
    public List<FileAccount> accounts() {
      return List.of();
    }

    @Override
    public void close() {
      // Nothing is held.
    }
  }
}
