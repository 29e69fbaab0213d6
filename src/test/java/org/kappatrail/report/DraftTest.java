package org.kappatrail.report;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class DraftTest {
  private static final LocalDate DAY = LocalDate.of(2026, 10, 28);

  @TempDir Path directory;

  @Test
  void putsAPackInThePlaceOfAnEarlierOneAndLeavesNothingElse() throws IOException {
    publish("first");
    assertThat(publish("second")).isEqualTo(directory.resolve("2026-10-28"));

    assertThat(page("2026-10-28")).isEqualTo("second");
    assertThat(entries()).containsExactly("2026-10-28");
  }

  @Test
  void leavesAnEarlierPackWhereTheNewOneIsNotFinished() throws IOException {
    publish("first");

    assertThatThrownBy(
            () -> {
              try (Draft draft = new Draft(directory, DAY)) {
                Files.writeString(draft.pack().resolve("index.html"), "half");
                throw new IOException("disk full");
              }
            })
        .hasMessage("disk full");

    assertThat(page("2026-10-28")).isEqualTo("first");
    assertThat(entries()).containsExactly("2026-10-28");
  }

  @Test
  void takesAwayWhatAKilledRunLeftButNothingInUseAndNothingOfOthers() throws IOException {
    abandoned(".2026-09-28.new-1");
    Files.createDirectory(directory.resolve(".2026-09-28.new-notes"));
    Files.createDirectory(directory.resolve(".git"));

    try (Draft running = new Draft(directory, DAY)) {
      publish("beside");
      assertThat(running.pack()).exists();
    }

    assertThat(entries()).containsExactly(".2026-09-28.new-notes", ".git", "2026-10-28");
  }

  @Test
  void putsAnEarlierPackBackThatAKilledRunHadMovedAside() throws IOException {
    Path left = abandoned(".2026-09-28.new-1");
    Files.createDirectory(left.resolve("earlier"));
    Files.writeString(left.resolve("earlier/index.html"), "september");

    publish("october");

    assertThat(page("2026-09-28")).isEqualTo("september");
    assertThat(entries()).containsExactly("2026-09-28", "2026-10-28");
  }

  private Path publish(String text) throws IOException {
    try (Draft draft = new Draft(directory, DAY)) {
      Files.writeString(draft.pack().resolve("index.html"), text);
      return draft.publish();
    }
  }

  private Path abandoned(String name) throws IOException {
    Path left = Files.createDirectory(directory.resolve(name));
    Files.createFile(left.resolve("in-use"));
    Files.createDirectory(left.resolve("pack"));
    Files.writeString(left.resolve("pack/findings.csv"), "half");
    return left;
  }

  private String page(String day) throws IOException {
    return Files.readString(directory.resolve(day).resolve("index.html"));
  }

  private List<String> entries() throws IOException {
    try (Stream<Path> entries = Files.list(directory)) {
      return entries.map(path -> path.getFileName().toString()).sorted().toList();
    }
  }
}
