package org.kappatrail.tribology;

/**
 * Viscosity-temperature law of ASTM D341-20 for liquid petroleum products: log log Z = A − B log T,
 * with T in kelvin and Z = ν + 0.7 + exp(−1.47 − 1.84 ν − 0.51 ν²); the exponential is left out
 * from 2 mm²/s up. Kinematic viscosity in mm²/s (cSt), from 0.21 mm²/s.
 *
 * <p>Backwards the standard gives ν = (Z − 0.7) − exp(−0.7487 − 3.295 (Z − 0.7) + 0.6119 (Z − 0.7)²
 * − 0.3193 (Z − 0.7)³). The law is an interpolation; {@link #extrapolated} tells where this tool
 * calls a value an extrapolation.
 *
 * @param a intercept A
 * @param b slope B, above 0 for every oil that thins with heat
 */
public record AstmD341(double a, double b) {
  /** 0 °C in kelvin. */
  public static final double ZERO_CELSIUS_K = 273.15;

  /** Least kinematic viscosity the law covers, mm²/s. */
  public static final double LEAST_VISCOSITY_CST = 0.21;

  /** Highest viscosity that is still told as a number, mm²/s; thicker oil does not flow. */
  public static final double MOST_VISCOSITY_CST = 2e7;

  private static final double FULL_FORM_BELOW_CST = 2.0;
  private static final double LOWEST_EXTRAPOLATION_C = 10;
  private static final double HIGHEST_EXTRAPOLATION_C = 130;

  public AstmD341 {
    if (!Double.isFinite(a) || !Double.isFinite(b)) {
      throw new IllegalArgumentException("A and B must be finite, are " + a + " and " + b);
    }
  }

  /**
   * The law through two measured points.
   *
   * @throws IllegalArgumentException where the temperatures are equal, or a viscosity lies below
   *     0.21 mm²/s
   */
  public static AstmD341 through(
      double temperature1C, double viscosity1Cst, double temperature2C, double viscosity2Cst) {
    double x1 = logT(temperature1C);
    double x2 = logT(temperature2C);
    if (x1 == x2) {
      throw new IllegalArgumentException("two points at " + temperature1C + " °C fix no law");
    }
    double b = (w(viscosity1Cst) - w(viscosity2Cst)) / (x2 - x1);
    return withSlope(b, temperature1C, viscosity1Cst);
  }

  /** The law with a given slope through one measured point. */
  public static AstmD341 withSlope(double b, double temperatureC, double viscosityCst) {
    return new AstmD341(w(viscosityCst) + b * logT(temperatureC), b);
  }

  /**
   * Kinematic viscosity at a temperature.
   *
   * @param temperatureC temperature, °C, above absolute zero
   * @return mm²/s; {@link #MOST_VISCOSITY_CST} where the law gives more
   * @throws IllegalArgumentException where the law falls below {@link #LEAST_VISCOSITY_CST}
   */
  public double viscosityCst(double temperatureC) {
    double beyond = Math.pow(10, Math.pow(10, a - b * logT(temperatureC))) - 0.7;
    if (beyond >= FULL_FORM_BELOW_CST) {
      return Math.min(beyond, MOST_VISCOSITY_CST);
    }
    double viscosity =
        beyond
            - Math.exp(
                -0.7487
                    - 3.295 * beyond
                    + 0.6119 * beyond * beyond
                    - 0.3193 * beyond * beyond * beyond);
    // 2 % below the limit, so that a law through a point at the limit gives that point back
    if (!(viscosity >= 0.98 * LEAST_VISCOSITY_CST)) {
      throw new IllegalArgumentException(
          "viscosity at "
              + temperatureC
              + " °C falls below "
              + LEAST_VISCOSITY_CST
              + " mm²/s, the least that ASTM D341 covers");
    }
    return viscosity;
  }

  /** Temperature at which the law gives a viscosity, °C. */
  public double temperatureC(double viscosityCst) {
    if (b == 0) {
      throw new IllegalArgumentException("a law with slope 0 has no temperature for a viscosity");
    }
    return Math.pow(10, (a - w(viscosityCst)) / b) - ZERO_CELSIUS_K;
  }

  /** True below 10 °C and above 130 °C (tool convention). */
  public static boolean extrapolated(double temperatureC) {
    return temperatureC < LOWEST_EXTRAPOLATION_C || temperatureC > HIGHEST_EXTRAPOLATION_C;
  }

  /** W = log log Z of a viscosity. */
  static double w(double viscosityCst) {
    Require.within(
        "kinematic viscosity", viscosityCst, "mm²/s", LEAST_VISCOSITY_CST, MOST_VISCOSITY_CST);
    double z = viscosityCst + 0.7;
    if (viscosityCst < FULL_FORM_BELOW_CST) {
      z += Math.exp(-1.47 - 1.84 * viscosityCst - 0.51 * viscosityCst * viscosityCst);
    }
    return Math.log10(Math.log10(z));
  }

  private static double logT(double temperatureC) {
    return Math.log10(
        Require.within("temperature", temperatureC, "°C", -ZERO_CELSIUS_K + 1, 1000)
            + ZERO_CELSIUS_K);
  }
}
