package org.kappatrail.duty;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.Arrays;
import java.util.List;
import java.util.zip.GZIPOutputStream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.UnusableInputException;

/** Files that cannot be read at all end the run with the file's name and a remedy. */
class MalformedLogTest {
  private static final List<Bearing> FAN = List.of(Plant.bearing("Fan é", "DE", 990));
  private static final String HEADER = "time,asset,bearing,temperature_c\n";
  private static final String ROW = "2025-01-01T00:00:00,Fan é,DE,60\n";

  @TempDir Path folder;

  @BeforeEach
  void addAGoodFile() {
    SeededLog.write(folder.resolve("temperatures/good.csv"), HEADER + ROW);
  }

  @Test
  void refusesATruncatedGzipFile() throws IOException {
    ByteArrayOutputStream packed = new ByteArrayOutputStream();
    try (GZIPOutputStream out = new GZIPOutputStream(packed)) {
      out.write((HEADER + ROW).getBytes(StandardCharsets.UTF_8));
      for (int row = 0; row < 5000; row++) {
        out.write(
            ("2025-01-01T00:00:00," + row * 7919 % 5003 + ",DE,60\n")
                .getBytes(StandardCharsets.UTF_8));
      }
    }
    byte[] bytes = packed.toByteArray();
    put("cut.csv.gz", Arrays.copyOf(bytes, bytes.length / 2));

    refuses("temperatures/cut.csv.gz: is not a whole gzip file; copy it again from its source");
  }

  @Test
  void refusesWhatIsNoGzipFile() throws IOException {
    put("plain.csv.gz", (HEADER + ROW).getBytes(StandardCharsets.UTF_8));

    refuses("temperatures/plain.csv.gz: is not a whole gzip file; copy it again from its source");
  }

  @Test
  void refusesAnEmptyParquetFile() throws IOException {
    put("empty.parquet", new byte[0]);

    refuses(
        "temperatures/empty.parquet: is not a whole Parquet file; copy it again from its source");
  }

  @Test
  void refusesAnEmptyCsvFile() throws IOException {
    put("empty.csv", new byte[0]);

    refuses("temperatures/empty.csv: is empty; a file of readings begins with a header line");
  }

  @Test
  void refusesAFolderNamedLikeAFile() throws IOException {
    Files.createDirectories(folder.resolve("temperatures/old.csv"));

    refuses(
        "temperatures/old.csv: is a folder with the name of a file of readings; rename or move it");
  }

  @Test
  void refusesAMissingColumn() throws IOException {
    put("bad.csv", "time;asset;temp\n".getBytes(StandardCharsets.UTF_8));

    refuses(
        "temperatures/bad.csv: has no column bearing; it has time, asset, temp; add a temperatures:"
            + " block with columns: to kappatrail.yaml");
  }

  @Test
  void refusesAMappedColumnThatIsNotThere() throws IOException {
    put("bad.csv", "ts,asset,bearing,temp\n".getBytes(StandardCharsets.UTF_8));

    refuses(
        "temperatures/bad.csv: has no column 'Temp C' that the settings name; it has ts, asset,"
            + " bearing, temp",
        Block.of("temperatures/bad.csv").column("ts", "time").column("Temp C", "temperature_c"));
    refuses(
        "kappatrail.yaml: temperatures: columns: 'temperature' is not a column of readings; these"
            + " are time, time_of_day, asset, bearing, temperature_c, speed_rpm, quality, tag,"
            + " value",
        Block.of("temperatures/bad.csv").column("temp", "temperature"));
  }

