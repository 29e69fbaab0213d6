package org.kappatrail.duty;

/** Knows the row that ends a table. */
final class Footer {
  private Footer() {}

  /** True where the row that begins with this text ends the table and is none of it. */
  static boolean ends(LogFile file, String beginning) {
    return file.mapping()
        .footer()
        .filter(footer -> beginning.strip().startsWith(footer))
        .isPresent();
  }
}
