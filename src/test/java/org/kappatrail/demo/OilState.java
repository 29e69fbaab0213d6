package org.kappatrail.demo;

import java.util.LinkedHashMap;
import java.util.Map;
import org.kappatrail.tribology.AstmD2270;
import org.kappatrail.tribology.AstmD7152Blend;
import org.kappatrail.tribology.OilViscosity;

/**
 * What the oil in a machine truly is on a day.
 *
 * @param viscosity40Cst kinematic viscosity at 40 °C, mm²/s
 * @param viscosity100Cst kinematic viscosity at 100 °C, mm²/s
 * @param additivesPpm additive elements by column name, mg/kg
 * @param acidNumber mg KOH/g
 */
record OilState(
    double viscosity40Cst,
    double viscosity100Cst,
    Map<String, Double> additivesPpm,
    double acidNumber) {

  /** The oil after a volume fraction of it has become another liquid. */
  OilState mixedWith(OilState other, double fraction) {
    Map<String, Double> additives = new LinkedHashMap<>();
    additivesPpm.forEach(
        (element, ppm) ->
            additives.put(
                element,
                ppm * (1 - fraction) + other.additivesPpm.getOrDefault(element, 0.0) * fraction));
    return new OilState(
        AstmD7152Blend.viscosityCst(viscosity40Cst, other.viscosity40Cst, fraction),
        AstmD7152Blend.viscosityCst(viscosity100Cst, other.viscosity100Cst, fraction),
        additives,
        acidNumber * (1 - fraction) + other.acidNumber * fraction);
  }

  /** The oil thinned or thickened at 40 °C by a factor, its viscosity index moved by a step. */
  OilState thickened(double factor, double indexStep) {
    double v40 = viscosity40Cst * factor;
    double index = AstmD2270.viscosityIndex(viscosity40Cst, viscosity100Cst) + indexStep;
    double v100 = AstmD2270.viscosity100Cst(v40, index).orElseThrow();
    return new OilState(v40, v100, additivesPpm, acidNumber);
  }

  OilState soured(double acidRise) {
    return new OilState(viscosity40Cst, viscosity100Cst, additivesPpm, acidNumber + acidRise);
  }

  OilViscosity viscosity() {
    return OilViscosity.measured(viscosity40Cst, viscosity100Cst);
  }
}
