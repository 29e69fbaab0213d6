package org.kappatrail.duty;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.LocalDate;
import java.util.Locale;

/**
 * A made-up fleet's history of any size, the same for the same numbers: every asset has four
 * bearings with temperature and speed logged at one interval, and a sample a month.
 *
 * @param bearings number of bearings
 * @param days days of log
 * @param intervalSeconds time between readings
 * @param parquet true for Parquet files with typed columns, false for CSV
 * @param seed changes every reading
 */
record Fleet(int bearings, int days, int intervalSeconds, boolean parquet, long seed) {
  static final LocalDate START = LocalDate.of(2025, 1, 1);
  private static final int DAYS_PER_FILE = 30;
  private static final int BEARINGS_PER_ASSET = 4;

  long readings() {
    return (long) bearings * days * (86_400 / intervalSeconds);
  }

  LocalDate lastDay() {
    return START.plusDays(days - 1L);
  }

  static String asset(int bearing) {
    return String.format(Locale.ROOT, "M%04d", bearing / BEARINGS_PER_ASSET);
  }

  static double speedRpm(int bearing) {
    return 400 + 10 * (bearing % 200);
  }

  /** Writes the history folder. */
  void write(Path folder) throws IOException, SQLException {
    Files.createDirectories(folder.resolve("samples"));
    Files.createDirectories(folder.resolve("temperatures"));
    Files.writeString(folder.resolve("kappatrail.yaml"), "site: Bench\ntimezone: Europe/London\n");
    Files.writeString(
        folder.resolve("oils.csv"), "oil,viscosity_40c_cst,viscosity_index\nVG 220,220,96\n");
    writeRegister(folder);
    writeSamples(folder);
    writeReadings(folder);
  }

  private void writeRegister(Path folder) throws IOException {
    StringBuilder assets = new StringBuilder("asset,oil,oil_volume_l\n");
    StringBuilder register =
        new StringBuilder(
            "asset,bearing,type,pitch_mm,speed_rpm,dynamic_rating_kn,static_rating_kn,"
                + "equivalent_load_kn\n");
    for (int bearing = 0; bearing < bearings; bearing++) {
      if (bearing % BEARINGS_PER_ASSET == 0) {
        assets.append(asset(bearing)).append(",VG 220,40\n");
      }
      register.append(
          String.format(
              Locale.ROOT,
              "%s,B%d,radial-roller,120,%.0f,300,400,25%n",
              asset(bearing),
              bearing % BEARINGS_PER_ASSET,
              speedRpm(bearing)));
    }
    Files.writeString(folder.resolve("assets.csv"), assets);
    Files.writeString(folder.resolve("bearings.csv"), register);
  }

  private void writeSamples(Path folder) throws IOException {
    StringBuilder samples =
        new StringBuilder("sample,asset,sampled_at,laboratory,oil_hours,viscosity_40c_cst\n");
    int number = 0;
    for (int bearing = 0; bearing < bearings; bearing += BEARINGS_PER_ASSET) {
      for (int day = days - 1; day >= 0; day -= 30) {
        samples.append(
            String.format(
                Locale.ROOT,
                "S%06d,%s,%s,North,%d,%.1f%n",
                number,
                asset(bearing),
                START.plusDays(day),
                day * 20,
                220 - 0.05 * day - number % 7 * 0.3));
        number++;
      }
    }
    Files.writeString(folder.resolve("samples/samples.csv"), samples);
  }

  private void writeReadings(Path folder) throws SQLException {
    try (Connection duck = DriverManager.getConnection("jdbc:duckdb:");
        Statement statement = duck.createStatement()) {
      statement.execute("SET preserve_insertion_order = false");
      statement.execute("SET TimeZone = 'UTC'");
      for (int day = 0; day < days; day += DAYS_PER_FILE) {
        String name = String.format(Locale.ROOT, "log-%05d%s", day, parquet ? ".parquet" : ".csv");
        statement.execute(
            "COPY ("
                + readings(day, Math.min(day + DAYS_PER_FILE, days))
                + ") TO "
                + SqlText.literal(folder.resolve("temperatures").resolve(name).toString())
                + (parquet ? " (FORMAT parquet)" : " (HEADER)"));
      }
    }
  }

  private String readings(int fromDay, int toDay) {
    String time = parquet ? "t" : "strftime(t, '%Y-%m-%dT%H:%M:%SZ')";
    String temperature =
        "62 + b % 17 + 6 * sin(epoch(t) / 13751.0 + b) + 2 * sin(epoch(t) / 977.0)";
    String noise = "(hash(epoch(t)::BIGINT * 4096 + b + " + seed + ") % 1000) / 700.0";
    String stands = "hash(epoch(t)::BIGINT // 14400 * 4096 + b + " + seed + ") % 40 = 0";
    return "SELECT "
        + time
        + " AS time, printf('M%04d', b // 4) AS asset, 'B' || (b % 4) AS bearing, "
        + text("%.1f", temperature + " + " + noise)
        + " AS temperature_c, "
        + text(
            "%.0f",
            "CASE WHEN "
                + stands
                + " THEN 0 ELSE (400 + 10 * (b % 200)) * (0.97 + 0.03 * sin(epoch(t) / 5001.0 + b))"
                + " END")
        + " AS speed_rpm FROM generate_series(TIMESTAMPTZ '"
        + START.plusDays(fromDay)
        + " 00:00:00Z', TIMESTAMPTZ '"
        + START.plusDays(toDay)
        + " 00:00:00Z' - INTERVAL 1 SECOND, INTERVAL "
        + intervalSeconds
        + " SECOND) g(t), range("
        + bearings
        + ") r(b)";
  }

  private String text(String format, String number) {
    String digits = format.equals("%.1f") ? "1" : "0";
    return parquet
        ? "round(" + number + ", " + digits + ")"
        : "printf('" + format + "', " + number + ")";
  }
}
