package org.kappatrail.intake;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.kappatrail.history.Measurement;

/** Splits a laboratory's number into its bound, {@code <} or {@code >}, and the number itself. */
final class MeasurementText {
  private static final Pattern BOUND = Pattern.compile("(<=|>=|<|>|≤|≥)[\\s\\u00A0]*(.*)");

  private MeasurementText() {}

  /** The number of a text, with {@code <} and {@code >} kept; empty where it is none. */
  static Optional<Measurement> parse(String text, NumberText numbers) {
    Matcher bound = BOUND.matcher(text);
    String bare = bound.matches() ? bound.group(2) : text;
    OptionalDouble number = numbers.parse(bare);
    if (number.isEmpty()) {
      return Optional.empty();
    }
    double value = number.getAsDouble();
    if (!bound.matches()) {
      return Optional.of(new Measurement.Exact(value));
    }
    return Optional.of(
        bound.group(1).startsWith("<") || bound.group(1).equals("≤")
            ? new Measurement.Below(value)
            : new Measurement.Above(value));
  }

  /** Why a text is no measurement: the bound aside. */
  static String complaint(String text, NumberText numbers) {
    Matcher bound = BOUND.matcher(text);
    return numbers.complaint(bound.matches() ? bound.group(2) : text);
  }
}
