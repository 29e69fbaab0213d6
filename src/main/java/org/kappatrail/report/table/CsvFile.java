package org.kappatrail.report.table;

import de.siegmar.fastcsv.writer.CsvWriter;
import de.siegmar.fastcsv.writer.LineDelimiter;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import tech.tablesaw.api.DoubleColumn;
import tech.tablesaw.api.Table;
import tech.tablesaw.columns.Column;

/** Writes a table as CSV: UTF-8, RFC 4180. */
public final class CsvFile {
  private CsvFile() {}

  public static void write(Table table, Path file) throws IOException {
    try (CsvWriter csv =
        CsvWriter.builder()
            .lineDelimiter(LineDelimiter.CRLF)
            .build(Files.newBufferedWriter(file, StandardCharsets.UTF_8))) {
      csv.writeRecord(table.columnNames());
      List<String> cells = new ArrayList<>();
      for (int row = 0; row < table.rowCount(); row++) {
        cells.clear();
        for (Column<?> column : table.columns()) {
          cells.add(cell(column, row));
        }
        csv.writeRecord(cells);
      }
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
    return text.matches("[+-]?\\d+(\\.\\d+)?");
  }
}
