package org.kappatrail.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class FingerprintTest {
  @TempDir Path temporary;

  /** SHA-256 of {@code abc} and of nothing: FIPS 180-2, B.1, and its usual empty-message value. */
  @Test
  void aFingerprintIsTheSha256OfTheBytes() throws IOException {
    Folder folder = new Folder(temporary);
    folder.put("samples/b.csv", "abc").put("a.csv", "");
    List<Path> files = List.of(temporary.resolve("samples/b.csv"), temporary.resolve("a.csv"));
    assertThat(Fingerprint.of(temporary, files))
        .containsExactly(
            new Fingerprint(
                "a.csv", 0, "e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855"),
            new Fingerprint(
                "samples/b.csv",
                3,
                "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad"));
  }

  @Test
  void everyFileThatWasReadIsAmongTheInputs() throws IOException {
    Folder folder = Folder.in(temporary);
    folder.put("events.csv", "asset,date,event\n").put("kappatrail.yaml", "site: Tarn Hollow\n");
    folder.put("samples/a.csv", "sample,asset,sampled_at\n").put("notes.txt", "not an input");
    assertThat(Fingerprint.of(temporary, folder.read().inputFiles()))
        .extracting(Fingerprint::file)
        .containsExactly(
            "assets.csv",
            "bearings.csv",
            "events.csv",
            "kappatrail.yaml",
            "oils.csv",
            "samples/a.csv");
  }
}
