package org.kappatrail.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.history.FileAccount;

class IntakeUpToTest {
  @TempDir Path temporary;

  @Test
  void whatComesAfterTheDayIsLeftOutAndCountedWhereItStood() throws IOException {
    Intake intake =
        Folder.in(temporary)
            .put(
                "samples/a.csv",
                """
                sample,asset,sampled_at
                A1,press-1,2024-03-05
                A2,press-1,2024-05-05T23:59
                A3,press-1,2024-05-06
                A4,press-1,yesterday
                """)
            .put("samples/b.csv", "sample,asset,sampled_at\nB1,fan-3,2024-07-01\n")
            .put(
                "events.csv",
                "asset,date,event\npress-1,2024-05-05,oil-change\npress-1,2024-05-06,top-up\n")
            .read()
            .upTo(LocalDate.of(2024, 5, 5));

    assertThat(intake.history().samples())
        .extracting(sample -> sample.id())
        .containsExactly("A1", "A2");
    assertThat(intake.history().eventsOf("press-1")).hasSize(1);
    FileAccount a = account(intake, "samples/a.csv");
    assertThat(a.rowsRead()).isEqualTo(4);
    assertThat(a.rowsUsed()).isEqualTo(2);
    assertThat(a.rejected())
        .isEqualTo(Map.of(FileAccount.LATER, 1L, "sampled_at cannot be used", 1L));
    assertThat(a.to()).contains(LocalDate.of(2024, 5, 5));
    FileAccount b = account(intake, "samples/b.csv");
    assertThat(b.rejected()).isEqualTo(Map.of(FileAccount.LATER, 1L));
    assertThat(b.from()).isEmpty();
    assertThat(account(intake, "events.csv").rejected()).isEqualTo(Map.of(FileAccount.LATER, 1L));
    assertThat(account(intake, "assets.csv").rejected()).isEmpty();
  }

  @Test
  void everyWayASampleIsLostHasItsOwnReason() throws IOException {
    Intake intake =
        Folder.in(temporary)
            .put(
                "samples/a.csv",
                """
                sample,asset,sampled_at,received_on,water_ppm
                A1,press-1,2024-03-05,2024-03-09,100
                A1,press-1,2024-03-05,2024-03-09,100
                A1,press-1,2024-03-05,2024-03-12,120
                ,press-1,2024-03-05,,
                A2,pres,2024-03-05,,
                A3,press-1,2024-02-31,,
                A4,press-1,2024-03-05,,,,7
                sample,asset,sampled_at,received_on,water_ppm
                """)
            .read();
    FileAccount a = account(intake, "samples/a.csv");
    assertThat(a.rowsUsed()).isEqualTo(1);
    assertThat(a.rejected())
        .isEqualTo(
            Map.of(
                "repeated with the same values", 1L,
                "sample that stands with other values elsewhere", 1L,
                "sample cannot be used", 1L,
                "asset cannot be used", 1L,
                "sampled_at cannot be used", 1L,
                "row cannot be read", 2L));
  }

  private static FileAccount account(Intake intake, String file) {
    return intake.files().stream()
        .filter(found -> found.file().equals(file))
        .findFirst()
        .orElseThrow();
  }
}
