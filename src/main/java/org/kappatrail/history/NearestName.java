package org.kappatrail.history;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** The name of a list that is most like a misspelt one, for messages. */
public final class NearestName {
  private NearestName() {}

  /** The nearest by edit distance, case aside; of equals the first; empty for an empty list. */
  public static Optional<String> of(String name, Collection<String> known) {
    @Nullable String best = null;
    int least = Integer.MAX_VALUE;
    for (String candidate : known) {
      int distance = distance(lower(name), lower(candidate));
      if (distance < least) {
        least = distance;
        best = candidate;
      }
    }
    return Optional.ofNullable(best);
  }

  private static String lower(String text) {
    String lower = text.toLowerCase(Locale.ROOT);
    return lower.substring(0, Math.min(200, lower.length()));
  }

  /** Edit distance: letters to be put in, taken out or replaced. */
  public static int distance(String a, String b) {
    int[] above = new int[b.length() + 1];
    for (int column = 0; column <= b.length(); column++) {
      above[column] = column;
    }
    for (int row = 1; row <= a.length(); row++) {
      int[] here = new int[b.length() + 1];
      here[0] = row;
      for (int column = 1; column <= b.length(); column++) {
        int replaced = above[column - 1] + (a.charAt(row - 1) == b.charAt(column - 1) ? 0 : 1);
        here[column] = Math.min(replaced, 1 + Math.min(above[column], here[column - 1]));
      }
      above = here;
    }
    return above[b.length()];
  }
}
