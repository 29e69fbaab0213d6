package org.kappatrail.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.history.BearingKey;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Problem;
import org.kappatrail.history.SourceLine;

class HistoryCheckTest {
  @TempDir Path temporary;

  @Test
  void theAccountSaysWhatWasFoundLeftOutAndMissing() throws IOException {
    Intake intake =
        Folder.in(temporary)
            .put(
                "samples/a.csv",
                """
                sample,asset,sampled_at,water_ppm,remark
                A1,press-1,2024-03-05,<20,clear
                A2,press-1,2024-05-05,120,hazy
                A3,pres,2024-05-05,120,
                """)
            .read();
    FileAccount log =
        new FileAccount(
            "temperatures/a.csv",
            FileAccount.Kind.TEMPERATURES,
            OptionalLong.of(50),
            97,
            Map.of("marked bad", 1L, "no temperature", 2L),
            Optional.of(LocalDate.of(2024, 3, 1)),
            Optional.of(LocalDate.of(2024, 3, 31)),
            List.of("note"));
    Problem dropped =
        new Problem(new SourceLine("temperatures/a.csv", 7), "temperature_c", "999", "too hot");
    List<LogSpan> spans =
        List.of(span("press-1", "DS", LocalDate.of(2024, 3, 1), LocalDate.of(2024, 3, 31)));

    String text =
        HistoryCheck.text(
            intake,
            new LogAccount(List.of(log), List.of(dropped), spans, Map.of("press-9/DS", 12L)));

    assertThat(text)
        .contains("  samples/a.csv: 3 rows, 2 used, 1 rejected, 2024-03-05 to 2024-05-05\n")
        .contains("    rejected: 1 asset cannot be used\n")
        .contains("    columns not used: remark\n")
        .contains(
            "  temperatures/a.csv: 50 rows with 100 readings, 97 used, 3 rejected, 2024-03-01 to"
                + " 2024-03-31\n    rejected: 2 no temperature, 1 marked bad\n"
                + "    columns not used: note\n")
        .contains(
            "  press-1: 2 samples, 2024-03-05 to 2024-05-05; log of DS 2024-03-01 to 2024-03-31\n")
        .contains("  fan-3: 0 samples; log of NDE none\n")
        .contains(
            "  water_ppm: 2 of 2 samples (1 as a bound), 20 to 120, 2024-03-05 to 2024-05-05\n")
        .contains("  Assets without samples (1): fan-3\n")
        .contains("  Bearings without logs (1): fan-3/NDE\n")
        .contains("  Logs without a bearing of the register (1): press-9/DS 12 readings\n")
        .contains("  Samples outside the days of their asset's logs (1): A2\n")
        .contains("  samples/a.csv:4 asset 'pres': is not in assets.csv; the nearest there is")
        .contains("  temperatures/a.csv:7 temperature_c '999': too hot\n")
        .endsWith("2 assets, 2 bearings, 2 oils, 2 samples, 1 log; 2 problems.\n");
  }

  @Test
  void aFolderWithoutSamplesHasAnAccountToo() throws IOException {
    Intake intake = Folder.in(temporary).read();
    assertThat(HistoryCheck.text(intake, LogAccount.NONE))
        .contains("Assets without samples (2): press-1, fan-3")
        .endsWith("0 samples, 0 logs; no problems.\n");
  }

  private static LogSpan span(String asset, String bearing, LocalDate from, LocalDate to) {
    return new LogSpan(new BearingKey(asset, bearing), from, to);
  }
}
