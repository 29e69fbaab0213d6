package org.kappatrail.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellStyle;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.history.Measurement;
import org.kappatrail.history.Sample;
import org.kappatrail.history.UnusableInputException;

class WorkbookFileTest {
  @TempDir Path temporary;

  @Test
  void numbersTextsDatesAndFormulasAreReadWhateverTheSettingsSayOfSigns() throws IOException {
    Folder folder =
        Folder.in(temporary)
            .put(
                "kappatrail.yaml",
                """
                samples:
                  - files: "samples/*.xlsx"
                    sheet: results
                    skip-lines: 2
                    decimal: comma
                    date-format: dd.MM.yyyy
                    units: {water_ppm: percent}
                    columns: {"Visc 40": viscosity_40c_cst, "Water": water_ppm}
                """);
    try (XSSFWorkbook book = new XSSFWorkbook()) {
      book.createSheet("Cover").createRow(0).createCell(0).setCellValue("nothing here");
      Sheet sheet = book.createSheet("Results");
      sheet.createRow(0).createCell(0).setCellValue("Tarn Hollow, oil laboratory");
      sheet.addMergedRegion(new CellRangeAddress(0, 0, 0, 4));
      fill(sheet.createRow(2), "sample", "asset", "sampled_at", "Visc 40", "Water");
      Row first = fill(sheet.createRow(3), "A1", "press-1");
      date(book, first.createCell(2), LocalDate.of(2024, 3, 5));
      first.createCell(3).setCellValue(148.3);
      percent(book, first.createCell(4), 0.0023);
      Row second = fill(sheet.createRow(5), "A2", "press-1", "31.03.2024", "149,5", "<0,01");
      assertThat(second.getRowNum()).isEqualTo(5);
      Row third = fill(sheet.createRow(6), "A3", "press-1");
      third.createCell(2).setCellValue(45357);
      third.createCell(3).setCellFormula("100+48");
      third.createCell(4).setCellValue("wet");
      book.getCreationHelper().createFormulaEvaluator().evaluateAll();
      save(book, "samples/lab.xlsx");
    }
    Intake intake = folder.read();

    assertThat(intake.problems())
        .singleElement()
        .hasToString(
            "samples/lab.xlsx:7 water_ppm 'wet': not a number; correct it or leave the cell empty");
    Sample first = Folder.sample(intake, "A1");
    assertThat(first.sampledAtText()).isEqualTo("2024-03-05");
    assertThat(first.exact("viscosity_40c_cst")).hasValue(148.3);
    assertThat(first.exact("water_ppm")).hasValue(2300);
    Sample second = Folder.sample(intake, "A2");
    assertThat(second.sampledAtText()).isEqualTo("2024-03-31");
    assertThat(second.exact("viscosity_40c_cst")).hasValue(149.5);
    assertThat(second.find("water_ppm")).contains(new Measurement.Below(100));
    Sample third = Folder.sample(intake, "A3");
    // Day 45357 of the 1900 system is 2024-03-06 (common practice of spreadsheets).
    assertThat(third.sampledAtText()).isEqualTo("2024-03-06");
    assertThat(third.exact("viscosity_40c_cst")).hasValue(148);
    assertThat(intake.notes()).anySatisfy(note -> assertThat(note).contains("formula", "row 7"));
  }

  @Test
  void daysCountedFrom1904AreReadAsSuch() throws IOException {
    Folder folder = Folder.in(temporary);
    try (XSSFWorkbook book = new XSSFWorkbook()) {
      book.getCTWorkbook().addNewWorkbookPr().setDate1904(true);
      Sheet sheet = book.createSheet("a");
      fill(sheet.createRow(0), "sample", "asset", "sampled_at");
      Row row = fill(sheet.createRow(1), "A1", "press-1");
      // 43895 days after 1904-01-01, as 45357 after 1899-12-30: 1462 days less.
      row.createCell(2).setCellValue(43895.25);
      save(book, "samples/a.xlsx");
    }
    assertThat(Folder.sample(folder.read(), "A1").sampledAt())
        .isEqualTo(LocalDateTime.of(2024, 3, 6, 6, 0));
  }

