package org.kappatrail.intake;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import tech.tablesaw.api.DateTimeColumn;
import tech.tablesaw.api.DoubleColumn;
import tech.tablesaw.api.StringColumn;
import tech.tablesaw.api.Table;
import tech.tablesaw.columns.Column;

/**
 * How far a column of numbers of the samples is filled.
 *
 * @param name its name
 * @param values values that are there, censored ones with them
 * @param rows samples
 * @param censored values that are a bound
 * @param low least value as stated
 * @param high greatest value as stated
 * @param span first and last day with a value
 */
record ColumnCount(
    String name, int values, int rows, int censored, double low, double high, String span) {

  /** The columns of numbers of a table of samples that hold anything. */
  static List<ColumnCount> of(Table table) {
    List<ColumnCount> counts = new ArrayList<>();
    for (Column<?> column : table.columns()) {
      if (column instanceof DoubleColumn numbers && numbers.countMissing() < numbers.size()) {
        counts.add(count(table, numbers));
      }
    }
    return counts;
  }

  private static ColumnCount count(Table table, DoubleColumn numbers) {
    StringColumn bounds = table.stringColumn(numbers.name() + SampleTable.BOUND_SUFFIX);
    DateTimeColumn times = table.dateTimeColumn("sampled_at").where(numbers.isNotMissing());
    return new ColumnCount(
        numbers.name(),
        numbers.size() - numbers.countMissing(),
        numbers.size(),
        bounds.size() - bounds.countMissing(),
        numbers.min(),
        numbers.max(),
        times.min().toLocalDate() + " to " + times.max().toLocalDate());
  }

  String text() {
    return String.format(
        Locale.ROOT,
        "%s: %d of %d samples%s, %s to %s, %s",
        name,
        values,
        rows,
        censored == 0 ? "" : " (" + censored + " as a bound)",
        Limit.plain(low),
        Limit.plain(high),
        span);
  }
}
