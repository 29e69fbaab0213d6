package org.kappatrail.review.decision;

import java.util.OptionalDouble;

/**
 * What an act does to one bearing.
 *
 * @param bearing the bearing
 * @param kappa κ at the present operating point after the act
 * @param kappaLow lower end of its 95 % interval
 * @param kappaHigh upper end
 * @param probabilityBelowFloor probability that κ lies below the floor
 * @param lifeModification a_ISO at that point; empty without loads
 * @param ratingLifeH L10mh over the duty by Palmgren–Miner, hours
 * @param failureProbability probability of failing within the horizon, given the life already used
 */
public record Outcome(
    String bearing,
    double kappa,
    double kappaLow,
    double kappaHigh,
    double probabilityBelowFloor,
    OptionalDouble lifeModification,
    OptionalDouble ratingLifeH,
    OptionalDouble failureProbability) {}
