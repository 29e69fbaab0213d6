package org.kappatrail.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.zip.GZIPInputStream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Every row of every input of the demo site is accounted for, in {@code check} and manifest. */
@Tag("slow")
class RowAccountsTest {
  private static final Path SITE = Path.of("sample-history");
  private static final Pattern LINE =
      Pattern.compile("  (\\S+): (\\d+) rows, (\\d+) used, (\\d+) rejected.*");

  @TempDir Path folder;

  @Test
  void usedAndRejectedRowsAddUpToTheLinesOfTheFile() throws IOException {
    Run check = Run.of("check", SITE.toString(), "--as-of", "2026-06-30");
    Run review =
        Run.of(
            "review",
            SITE.toString(),
            "--as-of",
            "2026-06-30",
            "--asset",
            "PM-SUF",
            "--no-charts",
            "--out",
            folder.toString());
    assertThat(check.code()).isEqualTo(ExitCodes.DONE);
    assertThat(review.code()).isEqualTo(ExitCodes.DONE);

    Map<String, String> checked = new TreeMap<>();
    for (String line : check.out().lines().toList()) {
      Matcher found = LINE.matcher(line);
      if (found.matches()) {
        long read = Long.parseLong(found.group(2));
        long used = Long.parseLong(found.group(3));
        long rejected = Long.parseLong(found.group(4));
        assertThat(used + rejected).isEqualTo(read).isEqualTo(rows(found.group(1)));
        checked.put(found.group(1), read + " " + used + " " + rejected);
      }
    }
    assertThat(checked).hasSize(10);
    assertThat(manifest()).isEqualTo(checked);
    assertThat(check.out()).contains("    rejected: 16 later than the review\n");
  }

  private Map<String, String> manifest() throws IOException {
    JsonNode root =
        new ObjectMapper().readTree(folder.resolve("2026-06-30/manifest.json").toFile());
    Map<String, String> rows = new TreeMap<>();
    for (JsonNode file : root.get("rows")) {
      long reasons = 0;
      for (JsonNode count : file.get("reasons")) {
        reasons += count.asLong();
      }
      assertThat(reasons).isEqualTo(file.get("rejected").asLong());
      assertThat(file.get("counted").asText()).isEqualTo("rows");
      rows.put(
          file.get("file").asText(),
          file.get("read") + " " + file.get("used") + " " + file.get("rejected"));
    }
    return rows;
  }

  /** Lines below the header. */
  private static long rows(String file) throws IOException {
    try (InputStream bytes = Files.newInputStream(SITE.resolve(file));
        InputStream plain = file.endsWith(".gz") ? new GZIPInputStream(bytes) : bytes;
        BufferedReader text =
            new BufferedReader(new InputStreamReader(plain, StandardCharsets.UTF_8))) {
      return text.lines().count() - 1;
    }
  }
}
