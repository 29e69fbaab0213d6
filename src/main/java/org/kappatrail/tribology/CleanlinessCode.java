package org.kappatrail.tribology;

import java.util.Locale;
import java.util.OptionalInt;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A cleanliness code of ISO 4406 for particles from 4, 6 and 14 µm(c), as in {@code 18/16/13}.
 *
 * @param c4 part for particles from 4 µm(c)
 * @param c6 part for particles from 6 µm(c)
 * @param c14 part for particles from 14 µm(c)
 */
public record CleanlinessCode(Part c4, Part c6, Part c14) {
  private static final Pattern PART = Pattern.compile("(?<bound>>=|>|≥)?\\s*(?<number>\\d{1,2})");

  /**
   * One part of a code.
   *
   * @param number scale number; empty where the part was not measured or not asked for
   * @param atLeast true where the count is known only to be at least of this class
   * @param above true where the count lies above the class
   */
  public record Part(OptionalInt number, boolean atLeast, boolean above) {
    /** Written {@code *}: too many particles to count, or not reported. */
    public static final Part NOT_REPORTED = new Part(OptionalInt.empty(), false, false);

    public Part {
      if (number.isPresent()) {
        Require.within("scale number", number.getAsInt(), "", 0, 30);
      }
    }

    public static Part of(int number) {
      return new Part(OptionalInt.of(number), false, false);
    }

    static Part atLeast(int number) {
      return new Part(OptionalInt.of(number), true, false);
    }

    static Part above(int number) {
      return new Part(OptionalInt.of(number), false, true);
    }

    /** The number to compare with a limit: one more where the count lies above the class. */
    public OptionalInt effective() {
      return number.isPresent() && above ? OptionalInt.of(number.getAsInt() + 1) : number;
    }

    /** True where the number is a lower bound only. */
    public boolean bound() {
      return atLeast || above;
    }

    Part cleanerBy(int codes) {
      return number.isPresent() ? of(Math.max(0, effective().getAsInt() - codes)) : this;
    }

    @Override
    public String toString() {
      if (number.isEmpty()) {
        return "*";
      }
      return (above ? ">" : atLeast ? "≥" : "") + number.getAsInt();
    }
  }

  /**
   * Reads a code: three parts, or two for 6 and 14 µm(c) as older reports give them. A part is a
   * number, with {@code >} or {@code ≥} where it is a lower bound, or {@code *} or {@code -} where
   * there is none.
   *
   * @throws IllegalArgumentException where the text is no code
   */
  public static CleanlinessCode parse(String text) {
    String bare = text.strip();
    if (bare.toUpperCase(Locale.ROOT).startsWith("ISO")) {
      bare = bare.substring(3).strip();
    }
    String[] parts = bare.split("[/\\\\]", -1);
    return switch (parts.length) {
      case 3 -> new CleanlinessCode(part(parts[0]), part(parts[1]), part(parts[2]));
      case 2 -> new CleanlinessCode(Part.NOT_REPORTED, part(parts[0]), part(parts[1]));
      default ->
          throw new IllegalArgumentException(
              "a cleanliness code has two or three parts, as in 18/16/13");
    };
  }

  /** The same code a number of classes cleaner in every part, not below 0. */
  public CleanlinessCode cleanerBy(int codes) {
    return new CleanlinessCode(c4.cleanerBy(codes), c6.cleanerBy(codes), c14.cleanerBy(codes));
  }

  /** True where any part that both have is dirtier than the limit's. */
  public boolean dirtierThan(CleanlinessCode limit) {
    return dirtier(c4, limit.c4) || dirtier(c6, limit.c6) || dirtier(c14, limit.c14);
  }

  @Override
  public String toString() {
    return c4 + "/" + c6 + "/" + c14;
  }

  private static boolean dirtier(Part part, Part limit) {
    return part.number().isPresent()
        && limit.number().isPresent()
        && part.effective().getAsInt() > limit.effective().getAsInt();
  }

  private static Part part(String text) {
    String bare = text.strip();
    if (bare.equals("*") || bare.equals("-") || bare.equals("–")) {
      return Part.NOT_REPORTED;
    }
    Matcher matcher = PART.matcher(bare);
    if (!matcher.matches()) {
      throw new IllegalArgumentException(
          "'" + bare + "' is no part of a cleanliness code; give a number, >number, * or -");
    }
    int number = Integer.parseInt(matcher.group("number"));
    String bound = matcher.group("bound");
    if (bound == null) {
      return Part.of(number);
    }
    return bound.equals(">") ? Part.above(number) : Part.atLeast(number);
  }
}
