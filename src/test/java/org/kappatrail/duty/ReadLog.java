package org.kappatrail.duty;

import java.nio.file.Path;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.BearingKey;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Problem;
import org.kappatrail.history.Settings;

/** All that reading a folder's logs gives. */
record ReadLog(
    Map<BearingKey, List<String>> lines,
    List<FileAccount> accounts,
    List<ReadingFates> fates,
    List<Problem> problems) {

  static ReadLog of(
      Path folder, ZoneId zone, List<Bearing> bearings, LocalDate asOf, ExportMapping... blocks) {
    Map<BearingKey, List<String>> lines = new TreeMap<>();
    try (DutyLog log =
        DutyLogs.open(
            folder,
            settings(zone, blocks),
            Plant.of(bearings.toArray(new Bearing[0])),
            asOf,
            new DutyOptions(2, 256, folder))) {
      log.forEachBearing(duty -> lines.put(duty.bearing(), BruteForce.lines(duty)));
      return new ReadLog(lines, log.accounts(), log.fates(), log.problems());
    }
  }

  static Settings settings(ZoneId zone, ExportMapping... blocks) {
    Settings defaults = Settings.defaults();
    return new Settings(
        defaults.site(),
        zone,
        defaults.limits(),
        defaults.outlookDays(),
        defaults.decision(),
        defaults.duty(),
        defaults.laboratory(),
        defaults.sampleExports(),
        List.of(blocks));
  }

  /** Problems as they are printed. */
  List<String> messages() {
    return problems.stream().map(Problem::toString).toList();
  }

  /** The lines of the only bearing. */
  List<String> only() {
    return lines.values().iterator().next();
  }
}
