package org.kappatrail.history;

import java.util.Comparator;

/**
 * Something in the inputs that could not be used, with what to do about it.
 *
 * @param source file and line
 * @param column column as the program names it; empty where the row or file is meant
 * @param value the text that was found; empty where nothing was
 * @param text what is wrong and the remedy
 */
public record Problem(SourceLine source, String column, String value, String text)
    implements Comparable<Problem> {
  private static final Comparator<Problem> ORDER =
      Comparator.comparing((Problem problem) -> problem.source().file())
          .thenComparing(problem -> problem.source().line())
          .thenComparing(Problem::column)
          .thenComparing(Problem::value)
          .thenComparing(Problem::text);

  private static final int LONGEST_VALUE = 120;

  public Problem {
    if (value.length() > LONGEST_VALUE) {
      value = value.substring(0, LONGEST_VALUE) + "…";
    }
  }

  @Override
  public int compareTo(Problem other) {
    return ORDER.compare(this, other);
  }

  /** One line: {@code file:line column 'value': what is wrong; remedy}. */
  @Override
  public String toString() {
    StringBuilder line = new StringBuilder(source.toString());
    if (!column.isEmpty()) {
      line.append(' ').append(column);
    }
    if (!value.isEmpty()) {
      line.append(" '").append(value).append('\'');
    }
    return line.append(": ").append(text).toString();
  }
}
