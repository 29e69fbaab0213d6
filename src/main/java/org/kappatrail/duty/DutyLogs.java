package org.kappatrail.duty;

import java.nio.file.Path;
import java.sql.SQLException;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Settings;
import org.kappatrail.history.UnusableInputException;

/** Opens the logs of a history. */
public final class DutyLogs {
  private DutyLogs() {}

  /**
   * The logs of a history folder: the files in its folder {@code temperatures}, and the files and
   * database tables that the settings name beside them. Headers are read at once, readings when
   * they are asked for. Interrupting the thread that reads cancels the reading, which then ends
   * with a {@link java.util.concurrent.CancellationException}.
   *
   * @param folder the history folder
   * @param settings zone, limits and the blocks that say how exports are read
   * @param history the register
   * @param asOf last local day that is used
   * @param options means that may be used
   * @throws UnusableInputException where a file or database cannot be read at all
   */
  public static DutyLog open(
      Path folder, Settings settings, PlantHistory history, LocalDate asOf, DutyOptions options) {
    List<Bearing> bearings =
        history.bearings().stream().sorted(Comparator.comparing(Bearing::key)).toList();
    LogFolder found = new LogFolder(folder, settings.logExports());
    List<DutySource> sources = new ArrayList<>();
    try {
      if (!found.files().isEmpty()) {
        sources.add(new FileSource(found.files(), settings, bearings, asOf, options));
      }
      for (ExportMapping mapping : settings.logExports()) {
        if (mapping.jdbc().isPresent()) {
          sources.add(
              new DatabaseSource(mapping, DatabaseLogin.ofEnvironment(), settings, bearings, asOf));
        }
      }
    } catch (SQLException e) {
      sources.forEach(DutySource::close);
      throw EngineFailure.of(e);
    } catch (RuntimeException e) {
      sources.forEach(DutySource::close);
      throw e;
    }
    return new MergedDutyLog(sources, found.problems());
  }

  /** A history without logs. */
  public static DutyLog empty() {
    return new MergedDutyLog(List.of(), List.of());
  }
}
