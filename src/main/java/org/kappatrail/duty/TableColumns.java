package org.kappatrail.duty;

import java.util.Optional;
import org.kappatrail.history.ExportMapping;

/** Expressions for the columns of a group of files, as their scan names them. */
final class TableColumns {
  private final LogGroup group;
  private final ExportMapping mapping;
  private final LogLayout layout;

  TableColumns(LogGroup group, LogLayout layout) {
    this.group = group;
    this.mapping = group.shape().mapping();
    this.layout = layout;
  }

  /** What every form takes from the scan: source, row number, surplus cells and time. */
  String common() {
    boolean csv = group.shape().format() != LogFile.Format.PARQUET;
    TimeSql time = time();
    return """
        CAST(file_index AS INTEGER) + {first} AS source,
        {row} AS row_number,
        {overflow} AS overflow,
        {time} AS time_text,
        {clock} AS clock_ms,
        {zoned} AS zoned"""
        .replace("{first}", Integer.toString(group.firstSource()))
        .replace("{row}", csv ? "0" : "file_row_number + 1")
        .replace("{overflow}", csv ? FileScan.OVERFLOW : "CAST(NULL AS VARCHAR)")
        .replace("{time}", layout.splitsTime() ? dayAndTime() : text(LogLayout.TIME))
        .replace("{clock}", time.clockMs())
        .replace("{zoned}", time.zoned());
  }

  /** The UTC instant of a row of {@link #common()}, ms; NULL where the time cannot be read. */
  static String instant(ZoneShift zone) {
    return "CASE WHEN clock_ms < 86400000 THEN NULL WHEN zoned THEN clock_ms ELSE clock_ms - ("
        + zone.atLocalTime("clock_ms")
        + ") END";
  }

  /** A canonical column as text. */
  String text(String canonical) {
    Optional<String> constant = layout.constant(canonical);
    if (constant.isPresent()) {
      return SqlText.literal(constant.get());
    }
    return layout.find(canonical).map(this::text).orElse("CAST(NULL AS VARCHAR)");
  }

  String text(int index) {
    return "CAST(" + FileScan.column(group.shape(), index) + " AS VARCHAR)";
  }

  /** The text of a column of numbers; NULL where the settings take it for missing. */
  String value(String canonical) {
    Optional<Integer> index = layout.find(canonical);
    return index.isPresent() && layout.constant(canonical).isEmpty()
        ? value(index.get())
        : text(canonical);
  }

  String value(int index) {
    String column = FileScan.column(group.shape(), index);
    return NumberSql.isNumeric(group.shape().types().get(index))
        ? "CAST(" + MissingSql.withoutNamedNumber(column, mapping) + " AS VARCHAR)"
        : MissingSql.withoutNamed(text(index), mapping);
  }

  /** A canonical column as a number in the unit of the file. */
  String number(String canonical) {
    Optional<Integer> index = layout.find(canonical);
    return index.isPresent() ? number(index.get()) : "TRY_CAST(" + text(canonical) + " AS DOUBLE)";
  }

  String number(int index) {
    return NumberSql.number(
        FileScan.column(group.shape(), index),
        group.shape().types().get(index),
        mapping,
        name() + ": " + group.shape().columns().get(index));
  }

  private TimeSql time() {
    if (layout.constant(LogLayout.TIME).isPresent()) {
      return TimeSql.iso(text(LogLayout.TIME));
    }
    int index = layout.find(LogLayout.TIME).orElseThrow();
    String format = mapping.dateFormat().orElse("");
    if (layout.splitsTime()) {
      String joined = dayAndTime();
      return format.isEmpty() ? TimeSql.iso(joined) : DateFormatSql.of(joined, format, name());
    }
    String column = FileScan.column(group.shape(), index);
    String type = group.shape().types().get(index);
    if (!type.equals(LogTable.TEXT)) {
      return TimeSql.typed(column, type, format, name());
    }
    return format.isEmpty() ? TimeSql.iso(column) : DateFormatSql.of(column, format, name());
  }

  /** Day and time of day joined with a blank; a row without one of them has no time. */
  private String dayAndTime() {
    return "CASE WHEN trim({time}) <> '' THEN trim({day}) || ' ' || trim({time}) ELSE {day} || ' ?' END"
        .replace("{day}", text(LogLayout.TIME))
        .replace("{time}", text(LogLayout.TIME_OF_DAY));
  }

  private String name() {
    return group.tables().get(0).file().name();
  }
}
