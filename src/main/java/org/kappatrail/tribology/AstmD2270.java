package org.kappatrail.tribology;

import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * Viscosity index from kinematic viscosity at 40 and 100 °C, ASTM D2270-10(2016) (ISO 2909), and
 * back. L and H come from Table 1 by linear interpolation from 2 to 70 mm²/s at 100 °C and from the
 * standard's formulas (last row of Table X2.1) above. Procedure A up to an index of 100, procedure
 * B above it. The result is not rounded; the standard rounds it to a whole number.
 */
public final class AstmD2270 {
  /** Least kinematic viscosity at 100 °C for which the index is defined, mm²/s. */
  public static final double LEAST_VISCOSITY_100_CST = 2.0;

  private static final double TABLE_START = 2.0;
  private static final double TABLE_END = 70.0;
  private static final double[] KV;
  private static final double[] L;
  private static final double[] H;

  static {
    List<String[]> rows = PublishedTable.rows("d2270-table-1.csv");
    KV = rows.stream().mapToDouble(row -> Double.parseDouble(row[0])).toArray();
    L = rows.stream().mapToDouble(row -> Double.parseDouble(row[1])).toArray();
    H = rows.stream().mapToDouble(row -> Double.parseDouble(row[2])).toArray();
  }

  private AstmD2270() {}

  /**
   * Viscosity index.
   *
   * @param viscosity40Cst kinematic viscosity at 40 °C, mm²/s
   * @param viscosity100Cst kinematic viscosity at 100 °C, mm²/s, at least 2
   * @throws IllegalArgumentException below 2 mm²/s at 100 °C, or where the oil would not thin with
   *     heat
   */
  public static double viscosityIndex(double viscosity40Cst, double viscosity100Cst) {
    Require.within("viscosity at 100 °C", viscosity100Cst, "mm²/s", LEAST_VISCOSITY_100_CST, 1e5);
    Require.positive("viscosity at 40 °C", viscosity40Cst, "mm²/s");
    if (viscosity40Cst <= viscosity100Cst) {
      throw new IllegalArgumentException(
          "viscosity at 40 °C ("
              + viscosity40Cst
              + " mm²/s) must be above the one at 100 °C ("
              + viscosity100Cst
              + " mm²/s)");
    }
    double h = h(viscosity100Cst);
    if (viscosity40Cst < h) {
      double n = (Math.log10(h) - Math.log10(viscosity40Cst)) / Math.log10(viscosity100Cst);
      return (Math.pow(10, n) - 1) / 0.00715 + 100;
    }
    double l = l(viscosity100Cst);
    return (l - viscosity40Cst) / (l - h) * 100;
  }

  /**
   * Viscosity at 100 °C of the oil that has a given index, by Brent's method.
   *
   * @param viscosity40Cst kinematic viscosity at 40 °C, mm²/s
   * @param viscosityIndex viscosity index
   * @return mm²/s; empty where no value from 2 mm²/s up has that index
   */
  public static OptionalDouble viscosity100Cst(double viscosity40Cst, double viscosityIndex) {
    double low = LEAST_VISCOSITY_100_CST;
    double high = viscosity40Cst * (1 - 1e-9);
    if (!(high > low) || viscosityIndex(viscosity40Cst, low) > viscosityIndex) {
      return OptionalDouble.empty();
    }
    if (viscosityIndex(viscosity40Cst, high) < viscosityIndex) {
      return OptionalDouble.empty();
    }
    double top = low;
    while (viscosityIndex(viscosity40Cst, top) < viscosityIndex) {
      low = top;
      top = Math.min(top * 1.1, high);
    }
    if (top == low) {
      return OptionalDouble.of(low);
    }
    BrentSolver solver = new BrentSolver(1e-13, 1e-12);
    return OptionalDouble.of(
        solver.solve(200, v100 -> viscosityIndex(viscosity40Cst, v100) - viscosityIndex, low, top));
  }

  /** L: viscosity at 40 °C of the oil of index 0 with the same viscosity at 100 °C, mm²/s. */
  static double l(double viscosity100Cst) {
    return viscosity100Cst <= TABLE_END
        ? interpolate(L, viscosity100Cst)
        : (0.83531 * viscosity100Cst + 14.6731) * viscosity100Cst - 216.246;
  }

  /** H: viscosity at 40 °C of the oil of index 100 with the same viscosity at 100 °C, mm²/s. */
  static double h(double viscosity100Cst) {
    return viscosity100Cst <= TABLE_END
        ? interpolate(H, viscosity100Cst)
        : (0.16841 * viscosity100Cst + 11.8493) * viscosity100Cst - 96.947;
  }

  private static double interpolate(double[] column, double viscosity100Cst) {
    double at = Math.max(TABLE_START, viscosity100Cst);
    int i = Arrays.binarySearch(KV, at);
    if (i >= 0) {
      return column[i];
    }
    int above = -i - 1;
    double share = (at - KV[above - 1]) / (KV[above] - KV[above - 1]);
    return column[above - 1] + share * (column[above] - column[above - 1]);
  }
}
