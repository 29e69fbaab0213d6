package org.kappatrail.tribology;

import java.util.Locale;
import java.util.OptionalDouble;

/**
 * Viscosity of an oil at 40 and 100 °C and the law through both.
 *
 * @param viscosity40Cst kinematic viscosity at 40 °C, mm²/s
 * @param viscosity100Cst kinematic viscosity at 100 °C, mm²/s
 * @param source where the second value comes from
 * @param law ASTM D341 through both points
 */
public record OilViscosity(
    double viscosity40Cst, double viscosity100Cst, Source source, AstmD341 law) {

  private static final double STEP = 1e-4;

  /** Where the viscosity at 100 °C comes from. */
  public enum Source {
    /** The laboratory measured it. */
    MEASURED,
    /** It is where the oil has the viscosity index of the registered oil. */
    INDEX,
    /** The slope of the registered oil was kept. */
    SLOPE;

    /** The word used in files. */
    public String label() {
      return name().toLowerCase(Locale.ROOT);
    }
  }

  /**
   * An oil measured at both temperatures.
   *
   * @throws IllegalArgumentException where it does not thin with heat
   */
  public static OilViscosity measured(double viscosity40Cst, double viscosity100Cst) {
    return of(viscosity40Cst, viscosity100Cst, Source.MEASURED);
  }

  /**
   * An oil of the register, by its viscosity at 100 °C where given, else by its index.
   *
   * @throws IllegalArgumentException where both are missing, or no viscosity at 100 °C from 2 mm²/s
   *     up has that index
   */
  public static OilViscosity register(
      double viscosity40Cst, OptionalDouble viscosity100Cst, OptionalDouble viscosityIndex) {
    if (viscosity100Cst.isPresent()) {
      return measured(viscosity40Cst, viscosity100Cst.getAsDouble());
    }
    double index =
        viscosityIndex.orElseThrow(
            () ->
                new IllegalArgumentException(
                    "an oil needs its viscosity at 100 °C or its viscosity index"));
    double solved =
        AstmD2270.viscosity100Cst(viscosity40Cst, index)
            .orElseThrow(
                () ->
                    new IllegalArgumentException(
                        "no viscosity at 100 °C from 2 mm²/s up gives "
                            + viscosity40Cst
                            + " mm²/s at 40 °C the viscosity index "
                            + index));
    return of(viscosity40Cst, solved, Source.INDEX);
  }

  /**
   * An oil of which only the viscosity at 40 °C is known: with the viscosity index of the
   * registered oil, or with its slope where that has no solution.
   */
  public static OilViscosity withIndexOf(double viscosity40Cst, OilViscosity registered) {
    OptionalDouble index = registered.viscosityIndex();
    if (index.isPresent()) {
      OptionalDouble solved = AstmD2270.viscosity100Cst(viscosity40Cst, index.getAsDouble());
      if (solved.isPresent()) {
        return of(viscosity40Cst, solved.getAsDouble(), Source.INDEX);
      }
    }
    AstmD341 law = AstmD341.withSlope(registered.law().b(), 40, viscosity40Cst);
    return new OilViscosity(viscosity40Cst, law.viscosityCst(100), Source.SLOPE, law);
  }

  /**
   * An oil between two, linear in both viscosities.
   *
   * @param weight share of the second, 0 to 1
   */
  public static OilViscosity interpolate(OilViscosity first, OilViscosity second, double weight) {
    Require.within("weight", weight, "", 0, 1);
    if (weight == 0) {
      return first;
    }
    if (weight == 1) {
      return second;
    }
    return of(
        first.viscosity40Cst + weight * (second.viscosity40Cst - first.viscosity40Cst),
        first.viscosity100Cst + weight * (second.viscosity100Cst - first.viscosity100Cst),
        first.source.compareTo(second.source) >= 0 ? first.source : second.source);
  }

  /** Viscosity index; empty below 2 mm²/s at 100 °C. */
  public OptionalDouble viscosityIndex() {
    return viscosity100Cst >= AstmD2270.LEAST_VISCOSITY_100_CST
        ? OptionalDouble.of(AstmD2270.viscosityIndex(viscosity40Cst, viscosity100Cst))
        : OptionalDouble.empty();
  }

  public double viscosityCst(double temperatureC) {
    return law.viscosityCst(temperatureC);
  }

  /**
   * ∂ln ν/∂ln ν40 at a temperature, the viscosity index held; the slope held where there is no
   * index. Central difference over ±0.01 %.
   */
  public double sensitivityToV40(double temperatureC) {
    double up = withIndexOf(viscosity40Cst * Math.exp(STEP), this).viscosityCst(temperatureC);
    double down = withIndexOf(viscosity40Cst * Math.exp(-STEP), this).viscosityCst(temperatureC);
    return Math.log(up / down) / (2 * STEP);
  }

  /** ∂ln ν/∂T at a temperature, 1/°C. Central difference over ±0.01 °C. */
  public double sensitivityToTemperature(double temperatureC) {
    double step = 0.01;
    return Math.log(law.viscosityCst(temperatureC + step) / law.viscosityCst(temperatureC - step))
        / (2 * step);
  }

  private static OilViscosity of(double viscosity40Cst, double viscosity100Cst, Source source) {
    if (!(viscosity100Cst < viscosity40Cst)) {
      throw new IllegalArgumentException(
          "viscosity at 100 °C ("
              + viscosity100Cst
              + " mm²/s) must be below the one at 40 °C ("
              + viscosity40Cst
              + " mm²/s)");
    }
    return new OilViscosity(
        viscosity40Cst,
        viscosity100Cst,
        source,
        AstmD341.through(40, viscosity40Cst, 100, viscosity100Cst));
  }
}
