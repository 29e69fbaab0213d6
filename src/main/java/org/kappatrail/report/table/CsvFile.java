package org.kappatrail.report.table;

import de.siegmar.fastcsv.writer.CsvWriter;
import de.siegmar.fastcsv.writer.LineDelimiter;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Iterator;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import tech.tablesaw.api.DoubleColumn;
import tech.tablesaw.api.Table;
import tech.tablesaw.columns.Column;

/** Writes a table as CSV: UTF-8, RFC 4180. */
public final class CsvFile {
  private static final Pattern NUMBER = Pattern.compile("[+-]?\\d+(\\.\\d+)?");

  private CsvFile() {}

  public static void write(Table table, Path file) throws IOException {
    write(Stream.of(table), file);
  }

  /** Writes tables of the same columns below each other; each is made when its turn comes. */
  public static void write(Stream<Table> parts, Path file) throws IOException {
    try (CsvWriter csv =
        CsvWriter.builder()
            .lineDelimiter(LineDelimiter.CRLF)
            .build(Files.newBufferedWriter(file, StandardCharsets.UTF_8))) {
      boolean first = true;
      for (Iterator<Table> tables = parts.iterator(); tables.hasNext(); ) {
        Table table = tables.next();
        if (first) {
          csv.writeRecord(table.columnNames());
          first = false;
        }
        writeRows(csv, table);
      }
    }
  }

  private static void writeRows(CsvWriter csv, Table table) {
    Column<?>[] columns = table.columns().toArray(new Column<?>[0]);
    String[] cells = new String[columns.length];
    for (int row = 0; row < table.rowCount(); row++) {
      for (int column = 0; column < columns.length; column++) {
        cells[column] = cell(columns[column], row);
      }
      csv.writeRecord(cells);
    }
  }

  private static String cell(Column<?> column, int row) {
    if (column instanceof DoubleColumn numbers) {
      return SixDigits.text(numbers.getDouble(row));
    }
    return column.isMissing(row) ? "" : inert(column.get(row).toString());
  }

  /**
   * Text as it can stand in a spreadsheet: one that starts like a formula gets an apostrophe in
   * front, so that it is not run.
   */
  public static String inert(String text) {
    if (text.isEmpty() || "=+-@\t\r".indexOf(text.charAt(0)) < 0) {
      return text;
    }
    return isNumber(text) ? text : "'" + text;
  }

  private static boolean isNumber(String text) {
    return NUMBER.matcher(text).matches();
  }
}
