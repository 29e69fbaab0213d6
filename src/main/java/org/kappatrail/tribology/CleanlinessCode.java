package org.kappatrail.tribology;

import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A cleanliness code of three scale numbers, for particles of at least 4, 6 and 14 µm(c).
 *
 * <p>Counts are cumulative, so no part may be above the one before it. The older code of two parts
 * has no part for 4 µm; it is read as one that does not require it.
 *
 * <p>Source: ISO 4406, clause on the code and its notation.
 *
 * @param c4 particles ≥ 4 µm(c)
 * @param c6 particles ≥ 6 µm(c)
 * @param c14 particles ≥ 14 µm(c)
 */
public record CleanlinessCode(Part c4, Part c6, Part c14) {
  private static final Pattern NUMBER = Pattern.compile("(>=|>|≥)?\\s*(\\d{1,3})");

  public CleanlinessCode {
    requireCumulative("≥4 µm", c4, "≥6 µm", c6);
    requireCumulative("≥6 µm", c6, "≥14 µm", c14);
    requireCumulative("≥4 µm", c4, "≥14 µm", c14);
  }

  /**
   * One part of a code.
   *
   * @param number the scale number, 0…28; empty where there is none
   * @param atLeast whether the number is a lower bound, written {@code >28} or {@code ≥18}
   * @param stated whether the code asks for this part: {@code false} for {@code -}; a {@code *} is
   *     stated and has no number
   */
  public record Part(OptionalInt number, boolean atLeast, boolean stated) {
    /** Counted, but not reported: {@code *}. */
    public static final Part NOT_MEASURED = new Part(OptionalInt.empty(), false, true);

    /** Not asked for: {@code -}. */
    public static final Part NOT_REQUIRED = new Part(OptionalInt.empty(), false, false);

    public Part {
      if (number.isPresent()) {
        int value = number.getAsInt();
        if (value < 0 || value > Iso4406.HIGHEST) {
          throw new IllegalArgumentException(
              "scale number "
                  + value
                  + ": must lie within 0 and "
                  + Iso4406.HIGHEST
                  + "; beyond it is written >28");
        }
        if (!stated) {
          throw new IllegalArgumentException(
              "scale number " + value + ": a part that is not required has no number");
        }
      } else if (atLeast) {
        throw new IllegalArgumentException("a part without a number cannot be a lower bound");
      }
    }

    public static Part of(int number) {
      return new Part(OptionalInt.of(number), false, true);
    }

    public static Part atLeast(int number) {
      return new Part(OptionalInt.of(number), true, true);
    }

    /** The number to reckon with: one dirtier than the number of a lower bound. */
    public OptionalInt effectiveNumber() {
      return number.isPresent()
          ? OptionalInt.of(number.getAsInt() + (atLeast ? 1 : 0))
          : OptionalInt.empty();
    }

    private Part cleanerBy(int codes) {
      return number.isPresent()
          ? new Part(OptionalInt.of(Math.max(0, number.getAsInt() - codes)), atLeast, true)
          : this;
    }

    @Override
    public String toString() {
      if (number.isEmpty()) {
        return stated ? "*" : "-";
      }
      int value = number.getAsInt();
      return atLeast ? (value == Iso4406.HIGHEST ? ">" : "≥") + value : Integer.toString(value);
    }
  }

  /**
   * Reads a code: {@code 18/16/13}, {@code 16/13} (6 and 14 µm), a part as {@code >28}, {@code
   * ≥18}, {@code >18}, {@code *} or {@code -}, with blanks around parts allowed.
   *
   * @throws IllegalArgumentException where the text is no code; the message says why
   */
  public static CleanlinessCode parse(String text) {
    List<String> cells = List.of(text.strip().split("/", -1));
    if (cells.size() != 2 && cells.size() != 3) {
      throw new IllegalArgumentException(
          "cleanliness code '" + text + "': must have three parts as in 18/16/13, or two");
    }
    try {
      List<Part> parts = cells.stream().map(CleanlinessCode::parsePart).toList();
      return parts.size() == 2
          ? new CleanlinessCode(Part.NOT_REQUIRED, parts.get(0), parts.get(1))
          : new CleanlinessCode(parts.get(0), parts.get(1), parts.get(2));
    } catch (IllegalArgumentException e) {
      throw new IllegalArgumentException("cleanliness code '" + text + "': " + e.getMessage(), e);
    }
  }

  /** Reads a code as {@link #parse} does; empty where the text is none. */
  public static Optional<CleanlinessCode> find(String text) {
    try {
      return Optional.of(parse(text));
    } catch (IllegalArgumentException e) {
      return Optional.empty();
    }
  }

  /** The same code with every number lower by some codes, 0 at the lowest. */
  public CleanlinessCode cleanerBy(int codes) {
    if (codes < 0) {
      throw new IllegalArgumentException("cleaner by " + codes + " codes: must not be below 0");
    }
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
        && part.effectiveNumber().getAsInt() > limit.effectiveNumber().getAsInt();
  }

  private static Part parsePart(String cell) {
    String text = cell.strip();
    if (text.equals("*")) {
      return Part.NOT_MEASURED;
    }
    if (text.equals("-")) {
      return Part.NOT_REQUIRED;
    }
    Matcher matcher = NUMBER.matcher(text);
    if (!matcher.matches()) {
      throw new IllegalArgumentException(
          "part '" + text + "' is no scale number, nor >, ≥ with one, nor * or -");
    }
    int number = Integer.parseInt(matcher.group(2));
    return matcher.group(1) == null ? Part.of(number) : Part.atLeast(number);
  }

  private static void requireCumulative(String fine, Part smaller, String coarse, Part larger) {
    if (smaller.number().isPresent()
        && larger.number().isPresent()
        && !smaller.atLeast()
        && larger.number().getAsInt() > smaller.number().getAsInt()) {
      throw new IllegalArgumentException(
          "scale number "
              + larger
              + " for "
              + coarse
              + " is above "
              + smaller
              + " for "
              + fine
              + ", but every larger particle counts as a smaller one too");
    }
  }
}
