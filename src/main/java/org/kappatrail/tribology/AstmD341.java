package org.kappatrail.tribology;

/**
 * Kinematic viscosity of a lubricating oil against temperature: log log Z = A − B log T, with T in
 * kelvin and Z = ν + 0.7 from 2 mm²/s up, Z = ν + 0.7 + exp(−1.47 − 1.84ν − 0.51ν²) below.
 *
 * <p>Units: mm²/s (= cSt) and °C. Range: 0.21 mm²/s up; a result below it, or one too large to be a
 * number, is refused. The published inverse of the low branch returns a viscosity within 0.03 % of
 * the one that went in.
 *
 * <p>Source: ASTM D341, equations of the viscosity-temperature charts and Annex A1 (low-viscosity
 * form and its inverse).
 *
 * @param a the constant A, dimensionless, for logarithms to base 10
 * @param b the slope B, above 0
 */
public record AstmD341(double a, double b) {
  /** 0 °C in kelvin (ITS-90). */
  public static final double ZERO_CELSIUS_K = 273.15;

  /** Lowest viscosity of the law, mm²/s. */
  public static final double LOWEST_CST = 0.21;

  private static final double LOW_BRANCH_CST = 2;
  private static final double LN_10 = Math.log(10);
  private static final double LN_LN_10 = Math.log(LN_10);
  private static final double LOWEST_Z = z(LOWEST_CST);

  /** Z of the low branch as ν comes up to 2 mm²/s; at and above it the exponential is dropped. */
  private static final double LOW_BRANCH_Z = lowZ(LOW_BRANCH_CST);

  /** A viscosity of exactly 0.21 mm²/s may come back a few units in the last place lower. */
  private static final double ROUNDING = 1e-9;

  private static final double COLDEST_PLAIN_C = 10;
  private static final double HOTTEST_PLAIN_C = 130;

  public AstmD341 {
    Require.finite("D341 constant A", a, "");
    Require.positive("D341 slope B", b, "");
  }

  /** The law through two measured points; the hotter one must have the lower viscosity. */
  public static AstmD341 through(double t1C, double v1Cst, double t2C, double v2Cst) {
    double x1 = log10Kelvin(t1C);
    double x2 = log10Kelvin(t2C);
    double y1 = logLogZ(v1Cst);
    double y2 = logLogZ(v2Cst);
    double slope = (y1 - y2) / (x2 - x1);
    if (!(slope > 0) || Double.isInfinite(slope)) {
      throw new IllegalArgumentException(
          String.join(
              " ",
              "viscosities",
              v1Cst + " mm²/s at " + t1C + " °C",
              "and",
              v2Cst + " mm²/s at " + t2C + " °C:",
              "the hotter point must have the lower viscosity"));
    }
    return new AstmD341(y1 + slope * x1, slope);
  }

  /** The law of slope B through one measured point. */
  public static AstmD341 withSlope(double b, double tC, double vCst) {
    return new AstmD341(logLogZ(vCst) + b * log10Kelvin(tC), b);
  }

  /** Kinematic viscosity at a temperature. */
  public double viscosityCst(double temperatureC) {
    double z = Math.exp(lnZ(kelvin(temperatureC)));
    if (z >= LOW_BRANCH_Z && z < Double.POSITIVE_INFINITY) {
      return z - 0.7;
    }
    return lowViscosityCst(z, temperatureC);
  }

  /** The temperature at which the oil has a viscosity. */
  public double temperatureC(double viscosityCst) {
    double lnLnZ = Math.log(Math.log(z(viscosityCst)));
    double kelvin = Math.exp((a * LN_10 + LN_LN_10 - lnLnZ) / b);
    return Require.finite("temperature of " + viscosityCst + " mm²/s", kelvin, "K")
        - ZERO_CELSIUS_K;
  }

  /** The relative change of viscosity per °C, ∂lnν/∂T, below 0. */
  public double relativeSlopePerC(double temperatureC) {
    double kelvin = kelvin(temperatureC);
    double viscosityCst = viscosityCst(temperatureC);
    double lnZ = lnZ(kelvin);
    double z = Math.exp(lnZ);
    double dvPerDz = 1;
    if (z < LOW_BRANCH_Z) {
      double y = z - 0.7;
      dvPerDz = 1 - inverseTerm(y) * (-3.295 + 2 * 0.6119 * y - 3 * 0.3193 * y * y);
    }
    return -b * z * lnZ / kelvin * dvPerDz / viscosityCst;
  }

  /**
   * Whether a temperature lies outside 10…130 °C, where the law leans far out of the two points
   * that fixed it (convention of this tool).
   */
  public static boolean extrapolated(double temperatureC) {
    return temperatureC < COLDEST_PLAIN_C || temperatureC > HOTTEST_PLAIN_C;
  }

  /** log log Z of a viscosity, the scale on which the law is a straight line. */
  static double logLogZ(double viscosityCst) {
    return Math.log10(Math.log10(z(viscosityCst)));
  }

  /** The viscosity of a value of log log Z; {@code where} completes the message of a refusal. */
  static double ofLogLogZ(double logLogZ, String where) {
    double z = Math.pow(10, Math.pow(10, logLogZ));
    if (z >= LOW_BRANCH_Z && z < Double.POSITIVE_INFINITY) {
      return z - 0.7;
    }
    return inverse(z, where);
  }

  private double lnZ(double kelvin) {
    return Math.exp(a * LN_10 + LN_LN_10 - b * Math.log(kelvin));
  }

  private static double lowViscosityCst(double z, double temperatureC) {
    return inverse(z, "at " + temperatureC + " °C");
  }

  private static double inverse(double z, String where) {
    if (!Double.isFinite(z)) {
      throw new IllegalArgumentException(
          "viscosity " + where + ": too large for the law of ASTM D341");
    }
    double y = z - 0.7;
    double viscosityCst = y - inverseTerm(y);
    if (z < LOWEST_Z * (1 - ROUNDING)) {
      throw new IllegalArgumentException(
          String.join(
              " ",
              "viscosity " + where + " about",
              viscosityCst + " mm²/s:",
              "below the law's lower limit of",
              LOWEST_CST + " mm²/s"));
    }
    return viscosityCst;
  }

  private static double inverseTerm(double y) {
    return Math.exp(-0.7487 - 3.295 * y + 0.6119 * y * y - 0.3193 * y * y * y);
  }

  private static double z(double viscosityCst) {
    Require.atLeast("viscosity", viscosityCst, LOWEST_CST, "mm²/s");
    return viscosityCst < LOW_BRANCH_CST ? lowZ(viscosityCst) : viscosityCst + 0.7;
  }

  private static double lowZ(double viscosityCst) {
    return viscosityCst
        + 0.7
        + Math.exp(-1.47 - 1.84 * viscosityCst - 0.51 * viscosityCst * viscosityCst);
  }

  private static double kelvin(double temperatureC) {
    double kelvin = temperatureC + ZERO_CELSIUS_K;
    if (!(kelvin > 0 && kelvin < Double.POSITIVE_INFINITY)) {
      throw new IllegalArgumentException(
          "temperature " + temperatureC + " °C: must be above " + -ZERO_CELSIUS_K + " °C");
    }
    return kelvin;
  }

  private static double log10Kelvin(double temperatureC) {
    return Math.log10(kelvin(temperatureC));
  }
}
