package org.kappatrail.intake;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;

/**
 * What a column of a foreign file seems to carry.
 *
 * @param header its header
 * @param position its place
 * @param canonical column of the program; empty where none was recognised
 * @param doubt why that is not sure
 * @param values its values that are not missing
 */
record ColumnGuess(
    RawTable.Header header,
    int position,
    Optional<String> canonical,
    Optional<String> doubt,
    List<String> values) {
  private static final String CODE = "(ISO\\s*)?[>≥*\\-\\d\\s]{1,4}/\\s*[>≥*\\-\\d]{1,3}.*";

  private static final Pattern TIME_OF_DAY =
      Pattern.compile("\\d{1,2}:\\d{2}(:\\d{2}([.,]\\d{1,6})?)?(\\s?[AaPp]\\.?[Mm]\\.?)?");
  private static final Set<String> NUMBER_WORDS =
      Set.of("no", "nr", "n", "id", "number", "nummer", "numero", "num", "ref", "code");

  /** Columns of an export of a laboratory. */
  static List<ColumnGuess> ofSamples(List<RawTable.Header> headers, List<RawRow> body) {
    List<ColumnGuess> guesses = new ArrayList<>();
    Set<String> taken = new HashSet<>();
    for (int position = 0; position < headers.size(); position++) {
      RawTable.Header header = headers.get(position);
      Optional<String> found = ColumnSynonyms.ofSamples(header);
      ColumnGuess guess = guess(header, position, found, new HashSet<>(), body);
      boolean fits =
          found.isEmpty()
              || Units.of(found.get()).isEmpty()
              || guess.isMostlyNumbers()
              || guess.values().isEmpty();
      guesses.add(
          fits
              ? guess(header, position, found, taken, body)
              : guess.without("it could be " + found.get() + ", but holds few numbers"));
    }
    return byValues(guesses, taken);
  }

  /** Columns of a log. */
  static List<ColumnGuess> ofReadings(List<RawTable.Header> headers, List<RawRow> body) {
    List<ColumnGuess> guesses = new ArrayList<>();
    Set<String> taken = new HashSet<>();
    for (int position = 0; position < headers.size(); position++) {
      RawTable.Header header = headers.get(position);
      Optional<String> found = ColumnSynonyms.ofReadings(header);
      guesses.add(guess(header, position, found, taken, body));
    }
    splitTime(guesses, taken);
    for (int index = 0; index < guesses.size(); index++) {
      ColumnGuess guess = guesses.get(index);
      if (guess.is("value") && !taken.contains("tag") && !taken.contains("temperature_c")) {
        guesses.set(index, guess.as("temperature_c", "no other column holds a temperature"));
      } else if (!taken.contains("asset") && guess.mayNameAssets()) {
        taken.add("asset");
        guesses.set(index, guess.as("asset", "they are texts that repeat"));
      }
    }
    if (!taken.contains("time")) {
      for (int index = 0; index < guesses.size(); index++) {
        ColumnGuess guess = guesses.get(index);
        if (guess.canonical().isEmpty() && DateGuess.of(guess.values()).isPresent()) {
          guesses.set(index, guess.as("time", "its values are dates"));
          break;
        }
      }
    }
    return guesses;
  }

  /** Takes a column of days and one of times of day for the time, where there are both. */
  private static void splitTime(List<ColumnGuess> guesses, Set<String> taken) {
    Optional<ColumnGuess> time = guesses.stream().filter(ColumnGuess::isTimesOfDay).findFirst();
    Optional<ColumnGuess> day =
        guesses.stream()
            .filter(guess -> guess.is("time") || guess.canonical().isEmpty())
            .filter(guess -> guess.values().stream().noneMatch(value -> value.contains(":")))
            .filter(guess -> DateGuess.of(guess.values()).isPresent())
            .findFirst();
    if (time.isPresent() && day.isPresent()) {
      taken.add("time");
      guesses.replaceAll(guess -> guess.is("time") ? guess.named(Optional.empty()) : guess);
      guesses.set(day.get().position(), day.get().named(Optional.of("time")));
      guesses.set(time.get().position(), time.get().named(Optional.of("time_of_day")));
    }
  }

  private ColumnGuess named(Optional<String> name) {
    return new ColumnGuess(header, position, name, Optional.empty(), values);
  }

  /** True where all values are times of day without a day. */
  boolean isTimesOfDay() {
    return !values.isEmpty() && values.stream().allMatch(TIME_OF_DAY.asMatchPredicate());
  }

  /** True for texts of which few differ, in a column without a meaning. */
  private boolean mayNameAssets() {
    return canonical.isEmpty()
        && values.size() > 2
        && !isMostlyNumbers()
        && !isTimesOfDay()
        && new HashSet<>(values).size() * 3 <= values.size()
        && DateGuess.of(values).isEmpty();
  }

  /** True for a text in the form of a cleanliness code. */
  static boolean isCode(String text) {
    return text.matches(CODE);
  }

  boolean isMostlyNumbers() {
    long numbers = values.stream().filter(GridShape::isNumber).count();
    return !values.isEmpty() && numbers * 2 >= values.size();
  }

  boolean is(String name) {
    return canonical.equals(Optional.of(name));
  }

  private ColumnGuess without(String why) {
    return new ColumnGuess(header, position, Optional.empty(), Optional.of(why), values);
  }

  private ColumnGuess as(String name, String why) {
    return new ColumnGuess(
        header, position, Optional.of(name), Optional.of("by its values: " + why), values);
  }

  private static ColumnGuess guess(
      RawTable.Header header,
      int position,
      Optional<String> found,
      Set<String> taken,
      List<RawRow> body) {
    List<String> values =
        body.stream()
            .map(row -> row.cell(position))
            .filter(cell -> !Texts.isMissing(cell))
            .toList();
    if (found.isPresent() && !taken.add(found.get())) {
      return new ColumnGuess(
          header,
          position,
          Optional.empty(),
          Optional.of("it could be " + found.get() + " too, which a column before it is taken for"),
          values);
    }
    return new ColumnGuess(header, position, found, Optional.empty(), values);
  }

  /** Gives the required columns that no header names to columns whose values fit. */
  private static List<ColumnGuess> byValues(List<ColumnGuess> guesses, Set<String> taken) {
    for (int index = 0; index < guesses.size(); index++) {
      ColumnGuess guess = guesses.get(index);
      if (guess.canonical().isPresent() || guess.values().isEmpty()) {
        continue;
      }
      if (!taken.contains("sampled_at") && DateGuess.of(guess.values()).isPresent()) {
        taken.add("sampled_at");
        guesses.set(index, guess.as("sampled_at", "they are dates"));
      } else if (!taken.contains("iso_4406")
          && guess.values().stream().filter(ColumnGuess::isCode).count() * 5
              >= guess.values().size() * 4L) {
        taken.add("iso_4406");
        guesses.set(index, guess.as("iso_4406", "they are cleanliness codes"));
      }
    }
    for (int index = 0; index < guesses.size() && !taken.contains("sample"); index++) {
      ColumnGuess guess = guesses.get(index);
      boolean distinct = new HashSet<>(guess.values()).size() == guess.values().size();
      List<String> words = List.of(Texts.key(guess.header().name()).split("_", -1));
      boolean called = words.stream().anyMatch(NUMBER_WORDS::contains);
      if (guess.canonical().isEmpty() && distinct && called && guess.values().size() > 1) {
        taken.add("sample");
        guesses.set(index, guess.as("sample", "no two are alike"));
      }
    }
    return guesses;
  }
}
