package org.kappatrail.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.LocalDateTime;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.history.Measurement;
import org.kappatrail.history.Sample;
import org.kappatrail.history.UnusableInputException;

/** Exports in shapes that laboratories and historians give; the data are invented. */
class ExportShapesTest {
  @TempDir Path temporary;

  @Test
  void semicolonsDecimalCommasAndDayFirstDatesAreReadAsTheSettingsSay() throws IOException {
    Intake intake =
        Folder.in(temporary)
            .put(
                "kappatrail.yaml",
                """
                samples:
                  - files: "samples/north-*.csv"
                    columns:
                      Probe: sample
                      Maschine: asset
                      Datum: sampled_at
                      Visk 40: viscosity_40c_cst
                      Wasser: water_ppm
                      Fe: iron_ppm
                    units: {water_ppm: "%"}
                    date-format: dd.MM.yyyy
                    decimal: comma
                    thousands: "."
                    delimiter: ";"
                    encoding: windows-1252
                    constant: {laboratory: north}
                    missing: ["k.A."]
                """)
            .put(
                "samples/north-1.csv",
                """
                Probe;Maschine;Datum;Visk 40 [mm²/s];Wasser (%);Fe;Bemerkung
                N1;press-1;3.02.2024;148,25;0,02;<5;trübe Öl
                N2;press-1;31.03.2024;1.148,5;k.A.;12;
                """,
                Charset.forName("windows-1252"))
            .read();

    assertThat(intake.problems()).isEmpty();
    Sample first = Folder.sample(intake, "N1");
    assertThat(first.sampledAtText()).isEqualTo("2024-02-03");
    assertThat(first.laboratory()).isEqualTo("north");
    assertThat(first.values())
        .containsEntry("viscosity_40c_cst", Measurement.of(148.25))
        .containsEntry("water_ppm", Measurement.of(200))
        .containsEntry("iron_ppm", new Measurement.Below(5))
        .hasSize(3);
    Sample second = Folder.sample(intake, "N2");
    assertThat(second.exact("viscosity_40c_cst")).hasValue(1148.5);
    assertThat(second.find("water_ppm")).isEmpty();
    assertThat(intake.files())
        .filteredOn(file -> file.file().equals("samples/north-1.csv"))
        .allSatisfy(file -> assertThat(file.unusedColumns()).containsExactly("bemerkung"));
  }

  @Test
  void titleLinesTwoHeaderRowsAndAFooterAreReadAsTheSettingsSay() throws IOException {
    Intake intake =
        Folder.in(temporary)
            .put(
                "kappatrail.yaml",
                """
                samples:
                  - files: "samples/*.csv"
                    skip-lines: 2
                    header-rows: 2
                    footer: "Total"
                    columns:
                      "Sample No": sample
                      "Unit": asset
                      "Drawn": sampled_at
                      "Viscosity 40 C": viscosity_40c_cst
                      "Viscosity 100 C": viscosity_100c_cst
                      "Water": water_ppm
                    date-format: d-MMM-yy
                """)
            .put(
                "samples/a.csv",
                """
                Tarn Hollow paper mill
                Report of March
                Sample,,,Viscosity,,Water
                No,Unit,Drawn,40 C,100 C,%
                A1,press-1,5-Mar-24,148,14.6,0.01
                A2,fan-3,17-SEPT-23,66,8.4,<0.005

                Total 2 samples,,,,,
                not,a,row,at,all,1
                """)
            .read();

    assertThat(intake.problems()).isEmpty();
    assertThat(Folder.sample(intake, "A1").values())
        .containsEntry("viscosity_40c_cst", Measurement.of(148))
        .containsEntry("viscosity_100c_cst", Measurement.of(14.6))
        .containsEntry("water_ppm", Measurement.of(100));
    assertThat(Folder.sample(intake, "A2").day()).isEqualTo(LocalDate.of(2023, 9, 17));
    assertThat(Folder.sample(intake, "A2").find("water_ppm")).contains(new Measurement.Below(50));
    assertThat(intake.notes())
        .singleElement()
        .asString()
        .contains("samples/a.csv", "water_ppm is read as percent", "header");
  }

  @Test
  void countsAndTemperaturesComeInTheUnitsTheSettingsName() throws IOException {
    Intake intake =
        Folder.in(temporary)
            .put(
                "kappatrail.yaml",
                """
                samples:
                  - files: "samples/a.csv"
                    units:
                      particles_4um_per_ml: per 100 ml
                      particles_6um_per_ml: per L
                      temperature_c: °F
                      oil_hours: days
                  - files: "samples/b.csv"
                    units: {temperature_c: K}
                """)
            .put(
                "samples/a.csv",
                """
                sample,asset,sampled_at,particles_4um_per_ml,particles_6um_per_ml,temperature_c,oil_hours
                A1,press-1,2024-03-05,130000,320000,212,10
                """)
            .put(
                "samples/b.csv",
                "sample,asset,sampled_at,temperature_c\nB1,fan-3,2024-03-05,350.15\n")
            .read();

    assertThat(intake.problems()).isEmpty();
    Sample first = Folder.sample(intake, "A1");
    assertThat(first.exact("particles_4um_per_ml")).hasValue(1300);
    assertThat(first.exact("particles_6um_per_ml")).hasValue(320);
    assertThat(first.exact("temperature_c")).hasValue(100);
    assertThat(first.exact("oil_hours")).hasValue(240);
    assertThat(first.cleanliness()).hasToString("Optional[17/15/*]");
    assertThat(Folder.sample(intake, "B1").exact("temperature_c")).hasValue(77);
  }

