package org.kappatrail.tribology;

import java.util.List;
import java.util.OptionalDouble;

/**
 * Scale numbers of ISO 4406:2021 for the number of particles per millilitre, and the code for 4, 6
 * and 14 µm(c). A number N stands for counts above the lower limit up to and including the upper
 * one; counts above the last limit are {@code >28}.
 */
public final class Iso4406 {
  /** Highest scale number of the table. */
  public static final int HIGHEST_NUMBER = 28;

  private static final double[] UPPER;

  static {
    List<String[]> rows = PublishedTable.rows("iso4406-scale.csv");
    UPPER =
        rows.stream()
            .filter(row -> !row[2].isEmpty())
            .mapToDouble(row -> Double.parseDouble(row[2]))
            .toArray();
  }

  private Iso4406() {}

  /**
   * Code part for a count.
   *
   * @param countPerMl particles per millilitre, at least 0
   */
  public static CleanlinessCode.Part part(double countPerMl) {
    Require.within("particle count", countPerMl, "per ml", 0, Double.MAX_VALUE);
    for (int number = 0; number < UPPER.length; number++) {
      if (countPerMl <= UPPER[number]) {
        return CleanlinessCode.Part.of(number);
      }
    }
    return CleanlinessCode.Part.above(HIGHEST_NUMBER);
  }

  /** Code from counts per millilitre at 4, 6 and 14 µm(c); a missing count is not reported. */
  public static CleanlinessCode code(
      OptionalDouble count4um, OptionalDouble count6um, OptionalDouble count14um) {
    return new CleanlinessCode(partOf(count4um), partOf(count6um), partOf(count14um));
  }

  /** Upper limit of a scale number, particles per ml; included in it. */
  public static double upperLimitPerMl(int number) {
    return UPPER[(int) Require.within("scale number", number, "", 0, HIGHEST_NUMBER)];
  }

  /** Lower limit of a scale number, particles per ml; not included in it. */
  public static double lowerLimitPerMl(int number) {
    return number == 0 ? 0 : upperLimitPerMl(number - 1);
  }

  /** Geometric middle of a class, particles per ml; half the limit for number 0. */
  public static double classMiddlePerMl(int number) {
    return number == 0
        ? upperLimitPerMl(0) / 2
        : Math.sqrt(lowerLimitPerMl(number) * upperLimitPerMl(number));
  }

  private static CleanlinessCode.Part partOf(OptionalDouble countPerMl) {
    return countPerMl.isPresent()
        ? part(countPerMl.getAsDouble())
        : CleanlinessCode.Part.NOT_REPORTED;
  }
}
