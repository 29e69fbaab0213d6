package org.kappatrail.duty;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Percentage.withPercentage;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.zip.GZIPOutputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.history.PlantHistory;

class RowEstimateTest {
  private static final int ROWS = 40_000;

  @TempDir Path folder;

  @Test
  void comesNearTheRowsOfPlainAndGzippedTextAndNeverTellsMoreThanTheTotal() throws IOException {
    Path logs = Files.createDirectory(folder.resolve("temperatures"));
    Files.writeString(logs.resolve("plain.csv"), text(ROWS));
    try (OutputStream out =
        new GZIPOutputStream(Files.newOutputStream(logs.resolve("packed.csv.gz")))) {
      out.write(text(ROWS).getBytes(StandardCharsets.UTF_8));
    }
    PlantHistory history = Plant.of(Plant.bearing("Fan", "DE", 990));
    List<Long> rows = Collections.synchronizedList(new ArrayList<>());
    List<Long> totals = Collections.synchronizedList(new ArrayList<>());

    try (DutyLog log =
        DutyLogs.open(
            folder,
            ReadLog.settings(ZoneOffset.UTC),
            history,
            LocalDate.of(2025, 12, 31),
            new DutyOptions(1, 512, folder))) {
      log.forEachBearing(
          duty -> {},
          (done, total) -> {
            rows.add(done);
            totals.add(total);
          });
    }

    assertThat(totals)
        .isNotEmpty()
        .allSatisfy(total -> assertThat(total).isCloseTo(2L * ROWS, withPercentage(5)));
    assertThat(rows).isSorted().allSatisfy(done -> assertThat(done).isBetween(0L, totals.get(0)));
  }

  private static String text(int rows) {
    StringBuilder text = new StringBuilder("time,asset,bearing,temperature_c\n");
    Random random = new Random(5);
    LocalDate day = LocalDate.of(2025, 1, 1);
    for (int row = 0; row < rows; row++) {
      text.append(day.plusDays(row % 300)).append("T00:00:00,Fan,DE,");
      text.append(10_000 + random.nextInt(80_000)).append("e-3\n");
    }
    return text.toString();
  }
}
