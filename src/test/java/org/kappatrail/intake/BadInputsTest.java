package org.kappatrail.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowable;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Problem;
import org.kappatrail.history.UnusableInputException;

class BadInputsTest {
  @TempDir Path folder;

  @ParameterizedTest
  @MethodSource("org.kappatrail.intake.BadInput#ofRecords")
  void everyBadInputHasItsExpectedOutcome(BadInput input) throws IOException {
    input.make(folder);
    Assumptions.assumeFalse(input.isBeyondThisMachine(folder));
    if (input.exit() == 3) {
      Throwable thrown = catchThrowable(() -> HistoryReader.read(folder, input.today()));
      assertThat(thrown).isInstanceOf(UnusableInputException.class);
      assertThat(thrown.getMessage()).contains(input.messages());
      return;
    }
    Intake intake = HistoryReader.read(folder, input.today());
    assertProblems(input, intake.problems());
    if (input.samples().isPresent()) {
      assertThat(intake.history().samples()).hasSize(input.samples().getAsInt());
    }
    for (FileAccount account : intake.files()) {
      assertRows(account, intake.problems());
    }
  }

  /** Rows are counted by the lines of the file, and every row left out is among the problems. */
  private void assertRows(FileAccount account, List<Problem> problems) throws IOException {
    Set<Long> told = new TreeSet<>();
    problems.stream()
        .map(Problem::source)
        .filter(source -> source.file().equals(account.file()))
        .forEach(source -> told.add(source.line()));
    assertThat(account.rowsRejected()).isLessThanOrEqualTo(told.size());
    String text = Files.readString(folder.resolve(account.file()), StandardCharsets.ISO_8859_1);
    boolean linesAreRows = text.indexOf('"') < 0 && text.indexOf('\0') < 0;
    if (linesAreRows) {
      long rows = text.lines().filter(line -> !line.replaceAll("[,;\\s]", "").isEmpty()).count();
      assertThat(account.rowsRead()).as(account.file()).isEqualTo(rows - 1);
    }
  }

  @Test
  void theBaseOfTheCasesIsWithoutProblems() throws IOException {
    BadInput.copy(BadInput.ROOT.resolve("base"), folder);
    Intake intake = HistoryReader.read(folder);
    assertThat(intake.problems()).isEmpty();
    assertThat(intake.history().samples()).hasSize(3);
    assertThat(intake.history().bearings()).hasSize(2);
  }

  private static void assertProblems(BadInput input, List<Problem> problems) {
    List<Problem> left = new ArrayList<>(problems);
    for (String expected : input.problems()) {
      String[] parts = expected.split("\\|", 4);
      Problem found =
          left.stream()
              .filter(
                  problem ->
                      problem.source().file().equals(parts[0])
                          && problem.source().line() == Long.parseLong(parts[1])
                          && problem.column().equals(parts[2])
                          && problem.text().contains(parts[3]))
              .findFirst()
              .orElse(null);
      assertThat(found).as("%s among %s", expected, left).isNotNull();
      left.remove(found);
    }
    assertThat(left).as("problems nobody expected").isEmpty();
  }
}
