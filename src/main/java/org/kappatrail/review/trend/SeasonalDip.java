package org.kappatrail.review.trend;

import java.time.LocalDate;

/**
 * A stretch below the floor that the season brings and takes away, with the present oil held and
 * last year's temperatures and speeds.
 *
 * @param from first day below the floor; the day of the latest sample where it is below already
 * @param to last day below it
 * @param leastKappa least κ of the stretch
 * @param present true where the latest sample lies in it
 */
public record SeasonalDip(LocalDate from, LocalDate to, double leastKappa, boolean present) {}
