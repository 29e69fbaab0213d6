package org.kappatrail.tribology;

import java.util.OptionalDouble;

/**
 * Viscosity of a blend of two oils at one temperature, the log-log rule of ASTM D7152: W = log
 * log(ν + 0.7) adds by volume fraction. Not for VI-improved oils.
 */
public final class AstmD7152Blend {
  private AstmD7152Blend() {}

  /**
   * Viscosity of a blend.
   *
   * @param baseCst viscosity of the base, mm²/s
   * @param otherCst viscosity of what was added, mm²/s
   * @param otherFraction volume fraction of it, 0 to 1
   * @return mm²/s
   */
  public static double viscosityCst(double baseCst, double otherCst, double otherFraction) {
    Require.within("volume fraction", otherFraction, "", 0, 1);
    double w = w(baseCst) + otherFraction * (w(otherCst) - w(baseCst));
    return Math.pow(10, Math.pow(10, w)) - 0.7;
  }

  /**
   * Volume fraction of another oil that explains a blend's viscosity; empty where none between 0
   * and 1 does.
   */
  public static OptionalDouble fractionExplaining(
      double baseCst, double otherCst, double blendCst) {
    double reach = w(otherCst) - w(baseCst);
    if (reach == 0) {
      return OptionalDouble.empty();
    }
    double fraction = (w(blendCst) - w(baseCst)) / reach;
    return fraction >= 0 && fraction <= 1 ? OptionalDouble.of(fraction) : OptionalDouble.empty();
  }

  private static double w(double viscosityCst) {
    Require.within("viscosity", viscosityCst, "mm²/s", 0.5, AstmD341.MOST_VISCOSITY_CST);
    return Math.log10(Math.log10(viscosityCst + 0.7));
  }
}
