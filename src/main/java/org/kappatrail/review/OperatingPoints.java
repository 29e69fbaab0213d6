package org.kappatrail.review;

import java.time.LocalDate;
import java.util.OptionalDouble;
import org.kappatrail.duty.DutyCells;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.history.Settings;
import org.kappatrail.review.OperatingPoint.SpeedSource;
import org.kappatrail.review.OperatingPoint.TemperatureSource;

/**
 * The operating point of a sample: time-weighted median temperature and mean speed of the running
 * readings in the window that ends with the day of sampling; without any, the temperature of the
 * laboratory's form and the nominal speed.
 */
final class OperatingPoints {
  private static final double MS_PER_HOUR = 3_600_000.0;

  private final Bearing bearing;
  private final DutyCells cells;
  private final int windowDays;

  OperatingPoints(Bearing bearing, DutyCells cells, Settings.Duty duty) {
    this.bearing = bearing;
    this.cells = cells;
    this.windowDays = duty.windowDays();
  }

  OperatingPoint of(Sample sample) {
    return of(sample.day(), sample.arithmetic(SampleColumns.TEMPERATURE));
  }

  private OperatingPoint of(LocalDate day, OptionalDouble formTemperatureC) {
    int last = Math.toIntExact(day.toEpochDay());
    int from = DayRows.firstAtOrAfter(cells, last - windowDays + 1);
    int to = DayRows.firstAtOrAfter(cells, last + 1);
    WeightedCells temperatures = new WeightedCells(to - from);
    double logged = 0;
    double loggedSpeed = 0;
    double unloggedMillis = 0;
    for (int row = from; row < to; row++) {
      if (cells.running(row)) {
        double millis = cells.millis(row);
        temperatures.add(
            cells.lowestC(row),
            cells.temperatureC(row),
            cells.highestC(row),
            cells.readings(row),
            millis);
        if (cells.speedLogged(row)) {
          logged += millis;
          loggedSpeed += millis * cells.speedRpm(row);
        } else {
          unloggedMillis += millis;
        }
      }
    }
    OptionalDouble median = temperatures.median();
    if (median.isEmpty()) {
      return fromForm(formTemperatureC);
    }
    boolean speedFromLog = logged > 0;
    double speed = speedFromLog ? loggedSpeed / logged : bearing.speedRpm();
    return new OperatingPoint(
        OptionalDouble.of(median.getAsDouble() + bearing.temperatureOffsetC()),
        TemperatureSource.LOG,
        speed,
        speedFromLog ? SpeedSource.LOG : SpeedSource.REGISTER,
        (logged + unloggedMillis) / MS_PER_HOUR);
  }

  /** The form's temperature is the oil's already: the sensor's offset has no part in it. */
  private OperatingPoint fromForm(OptionalDouble formTemperatureC) {
    return new OperatingPoint(
        formTemperatureC,
        formTemperatureC.isPresent() ? TemperatureSource.SAMPLE : TemperatureSource.NONE,
        bearing.speedRpm(),
        SpeedSource.REGISTER,
        0);
  }
}
