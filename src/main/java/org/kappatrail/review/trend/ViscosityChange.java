package org.kappatrail.review.trend;

import java.time.LocalDate;

/**
 * The last change of the viscosity at 40 °C between two samples, against what measuring alone can
 * make of one oil at 95 %.
 *
 * @param from day of the earlier sample
 * @param to day of the later one
 * @param fromCst earlier viscosity at 40 °C, mm²/s
 * @param toCst later one
 * @param limitCst largest difference that scatter explains, mm²/s
 * @param basis where the limit comes from
 */
public record ViscosityChange(
    LocalDate from, LocalDate to, double fromCst, double toCst, double limitCst, String basis) {

  /** True where the change exceeds the limit. */
  public boolean real() {
    return Math.abs(toCst - fromCst) > limitCst;
  }
}
