package org.kappatrail.tribology;

import java.util.OptionalDouble;

/**
 * Viscosity of a blend of two oils at one temperature: W = log log(ν + 0.7) adds by volume
 * fraction, with the low-viscosity term of ASTM D341 below 2 mm²/s.
 *
 * <p>Units: mm²/s; fractions by volume, 0…1. Range: 0.21 mm²/s up; others are refused. Not for oils
 * with a viscosity index improver.
 *
 * <p>Source: ASTM D7152, rule for blending by volume at one temperature.
 */
public final class AstmD7152Blend {
  private AstmD7152Blend() {}

  /** Viscosity of a blend that holds a volume fraction of the second oil. */
  public static double viscosityCst(double v1, double v2, double fraction2) {
    Require.within("volume fraction", fraction2, 0, 1, "");
    double w1 = AstmD341.logLogZ(v1);
    double w2 = AstmD341.logLogZ(v2);
    return AstmD341.ofLogLogZ(w1 + fraction2 * (w2 - w1), "of the blend");
  }

  /**
   * The volume fraction of the other oil that turns the base oil into a blend of given viscosity;
   * empty where no fraction from 0 to 1 does, or where the two oils are equally viscous.
   */
  public static OptionalDouble fractionExplaining(double base, double other, double blended) {
    double w1 = AstmD341.logLogZ(base);
    double w2 = AstmD341.logLogZ(other);
    double w = AstmD341.logLogZ(blended);
    if (w1 == w2) {
      return OptionalDouble.empty();
    }
    // The sum turns the −0.0 of a blend that equals a thicker base oil into 0.
    double fraction = (w - w1) / (w2 - w1) + 0.0;
    return fraction < 0 || fraction > 1 ? OptionalDouble.empty() : OptionalDouble.of(fraction);
  }
}
