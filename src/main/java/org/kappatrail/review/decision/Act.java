package org.kappatrail.review.decision;

import java.util.OptionalDouble;
import org.kappatrail.tribology.OilViscosity;

/**
 * Something that could be done.
 *
 * @param kind its kind
 * @param name in words
 * @param oil the oil that would be in the asset
 * @param warmerC change of every temperature, °C; below 0 for cooling
 * @param cleanerBy classes by which the code would be cleaner
 * @param price its price
 */
record Act(
    RemedyKind kind,
    String name,
    OilViscosity oil,
    double warmerC,
    int cleanerBy,
    OptionalDouble price) {}
