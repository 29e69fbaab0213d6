package org.kappatrail.intake;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.kappatrail.history.Event;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Problem;
import org.kappatrail.history.Sample;
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

  /** The same without the samples and events after a day, and accounts that say so. */
  public Intake upTo(LocalDate lastDay) {
    List<Event> events = new ArrayList<>();
    history.assets().forEach(asset -> events.addAll(history.eventsOf(asset.id())));
    List<Event> early = events.stream().filter(event -> !event.date().isAfter(lastDay)).toList();
    List<FileAccount> accounts = new ArrayList<>();
    for (FileAccount file : files) {
      List<LocalDate> days =
          switch (file.kind()) {
            case SAMPLES ->
                history.samples().stream()
                    .filter(sample -> sample.source().file().equals(file.file()))
                    .map(Sample::day)
                    .toList();
            case EVENTS -> events.stream().map(Event::date).toList();
            default -> List.of();
          };
      accounts.add(upTo(lastDay, file, days));
    }
    PlantHistory known =
        new PlantHistory(
            history.oils(),
            history.assets(),
            history.bearings(),
            history.samples().stream().filter(sample -> !sample.day().isAfter(lastDay)).toList(),
            early);
    return new Intake(settings, known, problems, accounts, inputFiles, notes);
  }

  private static FileAccount upTo(LocalDate lastDay, FileAccount file, List<LocalDate> days) {
    List<LocalDate> early = days.stream().filter(day -> !day.isAfter(lastDay)).sorted().toList();
    if (early.size() == days.size()) {
      return file;
    }
    Optional<LocalDate> last =
        early.isEmpty() ? Optional.empty() : Optional.of(early.get(early.size() - 1));
    return file.without(days.size() - early.size(), FileAccount.LATER)
        .over(early.stream().findFirst(), last);
  }
}
