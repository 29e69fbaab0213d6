package org.kappatrail.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.duty.DutyLogs;
import org.kappatrail.intake.HistoryReader;
import org.kappatrail.intake.Intake;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.CorrelationVariables;
import org.kappatrail.review.Progress;
import org.kappatrail.review.Review;
import org.kappatrail.review.Reviewer;

class ChartJobTest {
  private static final List<String> ASSETS = List.of("Fan", "fan-CORRELATION", "fleet-correlation");

  @TempDir Path folder;

  @Test
  void noChartTakesTheFileOfAnother() throws IOException {
    StringBuilder assets = new StringBuilder("asset,oil\n");
    StringBuilder samples = new StringBuilder("sample,asset,sampled_at,water_ppm,iron_ppm\n");
    for (String asset : ASSETS) {
      assets.append(asset).append(",TH-68\n");
      for (int month = 1; month <= 6; month++) {
        samples.append(
            String.format(
                Locale.ROOT,
                "%s-%d,%s,2024-0%d-05,%d,%d%n",
                asset,
                month,
                asset,
                month,
                30 + month * 7 % 5,
                10 + month * 3 % 7));
      }
    }
    Files.writeString(folder.resolve("assets.csv"), assets);
    Files.writeString(folder.resolve("bearings.csv"), "asset,bearing,pitch_mm,speed_rpm\n");
    Files.writeString(
        folder.resolve("oils.csv"), "oil,viscosity_40c_cst,viscosity_index\nTH-68,68,98\n");
    Files.createDirectories(folder.resolve("samples"));
    Files.writeString(folder.resolve("samples/lab.csv"), samples);

    List<ChartJob> jobs = ChartJob.of(review());
    // without a bearing there is no fleet picture
    assertThat(jobs)
        .extracting(ChartJob::kind)
        .containsOnly(
            ChartJob.Kind.TRAIL, ChartJob.Kind.CORRELATION, ChartJob.Kind.FLEET_CORRELATION);
    assertThat(jobs.stream().map(job -> job.fileName().toLowerCase(Locale.ROOT)))
        .doesNotHaveDuplicates()
        .hasSize(2 * ASSETS.size() + 1);
    assertThat(jobs)
        .filteredOn(job -> job.kind() == ChartJob.Kind.TRAIL)
        .extracting(ChartJob::fileName)
        .as("the trail keeps the plain name")
        .containsExactlyElementsOf(ASSETS);
  }

  private Review review() {
    Intake intake = HistoryReader.read(folder);
    LocalDate asOf = LocalDate.of(2024, 6, 30);
    List<AssetReview> assets =
        new Reviewer(intake.history(), intake.history(), intake.settings(), asOf, Progress.SILENT)
            .review(DutyLogs.empty());
    return new Review(
        asOf,
        intake.settings(),
        assets,
        Optional.empty(),
        CorrelationVariables.correlate(assets),
        intake.problems(),
        intake.files());
  }
}
