package org.kappatrail.duty;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.Objects;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.history.FileAccount;

/**
 * A real machine's temperature: Numenta Anomaly Benchmark, realKnownCause/
 * machine_temperature_system_failure.csv, MIT licence (beside the file). Totals by counting its
 * lines: 22,695 readings at 5 minutes; the clock jumps back once, from 2014-01-07 02:55 to 02:00,
 * so that 12 stamps stand twice. The unit is not stated; by its values °F.
 */
class PublishedLogTest {
  @TempDir Path folder;

  @Test
  void countsEveryInstantOnce() throws IOException {
    Path file = folder.resolve("temperatures/machine.csv.gz");
    Files.createDirectories(file.getParent());
    try (InputStream in =
        PublishedLogTest.class.getResourceAsStream("/published/machine-temperature.csv.gz")) {
      Files.copy(Objects.requireNonNull(in), file);
    }
    Block block =
        Block.of("temperatures/*.csv.gz")
            .column("timestamp", "time")
            .column("value", "temperature_c")
            .unit("temperature_c", "fahrenheit")
            .constant("asset", "Machine")
            .constant("bearing", "one");
    long[] millis = {0};
    long[] readings = {0};
    double[] lowest = {999};
    double[] highest = {-999};

    try (DutyLog log =
        DutyLogs.open(
            folder,
            ReadLog.settings(ZoneOffset.UTC, block.build()),
            Plant.of(Plant.bearing("Machine", "one", 1000)),
            LocalDate.of(2014, 12, 31),
            DutyOptions.defaults())) {
      log.forEachBearing(
          duty -> {
            DutyCells cells = duty.cells();
            for (int row = 0; row < cells.size(); row++) {
              millis[0] += cells.millis(row);
              readings[0] += cells.readings(row);
              lowest[0] = Math.min(lowest[0], cells.lowestC(row));
              highest[0] = Math.max(highest[0], cells.highestC(row));
            }
          });
      FileAccount account = log.accounts().get(0);
      assertThat(account.rowsRead()).isEqualTo(22_695);
      assertThat(log.fates().get(0).count(ReadingState.REPEATED)).isEqualTo(12);
      assertThat(account.from()).contains(LocalDate.of(2013, 12, 2));
      assertThat(account.to()).contains(LocalDate.of(2014, 2, 19));
      assertThat(log.problems()).isEmpty();
    }

    assertThat(readings[0]).isEqualTo(22_683);
    // 22,682 steps of 5 minutes and the gap limit for the last reading.
    assertThat(millis[0]).isEqualTo(22_682 * 300_000L + 3_600_000L);
    // 2.084721206 °F and 108.5105428 °F, to a thousandth of a degree.
    assertThat(lowest[0]).isCloseTo((2.084721206 - 32) / 1.8, within(0.0005));
    assertThat(highest[0]).isCloseTo((108.5105428 - 32) / 1.8, within(0.0005));
  }
}
