package org.kappatrail.review.decision;

import java.util.ArrayList;
import java.util.List;

/**
 * How a bearing runs over a year, in cells.
 *
 * @param cells hours at temperatures and speeds; the hours are those of one year
 * @param basis where it comes from, in words
 */
public record DutyYear(List<Cell> cells, String basis) {

  /** Days of the year that the hours stand for. */
  public static final double DAYS = 365;

  /**
   * Hours of a year at one operating point.
   *
   * @param hours hours a year, above 0
   * @param temperatureC oil temperature in the contact, °C
   * @param speedRpm speed, r/min, above 0
   */
  public record Cell(double hours, double temperatureC, double speedRpm) {
    public Cell {
      if (!(hours > 0) || !(speedRpm > 0) || Double.isNaN(temperatureC)) {
        throw new IllegalArgumentException(
            "no duty of " + hours + " h at " + temperatureC + " °C and " + speedRpm + " r/min");
      }
    }
  }

  public DutyYear {
    cells = List.copyOf(cells);
  }

  /** A year at one operating point. */
  public static DutyYear steady(double hours, double temperatureC, double speedRpm, String basis) {
    return new DutyYear(List.of(new Cell(hours, temperatureC, speedRpm)), basis);
  }

  /** Running hours of the year. */
  public double hours() {
    return cells.stream().mapToDouble(Cell::hours).sum();
  }

  /** The same hours, all at one temperature; speeds are kept. */
  public DutyYear allAt(double temperatureC, String why) {
    List<Cell> moved = new ArrayList<>();
    cells.forEach(cell -> moved.add(new Cell(cell.hours(), temperatureC, cell.speedRpm())));
    return new DutyYear(moved, why);
  }
}
