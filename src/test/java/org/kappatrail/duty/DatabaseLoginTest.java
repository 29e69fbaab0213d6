package org.kappatrail.duty;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.SQLException;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.history.UnusableInputException;

class DatabaseLoginTest {
  private static final DatabaseLogin LOGIN =
      DatabaseLogin.of(
          Map.of("KAPPATRAIL_DB_USER", "ann", "KAPPATRAIL_DB_PASSWORD", "hush 7")::get);

  @TempDir Path folder;

  @Test
  void takesUserAndPasswordFromTheEnvironment() {
    assertThat(LOGIN.properties())
        .containsEntry("user", "ann")
        .containsEntry("password", "hush 7")
        .hasSize(2);
    assertThat(DatabaseLogin.of(name -> null).properties()).isEmpty();
  }

  @Test
  void takesThemFromTheFileThatTheEnvironmentNames() throws IOException {
    Path file = folder.resolve("login");
    Files.writeString(file, "user=bob\npassword=quiet\n");

    assertThat(
            DatabaseLogin.of(Map.of("KAPPATRAIL_DB_CREDENTIALS", file.toString())::get)
                .properties())
        .containsEntry("user", "bob")
        .containsEntry("password", "quiet");
    assertThatThrownBy(() -> DatabaseLogin.of(Map.of("KAPPATRAIL_DB_CREDENTIALS", file + "x")::get))
        .isInstanceOf(UnusableInputException.class)
        .hasMessageStartingWith("KAPPATRAIL_DB_CREDENTIALS: the file");
  }

  @Test
  void takesThemOutOfEveryText() {
    assertThat(LOGIN.scrub("jdbc:postgresql://db.site:5432/plant?user=x&password=y"))
        .isEqualTo("jdbc:postgresql://db.site:5432/plant");
    assertThat(LOGIN.scrub("jdbc:postgresql://x:y@db.site/plant"))
        .isEqualTo("jdbc:postgresql://db.site/plant");
    assertThat(LOGIN.scrub("jdbc:sqlserver://db.site;user=x;password=y"))
        .isEqualTo("jdbc:sqlserver://db.site");
    assertThat(LOGIN.scrub("password authentication failed for user \"ann\" with hush 7"))
        .isEqualTo("password authentication failed for user \"…\" with …");
  }

  @Test
  void tellsAWrongPasswordAndALostConnectionApartInOneSentence() {
    DatabaseFailure failure =
        new DatabaseFailure(LOGIN, "jdbc:postgresql://ann:hush 7@db/plant", "readings");

    assertThat(failure.explain(new SQLException("refused for ann", "28P01")))
        .hasMessage(
            "jdbc:postgresql://db/plant readings: user or password is refused; set"
                + " KAPPATRAIL_DB_USER and KAPPATRAIL_DB_PASSWORD")
        .hasNoCause();
    assertThat(failure.explain(new SQLException("An I/O error for ann\nmore", "08006")))
        .hasMessage(
            "jdbc:postgresql://db/plant readings: the database cannot be reached or the connection"
                + " was lost; try again later (An I/O error for …)");
    assertThat(failure.explain(new SQLException("no relation", "42P01")))
        .hasMessageEndingWith("there is no such table or view; correct table:");
  }
}
