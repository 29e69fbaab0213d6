package org.kappatrail.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class AdoptCommandTest {
  @TempDir Path folder;

  @Test
  void aBlockWithItsDoubtsAndTheFirstRowsGoToTheOutput() throws IOException {
    Path export =
        Files.writeString(
            folder.resolve("fell.csv"),
            """
            Sample No;Machine;Sample Date;Visc 40;Water (%);Remark
            7001;press-1;03.02.2024;148,2;0,02;clear
            7002;press-1;05.03.2024;149,1;k.A.;hazy
            """);
    Run run = Run.of("adopt", export.toString());

    assertThat(run.code()).isEqualTo(ExitCodes.DONE);
    assertThat(run.err()).isEmpty();
    assertThat(run.out())
        .contains("samples:\n  - files: \"samples/fell.csv\"\n")
        .contains("      \"Visc 40\": viscosity_40c_cst\n")
        .contains("      water_ppm: percent\n")
        .contains("    decimal: comma\n")
        .contains("# date-format is not sure: day or month first cannot be told")
        .contains("#   sample 7001, asset press-1, sampled_at 2024-02-03, viscosity_40c_cst 148.2");
  }

  @Test
  void aLogGetsABlockOfTemperatures() throws IOException {
    Path export =
        Files.writeString(
            folder.resolve("dryer.csv"),
            """
            Timestamp,PM1.DRY.BRG1.TEMP,PM1.DRY.SPEED
            2024-03-05 14:00:00,71.5,118
            2024-03-05 14:10:00,71.9,I/O Timeout
            """);
    Run run = Run.of("adopt", export.toString());

    assertThat(run.code()).isEqualTo(ExitCodes.DONE);
    assertThat(run.out())
        .contains("temperatures:\n  - files: \"temperatures/dryer.csv\"\n")
        .contains("\"PM1.DRY.SPEED\": {asset: ASSET, bearing: BEARING, quantity: speed_rpm}")
        .contains("#   time 2024-03-05T14:00, PM1.DRY.BRG1.TEMP 71.5, PM1.DRY.SPEED 118");
  }

  @Test
  void aFileWithoutATableIsRefused() throws IOException {
    Path letter = Files.writeString(folder.resolve("letter.csv"), "Dear customer\nYours\n");
    Run run = Run.of("adopt", letter.toString());
    assertThat(run.code()).isEqualTo(ExitCodes.UNUSABLE_INPUT);
    assertThat(run.out()).isEmpty();
    assertThat(run.err()).startsWith("kappatrail: letter.csv: no table is found");
  }

  @ParameterizedTest
  @ValueSource(strings = {"missing.csv", "", "empty.csv", "broken.csv.gz", "broken.xlsx"})
  void whatCannotBeReadIsRefusedWithItsName(String name) throws IOException {
    Files.createFile(folder.resolve("empty.csv"));
    Files.write(folder.resolve("broken.csv.gz"), new byte[] {0x1f, (byte) 0x8b, 8, 0, 0, 0});
    Files.write(folder.resolve("broken.xlsx"), new byte[] {'P', 'K', 3, 4, 0, 0});
    Run run = Run.of("adopt", folder.resolve(name).toString());
    assertThat(run.code()).isEqualTo(ExitCodes.UNUSABLE_INPUT);
    assertThat(run.out()).isEmpty();
    assertThat(run.err()).startsWith("kappatrail: ").contains(name).doesNotContain("\tat ");
  }

  @Test
  void theRootOfAllFoldersIsNoFile() {
    Run run = Run.of("adopt", folder.getRoot().toString());
    assertThat(run.code()).isEqualTo(ExitCodes.UNUSABLE_INPUT);
    assertThat(run.err()).contains("is no file");
  }

  @Test
  void withoutAFileTheCommandLineIsWrong() {
    Run run = Run.of("adopt");
    assertThat(run.code()).isEqualTo(ExitCodes.USAGE);
    assertThat(run.err()).contains("Missing required parameter: 'FILE'");
  }

  @Test
  void theHelpSaysWhatItDoes() {
    Run run = Run.of("adopt", "--help");
    assertThat(run.code()).isEqualTo(ExitCodes.DONE);
    assertThat(run.out()).contains("kappatrail adopt", "FILE", "kappatrail.yaml");
  }
}
