package org.kappatrail.duty;

import java.nio.file.Path;
import java.sql.ResultSet;
import java.sql.Statement;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.Settings;

/** The statement alone: DuckDB with the program's settings, rows counted and thrown away. */
final class BareStatement {
  private BareStatement() {}

  /** Arguments: folder, bearings, last day. */
  public static void main(String[] args) throws Exception {
    List<Bearing> bearings = new ArrayList<>();
    for (int bearing = 0; bearing < Integer.parseInt(args[1]); bearing++) {
      bearings.add(bearing(bearing));
    }
    bearings.sort(Comparator.comparing(Bearing::key));
    LocalDate asOf = LocalDate.parse(args[2]);
    DutyOptions options = DutyOptions.defaults();
    List<LogFile> files = new LogFolder(Path.of(args[0]), List.of()).files();
    String sql;
    try (FileSource source = new FileSource(files, settings(), bearings, asOf, options)) {
      sql = source.statement();
    }
    try (DuckEngine engine = new DuckEngine(options);
        Statement statement = engine.statement();
        ResultSet rows = statement.executeQuery(sql)) {
      long count = 0;
      while (rows.next()) {
        count++;
      }
      System.out.println(count + " cells");
    }
  }

  private static Settings settings() {
    Settings defaults = Settings.defaults();
    return new Settings(
        "Bench",
        ZoneId.of("Europe/London"),
        defaults.limits(),
        defaults.outlookDays(),
        defaults.decision(),
        defaults.duty(),
        defaults.laboratory(),
        List.of(),
        List.of());
  }

  static Bearing bearing(int number) {
    return new Bearing(
        Fleet.asset(number),
        "B" + number % 4,
        Optional.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        120,
        Fleet.speedRpm(number),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        0);
  }
}
