package org.kappatrail.review.decision;

/**
 * An answer with the figures that made it.
 *
 * @param answer the answer
 * @param why a sentence with the figures; for an unknown answer what to measure to know
 */
public record Reply(Answer answer, String why) {}
