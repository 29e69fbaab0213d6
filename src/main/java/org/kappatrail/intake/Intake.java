package org.kappatrail.intake;

import java.nio.file.Path;
import java.util.List;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Problem;
import org.kappatrail.history.Settings;

/**
 * What a history folder gave.
 *
 * @param settings what the site has settled
 * @param history register, samples and events
 * @param problems what could not be used, by file and line
 * @param files what became of each file
 * @param inputFiles the files that were read, in the order of their names
 * @param notes how something was read that could be read in another way
 */
public record Intake(
    Settings settings,
    PlantHistory history,
    List<Problem> problems,
    List<FileAccount> files,
    List<Path> inputFiles,
    List<String> notes) {
  public Intake {
    problems = problems.stream().sorted().toList();
    files = List.copyOf(files);
    inputFiles = List.copyOf(inputFiles);
    notes = List.copyOf(notes);
  }
}
