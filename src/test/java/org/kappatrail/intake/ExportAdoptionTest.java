package org.kappatrail.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.zip.GZIPOutputStream;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.Measurement;
import org.kappatrail.history.Sample;
import org.kappatrail.history.Settings;
import org.kappatrail.history.UnusableInputException;

/** The exports are invented, in shapes that laboratories and historians give. */
class ExportAdoptionTest {
  private static final String NORTH =
      """
      Tarn Hollow;Ölanalysen
      Zeitraum;März

      Probe Nr.;Maschine;Datum;Visk. 40 °C (mm²/s);Visk. 100 °C (mm²/s);Wasser KF (%);ISO 4406;Fe (ppm);Bemerkung
      10234;press-1;03.02.2024;148,25;14,7;0,02;18/16/13;<5;trüb
      10235;press-1;31.03.2024;149,5;14,8;k.A.;17/15/12;12;
      10236;fan-3;31.03.2024;66,5;8,6;0,01;>20/18/15;1.012;
      Ende des Berichts;;;;;;;;
      """;

  @TempDir Path temporary;

  @Test
  void aBlockForALaboratoryReadsItsExportAsItStands() throws IOException {
    Folder folder =
        Folder.in(temporary).put("samples/north.csv", NORTH, Charset.forName("windows-1252"));
    String block = ExportAdoption.adopt(temporary.resolve("samples/north.csv"));
    Intake intake = folder.put("kappatrail.yaml", block).read();

    assertThat(intake.history().samples()).hasSize(3);
    Sample first = Folder.sample(intake, "10234");
    assertThat(first.sampledAtText()).isEqualTo("2024-02-03");
    assertThat(first.values())
        .containsEntry("viscosity_40c_cst", Measurement.of(148.25))
        .containsEntry("viscosity_100c_cst", Measurement.of(14.7))
        .containsEntry("water_ppm", Measurement.of(200))
        .containsEntry("iron_ppm", new Measurement.Below(5));
    assertThat(Folder.sample(intake, "10236").exact("iron_ppm")).hasValue(1012);
    assertThat(Folder.sample(intake, "10236").statedCode()).hasToString("Optional[≥20/18/15]");
    assertThat(block)
        .contains("decimal: comma", "thousands: \".\"", "skip-lines: 3", "encoding: windows-1252")
        .contains("water_ppm: percent", "date-format: \"dd.MM.yyyy\"", "missing: [\"k.A.\"]")
        .contains("#   sample 10234, asset press-1, sampled_at 2024-02-03")
        .contains("Bemerkung");
  }

  @Test
  void twoHeaderRowsWithUnitsGiveNamesAndUnits() throws IOException {
    Folder folder =
        Folder.in(temporary)
            .put(
                "samples/south.csv",
                """
                Sample No,Unit ID,Sample Date,Received,Viscosity,,Water,Particles >4 um,TAN
                ,,,,40 C,100 C,%,/100ml,mg KOH/g
                A1,press-1,02/14/2024,02/20/2024,148,14.6,0.01,130000,0.12
                A2,fan-3,03/05/2024,03/08/2024,66,8.4,<0.005,"1,250,000",0.2
                """);
    String block = ExportAdoption.adopt(temporary.resolve("samples/south.csv"));
    Intake intake = folder.put("kappatrail.yaml", block).read();

    assertThat(intake.problems()).isEmpty();
    assertThat(Folder.sample(intake, "A1").sampledAtText()).isEqualTo("2024-02-14");
    assertThat(Folder.sample(intake, "A2").values())
        .containsEntry("viscosity_40c_cst", Measurement.of(66))
        .containsEntry("viscosity_100c_cst", Measurement.of(8.4))
        .containsEntry("water_ppm", new Measurement.Below(50))
        .containsEntry("particles_4um_per_ml", Measurement.of(12500))
        .containsEntry("acid_number_mg_koh_g", Measurement.of(0.2));
    assertThat(block).contains("header-rows: 2").doesNotContain("not sure");
  }

  @Test
  void whatTheValuesLeaveOpenIsSaidAndNotGuessedSilently() throws IOException {
    Path file = temporary.resolve("east.csv");
    Files.writeString(
        file,
        """
        sample;asset;sampled_at;viscosity_40c_cst;water
        A1;press-1;03/02/2024;1,234;0,01
        """);
    assertThat(ExportAdoption.adopt(file))
        .contains("date-format is not sure: day or month first cannot be told")
        .contains("unit of water_ppm is not sure");
    Files.writeString(file, "sample;asset;sampled_at;iron_ppm\nA1;press-1;2024-02-03;1,234\n");
    assertThat(ExportAdoption.adopt(file)).contains("decimal is not sure: 1,234 may be one");
    Files.writeString(
        file, "asset;sampled_at;iron_ppm\npress-1;2024-02-03;12\npress-1;2024-02-04;12\n");
    assertThat(ExportAdoption.adopt(file)).contains("not found: sample, which is required");
    Files.writeString(
        file,
        "sample;asset;sampled_at;iron_ppm\nA1;a;31/01/2024;12\nA2;a;01/31/2024;12\nA3;a;1/2/2024;2\n");
    assertThat(ExportAdoption.adopt(file)).contains("some dates fit day first only");
  }

