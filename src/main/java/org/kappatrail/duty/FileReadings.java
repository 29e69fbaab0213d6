package org.kappatrail.duty;

import java.util.List;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.Settings;

/**
 * The readings of a group of files as the statement wants them. Beside the statement's columns the
 * query carries the texts as they stand in the file, which cost nothing unless asked for.
 */
final class FileReadings {
  private final LogGroup group;
  private final List<Bearing> bearings;
  private final Settings settings;
  private final LogLayout layout;
  private final TableColumns columns;

  FileReadings(LogGroup group, List<Bearing> bearings, Settings settings) {
    this.group = group;
    this.bearings = List.copyOf(bearings);
    this.settings = settings;
    String name = group.tables().get(0).file().name();
    this.layout = new LogLayout(name, group.shape().columns(), group.shape().mapping());
    this.columns = new TableColumns(group, layout);
  }

  LogLayout layout() {
    return layout;
  }

  /** The query; {@code parallel} as in {@link FileScan}. */
  String sql(ZoneShift zone, boolean parallel) {
    String scan = FileScan.of(group, parallel);
    return switch (layout.form()) {
      case LONG -> longForm(zone, scan);
      case WIDE, TAGGED ->
          new TagReadings(group, layout, columns, bearings, settings).sql(zone, scan);
    };
  }

  private String longForm(ZoneShift zone, String scan) {
    return """
        WITH names (bearing, asset, name) AS (VALUES {names}),
        parsed AS (
          SELECT {common},
            {asset} AS asset_text,
            {bearing} AS bearing_text,
            {temperature_text} AS temperature_text,
            {speed_text} AS speed_text,
            {quality} AS quality_text,
            {temperature} AS temperature_c,
            {speed} AS speed_rpm
          FROM {scan}
        ),
        whole AS (
          SELECT *, {instant} AS instant_ms,
            {temperature_thousandths} AS temperature,
            {speed_thousandths} AS speed
          FROM parsed
        )
        SELECT COALESCE(names.bearing, 0) AS bearing, source, instant_ms, temperature, speed,
          {fault} AS fault, {flaw} AS flaw,
          time_text, asset_text, bearing_text, temperature_text, speed_text, quality_text, row_number
        FROM whole
        LEFT JOIN names ON names.asset = trim(asset_text) AND names.name = trim(bearing_text)"""
        .replace("{names}", RegisterNames.rows(bearings))
        .replace("{common}", columns.common())
        .replace("{asset}", columns.text(LogLayout.ASSET))
        .replace("{bearing}", columns.text(LogLayout.BEARING))
        .replace("{temperature_text}", columns.value(LogLayout.TEMPERATURE))
        .replace("{speed_text}", columns.value(LogLayout.SPEED))
        .replace("{quality}", columns.text(LogLayout.QUALITY))
        .replace(
            "{temperature}",
            NumberSql.celsius(columns.number(LogLayout.TEMPERATURE), group.shape().mapping()))
        .replace("{speed}", NumberSql.rpm(columns.number(LogLayout.SPEED), group.shape().mapping()))
        .replace("{instant}", TableColumns.instant(zone))
        .replace("{temperature_thousandths}", NumberSql.thousandths("temperature_c"))
        .replace("{speed_thousandths}", NumberSql.thousandths("speed_rpm"))
        .replace("{fault}", FaultSql.fault())
        .replace("{flaw}", FaultSql.flaw())
        .replace("{scan}", scan);
  }
}
