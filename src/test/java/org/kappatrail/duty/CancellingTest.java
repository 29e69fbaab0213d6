package org.kappatrail.duty;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicReference;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.history.PlantHistory;

class CancellingTest {
  @TempDir Path folder;

  @Test
  void endsWhenItsThreadIsInterruptedAndLeavesNothingBehind() throws Exception {
    StringBuilder text = new StringBuilder("time,asset,bearing,temperature_c\n");
    for (int row = 0; row < 1_500_000; row++) {
      text.append("2025-01-01T00:00:00,Fan,DE,").append(row % 90).append('\n');
    }
    SeededLog.write(folder.resolve("temperatures/log.csv"), text.toString());
    Path temporary = Files.createDirectory(folder.resolve("tmp"));
    PlantHistory history = Plant.of(Plant.bearing("Fan", "DE", 990));
    AtomicReference<Throwable> end = new AtomicReference<>();

    Thread reader =
        new Thread(
            () -> {
              try (DutyLog log =
                  DutyLogs.open(
                      folder,
                      ReadLog.settings(ZoneOffset.UTC),
                      history,
                      LocalDate.of(2025, 1, 31),
                      new DutyOptions(1, 512, temporary))) {
                Thread.currentThread().interrupt();
                log.forEachBearing(duty -> {});
              } catch (CancellationException e) {
                end.set(e);
              }
            });
    reader.start();

    reader.join(30_000);

    assertThat(reader.isAlive()).isFalse();
    assertThat(end.get()).isInstanceOf(CancellationException.class);
    assertThat(entries(temporary)).isZero();
  }

  @Test
  void takesAwayWhatAKilledRunLeftAndNothingInUse() throws IOException {
    Path abandoned = Files.createDirectory(folder.resolve("kappatrail-1-x"));
    Files.createFile(abandoned.resolve("in-use"));
    Files.createFile(abandoned.resolve("spilled.tmp"));
    Path foreign = Files.createDirectory(folder.resolve("kappatrail-notes"));

    try (WorkFolder first = new WorkFolder(folder);
        WorkFolder second = new WorkFolder(folder)) {
      assertThat(abandoned).doesNotExist();
      assertThat(foreign).exists();
      assertThat(first.path()).exists().isNotEqualTo(second.path());
    }
    assertThat(entries(folder)).isEqualTo(1);
  }

  private static long entries(Path directory) throws IOException {
    try (Stream<Path> entries = Files.list(directory)) {
      return entries.count();
    }
  }
}
