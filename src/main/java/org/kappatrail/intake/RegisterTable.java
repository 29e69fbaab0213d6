package org.kappatrail.intake;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.TreeMap;
import java.util.function.Function;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Problem;

/** Reads a register file row by row into records. */
final class RegisterTable {
  private final String file;
  private final FileAccount.Kind kind;
  private final RawTable table;
  private final Columns columns;
  private final List<Problem> problems;

  RegisterTable(
      Path path,
      String file,
      FileAccount.Kind kind,
      Collection<String> known,
      Collection<String> required,
      List<Problem> problems) {
    ExportMapping canonical = ExportMapping.canonical(file);
    this.file = file;
    this.kind = kind;
    this.table = CsvFile.read(path, file, canonical);
    this.columns = new Columns(table, canonical, known, required);
    this.problems = problems;
  }

  /** Columns without a meaning here. */
  Collection<String> further() {
    return columns.further().values();
  }

  /**
   * The records of the rows that are not left out.
   *
   * @param <T> record
   * @param record makes the record of a row; empty after {@link Row#reject}
   * @param accounts takes the account of the file
   * @param unused columns that were not used
   * @param day day of a record, where it has one
   */
  <T> List<T> read(
      Function<Row, Optional<T>> record,
      List<FileAccount> accounts,
      List<String> unused,
      Function<T, Optional<LocalDate>> day) {
    List<T> records = new ArrayList<>();
    Map<String, Long> rejected = new TreeMap<>();
    @org.jspecify.annotations.Nullable LocalDate from = null;
    @org.jspecify.annotations.Nullable LocalDate to = null;
    for (RawRow raw : table.rows()) {
      Row row = new Row(file, raw, columns, problems);
      Optional<T> made = row.isRejected() ? Optional.empty() : make(row, record);
      if (made.isEmpty()) {
        rejected.merge(row.rejection(), 1L, Long::sum);
        continue;
      }
      records.add(made.get());
      LocalDate at = day.apply(made.get()).orElse(null);
      if (at != null) {
        from = from == null || at.isBefore(from) ? at : from;
        to = to == null || at.isAfter(to) ? at : to;
      }
    }
    accounts.add(
        new FileAccount(
            file,
            kind,
            OptionalLong.empty(),
            records.size(),
            rejected,
            Optional.ofNullable(from),
            Optional.ofNullable(to),
            unused));
    return records;
  }

  private static <T> Optional<T> make(Row row, Function<Row, Optional<T>> record) {
    try {
      Optional<T> made = record.apply(row);
      return row.isRejected() ? Optional.empty() : made;
    } catch (IllegalArgumentException e) {
      String reason = e.getMessage() == null ? "cannot be true" : e.getMessage();
      row.reject("", "", reason + "; correct the row");
      return Optional.empty();
    }
  }
}
