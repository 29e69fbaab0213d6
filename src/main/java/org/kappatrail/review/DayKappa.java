package org.kappatrail.review;

import java.time.LocalDate;
import java.util.OptionalDouble;

/**
 * One day of one bearing.
 *
 * @param date local calendar day
 * @param runningHours hours of running
 * @param temperatureC time-weighted median oil temperature while running, °C
 * @param speedRpm time-weighted mean speed while running, r/min
 * @param kappa time-weighted median κ; empty where no oil viscosity is known for the day
 * @param kappaP05 5 % quantile
 * @param kappaP95 95 % quantile
 * @param mixedHours hours with κ below 1
 */
public record DayKappa(
    LocalDate date,
    double runningHours,
    double temperatureC,
    double speedRpm,
    OptionalDouble kappa,
    OptionalDouble kappaP05,
    OptionalDouble kappaP95,
    OptionalDouble mixedHours) {}
