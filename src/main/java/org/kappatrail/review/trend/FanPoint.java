package org.kappatrail.review.trend;

import java.time.LocalDate;
import java.util.OptionalDouble;

/**
 * Where κ may stand on a day to come, at the present operating point.
 *
 * @param date the day
 * @param low by the lower limit of the slope; empty where it has none
 * @param likely by the slope
 * @param high by the upper limit of the slope
 */
public record FanPoint(LocalDate date, OptionalDouble low, double likely, OptionalDouble high) {}
