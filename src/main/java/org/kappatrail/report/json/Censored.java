package org.kappatrail.report.json;

import org.kappatrail.history.Measurement;
import org.kappatrail.report.table.SixDigits;

/** A censored number as the laboratories write it. */
final class Censored {
  private Censored() {}

  static String text(Measurement value) {
    return (value instanceof Measurement.Below ? "<" : ">") + SixDigits.text(value.stated());
  }
}
