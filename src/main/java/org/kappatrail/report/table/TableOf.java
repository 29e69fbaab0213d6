package org.kappatrail.report.table;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToIntFunction;
import tech.tablesaw.api.DoubleColumn;
import tech.tablesaw.api.IntColumn;
import tech.tablesaw.api.StringColumn;
import tech.tablesaw.api.Table;
import tech.tablesaw.columns.Column;

/**
 * Describes a table column by column and fills it from records: every column has its type from the
 * start, nothing is inferred.
 *
 * @param <R> what a row is made from
 */
public final class TableOf<R> {
  private final String name;
  private final List<Function<List<R>, Column<?>>> columns = new ArrayList<>();

  public TableOf(String name) {
    this.name = name;
  }

  public TableOf<R> text(String column, Function<R, String> value) {
    columns.add(
        rows -> {
          StringColumn filled = StringColumn.create(column);
          rows.forEach(row -> filled.append(value.apply(row)));
          return filled;
        });
    return this;
  }

  public TableOf<R> optionalText(String column, Function<R, Optional<String>> value) {
    return text(column, row -> value.apply(row).orElse(""));
  }

  public TableOf<R> number(String column, Function<R, OptionalDouble> value) {
    columns.add(
        rows -> {
          DoubleColumn filled = DoubleColumn.create(column);
          for (R row : rows) {
            OptionalDouble number = value.apply(row);
            if (number.isPresent()) {
              filled.append(number.getAsDouble());
            } else {
              filled.appendMissing();
            }
          }
          return filled;
        });
    return this;
  }

  public TableOf<R> whole(String column, ToIntFunction<R> value) {
    columns.add(
        rows -> {
          IntColumn filled = IntColumn.create(column);
          rows.forEach(row -> filled.append(value.applyAsInt(row)));
          return filled;
        });
    return this;
  }

  public Table from(List<R> rows) {
    Table table = Table.create(name);
    columns.forEach(column -> table.addColumns(column.apply(rows)));
    return table;
  }
}
