package org.kappatrail.review.trend;

/**
 * Temperature and speed of a day's running.
 *
 * @param epochDay days since 1970-01-01
 * @param temperatureC median oil temperature in the contact, °C
 * @param speedRpm mean speed, r/min
 */
public record DayPoint(long epochDay, double temperatureC, double speedRpm) {}
