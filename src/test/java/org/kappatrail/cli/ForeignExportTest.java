package org.kappatrail.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.stream.Stream;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellStyle;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** From an export as it was sent to κ: adopt, put in what the file does not tell, review. */
@Tag("slow")
class ForeignExportTest {
  private static final Path FOREIGN = Path.of("src", "test", "resources", "foreign");

  /** κ is printed with six digits. */
  private static final double SIX_DIGITS = 1e-5;

  @TempDir Path folder;

  @Test
  void aGermanReportAndAColumnPerTag() throws IOException {
    copy("north");
    String samples =
        edited(
            adopt("samples/nord-2024.csv"),
            Map.of("# missing: [\"k.A.\", \"n.b.\"]", "missing: [\"k.A.\", \"n.b.\"]"));
    String log =
        edited(
            adopt("temperatures/leitsystem.csv"),
            tags(
                Map.of(
                    "PM1.PRS.BRG1.TEMP °C", "press-1",
                    "PM1.PRS.ANTRIEB U/min", "press-1",
                    "PM1.FAN3.BRG1.TEMP °C", "fan-3",
                    "PM1.FAN3.ANTRIEB U/min", "fan-3")));
    settle(samples, log);

    assertKappa("north");
    assertThat(problems())
        .containsExactly(
            "temperatures/leitsystem.csv:9 PM1.PRS.BRG1.TEMP °C 'I/O Timeout'",
            "temperatures/leitsystem.csv:13 PM1.FAN3.BRG1.TEMP °C 'Bad'");
    Run check = Run.of("check", folder.toString());
    assertThat(check.out())
        .contains("samples/nord-2024.csv: 4 rows, 4 used, 0 rejected, 2024-02-13 to 2024-03-12")
        .contains("columns not used: bemerkung")
        .contains("leitsystem.csv: 48 rows with 96 readings, 92 used, 4 rejected")
        .contains("water_ppm: 3 of 4 samples (1 as a bound), 20 to 300")
        .contains("iron_ppm: 4 of 4 samples (1 as a bound), 1 to 1012");
  }

  @Test
  void twoHeaderRowsAndARowPerValue() throws IOException {
    copy("ridge");
    String samples =
        edited(adopt("samples/ridge.csv"), Map.of("# missing: [\"N/D\"]", "missing: [\"N/D\"]"));
    String adopted = adopt("temperatures/historian.csv");
    assertThat(adopted).contains("write units: {temperature_c: fahrenheit}");
    Map<String, String> edits =
        tags(
            Map.of("TI-101", "press-1", "SI-101", "press-1", "TI-302", "fan-3", "SI-302", "fan-3"));
    edits.put(
        "    tags:", "    units: {temperature_c: fahrenheit}\n    missing: [\"-9999\"]\n    tags:");
    settle(samples, edited(adopted, edits));

    assertKappa("ridge");
    assertThat(problems()).containsExactly("temperatures/historian.csv: tag 'PI-101, PI-302'");
    assertThat(Run.of("check", folder.toString()).out())
        .contains("iron_ppm: 4 of 4 samples (1 as a bound), 14 to 100")
        .contains("water_ppm: 3 of 4 samples (1 as a bound), 20 to 1250")
        .contains(
            "historian.csv: 288 rows, 180 used, 108 rejected",
            "96 bearing that is not in the register, 8 marked bad, 4 no temperature");
  }

  @Test
  void aWorkbookWithTitlesAndARowPerMachine() throws IOException {
    copy("fell");
    workbook();
    String samples = adopt("samples/results.xlsx");
    String log =
        edited(
            adopt("temperatures/scada.csv"),
            Map.of("constant: {bearing: BEARING}", "constant: {bearing: DS}"));
    settle(samples, log);

    assertKappa("fell");
    assertThat(problems()).isEmpty();
    assertThat(Run.of("check", folder.toString()).out())
        .contains("scada.csv: 96 rows, 92 used, 4 rejected")
        .contains("rejected: 4 no temperature")
        .contains("water_ppm: 3 of 4 samples (1 as a bound), 20 to 110");
  }

  private void copy(String name) throws IOException {
    for (String from : List.of("register", name)) {
      try (Stream<Path> paths = Files.walk(FOREIGN.resolve(from))) {
        for (Path path : paths.toList()) {
          Path target = folder.resolve(FOREIGN.resolve(from).relativize(path).toString());
          if (Files.isDirectory(path)) {
            Files.createDirectories(target);
          } else {
            Files.copy(path, target);
          }
        }
      }
    }
  }

