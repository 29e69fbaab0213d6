package org.kappatrail.duty;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.UnusableInputException;

/**
 * The readings of a long-form table in an engine of the site, as the statement wants them. Columns
 * are typed there, so that nothing needs to be parsed.
 */
final class TableReadings {
  private final SqlEngine engine;
  private final String table;
  private final List<Column> columns;
  private final ExportMapping mapping;
  private final String names;
  private final LogLayout layout;

  /**
   * A column of the table.
   *
   * @param name as the engine gives it
   * @param quoted as it stands in a statement
   * @param type the engine's name of its type
   */
  record Column(String name, String quoted, String type) {
    boolean isNumeric() {
      String lower = type.toLowerCase(Locale.ROOT);
      return NumberSql.isNumeric(type.toUpperCase(Locale.ROOT))
          || lower.matches("(int|float|serial|bigserial|numeric|decimal|double|real|long|short).*");
    }

    boolean isTimestamp() {
      return type.toLowerCase(Locale.ROOT).startsWith("timestamp");
    }

    /** True where the column tells UTC instants rather than clock readings. */
    boolean isZoned(SqlEngine engine) {
      String lower = type.toLowerCase(Locale.ROOT);
      return lower.equals("timestamptz")
          || lower.contains("with time zone")
          || (engine == SqlEngine.SPARK && lower.equals("timestamp"));
    }
  }

  /**
   * Looks at the columns.
   *
   * @param table the table as it stands in a statement
   * @param columns its columns
   * @param mapping what they carry
   * @param names relation {@code names} of bearing, asset and name, with the register's keys
   */
  TableReadings(
      SqlEngine engine, String table, List<Column> columns, ExportMapping mapping, String names) {
    this.engine = engine;
    this.table = table;
    this.columns = List.copyOf(columns);
    this.mapping = mapping;
    this.names = names;
    if (mapping.columns().containsValue(LogLayout.TIME_OF_DAY)) {
      throw new UnusableInputException(
          table + ": time_of_day is for files; make a view with a timestamp and name that");
    }
    if (!mapping.tags().isEmpty()) {
      throw new UnusableInputException(
          table + ": tags: are for files; make a view with a row per reading and name that");
    }
    this.layout = new LogLayout(table, columns.stream().map(Column::name).toList(), mapping);
  }

  LogLayout layout() {
    return layout;
  }

  /** The query. */
  String sql(ZoneShift zone) {
    return """
        SELECT COALESCE(names.bearing, 0) AS bearing, 0 AS source, instant_ms, temperature, speed,
          CASE
            WHEN instant_ms IS NULL THEN 4
            WHEN names.bearing IS NULL THEN 6
            WHEN LOWER(TRIM(quality_text)) NOT IN ('', 'good', '192') THEN 7
            WHEN temperature IS NULL THEN 9
            ELSE 0
          END AS fault,
          0 AS flaw, asset_text, bearing_text
        FROM (
          SELECT asset_text, bearing_text, quality_text,
            CASE WHEN clock_ms >= 86400000 THEN {instant} END AS instant_ms,
            {temperature} AS temperature,
            {speed} AS speed
          FROM (
            SELECT {clock} AS clock_ms, {asset} AS asset_text, {bearing} AS bearing_text,
              {celsius} AS temperature_c, {rpm} AS speed_rpm, {quality} AS quality_text
            FROM {table}
          ) parsed
        ) whole
        LEFT JOIN {names}
          ON names.asset = TRIM(asset_text) AND names.name = TRIM(bearing_text)"""
        .replace("{instant}", instant(zone))
        .replace("{temperature}", thousandths("temperature_c"))
        .replace("{speed}", thousandths("speed_rpm"))
        .replace("{clock}", clock())
        .replace("{asset}", text(LogLayout.ASSET))
        .replace("{bearing}", text(LogLayout.BEARING))
        .replace("{celsius}", NumberSql.celsius(number(LogLayout.TEMPERATURE), mapping))
        .replace("{rpm}", NumberSql.rpm(number(LogLayout.SPEED), mapping))
        .replace("{quality}", text(LogLayout.QUALITY))
        .replace("{names}", names)
        .replace("{table}", table);
  }

  private String instant(ZoneShift zone) {
    return time().isZoned(engine) || time().isNumeric()
        ? "clock_ms"
        : "clock_ms - (" + zone.atLocalTime("clock_ms") + ")";
  }

  /** As in NumberSql, in words that every engine has. */
  private static String thousandths(String number) {
    return """
        CASE
          WHEN {n} > 1e300 OR {n} < -1e300 THEN NULL
          WHEN {n} > 1000001 THEN 1000001000
          WHEN {n} < -1000001 THEN -1000001000
          ELSE CAST(FLOOR({n} * 1000 + 0.5) AS BIGINT)
        END"""
        .replace("{n}", number);
  }

  private String clock() {
    Column time = time();
    if (time.isTimestamp()) {
      return "CASE WHEN {t} >= TIMESTAMP '1970-01-01 00:00:00'"
          .concat(" AND {t} < TIMESTAMP '9999-01-01 00:00:00' THEN ")
          .replace("{t}", time.quoted())
          .concat(engine.epochMillis(time.quoted()))
          .concat(" END");
    }
    if (time.isNumeric()) {
      return TimeSql.epoch(engine.number(time.quoted()), mapping.dateFormat().orElse(""), table)
          .clockMs();
    }
    throw new UnusableInputException(
        table
            + ": column "
            + time.name()
            + " is of type "
            + time.type()
            + " and no timestamp; make a view with a timestamp and name that");
  }

  private String number(String canonical) {
    Optional<Column> column = layout.find(canonical).map(columns::get);
    if (column.isEmpty()) {
      return engine.number(layout.constant(canonical).map(SqlText::literal).orElse("NULL"));
    }
    if (!column.get().isNumeric()) {
      throw new UnusableInputException(
          table
              + ": column "
              + column.get().name()
              + " is of type "
              + column.get().type()
              + " and no number; make a view with numbers and name that");
    }
    return MissingSql.withoutNamedNumber(engine.number(column.get().quoted()), mapping);
  }

  private String text(String canonical) {
    String value =
        layout
            .constant(canonical)
            .map(SqlText::literal)
            .or(() -> layout.find(canonical).map(index -> columns.get(index).quoted()))
            .orElse("NULL");
    return "CAST(" + value + " AS VARCHAR(200))";
  }

  private Column time() {
    return layout
        .find(LogLayout.TIME)
        .map(columns::get)
        .orElseThrow(
            () ->
                new UnusableInputException(
                    table + ": a table of readings needs a column of times"));
  }

  /** The register's names as values in the statement, for engines with standard literals. */
  static String namesOf(List<Bearing> bearings) {
    String rows =
        bearings.isEmpty()
            ? "(0, '', '')"
            : IntStream.range(0, bearings.size())
                .mapToObj(index -> name(index + 1, bearings.get(index)))
                .collect(Collectors.joining(", "));
    return "(VALUES " + rows + ") AS names (bearing, asset, name)";
  }

  private static String name(int key, Bearing bearing) {
    return "("
        + key
        + ", "
        + SqlText.literal(bearing.asset())
        + ", "
        + SqlText.literal(bearing.id())
        + ")";
  }
}