  @Test
  void theFirstOfSeveralSheetsIsReadAndThatIsSaid() throws IOException {
    Folder folder = Folder.in(temporary);
    try (XSSFWorkbook book = new XSSFWorkbook()) {
      Sheet sheet = book.createSheet("March");
      fill(sheet.createRow(0), "sample", "asset", "sampled_at");
      fill(sheet.createRow(1), "A1", "press-1", "2024-03-05");
      book.createSheet("April");
      save(book, "samples/a.xlsx");
    }
    Intake intake = folder.read();
    assertThat(intake.history().samples()).hasSize(1);
    assertThat(intake.notes())
        .singleElement()
        .asString()
        .contains("samples/a.xlsx", "'March' is read", "April");
  }

  @Test
  void aMissingSheetNamesTheSheetsThereAre() throws IOException {
    Folder folder =
        Folder.in(temporary)
            .put("kappatrail.yaml", "samples:\n  - {files: \"samples/*.xlsx\", sheet: Mai}\n");
    try (XSSFWorkbook book = new XSSFWorkbook()) {
      book.createSheet("March");
      save(book, "samples/a.xlsx");
    }
    assertThatThrownBy(folder::read)
        .isInstanceOf(UnusableInputException.class)
        .hasMessageContaining("samples/a.xlsx: has no sheet 'Mai'; it has March");
  }

  @Test
  void whatIsNoWorkbookIsRefusedWithARemedy() throws IOException {
    Folder folder = Folder.in(temporary).put("samples/a.xlsx", "sample,asset\n");
    assertThatThrownBy(folder::read)
        .isInstanceOf(UnusableInputException.class)
        .hasMessageContaining("samples/a.xlsx: cannot be read as a workbook")
        .hasMessageContaining("save it as .xlsx or CSV");
  }

  @Test
  void aWorkbookThatUnpacksBeyondMeasureIsRefused() throws IOException {
    Folder folder = Folder.in(temporary);
    try (XSSFWorkbook book = new XSSFWorkbook()) {
      book.createSheet("a").createRow(0).createCell(0).setCellValue("sample");
      save(book, "small.xlsx");
    }
    Path bomb = temporary.resolve("samples/bomb.xlsx");
    Files.createDirectories(bomb.getParent());
    try (java.util.zip.ZipFile small =
            new java.util.zip.ZipFile(temporary.resolve("small.xlsx").toFile());
        OutputStream out = Files.newOutputStream(bomb);
        ZipOutputStream zip = new ZipOutputStream(out)) {
      for (ZipEntry entry : java.util.Collections.list(small.entries())) {
        zip.putNextEntry(new ZipEntry(entry.getName()));
        if (entry.getName().endsWith("sheet1.xml")) {
          zip.write("<worksheet><sheetData>".getBytes(StandardCharsets.UTF_8));
          byte[] blanks = new byte[1 << 20];
          java.util.Arrays.fill(blanks, (byte) ' ');
          for (int part = 0; part < 40; part++) {
            zip.write(blanks);
          }
        } else {
          small.getInputStream(entry).transferTo(zip);
        }
      }
    }
    assertThatThrownBy(folder::read)
        .isInstanceOf(UnusableInputException.class)
        .hasMessageContaining("samples/bomb.xlsx: cannot be read as a workbook");
  }

  private void save(XSSFWorkbook book, String name) throws IOException {
    Path file = temporary.resolve(name);
    Files.createDirectories(file.getParent());
    try (OutputStream out = Files.newOutputStream(file)) {
      book.write(out);
    }
  }

  private static Row fill(Row row, String... texts) {
    for (int column = 0; column < texts.length; column++) {
      row.createCell(column).setCellValue(texts[column]);
    }
    return row;
  }

  private static void date(XSSFWorkbook book, Cell cell, LocalDate day) {
    CellStyle style = book.createCellStyle();
    style.setDataFormat(book.createDataFormat().getFormat("m/d/yy"));
    cell.setCellStyle(style);
    cell.setCellValue(day);
  }

  private static void percent(XSSFWorkbook book, Cell cell, double value) {
    CellStyle style = book.createCellStyle();
    style.setDataFormat(book.createDataFormat().getFormat("0.00%"));
    cell.setCellStyle(style);
    cell.setCellValue(value);
  }
}
