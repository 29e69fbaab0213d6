package org.kappatrail.tribology;

import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * Viscosity index from the kinematic viscosities at 40 and 100 °C, and the way back.
 *
 * <p>Units: mm²/s; the index has none and is not rounded. Range: 2 mm²/s at 100 °C up; below it
 * there is no index. Procedure A, 100 (L − U)/(L − H), up to an index of 100; Procedure B, 100 +
 * (10^N − 1)/0.00715 with N = (log H − log U)/log Y, above. The two meet at U = H, where both give
 * 100.
 *
 * <p>Source: ASTM D2270 / ISO 2909, Table 1 by linear interpolation from 2 to 70 mm²/s, above that
 * the equations for L and H in Y (last row of Table X2.1).
 */
public final class AstmD2270 {
  /** Lowest viscosity at 100 °C for which an index is defined, mm²/s. */
  public static final double LOWEST_100_CST = 2;

  private static final double ACCURACY_CST = 1e-11;
  private static final int MOST_STEPS = 200;
  private static final double[] Y;
  private static final double[] L;
  private static final double[] H;

  static {
    List<List<String>> rows = PublishedTable.rows("astm-d2270-table-1.csv");
    Y = rows.stream().mapToDouble(row -> PublishedTable.number(row, 0)).toArray();
    L = rows.stream().mapToDouble(row -> PublishedTable.number(row, 1)).toArray();
    H = rows.stream().mapToDouble(row -> PublishedTable.number(row, 2)).toArray();
  }

  private AstmD2270() {}

  /** The viscosity index; below 0 for an oil thinner when hot than the lower reference oil. */
  public static double viscosityIndex(double v40, double v100) {
    Require.atLeast("viscosity at 100 °C", v100, LOWEST_100_CST, "mm²/s");
    Require.finite("viscosity at 40 °C", v40, "mm²/s");
    if (v40 <= v100) {
      throw new IllegalArgumentException(
          "viscosity at 40 °C "
              + v40
              + " mm²/s: must be above the one at 100 °C, "
              + v100
              + " mm²/s");
    }
    return index(v40, v100);
  }

  /**
   * The viscosity at 100 °C at which an oil of a given viscosity at 40 °C has a given index; empty
   * where no viscosity from 2 mm²/s up to {@code v40} has it.
   */
  public static OptionalDouble viscosity100Cst(double v40, double viscosityIndex) {
    Require.positive("viscosity at 40 °C", v40, "mm²/s");
    Require.finite("viscosity index", viscosityIndex, "");
    if (v40 <= LOWEST_100_CST) {
      return OptionalDouble.empty();
    }
    double missAtLowest = index(v40, LOWEST_100_CST) - viscosityIndex;
    double missAtHighest = index(v40, v40) - viscosityIndex;
    if (missAtLowest > 0 || missAtHighest <= 0) {
      return OptionalDouble.empty();
    }
    if (missAtLowest == 0) {
      return OptionalDouble.of(LOWEST_100_CST);
    }
    UnivariateFunction miss = v100 -> index(v40, v100) - viscosityIndex;
    BrentSolver solver = new BrentSolver(ACCURACY_CST, ACCURACY_CST);
    return OptionalDouble.of(solver.solve(MOST_STEPS, miss, LOWEST_100_CST, v40));
  }

  /** L of Table 1: viscosity at 40 °C of the oil of index 0 that has {@code v100}. */
  static double lowReferenceCst(double v100) {
    return v100 > Y[Y.length - 1]
        ? 0.83531 * v100 * v100 + 14.6731 * v100 - 216.246
        : interpolated(L, v100);
  }

  /** H of Table 1: viscosity at 40 °C of the oil of index 100 that has {@code v100}. */
  static double highReferenceCst(double v100) {
    return v100 > Y[Y.length - 1]
        ? 0.16841 * v100 * v100 + 11.8493 * v100 - 96.947
        : interpolated(H, v100);
  }

  private static double index(double v40, double v100) {
    double high = highReferenceCst(v100);
    if (v40 >= high) {
      double low = lowReferenceCst(v100);
      return 100 * (low - v40) / (low - high);
    }
    double n = Math.log(high / v40) / Math.log(v100);
    return 100 + (Math.pow(10, n) - 1) / 0.00715;
  }

  private static double interpolated(double[] column, double v100) {
    int found = Arrays.binarySearch(Y, v100);
    if (found >= 0) {
      return column[found];
    }
    int above = -found - 1;
    double share = (v100 - Y[above - 1]) / (Y[above] - Y[above - 1]);
    return column[above - 1] + share * (column[above] - column[above - 1]);
  }
}
