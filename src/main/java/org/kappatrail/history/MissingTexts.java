package org.kappatrail.history;

import java.util.List;
import java.util.Locale;

/** Texts that stand for a missing value in every input; a settings block may name further ones. */
public final class MissingTexts {
  /** In lower case. */
  public static final List<String> USUAL =
      List.of(
          "", "-", "–", "—", "--", "---", ".", "n/a", "#n/a", "na", "n.a.", "nd", "n.d.", "null",
          "none", "nan");

  private static final int LONGEST = 4;

  private MissingTexts() {}

  /** True for one of the usual texts, in either case, without blanks around it. */
  public static boolean isUsual(String cleaned) {
    return cleaned.length() <= LONGEST && USUAL.contains(cleaned.toLowerCase(Locale.ROOT));
  }
}
