package org.kappatrail.tribology;

import java.util.List;
import java.util.Optional;

/**
 * Viscosity grades of industrial liquid lubricants.
 *
 * <p>Units: mm²/s at 40 °C. Each grade reaches 10 % below and above its midpoint; viscosities
 * between two grades belong to none.
 *
 * <p>Source: ISO 3448, Table 1 (grades 2200 and 3200 from memory).
 */
public final class Iso3448 {
  private static final List<Grade> GRADES =
      PublishedTable.rows("iso-3448-grades.csv").stream()
          .map(
              row ->
                  new Grade(
                      PublishedTable.whole(row, 0),
                      PublishedTable.number(row, 1),
                      PublishedTable.number(row, 2),
                      PublishedTable.number(row, 3)))
          .toList();

  private Iso3448() {}

  /** A grade and its limits, both of which belong to it. */
  public record Grade(int vg, double midpointCst, double minCst, double maxCst) {
    public Grade {
      Require.positive("lower limit of VG " + vg, minCst, "mm²/s");
      Require.atLeast("midpoint of VG " + vg, midpointCst, minCst, "mm²/s");
      Require.atLeast("upper limit of VG " + vg, maxCst, midpointCst, "mm²/s");
    }

    /** Whether a viscosity at 40 °C lies within the grade. */
    public boolean contains(double v40) {
      return v40 >= minCst && v40 <= maxCst;
    }

    @Override
    public String toString() {
      return "ISO VG " + vg;
    }
  }

  /** All grades, thinnest first. */
  public static List<Grade> grades() {
    return GRADES;
  }

  /** The grade that holds a viscosity at 40 °C. */
  public static Optional<Grade> gradeOf(double v40) {
    return GRADES.stream().filter(grade -> grade.contains(v40)).findFirst();
  }

  /** The grade of a number. */
  public static Optional<Grade> find(int vg) {
    return GRADES.stream().filter(grade -> grade.vg() == vg).findFirst();
  }

  /** The next thicker grade; empty for the last one and for a number that is no grade. */
  public static Optional<Grade> oneUp(int vg) {
    return neighbour(vg, 1);
  }

  /** The next thinner grade; empty for the first one and for a number that is no grade. */
  public static Optional<Grade> oneDown(int vg) {
    return neighbour(vg, -1);
  }

  private static Optional<Grade> neighbour(int vg, int step) {
    return find(vg)
        .map(grade -> GRADES.indexOf(grade) + step)
        .filter(index -> index >= 0 && index < GRADES.size())
        .map(GRADES::get);
  }
}
