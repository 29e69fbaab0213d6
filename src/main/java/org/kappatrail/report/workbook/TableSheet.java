package org.kappatrail.report.workbook;

import java.io.IOException;
import java.math.BigDecimal;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.format.DateTimeParseException;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.IgnoredErrorType;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xssf.streaming.SXSSFSheet;
import org.apache.poi.xssf.streaming.SXSSFWorkbook;
import org.kappatrail.report.office.ShownText;
import org.kappatrail.report.table.SixDigits;
import org.kappatrail.review.Level;
import tech.tablesaw.api.DoubleColumn;
import tech.tablesaw.api.IntColumn;
import tech.tablesaw.api.Table;
import tech.tablesaw.columns.Column;

/**
 * Writes a table as a sheet: header frozen with a filter, numbers as numbers, dates as dates, every
 * text as text.
 */
final class TableSheet {
  /** Most characters that a cell can hold. */
  private static final int LONGEST_TEXT = 32_767;

  private static final int WIDTH_UNITS = 256;
  private static final int WIDEST_TEXT_CHARS = 40;
  private static final int FILTER_ARROW_CHARS = 3;

  private static final float LINE_POINTS = 15;
  private static final int MOST_LINES = 12;

  /** First year whose days a workbook counts as dates; earlier ones stay text. */
  private static final int FIRST_YEAR = 1901;

  private static final int LAST_YEAR = 9999;

  private final SXSSFWorkbook workbook;
  private final Styles styles;

  TableSheet(SXSSFWorkbook workbook, Styles styles) {
    this.workbook = workbook;
    this.styles = styles;
  }

  /**
   * Adds the sheet.
   *
   * @param frozenColumns columns that stay in sight when scrolling to the right
   */
  void add(Table table, int frozenColumns) throws IOException {
    SXSSFSheet sheet = workbook.createSheet(table.name());
    List<Column<?>> columns = table.columns();
    Row header = sheet.createRow(0);
    for (int i = 0; i < columns.size(); i++) {
      Cell cell = header.createCell(i);
      cell.setCellValue(columns.get(i).name());
      cell.setCellStyle(styles.header(isNumber(columns.get(i))));
      sheet.setColumnWidth(i, width(columns.get(i)) * WIDTH_UNITS);
    }
    for (int r = 0; r < table.rowCount(); r++) {
      Row row = sheet.createRow(r + 1);
      int lines = 1;
      for (int i = 0; i < columns.size(); i++) {
        write(row, i, columns.get(i), r);
        lines = Math.max(lines, lines(columns.get(i), r));
      }
      if (lines > 1) {
        row.setHeightInPoints(lines * LINE_POINTS);
      }
    }
    sheet.createFreezePane(frozenColumns, 1);
    CellRangeAddress all = new CellRangeAddress(0, table.rowCount(), 0, columns.size() - 1);
    sheet.setAutoFilter(all);
    workbook
        .getXSSFWorkbook()
        .getSheet(table.name())
        .addIgnoredErrors(all, IgnoredErrorType.NUMBER_STORED_AS_TEXT);
    sheet.setRepeatingRows(CellRangeAddress.valueOf("1:1"));
    ReviewWorkbook.finish(sheet);
  }

  private void write(Row row, int index, Column<?> column, int r) {
    if (column instanceof DoubleColumn numbers) {
      double value = numbers.getDouble(r);
      if (!Double.isNaN(value)) {
        number(row, index, new BigDecimal(SixDigits.text(value)).doubleValue(), column.name());
      }
    } else if (column instanceof IntColumn wholes) {
      if (!wholes.isMissing(r)) {
        Cell cell = row.createCell(index);
        cell.setCellValue(wholes.getInt(r));
        cell.setCellStyle(styles.of(CellKind.WHOLE));
      }
    } else if (!column.isMissing(r)) {
      text(row, index, ShownText.of(column.get(r).toString()), CellKind.ofText(column.name()));
    }
  }

  private void number(Row row, int index, double value, String column) {
    Cell cell = row.createCell(index);
    cell.setCellValue(value);
    cell.setCellStyle(styles.of(CellKind.ofNumber(column)));
  }

  private void text(Row row, int index, String text, CellKind kind) {
    if (text.isEmpty()) {
      return;
    }
    Cell cell = row.createCell(index);
    Optional<LocalDateTime> moment = kind == CellKind.DATE ? moment(text) : Optional.empty();
    if (moment.isPresent()) {
      cell.setCellValue(moment.get());
      cell.setCellStyle(text.indexOf('T') > 0 ? styles.dateTime() : styles.of(CellKind.DATE));
      return;
    }
    cell.setCellValue(clipped(text));
    if ("=+-@".indexOf(text.charAt(0)) >= 0) {
      cell.setCellStyle(styles.quoted());
    } else {
      cell.setCellStyle(
          kind == CellKind.LEVEL
              ? level(text).map(styles::of).orElse(styles.of(CellKind.TEXT))
              : styles.of(kind));
    }
  }

  private static Optional<Level> level(String word) {
    for (Level level : Level.values()) {
      if (level.label().equals(word.toLowerCase(Locale.ROOT))) {
        return Optional.of(level);
      }
    }
    return Optional.empty();
  }

  private static Optional<LocalDateTime> moment(String text) {
    try {
      LocalDateTime moment =
          text.indexOf('T') > 0 ? LocalDateTime.parse(text) : LocalDate.parse(text).atStartOfDay();
      boolean counted = moment.getYear() >= FIRST_YEAR && moment.getYear() <= LAST_YEAR;
      return counted ? Optional.of(moment) : Optional.empty();
    } catch (DateTimeParseException noDate) {
      return Optional.empty();
    }
  }

  private static String clipped(String text) {
    return text.length() <= LONGEST_TEXT ? text : text.substring(0, LONGEST_TEXT - 1) + "…";
  }

  /** Lines that a text takes in its column, reckoned with room to spare. */
  private static int lines(Column<?> column, int r) {
    if (isNumber(column)
        || column.isMissing(r)
        || CellKind.ofText(column.name()) != CellKind.PROSE) {
      return 1;
    }
    int room = CellKind.PROSE.widthChars() - 8;
    return Math.min(MOST_LINES, 1 + column.get(r).toString().length() / room);
  }

  private static boolean isNumber(Column<?> column) {
    return column instanceof DoubleColumn || column instanceof IntColumn;
  }

  private static int width(Column<?> column) {
    CellKind kind =
        !isNumber(column)
            ? CellKind.ofText(column.name())
            : column instanceof IntColumn ? CellKind.WHOLE : CellKind.ofNumber(column.name());
    int least = column.name().length() + FILTER_ARROW_CHARS;
    if (kind.widthChars() > 0) {
      return Math.max(least, kind.widthChars());
    }
    int longest = 0;
    for (int r = 0; r < column.size(); r++) {
      longest = Math.max(longest, column.isMissing(r) ? 0 : column.get(r).toString().length());
    }
    return Math.max(least, Math.min(longest, WIDEST_TEXT_CHARS) + 2);
  }
}
