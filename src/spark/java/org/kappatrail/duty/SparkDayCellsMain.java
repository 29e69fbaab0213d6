package org.kappatrail.duty;

import java.io.IOException;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.apache.spark.sql.Dataset;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.SparkSession;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.Settings;
import org.kappatrail.history.UnusableInputException;

/**
 * Writes day cells as Parquet from a cluster: {@code --readings} a table, or a Parquet path, which
 * has a slash in it, {@code --bearings} the register's {@code bearings.csv}, {@code --as-of} a
 * date, {@code --out} a folder that is not there yet; {@code --timezone}, {@code --gap-minutes} and
 * {@code --running-speed-percent} as in the settings.
 */
public final class SparkDayCellsMain {
  private SparkDayCellsMain() {}

  /** Runs and ends the session. */
  public static void main(String[] args) throws IOException {
    try (SparkSession session =
        SparkSession.builder().appName("kappatrail day cells").getOrCreate()) {
      write(session, args);
    }
  }

  /** Writes what the arguments ask for. */
  static void write(SparkSession session, String... args) {
    Map<String, String> options = options(args);
    String from = required(options, "--readings");
    Dataset<Row> readings =
        from.indexOf('/') < 0 ? session.table(from) : session.read().parquet(from);
    SparkDayCells.of(
            session,
            readings,
            ExportMapping.canonical("*"),
            bearings(session, required(options, "--bearings")),
            settings(options),
            LocalDate.parse(required(options, "--as-of")))
        .write()
        .parquet(required(options, "--out"));
  }

  /** Names and nominal speeds, which are all that the statement needs of the register. */
  static List<Bearing> bearings(SparkSession session, String file) {
    return session
        .read()
        .option("header", true)
        .csv(file)
        .selectExpr("asset", "bearing", "CAST(speed_rpm AS DOUBLE)")
        .collectAsList()
        .stream()
        .map(row -> bearing(row.getString(0), row.getString(1), row.getDouble(2)))
        .toList();
  }

  private static Bearing bearing(String asset, String id, double speedRpm) {
    double anyPitchMm = 100;
    return new Bearing(
        asset,
        id,
        Optional.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        anyPitchMm,
        speedRpm,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        0);
  }

  private static Settings settings(Map<String, String> options) {
    Settings defaults = Settings.defaults();
    Settings.Duty duty = defaults.duty();
    return new Settings(
        defaults.site(),
        ZoneId.of(options.getOrDefault("--timezone", "UTC")),
        defaults.limits(),
        defaults.outlookDays(),
        defaults.decision(),
        new Settings.Duty(
            duty.windowDays(),
            Integer.parseInt(
                options.getOrDefault("--gap-minutes", Integer.toString(duty.gapMinutes()))),
            Double.parseDouble(
                options.getOrDefault(
                    "--running-speed-percent", Double.toString(duty.runningSpeedPercent()))),
            duty.uncertaintyC()),
        defaults.laboratory(),
        List.of(),
        List.of());
  }

  private static Map<String, String> options(String[] args) {
    Map<String, String> options = new LinkedHashMap<>();
    for (int index = 0; index + 1 < args.length; index += 2) {
      options.put(args[index], args[index + 1]);
    }
    return options;
  }

  private static String required(Map<String, String> options, String name) {
    String value = options.get(name);
    if (value == null) {
      throw new UnusableInputException(
          name + " is missing; needed are --readings, --bearings, --as-of and --out");
    }
    return value;
  }
}