  @Test
  void timesComeIntoSiteTime() throws IOException {
    Intake intake =
        Folder.in(temporary)
            .put(
                "kappatrail.yaml",
                """
                timezone: Europe/London
                samples:
                  - files: "samples/west.csv"
                    timezone: America/New_York
                    date-format: MM/dd/yyyy[ h:mm a]
                """)
            .put(
                "samples/a.csv",
                """
                sample,asset,sampled_at
                A1,press-1,2024-07-01T23:30Z
                A2,press-1,2024-07-01 08:15
                A3,press-1,2024-07-01T08:15:00+02:00
                A4,press-1,2024-07-01
                """)
            .put(
                "samples/west.csv",
                "sample,asset,sampled_at\nW1,fan-3,07/01/2024 8:15 PM\nW2,fan-3,07/02/2024\n")
            .read();

    assertThat(intake.problems()).isEmpty();
    assertThat(Folder.sample(intake, "A1").sampledAt())
        .isEqualTo(LocalDateTime.of(2024, 7, 2, 0, 30));
    assertThat(Folder.sample(intake, "A2").sampledAtText()).isEqualTo("2024-07-01T08:15");
    assertThat(Folder.sample(intake, "A3").sampledAtText()).isEqualTo("2024-07-01T07:15");
    assertThat(Folder.sample(intake, "A4").sampledAtText()).isEqualTo("2024-07-01");
    assertThat(Folder.sample(intake, "W1").sampledAtText()).isEqualTo("2024-07-02T01:15");
    assertThat(Folder.sample(intake, "W2").sampledAtText()).isEqualTo("2024-07-02");
  }

  @Test
  void everyFurtherColumnOfNumbersTakesPartAndATextColumnIsToldAsUnused() throws IOException {
    Intake intake =
        Folder.in(temporary)
            .put(
                "samples/a.csv",
                """
                sample,asset,sampled_at,PQ Index,Appearance,molybdenum_ppm
                A1,press-1,2024-03-05,45,clear,
                A2,press-1,2024-04-05,>500,hazy,3
                A3,press-1,2024-05-05,high,clear,
                """)
            .read();

    assertThat(Folder.sample(intake, "A1").exact("pq_index")).hasValue(45);
    assertThat(Folder.sample(intake, "A2").find("pq_index")).contains(new Measurement.Above(500));
    assertThat(Folder.sample(intake, "A2").exact("molybdenum_ppm")).hasValue(3);
    assertThat(intake.problems())
        .singleElement()
        .hasToString(
            "samples/a.csv:4 pq_index 'high': not a number; correct it or leave the cell empty");
    assertThat(intake.files().get(3).unusedColumns()).containsExactly("appearance");
  }

  @Test
  void everyMarkerOfAMissingValueIsMissingAndNotZero() throws IOException {
    StringBuilder rows = new StringBuilder("sample,asset,sampled_at,water_ppm\n");
    String[] markers = {"", "-", "n/a", "N/A", "nd", "ND", "na", "null", "none", ".", "–", " - "};
    for (int row = 0; row < markers.length; row++) {
      rows.append("M").append(row).append(",press-1,2024-03-05,").append(markers[row]).append('\n');
    }
    Intake intake = Folder.in(temporary).put("samples/a.csv", rows.toString()).read();

    assertThat(intake.problems()).isEmpty();
    assertThat(intake.history().samples()).hasSize(markers.length);
    assertThat(intake.history().samples()).allSatisfy(s -> assertThat(s.values()).isEmpty());
  }

  @Test
  void boundsAreKeptAsBoundsInEverySpelling() throws IOException {
    Intake intake =
        Folder.in(temporary)
            .put(
                "samples/a.csv",
                """
                sample,asset,sampled_at,water_ppm,iron_ppm,particles_4um_per_ml,acid_number_mg_koh_g
                A1,press-1,2024-03-05,< 20,≤0.5,>5000,1.2e-1
                A2,press-1,2024-03-05,<=20,.5,>=5000,+0.12
                """)
            .read();

    assertThat(intake.problems()).isEmpty();
    assertThat(Folder.sample(intake, "A1").values())
        .containsEntry("water_ppm", new Measurement.Below(20))
        .containsEntry("iron_ppm", new Measurement.Below(0.5))
        .containsEntry("particles_4um_per_ml", new Measurement.Above(5000))
        .containsEntry("acid_number_mg_koh_g", Measurement.of(0.12));
    assertThat(Folder.sample(intake, "A2").values())
        .containsEntry("water_ppm", new Measurement.Below(20))
        .containsEntry("particles_4um_per_ml", new Measurement.Above(5000));
  }

