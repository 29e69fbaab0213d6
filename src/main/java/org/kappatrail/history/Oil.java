package org.kappatrail.history;

import java.util.Collections;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.TreeMap;
import org.kappatrail.tribology.OilViscosity;

/**
 * An oil of the register, as it is when fresh.
 *
 * @param id unique name
 * @param gradeVg ISO 3448 viscosity grade
 * @param viscosity viscosity at 40 and 100 °C
 * @param effectiveEp true for an effective EP additive in the sense of ISO 281
 * @param viImproved true for a VI-improved oil, which the blend rule does not cover
 * @param pricePerL price of a litre
 * @param elementsPpm additive elements when fresh, mg/kg, by column name such as {@code zinc_ppm}
 */
public record Oil(
    String id,
    OptionalInt gradeVg,
    OilViscosity viscosity,
    boolean effectiveEp,
    boolean viImproved,
    OptionalDouble pricePerL,
    Map<String, Double> elementsPpm) {

  public Oil {
    Names.require("oil", id);
    Quantity.notNegative("price_per_l", pricePerL);
    elementsPpm = Collections.unmodifiableSortedMap(new TreeMap<>(elementsPpm));
  }
}