  /** Merged titles, group titles, names, dates as day numbers, every other number as a text. */
  private void workbook() throws IOException {
    try (XSSFWorkbook book = new XSSFWorkbook()) {
      book.createSheet("Cover").createRow(0).createCell(0).setCellValue("Tarn Hollow");
      Sheet sheet = book.createSheet("Results");
      CellStyle date = book.createCellStyle();
      date.setDataFormat(book.createDataFormat().getFormat("dd/mm/yyyy"));
      List<String> lines = Files.readAllLines(FOREIGN.resolve("fell/workbook.tsv"));
      for (int row = 0; row < lines.size(); row++) {
        Row cells = sheet.createRow(row);
        String[] texts = lines.get(row).split("\t", -1);
        for (int column = 0; column < texts.length; column++) {
          if (!texts[column].isEmpty()) {
            fill(cells.createCell(column), texts[column], date);
          }
        }
      }
      sheet.addMergedRegion(new CellRangeAddress(0, 0, 0, 7));
      sheet.addMergedRegion(new CellRangeAddress(1, 1, 0, 7));
      sheet.addMergedRegion(new CellRangeAddress(3, 3, 0, 2));
      Files.createDirectories(folder.resolve("samples"));
      try (OutputStream out = Files.newOutputStream(folder.resolve("samples/results.xlsx"))) {
        book.write(out);
      }
    }
  }

  private static void fill(Cell cell, String text, CellStyle date) {
    if (text.matches("\\d{4}-.*")) {
      cell.setCellValue(LocalDate.parse(text));
      cell.setCellStyle(date);
    } else if (text.matches("[\\d.]+") && cell.getColumnIndex() % 2 == 0) {
      cell.setCellValue(Double.parseDouble(text));
    } else {
      cell.setCellValue(text);
    }
  }

  private String adopt(String file) {
    Run run = Run.of("adopt", folder.resolve(file).toString());
    assertThat(run.code()).isEqualTo(ExitCodes.DONE);
    return run.out();
  }

  /** What a person would change in the block; each text must be there. */
  private static String edited(String block, Map<String, String> edits) {
    String text = block;
    for (Map.Entry<String, String> edit : edits.entrySet()) {
      assertThat(text).contains(edit.getKey());
      text = text.replace(edit.getKey(), edit.getValue());
    }
    return text;
  }

  private static Map<String, String> tags(Map<String, String> assets) {
    Map<String, String> edits = new LinkedHashMap<>();
    assets.forEach(
        (tag, asset) ->
            edits.put(
                '"' + tag + "\": {asset: ASSET, bearing: BEARING,",
                '"' + tag + "\": {asset: " + asset + ", bearing: DS,"));
    return edits;
  }

  private void settle(String samples, String log) throws IOException {
    Files.writeString(
        folder.resolve("kappatrail.yaml"),
        "site: Tarn Hollow\ntimezone: Europe/London\n" + samples + log);
  }

  private void assertKappa(String name) throws IOException {
    Run run = Run.of("review", folder.toString(), "--no-charts", "--out", out().toString());
    assertThat(run.err()).isEmpty();
    assertThat(run.code()).isEqualTo(ExitCodes.DONE);
    Map<String, NamedCsvRecord> found = new LinkedHashMap<>();
    for (NamedCsvRecord row : rows(pack().resolve("kappa-history.csv"))) {
      found.put(row.getField("sample"), row);
    }
    List<NamedCsvRecord> expected = rows(FOREIGN.resolve(name + "/expected.csv"));
    assertThat(found).hasSameSizeAs(expected);
    for (NamedCsvRecord want : expected) {
      assertThat(found).containsKey(want.getField("sample"));
      NamedCsvRecord row = Objects.requireNonNull(found.get(want.getField("sample")));
      for (String text : List.of("asset", "bearing")) {
        assertThat(row.getField(text)).isEqualTo(want.getField(text));
      }
      assertThat(row.getField("sampled_at")).startsWith(want.getField("sampled_at"));
      assertThat(row.getField("temperature_source")).isEqualTo("log");
      assertThat(row.getField("speed_source")).isEqualTo("log");
      for (String column :
          List.of(
              "viscosity_40c_cst", "viscosity_100c_cst", "temperature_c", "speed_rpm", "kappa")) {
        double value = Double.parseDouble(want.getField(column));
        assertThat(Double.parseDouble(row.getField(column)))
            .as("%s of %s", column, want.getField("sample"))
            .isCloseTo(value, within(SIX_DIGITS * value));
      }
    }
  }

  private List<String> problems() throws IOException {
    return rows(pack().resolve("problems.csv")).stream()
        .map(
            row ->
                row.getField("file")
                    + ':'
                    + row.getField("line")
                    + ' '
                    + row.getField("column")
                    + " '"
                    + row.getField("value")
                    + '\'')
        .toList();
  }

  private Path out() {
    return folder.resolve("packs");
  }

  private Path pack() throws IOException {
    try (Stream<Path> packs = Files.list(out())) {
      List<Path> found = packs.toList();
      assertThat(found).hasSize(1);
      return found.get(0);
    }
  }

  private static List<NamedCsvRecord> rows(Path file) throws IOException {
    try (CsvReader<NamedCsvRecord> rows = CsvReader.builder().ofNamedCsvRecord(file)) {
      return rows.stream().toList();
    }
  }
}
