package org.kappatrail.review.decision;

import java.util.Locale;

/** What is worth doing about the oil of an asset, mildest first. */
public enum Verdict {
  /** Nothing pays. */
  KEEP,
  /** Something would pay if the shift were real, and it is not shown to be. */
  RESAMPLE,
  /** Temperature, speed or the grade is to blame, and putting that right is worth more. */
  FIX_CAUSE_FIRST,
  /** Fresh oil pays; it need not be at once. */
  PLAN_CHANGE,
  /** Fresh oil pays, and the film is thin already or will be before the next sample. */
  CHANGE_NOW;

  /** The word used in files. */
  public String label() {
    return name().toLowerCase(Locale.ROOT).replace('_', '-');
  }
}