  @Test
  void aDelimiterHintAndTabsAreUnderstood() throws IOException {
    Intake intake =
        Folder.in(temporary)
            .put("samples/a.csv", "sep=;\nsample;asset;sampled_at\nA1;press-1;2024-03-05\n")
            .put("samples/b.csv", "sample\tasset\tsampled_at\nB1\tfan-3\t2024-03-05\n")
            .put(
                "samples/c.csv",
                "sample,asset,sampled_at\nC1,fan-3,2024-03-05\n",
                StandardCharsets.UTF_16)
            .read();

    assertThat(intake.problems()).isEmpty();
    assertThat(intake.history().samples()).hasSize(3);
  }

  @Test
  void retestsOfOneMomentUnderOtherNamesAreKept() throws IOException {
    Intake intake =
        Folder.in(temporary)
            .put(
                "samples/a.csv",
                "sample,asset,sampled_at,water_ppm\nA1,press-1,2024-03-05,1\nA2,press-1,2024-03-05,1\n")
            .read();

    assertThat(intake.problems()).isEmpty();
    assertThat(intake.history().samples()).hasSize(2);
  }

  @Test
  void canonicalNamesAreKnownInAnyCaseAndWithAUnitInBracketsThatIsHeeded() throws IOException {
    Intake intake =
        Folder.in(temporary)
            .put(
                "samples/a.csv",
                """
                Sample;ASSET;Sampled at;Viscosity 40C cSt [mm²/s];Temperature C (°F);Iron ppm
                A1;press-1;2024-03-05;148;212;7
                """)
            .read();

    assertThat(intake.problems()).isEmpty();
    assertThat(Folder.sample(intake, "A1").values())
        .containsEntry("viscosity_40c_cst", Measurement.of(148))
        .containsEntry("temperature_c", Measurement.of(100))
        .containsEntry("iron_ppm", Measurement.of(7));
    assertThat(intake.notes()).singleElement().asString().contains("fahrenheit");
  }

  @Test
  void columnsOfOneNameAreToldApartByTheirNumber() throws IOException {
    Folder folder =
        Folder.in(temporary)
            .put(
                "samples/twice.csv",
                """
                Lab No,Equipment,Date Sampled,Fe,Fe,Water (Crackle),Water KF ppm,ISO
                L1,press-1,Feb 13 2024,12,120,neg,.5,18/16
                L2,press-1,Mar 13 2024,<1,1,pos,60,ISO 18/16/13
                """);
    String block = ExportAdoption.adopt(temporary.resolve("samples/twice.csv"));
    Intake intake = folder.put("kappatrail.yaml", block).read();

    assertThat(block)
        .contains("\"Fe #1\": iron_ppm\n")
        .contains("#   Fe #2 (it could be iron_ppm too, which a column before it is taken for)")
        .contains("#   Water (Crackle) (it could be water_ppm, but holds few numbers)")
        .contains("\"Water KF ppm\": water_ppm\n")
        .contains("date-format: \"MMM d yyyy\"");
    assertThat(intake.problems()).isEmpty();
    assertThat(Folder.sample(intake, "L1").values())
        .containsEntry("iron_ppm", Measurement.of(12))
        .containsEntry("water_ppm", Measurement.of(0.5));
    assertThat(Folder.sample(intake, "L2").statedCode()).hasToString("Optional[18/16/13]");

    Intake second = folder.put("kappatrail.yaml", block.replace("Fe #1", "Fe #2")).read();
    assertThat(Folder.sample(second, "L1").exact("iron_ppm")).hasValue(120);
    assertThatThrownBy(() -> folder.put("kappatrail.yaml", block.replace("Fe #1", "Fe")).read())
        .hasMessageContaining("name the right one in columns:, as 'Fe #1' or 'Fe #2'");
  }

  @Test
  void twoColumnsThatAMappingCouldMeanAreNotGuessedBetween() throws IOException {
    Folder folder =
        Folder.in(temporary)
            .put(
                "kappatrail.yaml",
                """
                samples:
                  - files: "samples/*.csv"
                    columns: {Iron: iron_ppm}
                """)
            .put(
                "samples/a.csv",
                "sample,asset,sampled_at,Iron (ppm),Iron (%)\nA1,press-1,2024-03-05,1,2\n");
    assertThatThrownBy(folder::read)
        .isInstanceOf(UnusableInputException.class)
        .hasMessageContaining("samples/a.csv:1 Iron: columns 4 and 5 both go by this name");
    folder.put(
        "kappatrail.yaml",
        "samples:\n  - files: \"samples/*.csv\"\n    columns: {\"Iron (ppm)\": iron_ppm}\n");
    assertThat(Folder.sample(folder.read(), "A1").exact("iron_ppm")).hasValue(1);
  }
}
