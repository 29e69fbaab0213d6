package org.kappatrail.report;

import static org.assertj.core.api.Assertions.assertThat;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.DataFormatter;
import org.apache.poi.ss.usermodel.DateUtil;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class WorkbookTest {
  @TempDir static Path folder;
  private static Path pack;

  @BeforeAll
  static void writeAPackOfHostileNames() throws IOException {
    FleetFiles.write(folder.resolve("site"), FleetFiles.HOSTILE, FleetFiles.HOSTILE);
    pack = FleetFiles.review(folder.resolve("site"), folder.resolve("out"));
  }

  @Test
  void everyTableOfThePackIsASheetWithTheSameRowsAndColumns() throws IOException {
    try (XSSFWorkbook workbook = open()) {
      for (String table :
          List.of("kappa-history", "attribution", "drift", "verdicts", "remedies", "findings")) {
        XSSFSheet sheet = workbook.getSheet(table);
        List<NamedCsvRecord> rows = csv(table);
        assertThat(sheet.getLastRowNum()).as(table).isEqualTo(rows.size());
        assertThat(header(sheet)).as(table).isEqualTo(rows.get(0).getHeader());
      }
    }
  }

  @Test
  void numbersOfTheWorkbookAreThoseOfTheCsvFiles() throws IOException {
    try (XSSFWorkbook workbook = open()) {
      XSSFSheet sheet = workbook.getSheet("kappa-history");
      List<NamedCsvRecord> rows = csv("kappa-history");
      int column = rows.get(0).getHeader().indexOf("kappa");
      assertThat(column).isPositive();
      for (int i = 0; i < rows.size(); i++) {
        Cell cell = sheet.getRow(i + 1).getCell(column);
        assertThat(cell.getNumericCellValue())
            .isEqualTo(Double.parseDouble(rows.get(i).getField("kappa")));
      }
    }
  }

  @Test
  void namesThatLookLikeFormulasAreQuotedTextAndNoCellIsAFormula() throws IOException {
    List<String> shown = new ArrayList<>();
    try (XSSFWorkbook workbook = open()) {
      for (int i = 0; i < workbook.getNumberOfSheets(); i++) {
        for (Row row : workbook.getSheetAt(i)) {
          for (Cell cell : row) {
            assertThat(cell.getCellType()).isNotEqualTo(CellType.FORMULA);
            boolean like =
                cell.getCellType() == CellType.STRING
                    && !cell.getStringCellValue().isEmpty()
                    && "=+-@".indexOf(cell.getStringCellValue().charAt(0)) >= 0;
            if (like) {
              assertThat(cell.getCellStyle().getQuotePrefixed()).isTrue();
              shown.add(cell.getStringCellValue());
            }
          }
        }
      }
    }
    assertThat(shown).contains("=cmd|'/C calc'!A1", "-2+3", "@sum(A1)");
  }

  @Test
  void theFleetSheetComesFirstAndHasEachAssetOnce() throws IOException {
    try (XSSFWorkbook workbook = open()) {
      XSSFSheet fleet = workbook.getSheetAt(0);
      assertThat(fleet.getSheetName()).isEqualTo("fleet");
      List<String> assets = new ArrayList<>();
      for (int r = 1; r <= fleet.getLastRowNum(); r++) {
        assets.add(fleet.getRow(r).getCell(0).getStringCellValue());
      }
      assertThat(assets)
          .hasSize(FleetFiles.HOSTILE.size())
          .contains("<img src=x onerror=alert(1)>");
      assertThat(assets).anyMatch(name -> name.length() == 300);
    }
  }

  @Test
  void levelsKeepTheirWordAndShowTheirShape() throws IOException {
    DataFormatter formatter = new DataFormatter(java.util.Locale.ROOT);
    List<String> shown = new ArrayList<>();
    try (XSSFWorkbook workbook = open()) {
      XSSFSheet fleet = workbook.getSheet("fleet");
      for (int r = 1; r <= fleet.getLastRowNum(); r++) {
        Cell cell = fleet.getRow(r).getCell(1);
        assertThat(cell.getStringCellValue()).isIn("alarm", "alert", "clear");
        shown.add(
            formatter.formatCellValue(cell) + "/" + cell.getCellStyle().getDataFormatString());
      }
    }
    assertThat(shown).anyMatch(text -> text.startsWith("■ alarm/") || text.contains("\"■ \"@"));
    assertThat(shown).anyMatch(text -> text.contains("\"○ \"@"));
  }

  @Test
  void tablesHaveAFrozenHeaderAFilterAndDatesAsDates() throws IOException {
    try (XSSFWorkbook workbook = open()) {
      XSSFSheet sheet = workbook.getSheet("kappa-history");
      assertThat(sheet.getPaneInformation().getHorizontalSplitPosition()).isEqualTo((short) 1);
      assertThat(sheet.getPaneInformation().getVerticalSplitPosition()).isEqualTo((short) 2);
      assertThat(sheet.getCTWorksheet().isSetAutoFilter()).isTrue();
      Cell sampled = sheet.getRow(1).getCell(header(sheet).indexOf("sampled_at"));
      assertThat(DateUtil.isCellDateFormatted(sampled)).isTrue();
      assertThat(sampled.getLocalDateTimeCellValue().toLocalDate().toString())
          .isEqualTo(csv("kappa-history").get(0).getField("sampled_at"));
    }
  }

  @Test
  void theSameReviewGivesTheSameBytes() throws IOException {
    Path again = FleetFiles.review(folder.resolve("site"), folder.resolve("again"));
    for (String file : List.of("review.xlsx", "review.json")) {
      assertThat(Files.mismatch(pack.resolve(file), again.resolve(file))).as(file).isEqualTo(-1);
    }
  }

  private static XSSFWorkbook open() throws IOException {
    try (InputStream in = Files.newInputStream(pack.resolve("review.xlsx"))) {
      return new XSSFWorkbook(in);
    }
  }

  private static List<String> header(XSSFSheet sheet) {
    List<String> names = new ArrayList<>();
    sheet.getRow(0).forEach(cell -> names.add(cell.getStringCellValue()));
    return names;
  }

  private static List<NamedCsvRecord> csv(String table) throws IOException {
    try (CsvReader<NamedCsvRecord> reader =
        CsvReader.builder().ofNamedCsvRecord(pack.resolve(table + ".csv"))) {
      return reader.stream().toList();
    }
  }
}
