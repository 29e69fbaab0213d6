package org.kappatrail.review.trend;

import java.util.Optional;

/**
 * Drift of one bearing over one oil charge.
 *
 * @param charge number of the charge
 * @param achieved trail of κ as achieved
 * @param reference trail of κ at reference conditions, which shows the oil alone
 * @param oilShift signal of the cumulative sum of the reference trail
 */
public record ChargeDrift(
    int charge, Drift achieved, Drift reference, Optional<OilShift> oilShift) {}
