package org.kappatrail.review.decision;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.kappatrail.review.trend.Direction;

/**
 * What the samples of the present charge say of its viscosity.
 *
 * @param viscosities40Cst viscosities at 40 °C in time, mm²/s
 * @param fresh40Cst that of the registered oil when fresh
 * @param limitPercent largest difference that measuring alone makes of one oil at 95 %, percent
 * @param basis where the limit comes from
 * @param trend where the reference trail goes over the charge
 * @param suspect empty, or why the latest sample cannot be trusted
 */
public record OilRecord(
    List<Double> viscosities40Cst,
    double fresh40Cst,
    double limitPercent,
    String basis,
    Direction trend,
    String suspect) {
  public OilRecord {
    viscosities40Cst = List.copyOf(viscosities40Cst);
  }

  /** Shift of the mean of the last two samples, as a fraction of the fresh oil's viscosity. */
  public OptionalDouble shift() {
    List<Double> last = lastShifts();
    return last.isEmpty()
        ? OptionalDouble.empty()
        : OptionalDouble.of(last.stream().mapToDouble(v -> v).average().getAsDouble());
  }

  /** Shift of each of the last two samples, the earlier first. */
  public List<Double> lastShifts() {
    int n = viscosities40Cst.size();
    List<Double> shifts = new ArrayList<>();
    for (double value : viscosities40Cst.subList(Math.max(0, n - 2), n)) {
      shifts.add(value / fresh40Cst - 1);
    }
    return shifts;
  }
}
