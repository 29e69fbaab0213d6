package org.kappatrail.intake;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Pattern;
import org.kappatrail.history.Measurement;

/**
 * What a historian's tag seems to measure: by a unit in its name, by its name (words, or the letter
 * codes of instruments, T for temperature and S for speed), else by the size of its values.
 *
 * @param quantity column of readings
 * @param doubt why that is not sure
 */
record TagGuess(String quantity, Optional<String> doubt) {
  private static final String TEMPERATURE = "temperature_c";
  private static final String SPEED = "speed_rpm";
  private static final Pattern SPEED_NAME =
      Pattern.compile(
          ".*(speed|rpm|drehz|n_ist|vitesse|velocid|toerental|varvtal"
              + "|(^|[^a-z])s[itcerxy]{0,2}[-_. ]?\\d).*");
  private static final Pattern TEMPERATURE_NAME =
      Pattern.compile(".*(temp|lagert|degc|°|(^|[^a-z])t[itcerxy]{0,2}[-_. ]?\\d).*");

  /** Beyond this half of the values are no temperatures, as none is accepted there. */
  private static final double HOTTEST_C = 200;

  static TagGuess of(RawTable.Header header, List<String> values, NumberText numbers) {
    String name = header.name().toLowerCase(Locale.ROOT);
    if (SampleColumn.statedUnit(SPEED, header).isPresent()) {
      return new TagGuess(SPEED, Optional.empty());
    }
    if (SampleColumn.statedUnit(TEMPERATURE, header).isPresent()) {
      return new TagGuess(TEMPERATURE, Optional.empty());
    }
    boolean speed = SPEED_NAME.matcher(name).matches();
    boolean temperature = TEMPERATURE_NAME.matcher(name).matches();
    if (speed != temperature) {
      return new TagGuess(speed ? SPEED : TEMPERATURE, Optional.empty());
    }
    return median(values, numbers) > HOTTEST_C
        ? new TagGuess(SPEED, Optional.of("taken for a speed by the size of its values"))
        : new TagGuess(TEMPERATURE, Optional.of("taken for a temperature by its values"));
  }

  boolean isSpeed() {
    return quantity.equals(SPEED);
  }

  private static double median(List<String> values, NumberText numbers) {
    List<Double> sorted =
        values.stream()
            .flatMap(value -> MeasurementText.parse(value, numbers).stream())
            .map(Measurement::stated)
            .sorted(Comparator.naturalOrder())
            .toList();
    return sorted.isEmpty() ? 0 : sorted.get(sorted.size() / 2);
  }
}
