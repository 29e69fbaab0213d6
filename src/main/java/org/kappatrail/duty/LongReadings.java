package org.kappatrail.duty;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.ExportMapping;

/**
 * The readings of a group of long-form files as the statement wants them. Beside the statement's
 * columns it carries the texts as they stand in the file, which cost nothing unless asked for.
 */
final class LongReadings {
  private final LogGroup group;
  private final ExportMapping mapping;
  private final LogLayout layout;

  LongReadings(LogGroup group) {
    this.group = group;
    this.mapping = group.shape().mapping();
    this.layout = new LogLayout(place(), group.shape().columns(), mapping);
  }

  LogLayout layout() {
    return layout;
  }

  /** The query; {@code names} is the relation of bearing, asset and name. */
  String sql(ZoneShift zone, boolean parallel) {
    TimeSql time = time();
    String raw =
        "SELECT CAST(file_index AS INTEGER) + "
            + group.firstSource()
            + " AS source, "
            + text(LogLayout.TIME)
            + " AS time_text, "
            + text(LogLayout.ASSET)
            + " AS asset_text, "
            + text(LogLayout.BEARING)
            + " AS bearing_text, "
            + text(LogLayout.TEMPERATURE)
            + " AS temperature_text, "
            + text(LogLayout.SPEED)
            + " AS speed_text, "
            + text(LogLayout.QUALITY)
            + " AS quality_text, "
            + (isCsv() ? FileScan.OVERFLOW : "NULL")
            + " AS overflow, "
            + (isCsv() ? "0" : "file_row_number + 1")
            + " AS row_number, "
            + time.clockMs()
            + " AS clock_ms, "
            + time.zoned()
            + " AS zoned, "
            + NumberSql.celsius(number(LogLayout.TEMPERATURE), mapping)
            + " AS temperature_c, "
            + NumberSql.rpm(number(LogLayout.SPEED), mapping)
            + " AS speed_rpm FROM "
            + FileScan.of(group, parallel);
    String whole =
        "SELECT *, CASE WHEN clock_ms < 86400000 THEN NULL WHEN zoned THEN clock_ms ELSE clock_ms - ("
            + zone.atLocalTime("clock_ms")
            + ") END AS instant_ms, "
            + NumberSql.thousandths("temperature_c")
            + " AS temperature, "
            + NumberSql.thousandths("speed_rpm")
            + " AS speed FROM ("
            + raw
            + ")";
    return "SELECT COALESCE(names.bearing, 0) AS bearing, source, instant_ms, temperature, speed, "
        + FaultSql.fault()
        + " AS fault, "
        + FaultSql.flaw()
        + " AS flaw, time_text, asset_text, bearing_text, temperature_text, speed_text,"
        + " quality_text, row_number FROM ("
        + whole
        + ") LEFT JOIN names ON names.asset = trim(asset_text) AND names.name = trim(bearing_text)";
  }

  /** The relation that turns names into the register's keys. */
  static String names(List<Bearing> bearings) {
    String rows =
        IntStream.range(0, bearings.size())
            .mapToObj(
                index ->
                    "("
                        + (index + 1)
                        + ", "
                        + SqlText.literal(bearings.get(index).asset())
                        + ", "
                        + SqlText.literal(bearings.get(index).id())
                        + ")")
            .collect(Collectors.joining(", "));
    return "names (bearing, asset, name) AS (VALUES "
        + (rows.isEmpty() ? "(0, NULL, NULL)" : rows)
        + ")";
  }

  private TimeSql time() {
    if (constant(LogLayout.TIME).isPresent()) {
      return TimeSql.iso(text(LogLayout.TIME));
    }
    int index = layout.find(LogLayout.TIME).orElseThrow();
    String column = FileScan.column(group.shape(), index);
    String type = group.shape().types().get(index);
    String format = mapping.dateFormat().orElse("");
    if (!type.equals(LogTable.TEXT)) {
      return TimeSql.typed(column, type, format, place());
    }
    return format.isEmpty() ? TimeSql.iso(column) : DateFormatSql.of(column, format, place());
  }

  private String number(String canonical) {
    Optional<Integer> index = layout.find(canonical);
    if (index.isEmpty()) {
      return "TRY_CAST(" + text(canonical) + " AS DOUBLE)";
    }
    return NumberSql.number(
        FileScan.column(group.shape(), index.get()),
        group.shape().types().get(index.get()),
        mapping,
        place() + ": " + canonical);
  }

  private String text(String canonical) {
    Optional<String> constant = constant(canonical);
    if (constant.isPresent()) {
      return SqlText.literal(constant.get());
    }
    return layout
        .find(canonical)
        .map(index -> "CAST(" + FileScan.column(group.shape(), index) + " AS VARCHAR)")
        .orElse("CAST(NULL AS VARCHAR)");
  }

  private Optional<String> constant(String canonical) {
    return Optional.ofNullable(mapping.constants().get(canonical));
  }

  private boolean isCsv() {
    return group.shape().format() != LogFile.Format.PARQUET;
  }

  private String place() {
    return group.tables().get(0).file().name();
  }
}
