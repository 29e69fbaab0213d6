package org.kappatrail.cli;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.time.Clock;
import java.time.Duration;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;

class ProgressBarsTest {
  @Test
  void saysPhaseRowsAndTimeLeft() {
    String line =
        ProgressLine.text(
            "log rows", 13_140_000, 52_560_000, Optional.of(Duration.ofMinutes(61)), 100);

    assertThat(line)
        .startsWith("log rows  [=======")
        .endsWith("]  25 %  13,140,000 of 52,560,000  1:01:00 left");
  }

  @Test
  void leavesTheBarAndThenTheEndOutWhereTheLineIsNarrow() {
    Optional<Duration> left = Optional.of(Duration.ofSeconds(10));

    assertThat(ProgressLine.text("bearings", 500, 1000, left, 50))
        .isEqualTo("bearings   50 %  500 of 1,000  0:00:10 left");
    assertThat(ProgressLine.text("bearings", 500, 1000, left, 20)).hasSize(20);
  }

  @Test
  void saysNothingOfATotalOrTimeThatIsUnknown() {
    assertThat(ProgressLine.text("charts", 0, 12, Optional.empty(), 80))
        .contains("0 of 12")
        .doesNotContain("left");
    assertThat(ProgressLine.text("charts", 7, 0, Optional.empty(), 80)).isEqualTo("charts  7");
    assertThat(ProgressLine.text("log rows", 130, 100, Optional.empty(), 80))
        .contains("100 %  100 of 100");
  }

  @Test
  void takesTheTimeLeftFromTheLatePace() {
    Pace pace = new Pace();
    assertThat(pace.left(Duration.ZERO, 0, 1000)).isEmpty();
    for (int second = 1; second <= 10; second++) {
      pace.left(Duration.ofSeconds(second), 50L * second, 1000);
    }
    assertThat(pace.left(Duration.ofSeconds(10), 500, 1000)).hasValue(Duration.ofSeconds(10));

    for (int second = 11; second < 60; second++) {
      pace.left(Duration.ofSeconds(second), 500 + second - 10, 1000);
    }

    assertThat(pace.left(Duration.ofSeconds(60), 550, 1000)).hasValue(Duration.ofSeconds(450));
  }

  @Test
  void drawsEveryPhaseAndWipesItsLineInTheEnd() throws InterruptedException {
    ByteArrayOutputStream drawn = new ByteArrayOutputStream();
    try (ProgressBars bars = new ProgressBars(new PrintStream(drawn, true, UTF_8))) {
      bars.at("log rows", 10, 20);
      assertThat(drawnSoon(drawn, "10 of 20")).contains("log rows", "50 %", "left");
      bars.at("bearings", 3, 4);
      assertThat(drawnSoon(drawn, "3 of 4")).contains("bearings", "75 %");
    }

    assertThat(onScreen(drawn.toString(UTF_8))).isBlank();
  }

  private static String drawnSoon(ByteArrayOutputStream drawn, String text)
      throws InterruptedException {
    for (int i = 0; i < 200 && !drawn.toString(UTF_8).contains(text); i++) {
      Thread.sleep(50);
    }
    return drawn.toString(UTF_8);
  }

  /** What is left to be seen of lines that are drawn over each other. */
  private static String onScreen(String drawn) {
    StringBuilder line = new StringBuilder();
    int column = 0;
    for (int i = 0; i < drawn.length(); i++) {
      char sign = drawn.charAt(i);
      if (sign == '\r') {
        column = 0;
      } else {
        line.replace(column, Math.min(column + 1, line.length()), String.valueOf(sign));
        column++;
      }
    }
    return line.toString();
  }

  @Test
  void drawsNothingWhereThereIsNoTerminal() throws IOException {
    StringWriter out = new StringWriter();
    PrintWriter writer = new PrintWriter(out);
    Terminal pipe = new Terminal(writer, writer, false, Clock.systemUTC());

    pipe.withProgress(progress -> progress.at("bearings", 1, 2));

    assertThat(out.toString()).isEmpty();
  }

  @Test
  void endsWorkThatIsInterruptedAtItsNextReport() {
    Terminal pipe =
        new Terminal(
            new PrintWriter(new StringWriter()),
            new PrintWriter(new StringWriter()),
            false,
            Clock.systemUTC());
    try {
      assertThatThrownBy(
              () ->
                  pipe.withProgress(
                      progress -> {
                        progress.at("bearings", 1, 2);
                        Thread.currentThread().interrupt();
                        progress.at("bearings", 2, 2);
                      }))
          .isInstanceOf(CancellationException.class);
    } finally {
      assertThat(Thread.interrupted()).isTrue();
    }
  }
}
