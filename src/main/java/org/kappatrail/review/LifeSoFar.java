package org.kappatrail.review;

import java.util.OptionalDouble;
import org.kappatrail.review.decision.DutyYear;

/**
 * How a bearing runs, and the life it has used up.
 *
 * @param duty how it runs over a year
 * @param used fraction of L10mh used up so far; empty without loads or contamination factor
 * @param since what it counts from, in words
 */
public record LifeSoFar(DutyYear duty, OptionalDouble used, String since) {}
