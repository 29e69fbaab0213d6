package org.kappatrail.review.decision;

import java.util.Locale;

/** Kinds of acts that are weighed. */
public enum RemedyKind {
  STAY,
  FRESH_OIL,
  OTHER_OIL,
  GRADE,
  COOLER,
  RESTORE_TEMPERATURE,
  TARGET_TEMPERATURE,
  CLEANER,
  DRIER;

  /** The word used in files. */
  public String label() {
    return name().toLowerCase(Locale.ROOT).replace('_', '-');
  }

  /** True for acts on viscosity or temperature, of which the verdict speaks. */
  public boolean onFilm() {
    return this != CLEANER && this != DRIER;
  }
}
