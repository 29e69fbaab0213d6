package org.kappatrail.tribology;

import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;

/**
 * Scale numbers of solid particle contamination.
 *
 * <p>Units: particles per ml. A scale number holds the counts above its lower limit up to and
 * including its upper one; counts above 2 500 000 are beyond 28 and written {@code >28}.
 *
 * <p>Source: ISO 4406, Table 1.
 */
public final class Iso4406 {
  /** Highest scale number with an upper limit. */
  public static final int HIGHEST = 28;

  /** What {@link #scaleNumber} returns for a count beyond scale number 28. */
  public static final int ABOVE_HIGHEST = HIGHEST + 1;

  private static final double[] LOWER;
  private static final double[] UPPER;

  static {
    List<List<String>> rows = PublishedTable.rows("iso-4406-scale-numbers.csv");
    LOWER = rows.stream().mapToDouble(row -> PublishedTable.number(row, 1)).toArray();
    UPPER = rows.stream().mapToDouble(row -> PublishedTable.number(row, 2)).toArray();
  }

  private Iso4406() {}

  /** The scale number of a count, 0…28, or {@link #ABOVE_HIGHEST}. */
  public static int scaleNumber(double countPerMl) {
    Require.notNegative("particle count", countPerMl, "per ml");
    int found = Arrays.binarySearch(UPPER, countPerMl);
    return found >= 0 ? found : -found - 1;
  }

  /** The code of three counts; a count that is absent becomes a part not measured. */
  public static CleanlinessCode code(OptionalDouble c4, OptionalDouble c6, OptionalDouble c14) {
    return new CleanlinessCode(part(c4), part(c6), part(c14));
  }

  /** The limit above which counts have a scale number, 0…28. */
  public static double lowerLimitPerMl(int scaleNumber) {
    return LOWER[known(scaleNumber)];
  }

  /** The limit up to which counts have a scale number, 0…28. */
  public static double upperLimitPerMl(int scaleNumber) {
    return UPPER[known(scaleNumber)];
  }

  /**
   * The geometric middle of a scale number, 0…28. Scale number 0 reaches down to nothing; for its
   * middle the halving of the series is carried on (convention of this tool).
   */
  public static double classMiddlePerMl(int scaleNumber) {
    double upper = UPPER[known(scaleNumber)];
    double lower = scaleNumber == 0 ? upper / 2 : LOWER[scaleNumber];
    return Math.sqrt(lower * upper);
  }

  private static CleanlinessCode.Part part(OptionalDouble countPerMl) {
    if (countPerMl.isEmpty()) {
      return CleanlinessCode.Part.NOT_MEASURED;
    }
    int number = scaleNumber(countPerMl.getAsDouble());
    return number > HIGHEST
        ? CleanlinessCode.Part.atLeast(HIGHEST)
        : CleanlinessCode.Part.of(number);
  }

  private static int known(int scaleNumber) {
    if (scaleNumber < 0 || scaleNumber > HIGHEST) {
      throw new IllegalArgumentException(
          "scale number " + scaleNumber + ": must lie within 0 and " + HIGHEST);
    }
    return scaleNumber;
  }
}