  @Test
  void aLogWithAColumnPerTagGivesATagList() throws IOException {
    String block =
        adopt(
            "wide.csv",
            """
            Timestamp;TIC101.PV;TIC102.PV;SI101.PV
            05.03.2024 00:00:00;61,5;58,25;179,9
            13.03.2024 00:10:00;61,5;Bad;180,1
            """);
    ExportMapping mapping = SettingsReader.parse(block).logExports().get(0);
    assertThat(mapping.columns()).containsEntry("Timestamp", "time");
    assertThat(mapping.decimalComma()).isTrue();
    assertThat(mapping.delimiter()).contains(";");
    assertThat(mapping.dateFormat()).contains("dd.MM.yyyy H:mm:ss");
    assertThat(mapping.tags()).containsOnlyKeys("TIC101.PV", "TIC102.PV", "SI101.PV");
    assertThat(mapping.tags())
        .hasEntrySatisfying(
            "SI101.PV",
            tag -> assertThat(tag.quantity()).isEqualTo(ExportMapping.Tag.Quantity.SPEED));
    assertThat(block).contains("which bearing each tag belongs to is not in the file");
  }

  @Test
  void aLogThatNamesItsTagsInAColumnGivesTheTagsItHolds() throws IOException {
    String block =
        adopt(
            "tags.csv",
            """
            ts|tag_name|value|quality
            2024-03-05T00:00:00Z|TH.FAN3.NDE.TEMP|63.5|good
            2024-03-05T00:00:00Z|TH.FAN3.SPEED|1480|good
            """
                .replace('|', '\t'));
    ExportMapping mapping = SettingsReader.parse(block).logExports().get(0);
    assertThat(mapping.columns().values()).containsExactly("time", "tag", "value", "quality");
    assertThat(mapping.delimiter()).contains("\t");
    assertThat(mapping.dateFormat()).isEmpty();
    assertThat(mapping.tags()).containsOnlyKeys("TH.FAN3.NDE.TEMP", "TH.FAN3.SPEED");
  }

  @Test
  void aPackedLongLogGivesColumnsAndUnits() throws IOException {
    Path file = temporary.resolve("long.csv.gz");
    try (OutputStream out = new GZIPOutputStream(Files.newOutputStream(file))) {
      out.write(
          """
          time,machine,brg,Temp (°F),rpm
          5-Mar-24 1:05 PM,fan-3,NDE,143.5,1480
          """
              .getBytes(StandardCharsets.UTF_8));
    }
    Settings settings = SettingsReader.parse(ExportAdoption.adopt(file));
    ExportMapping mapping = settings.logExports().get(0);
    assertThat(mapping.columns())
        .containsEntry("machine", "asset")
        .containsEntry("brg", "bearing")
        .containsEntry("Temp (°F)", "temperature_c")
        .containsEntry("rpm", "speed_rpm");
    assertThat(mapping.units()).containsEntry("temperature_c", "fahrenheit");
    assertThat(mapping.dateFormat()).contains("d-MMM-yy h:mm a");
  }

  @Test
  void aWorkbookGivesTheSheetWithTheTable() throws IOException {
    Folder folder = Folder.in(temporary);
    try (XSSFWorkbook book = new XSSFWorkbook()) {
      book.createSheet("Info").createRow(0).createCell(0).setCellValue("Tarn Hollow");
      Sheet sheet = book.createSheet("Results");
      String[][] cells = {
        {"Oil laboratory"},
        {"Lab No", "Machine", "Date sampled", "V40", "Fe ppm"},
        {"7001", "press-1", "05/03/2024", "", "<1"},
        {"7002", "press-1", "25/03/2024", "", "3"}
      };
      for (int row = 0; row < cells.length; row++) {
        Row made = sheet.createRow(row);
        for (int column = 0; column < cells[row].length; column++) {
          made.createCell(column).setCellValue(cells[row][column]);
        }
      }
      sheet.getRow(2).getCell(3).setCellValue(148.5);
      sheet.getRow(3).getCell(3).setCellValue(149.5);
      Files.createDirectories(temporary.resolve("samples"));
      try (OutputStream out = Files.newOutputStream(temporary.resolve("samples/a.xlsx"))) {
        book.write(out);
      }
    }
    String block = ExportAdoption.adopt(temporary.resolve("samples/a.xlsx"));
    Intake intake = folder.put("kappatrail.yaml", block).read();
    assertThat(intake.problems()).isEmpty();
    assertThat(Folder.sample(intake, "7002").sampledAtText()).isEqualTo("2024-03-25");
    assertThat(Folder.sample(intake, "7002").exact("viscosity_40c_cst")).hasValue(149.5);
    assertThat(Folder.sample(intake, "7001").find("iron_ppm")).contains(new Measurement.Below(1));
  }

  @Test
  void aFileWithoutATableIsRefused() throws IOException {
    Path file = temporary.resolve("letter.csv");
    Files.writeString(file, "Dear colleague\nthe results follow\n");
    assertThatThrownBy(() -> ExportAdoption.adopt(file))
        .isInstanceOf(UnusableInputException.class)
        .hasMessageContaining("letter.csv: no table is found");
  }

  private String adopt(String name, String text) throws IOException {
    Path file = temporary.resolve(name);
    Files.writeString(file, text);
    return ExportAdoption.adopt(file);
  }
}
