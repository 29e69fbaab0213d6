package org.kappatrail.review.trend;

import java.time.YearMonth;
import java.util.OptionalDouble;

/**
 * A calendar month of the log, so that the same month of several years can be laid side by side.
 *
 * @param month year and month
 * @param days running days in it
 * @param kappa median of the daily κ; empty where the oil of those days is unknown
 * @param temperatureC median of the daily temperatures, °C
 * @param kappaWithPresentOil κ of the present oil at that month's temperature and speed
 */
public record SeasonMonth(
    YearMonth month,
    int days,
    OptionalDouble kappa,
    double temperatureC,
    OptionalDouble kappaWithPresentOil) {}
