package org.kappatrail.tribology;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;

/**
 * Viscosity grades of industrial liquid lubricants, ISO 3448:1992: kinematic viscosity at 40 °C,
 * midpoint ±10 %. Grades 2200 and 3200 from memory.
 */
public final class Iso3448 {
  private static final List<Grade> GRADES =
      PublishedTable.rows("iso3448-grades.csv").stream()
          .map(
              row ->
                  new Grade(
                      Integer.parseInt(row[0]),
                      Double.parseDouble(row[1]),
                      Double.parseDouble(row[2]),
                      Double.parseDouble(row[3])))
          .toList();

  private Iso3448() {}

  /**
   * One viscosity grade.
   *
   * @param vg the number after "ISO VG"
   * @param midpointCst midpoint at 40 °C, mm²/s
   * @param minCst least viscosity at 40 °C, mm²/s
   * @param maxCst highest viscosity at 40 °C, mm²/s
   */
  public record Grade(int vg, double midpointCst, double minCst, double maxCst) {
    /** True where a viscosity at 40 °C lies within the grade, limits included. */
    public boolean contains(double viscosity40Cst) {
      return viscosity40Cst >= minCst && viscosity40Cst <= maxCst;
    }
  }

  /** All grades, thinnest first. */
  public static List<Grade> grades() {
    return GRADES;
  }

  public static Optional<Grade> find(int vg) {
    return GRADES.stream().filter(grade -> grade.vg() == vg).findFirst();
  }

  /** Grade that holds a viscosity at 40 °C; empty between grades. */
  public static Optional<Grade> gradeOf(double viscosity40Cst) {
    return GRADES.stream().filter(grade -> grade.contains(viscosity40Cst)).findFirst();
  }

  public static Optional<Grade> oneUp(int vg) {
    return neighbour(vg, 1);
  }

  public static Optional<Grade> oneDown(int vg) {
    return neighbour(vg, -1);
  }

  private static Optional<Grade> neighbour(int vg, int step) {
    return IntStream.range(0, GRADES.size())
        .filter(i -> GRADES.get(i).vg() == vg)
        .map(i -> i + step)
        .filter(i -> i >= 0 && i < GRADES.size())
        .mapToObj(GRADES::get)
        .findFirst();
  }
}
