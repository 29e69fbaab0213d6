package org.kappatrail.report.workbook;

import java.io.BufferedOutputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.apache.commons.compress.archivers.zip.Zip64Mode;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellStyle;
import org.apache.poi.util.DefaultTempFileCreationStrategy;
import org.apache.poi.util.TempFile;
import org.apache.poi.xssf.streaming.SXSSFSheet;
import org.apache.poi.xssf.streaming.SXSSFWorkbook;
import org.kappatrail.report.office.FixedZip;
import org.kappatrail.report.office.OfficeProperties;
import org.kappatrail.report.office.ShownText;
import org.kappatrail.report.page.Numbers;
import org.kappatrail.report.table.ReviewTables;
import org.kappatrail.review.Review;
import tech.tablesaw.api.Table;

/**
 * The workbook of a review: the fleet first, then the tables of the pack, a sheet each, and what
 * they mean. Made row by row, so that a large fleet does not fill the memory.
 */
public final class ReviewWorkbook {
  /** Rows beyond which a table is left to its CSV file: what still opens at once. */
  public static final int MOST_ROWS = 100_000;

  private static final String DAILY = "kappa-daily";
  private static final int WINDOW_ROWS = 200;
  private static final int FLEET_FROZEN_COLUMNS = 2;

  private final Review review;
  private final List<Table> tables;
  private final int mostRows;

  /**
   * A workbook to be written.
   *
   * @param review what was found
   * @param tables the tables of the pack, the daily one apart
   */
  public ReviewWorkbook(Review review, List<Table> tables) {
    this(review, tables, MOST_ROWS);
  }

  ReviewWorkbook(Review review, List<Table> tables, int mostRows) {
    this.review = review;
    this.tables = List.copyOf(tables);
    this.mostRows = mostRows;
  }

  /** Writes it; the library's own temporary files lie beside it meanwhile, and go with the pack. */
  public void write(Path file) throws IOException {
    Path work = Files.createTempDirectory(file.toAbsolutePath().getParent(), ".sheets-");
    TempFile.setThreadLocalTempFileCreationStrategy(
        new DefaultTempFileCreationStrategy(work.toFile()));
    try (OutputStream out = new BufferedOutputStream(Files.newOutputStream(file))) {
      FixedZip.write(bytes(), out);
    } finally {
      TempFile.setThreadLocalTempFileCreationStrategy(null);
      delete(work);
    }
  }

  private static void delete(Path folder) throws IOException {
    try (Stream<Path> left = Files.list(folder)) {
      for (Path path : left.toList()) {
        Files.delete(path);
      }
    }
    Files.delete(folder);
  }

  private byte[] bytes() throws IOException {
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try (SXSSFWorkbook workbook = new SXSSFWorkbook(null, WINDOW_ROWS, false, true)) {
      workbook.setZip64Mode(Zip64Mode.AsNeeded);
      Styles styles = new Styles(workbook);
      TableSheet sheets = new TableSheet(workbook, styles);
      sheets.add(FleetTable.of(review), FLEET_FROZEN_COLUMNS);
      for (Table table : tables) {
        if (table.rowCount() > mostRows) {
          leftOut(workbook, styles, table.name(), table.rowCount());
        } else {
          sheets.add(table, namesInFront(table));
        }
      }
      daily(workbook, styles, sheets);
      prose(workbook, styles, "about", AboutSheet.lines(review));
      OfficeProperties.set(workbook.getXSSFWorkbook().getProperties(), review, "Review");
      workbook.write(bytes);
    }
    return bytes.toByteArray();
  }

  /** The daily table is made part by part, and only where it has its place here. */
  private void daily(SXSSFWorkbook workbook, Styles styles, TableSheet sheets) throws IOException {
    long rows =
        review.assets().stream()
            .flatMap(asset -> asset.bearings().stream())
            .mapToLong(bearing -> bearing.days().size())
            .sum();
    if (rows > mostRows) {
      leftOut(workbook, styles, DAILY, rows);
      return;
    }
    try (Stream<Table> parts = ReviewTables.kappaDaily(review)) {
      Optional<Table> whole = parts.reduce(Table::append);
      if (whole.isPresent()) {
        sheets.add(whole.get(), namesInFront(whole.get()));
      }
    }
  }

  /** Asset and bearing stay in sight. */
  private static int namesInFront(Table table) {
    int count = 0;
    for (String column : List.of("asset", "bearing")) {
      if (count < table.columnCount() && table.column(count).name().equals(column)) {
        count++;
      }
    }
    return count;
  }

  private void leftOut(SXSSFWorkbook workbook, Styles styles, String table, long rows)
      throws IOException {
    prose(
        workbook,
        styles,
        table,
        List.of(
            table,
            "This table has "
                + Numbers.grouped((double) rows)
                + " rows; tables of more than "
                + Numbers.grouped(mostRows)
                + " are not in the workbook.",
            "All of it is in " + table + ".csv beside this file."));
  }

  /** A sheet of lines, the first of them its title. */
  private static void prose(SXSSFWorkbook workbook, Styles styles, String name, List<String> lines)
      throws IOException {
    SXSSFSheet sheet = workbook.createSheet(name);
    List<String> shown = new ArrayList<>(lines);
    for (int i = 0; i < shown.size(); i++) {
      Cell cell = sheet.createRow(i).createCell(0);
      cell.setCellValue(ShownText.of(shown.get(i)));
      CellStyle style = i == 0 ? styles.title() : styles.of(CellKind.PROSE);
      cell.setCellStyle(style);
    }
    sheet.setColumnWidth(0, 110 * 256);
    sheet.setDisplayGridlines(false);
    finish(sheet);
  }

  /**
   * Last touches. The rows go out at once: left to the library, sheets would go out in the order of
   * a hash, and with them the numbers of the shared texts.
   */
  static void finish(SXSSFSheet sheet) throws IOException {
    sheet.flushRows();
    sheet.getPrintSetup().setLandscape(true);
    sheet.getPrintSetup().setPaperSize(org.apache.poi.ss.usermodel.PrintSetup.A4_PAPERSIZE);
    sheet.setFitToPage(true);
    sheet.getPrintSetup().setFitWidth((short) 1);
    sheet.getPrintSetup().setFitHeight((short) 0);
  }
}
