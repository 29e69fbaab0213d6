package org.kappatrail.review.correlation;

/** What a correlation comes to. */
public enum Judgement {
  /** q of at most 0.05 as measured, and it stands without each one's drift too. */
  CALLED,
  /** q of at most 0.05 as measured, but without each one's drift it could be chance. */
  DRIFT,
  /** It could be chance. */
  CHANCE,
  /** One is calculated from the other, or both from one measurement. */
  BY_CONSTRUCTION
}
