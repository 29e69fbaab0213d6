package org.kappatrail.report.slides;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.TreeSet;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellStyle;
import org.apache.poi.ss.usermodel.DateUtil;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.util.CellReference;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.kappatrail.report.table.SixDigits;

/** The numbers behind a chart: a column of dates and a column per series, empty where unknown. */
final class ChartSheet {
  private static final String SHEET = "data";

  private final List<String> names = new ArrayList<>();
  private final List<SortedMap<LocalDate, Double>> columns = new ArrayList<>();

  /** Adds a column and gives its number, from 0. */
  int add(String name, SortedMap<LocalDate, Double> values) {
    names.add(name);
    TreeMap<LocalDate, Double> rounded = new TreeMap<>();
    values.forEach(
        (day, value) -> rounded.put(day, new BigDecimal(SixDigits.text(value)).doubleValue()));
    columns.add(rounded);
    return names.size() - 1;
  }

  String name(int column) {
    return names.get(column);
  }

  /** Every day that has a value, in time. */
  List<LocalDate> days() {
    TreeSet<LocalDate> days = new TreeSet<>();
    columns.forEach(column -> days.addAll(column.keySet()));
    return List.copyOf(days);
  }

  SortedMap<LocalDate, Double> values(int column) {
    return columns.get(column);
  }

  static double serial(LocalDate day) {
    return DateUtil.getExcelDate(day);
  }

  String dayRange() {
    return range(0);
  }

  String valueRange(int column) {
    return range(column + 1);
  }

  String nameCell(int column) {
    return SHEET + "!$" + CellReference.convertNumToColString(column + 1) + "$1";
  }

  private String range(int index) {
    String letter = CellReference.convertNumToColString(index);
    return SHEET + "!$" + letter + "$2:$" + letter + "$" + (days().size() + 1);
  }

  /** Writes the sheet into a chart's workbook. */
  void fill(XSSFWorkbook workbook) {
    XSSFSheet sheet =
        workbook.getNumberOfSheets() == 0 ? workbook.createSheet() : workbook.getSheetAt(0);
    workbook.setSheetName(0, SHEET);
    CellStyle date = workbook.createCellStyle();
    date.setDataFormat(workbook.createDataFormat().getFormat("yyyy-mm-dd"));
    Row header = sheet.createRow(0);
    header.createCell(0).setCellValue("date");
    for (int i = 0; i < names.size(); i++) {
      header.createCell(i + 1).setCellValue(names.get(i));
      sheet.setColumnWidth(i + 1, 14 * 256);
    }
    sheet.setColumnWidth(0, 12 * 256);
    int r = 1;
    for (LocalDate day : days()) {
      Row row = sheet.createRow(r++);
      Cell cell = row.createCell(0);
      cell.setCellValue(day);
      cell.setCellStyle(date);
      for (int i = 0; i < columns.size(); i++) {
        Double value = columns.get(i).get(day);
        if (value != null) {
          row.createCell(i + 1).setCellValue(value);
        }
      }
    }
    sheet.createFreezePane(1, 1);
  }
}
