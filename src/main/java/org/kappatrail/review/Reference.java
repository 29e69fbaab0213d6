package org.kappatrail.review;

/**
 * Conditions at which oils are compared: a bearing's medians over all its samples.
 *
 * @param temperatureC median operating temperature, °C
 * @param speedRpm median speed, r/min
 */
public record Reference(double temperatureC, double speedRpm) {}