  @Test
  void refusesAnotherEncodingInTheHeaderAndFarBelow() throws IOException {
    put("latin.csv", (HEADER + ROW).getBytes(Charset.forName("windows-1252")));
    refuses("temperatures/latin.csv: is not UTF-8 text; set encoding for this file");

    byte[] row = "2025-01-01T00:00:00,Fan e,DE,60\n".getBytes(StandardCharsets.UTF_8);
    ByteArrayOutputStream far = new ByteArrayOutputStream();
    far.write(HEADER.getBytes(StandardCharsets.UTF_8));
    for (int line = 0; line < 10_000; line++) {
      far.write(row);
    }
    far.write(ROW.getBytes(Charset.forName("windows-1252")));
    put("latin.csv", far.toByteArray());
    refuses("temperatures/latin.csv:10002: is not UTF-8 text; set encoding for this file");
  }

  @Test
  void refusesALineThatNeverEnds() throws IOException {
    String open = HEADER + "2025-01-01T00:00:00,\"Fan é,DE,60\n" + ROW.repeat(100_000);
    put("open.csv", open.getBytes(StandardCharsets.UTF_8));

    refuses(
        "temperatures/open.csv:2: a line of more than 2,000,000 bytes; a quotation mark may be");
  }

  @Test
  void readsQuotedLineBreaksAndOtherHarmlessOddities() throws IOException {
    String odd =
        String.join(
            "\r\n",
            "\uFEFF Time ,ASSET,bearing,temperature_c,remark,",
            "2025-01-01T01:00:00,\"Fan é\",DE,60,\"two",
            "lines\",",
            "",
            "2025-01-01T02:00:00, Fan é ,DE, 61 ",
            "2025-01-01T03:00+00:00,Fan é,DE,62,x,",
            "2025-01-01 04:00,Fan é,DE,63,x,");
    put("odd.csv", odd.getBytes(StandardCharsets.UTF_8));

    ReadLog log = ReadLog.of(folder, ZoneOffset.UTC, FAN, LocalDate.of(2025, 1, 31));

    assertThat(log.messages()).isEmpty();
    assertThat(log.only())
        .extracting(line -> line.replaceAll("0 \\(.*", ""))
        .contains(
            "2025-01-01 running 7200000 ms 2 readings 60.00000000",
            "2025-01-01 running 3600000 ms 1 readings 61.00000000",
            "2025-01-01 running 3600000 ms 1 readings 62.00000000",
            "2025-01-01 running 3600000 ms 1 readings 63.00000000");
    assertThat(log.accounts().get(1).unusedColumns()).containsExactly("remark", "");
  }

  @Test
  void takesFileNamesByTheirLetters() throws IOException {
    put("a[1]*'s.csv", (HEADER + ROW.replace("T00", "T01")).getBytes(StandardCharsets.UTF_8));
    put("a1x's.csv", (HEADER + ROW.replace("T00", "T02")).getBytes(StandardCharsets.UTF_8));

    ReadLog log = ReadLog.of(folder, ZoneOffset.UTC, FAN, LocalDate.of(2025, 1, 31));

    assertThat(log.accounts()).allMatch(account -> account.rowsUsed() == 1).hasSize(3);
  }

  @Test
  void countsNothingInAFileThatIsAHeaderOnly() throws IOException {
    Files.delete(folder.resolve("temperatures/good.csv"));
    put("new.csv", HEADER.strip().getBytes(StandardCharsets.UTF_8));

    ReadLog log = ReadLog.of(folder, ZoneOffset.UTC, FAN, LocalDate.of(2025, 1, 31));

    assertThat(log.lines()).isEmpty();
    assertThat(log.accounts().get(0).rowsRead()).isZero();
    assertThat(log.accounts().get(0).from()).isEmpty();
  }

  private void put(String name, byte[] bytes) throws IOException {
    Files.write(folder.resolve("temperatures").resolve(name), bytes);
  }

  private void refuses(String message, Block... blocks) {
    ExportMapping[] mappings =
        Arrays.stream(blocks).map(Block::build).toArray(ExportMapping[]::new);
    assertThatThrownBy(
            () -> ReadLog.of(folder, ZoneOffset.UTC, FAN, LocalDate.of(2025, 1, 31), mappings))
        .isInstanceOf(UnusableInputException.class)
        .hasMessageStartingWith(message);
  }
}
