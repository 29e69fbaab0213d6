package org.kappatrail.tribology;

import java.util.OptionalDouble;

/**
 * The viscosity of an oil, registered or sampled, at every temperature.
 *
 * <p>Units: mm²/s and °C. The law is that of ASTM D341 through the viscosities at 40 and 100 °C.
 * Where the laboratory gives no viscosity at 100 °C, it is the one at which the index equals that
 * of the registered oil (ASTM D2270); where none from 2 mm²/s up does, the slope of the registered
 * oil is kept.
 *
 * @param viscosity40Cst kinematic viscosity at 40 °C
 * @param viscosity100Cst kinematic viscosity at 100 °C
 * @param source where the viscosity at 100 °C comes from
 * @param law the viscosity-temperature law
 */
public record OilViscosity(
    double viscosity40Cst, double viscosity100Cst, Source source, AstmD341 law) {
  private static final double COOL_C = 40;
  private static final double HOT_C = 100;

  /** Where a viscosity at 100 °C comes from, most direct first. */
  public enum Source {
    MEASURED("measured"),
    INDEX("index"),
    SLOPE("slope");

    private final String label;

    Source(String label) {
      this.label = label;
    }

    public String label() {
      return label;
    }
  }

  public OilViscosity {
    Require.atLeast("viscosity at 100 °C", viscosity100Cst, AstmD341.LOWEST_CST, "mm²/s");
    Require.finite("viscosity at 40 °C", viscosity40Cst, "mm²/s");
    if (viscosity40Cst <= viscosity100Cst) {
      throw new IllegalArgumentException(
          "viscosity at 40 °C "
              + viscosity40Cst
              + " mm²/s: must be above the one at 100 °C, "
              + viscosity100Cst
              + " mm²/s");
    }
  }

  /** An oil with both viscosities given. */
  public static OilViscosity measured(double v40, double v100) {
    return through(v40, v100, Source.MEASURED);
  }

  /** A sample without a viscosity at 100 °C, of a registered oil. */
  public static OilViscosity withIndexOf(double v40, OilViscosity registered) {
    OptionalDouble index = registered.viscosityIndex();
    OptionalDouble v100 =
        index.isPresent()
            ? AstmD2270.viscosity100Cst(v40, index.getAsDouble())
            : OptionalDouble.empty();
    return v100.isPresent()
        ? through(v40, v100.getAsDouble(), Source.INDEX)
        : withSlope(v40, registered.law().b());
  }

  /**
   * An oil as the register gives it: by its viscosity at 100 °C, or else by its index.
   *
   * @throws IllegalArgumentException where both are absent, or no viscosity at 100 °C has the index
   */
  public static OilViscosity register(double v40, OptionalDouble v100, OptionalDouble vi) {
    if (v100.isPresent()) {
      return measured(v40, v100.getAsDouble());
    }
    if (vi.isEmpty()) {
      throw new IllegalArgumentException(
          "oil of " + v40 + " mm²/s at 40 °C: give its viscosity at 100 °C or its viscosity index");
    }
    OptionalDouble solved = AstmD2270.viscosity100Cst(v40, vi.getAsDouble());
    if (solved.isEmpty()) {
      throw new IllegalArgumentException(
          String.join(
              " ",
              "viscosity index " + vi.getAsDouble() + ":",
              "no viscosity at 100 °C from 2 mm²/s up has it with",
              v40 + " mm²/s at 40 °C; give the viscosity at 100 °C instead"));
    }
    return through(v40, solved.getAsDouble(), Source.INDEX);
  }

  /**
   * An oil between two, linear in both viscosities.
   *
   * @param weight 0 for the first oil, 1 for the second
   */
  public static OilViscosity interpolate(OilViscosity a, OilViscosity b, double weight) {
    Require.within("weight", weight, 0, 1, "");
    if (weight == 0) {
      return a;
    }
    if (weight == 1) {
      return b;
    }
    Source source = a.source.compareTo(b.source) >= 0 ? a.source : b.source;
    return through(
        a.viscosity40Cst + weight * (b.viscosity40Cst - a.viscosity40Cst),
        a.viscosity100Cst + weight * (b.viscosity100Cst - a.viscosity100Cst),
        source);
  }

  /** Kinematic viscosity at a temperature. */
  public double viscosityCst(double temperatureC) {
    return law.viscosityCst(temperatureC);
  }

  /** The viscosity index; empty where the viscosity at 100 °C is below 2 mm²/s. */
  public OptionalDouble viscosityIndex() {
    return viscosity100Cst < AstmD2270.LOWEST_100_CST
        ? OptionalDouble.empty()
        : OptionalDouble.of(AstmD2270.viscosityIndex(viscosity40Cst, viscosity100Cst));
  }

  /**
   * ∂lnν/∂lnν40 at a temperature with the oil's viscosity index held, or its slope where the index
   * is undefined.
   */
  public double sensitivityToV40(double temperatureC) {
    return OilSensitivity.of(this).at(temperatureC);
  }

  /** ∂lnν/∂T at a temperature, per °C, below 0. */
  public double sensitivityToTemperature(double temperatureC) {
    return law.relativeSlopePerC(temperatureC);
  }

  private static OilViscosity through(double v40, double v100, Source source) {
    return new OilViscosity(v40, v100, source, AstmD341.through(COOL_C, v40, HOT_C, v100));
  }

  static OilViscosity withSlope(double v40, double b) {
    AstmD341 law = AstmD341.withSlope(b, COOL_C, v40);
    return new OilViscosity(v40, law.viscosityCst(HOT_C), Source.SLOPE, law);
  }
}
