package org.kappatrail.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import java.util.zip.GZIPOutputStream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.cli.Run;

/**
 * The whole review of a folder with one damaged file gives a pack or a message: no stack trace, no
 * hang, no half-written pack. The seed makes runs alike; only how many of them fit into the time
 * depends on the machine.
 */
@Tag("slow")
class ReviewFuzzTest {
  private static final long SEED = 20240610;
  private static final int MOST_RUNS = 120;
  private static final int FEWEST_RUNS = 10;
  private static final long LONGEST_NS = TimeUnit.SECONDS.toNanos(20);
  private static final String SETTINGS =
      """
      site: Tarn Hollow
      timezone: Europe/London
      limits: {kappa-floor: 1.0, water-ppm: 300}
      samples:
        - files: "samples/foreign.csv"
          columns: {Probe: sample, Maschine: asset, Datum: sampled_at, Visk: viscosity_40c_cst}
          date-format: dd.MM.yyyy
          decimal: comma
          footer: Ende
      temperatures:
        - files: "temperatures/wide.csv"
          decimal: comma
          date-format: "dd.MM.yyyy HH:mm"
          missing: ["-9999"]
          tags:
            T1: {asset: press-1, bearing: DS}
            S1: {asset: press-1, bearing: DS, quantity: speed_rpm}
      """;
  private static final String FOREIGN =
      "Probe;Maschine;Datum;Visk\nN1;fan-3;03.02.2024;66,5\nN2;fan-3;04.03.2024;<66\nEnde;;;\n";

  @TempDir Path folder;
  @TempDir Path packs;

  @Test
  @Timeout(value = 240, threadMode = Timeout.ThreadMode.SEPARATE_THREAD)
  void aDamagedFileGivesAPackOrAMessage() throws IOException {
    Random random = new Random(SEED);
    long start = System.nanoTime();
    int reviewed = 0;
    int refused = 0;
    while (reviewed + refused < MOST_RUNS
        && (reviewed + refused < FEWEST_RUNS || System.nanoTime() - start < LONGEST_NS)) {
      clear();
      write();
      Path damaged = damage(random);
      Run run =
          Run.of(
              "review",
              folder.toString(),
              "--no-charts",
              "--as-of",
              "2024-03-05",
              "--out",
              packs.toString());
      String what = "run " + (reviewed + refused) + ", " + damaged + ": " + run.err();
      assertThat(run.code()).as(what).isIn(0, 3);
      assertThat(run.err()).as(what).doesNotContain("this is a bug", "\tat ");
      if (run.code() == 3) {
        assertThat(run.err()).as(what).startsWith("kappatrail: ");
        assertThat(run.out()).as(what).isEmpty();
        refused++;
      } else {
        reviewed++;
      }
      assertWholePacks(what);
    }
    assertThat(reviewed).isPositive();
    assertThat(refused).isPositive();
  }

  /** Nothing but whole packs: a message leaves the one that was there as it was. */
  private void assertWholePacks(String what) throws IOException {
    try (Stream<Path> entries = Files.list(packs)) {
      for (Path pack : entries.toList()) {
        assertThat(pack.getFileName().toString()).as(what).matches("\\d{4}-\\d\\d-\\d\\d");
        assertThat(pack.resolve("index.html")).as(what).isNotEmptyFile();
        assertThat(pack.resolve("manifest.json")).as(what).isNotEmptyFile();
        assertThat(pack.resolve("kappa-history.csv")).as(what).isNotEmptyFile();
      }
    }
  }

  private void write() throws IOException {
    BadInput.copy(BadInput.ROOT.resolve("base"), folder);
    Files.createDirectories(folder.resolve("temperatures"));
    put("kappatrail.yaml", SETTINGS.getBytes(StandardCharsets.UTF_8));
    put("samples/foreign.csv", FOREIGN.getBytes(StandardCharsets.UTF_8));
    put("temperatures/long.csv", log("fan-3", "NDE").getBytes(StandardCharsets.UTF_8));
    put("temperatures/packed.csv.gz", packed(log("press-1", "DS")));
    put("temperatures/wide.csv", wide().getBytes(StandardCharsets.UTF_8));
  }

  /** Damages a file; of the packed one now the text and now the bytes. */
  private Path damage(Random random) throws IOException {
    List<Path> files;
    try (Stream<Path> paths = Files.walk(folder)) {
      files = paths.filter(Files::isRegularFile).sorted().toList();
    }
    Path file = files.get(random.nextInt(files.size()));
    byte[] bytes = Files.readAllBytes(file);
    boolean repack = file.toString().endsWith(".gz") && random.nextBoolean();
    if (repack) {
      byte[] text = log("press-1", "DS").getBytes(StandardCharsets.UTF_8);
      Files.write(file, packed(new String(Mutation.of(text, random), StandardCharsets.ISO_8859_1)));
    } else {
      Files.write(file, Mutation.of(bytes, random));
    }
    return folder.relativize(file);
  }

  private void clear() throws IOException {
    try (Stream<Path> paths = Files.walk(folder)) {
      for (Path path : paths.filter(Files::isRegularFile).toList()) {
        Files.delete(path);
      }
    }
  }

  private void put(String name, byte[] bytes) throws IOException {
    Files.write(folder.resolve(name), bytes);
  }

  private static String log(String asset, String bearing) {
    StringBuilder text = new StringBuilder("time,asset,bearing,temperature_c,speed_rpm,quality\n");
    for (int hour = 0; hour < 96; hour++) {
      text.append(
          String.format(
              Locale.ROOT,
              "2024-02-%02dT%02d:00:00,%s,%s,6%d.5,180,Good\n",
              8 + hour / 24,
              hour % 24,
              asset,
              bearing,
              hour % 7));
    }
    return text.toString();
  }

  private static String wide() {
    StringBuilder text = new StringBuilder("time;T1;S1\n");
    for (int hour = 0; hour < 96; hour++) {
      text.append(
          String.format(
              Locale.ROOT,
              "%02d.01.2024 %02d:00;6%d,5;%s\n",
              7 + hour / 24,
              hour % 24,
              hour % 5,
              hour % 9 == 0 ? "-9999" : "180"));
    }
    return text.toString();
  }

  private static byte[] packed(String text) throws IOException {
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try (GZIPOutputStream out = new GZIPOutputStream(bytes)) {
      out.write(text.getBytes(StandardCharsets.ISO_8859_1));
    }
    return bytes.toByteArray();
  }
}
