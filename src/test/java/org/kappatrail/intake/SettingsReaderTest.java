package org.kappatrail.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.ZoneId;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.kappatrail.history.BearingKey;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.Settings;

class SettingsReaderTest {
  @Test
  void nothingGivesTheDefaults() {
    assertThat(SettingsReader.parse("")).isEqualTo(Settings.defaults());
    assertThat(SettingsReader.parse("# only a comment\n")).isEqualTo(Settings.defaults());
    assertThat(SettingsReader.parse("limits:\nsamples:\n")).isEqualTo(Settings.defaults());
  }

  @Test
  void everySettingOfTheContractIsRead() {
    Settings settings =
        SettingsReader.parse(
            """
            site: Tarn Hollow            # any text
            timezone: Europe/London
            limits: {kappa-floor: 1.2, water-ppm: 300, iso-4406: 18/16/13, acid-number-rise: 0.5}
            outlook: {horizon-days: 90}
            decision: {horizon-days: 200, failure-cost-ratio: 45.5}
            temperature: {window-days: 5, gap-minutes: 30, running-speed-percent: 15, uncertainty-c: 2}
            laboratory: {viscosity-reproducibility-percent: 1.2, same-laboratory-percent: 0.8}
            """);
    assertThat(settings.site()).isEqualTo("Tarn Hollow");
    assertThat(settings.zone()).isEqualTo(ZoneId.of("Europe/London"));
    assertThat(settings.limits().kappaFloor()).isEqualTo(1.2);
    assertThat(settings.limits().waterPpm()).hasValue(300);
    assertThat(settings.limits().cleanliness()).hasToString("Optional[18/16/13]");
    assertThat(settings.limits().acidNumberRise()).hasValue(0.5);
    assertThat(settings.outlookDays()).isEqualTo(90);
    assertThat(settings.decision()).isEqualTo(new Settings.Decision(200, 45.5));
    assertThat(settings.duty()).isEqualTo(new Settings.Duty(5, 30, 15, 2));
    assertThat(settings.laboratory().reproducibilityPercent()).hasValue(1.2);
    assertThat(settings.laboratory().sameLaboratoryPercent()).hasValue(0.8);
  }

  @Test
  void blocksOfLogsKeepTagsDatabaseAndUnits() {
    Settings settings =
        SettingsReader.parse(
            """
            temperatures:
              - files: "temperatures/*.csv"
                columns: {ts: time}
                units: {temperature_c: °F, speed_rpm: Hz}
                date-format: epoch-millis
                timezone: America/New_York
                tags:
                  "TIC101.PV": {asset: fan-3, bearing: DE, quantity: temperature_c}
                  "SI101.PV": {asset: fan-3, bearing: DE, quantity: speed_rpm}
              - jdbc: "jdbc:postgresql://historian/readings"
                table: readings
                columns: {tag_value: temperature_c}
            """);
    ExportMapping files = settings.logExports().get(0);
    assertThat(files.units())
        .containsEntry("temperature_c", "fahrenheit")
        .containsEntry("speed_rpm", "hz");
    assertThat(files.timezone()).contains("America/New_York");
    assertThat(files.dateFormat()).contains("epoch-millis");
    assertThat(files.tags())
        .containsEntry(
            "SI101.PV",
            new ExportMapping.Tag(new BearingKey("fan-3", "DE"), ExportMapping.Tag.Quantity.SPEED));
    ExportMapping database = settings.logExports().get(1);
    assertThat(database.jdbc()).contains("jdbc:postgresql://historian/readings");
    assertThat(database.table()).isEqualTo(Optional.of("readings"));
  }

  @Test
  void signsMayBeWrittenAsWords() {
    ExportMapping mapping =
        SettingsReader.parse(
                """
                samples:
                  - files: "samples/*.csv"
                    decimal: comma
                    thousands: point
                    delimiter: tab
                    encoding: windows-1252
                    missing: k.A.
                    columns: {Viskosität 50: viscosity_50c_cst, Moly: molybdenum_ppm}
                """)
            .sampleExports()
            .get(0);
    assertThat(mapping.thousands()).contains(".");
    assertThat(mapping.delimiter()).contains("\t");
    assertThat(mapping.missing()).containsExactly("k.A.");
    assertThat(mapping.columns()).containsEntry("Viskosität 50", "viscosity_50c_cst");
  }
}
