package org.kappatrail.review;

import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.tribology.ContaminationFactor;

/**
 * Life figures at one operating point; each is empty where the register or the sample lacks what it
 * needs.
 *
 * @param contamination contamination factor e_C
 * @param lifeModification a_ISO
 * @param lifeModificationEp a_ISO by the rule for effective EP additives, beside the plain one
 * @param ratingLifeH L10mh, hours
 * @param waterLifeFactor Cantley's relative life, never part of L10mh
 */
public record LifeAtPoint(
    Optional<ContaminationFactor> contamination,
    OptionalDouble lifeModification,
    OptionalDouble lifeModificationEp,
    OptionalDouble ratingLifeH,
    OptionalDouble waterLifeFactor) {}
