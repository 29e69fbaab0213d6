package org.kappatrail.history;

/** Checks shared by the records of this package. */
final class Names {
  private Names() {}

  static void require(String what, String name) {
    if (name.isBlank()) {
      throw new IllegalArgumentException(what + " has no name");
    }
  }
}
