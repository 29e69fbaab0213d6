package org.kappatrail.history;

import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.kappatrail.tribology.OilSupply;

/**
 * A machine with one oil system, as the site's register describes it.
 *
 * @param id unique name
 * @param name what people call it; the id where the register has none
 * @param area part of the site; empty where unknown
 * @param oil id of the registered oil
 * @param supply how the oil reaches the bearings
 * @param oilVolumeL volume of one charge, litres
 * @param contaminationFactor e_C entered by hand, 0 to 1; replaces the one from the code
 * @param changeCost price of one oil change, in the site's currency
 * @param coolingCost price of putting the cooling right
 * @param failureCost cost of one bearing failure
 * @param samplingIntervalDays usual days between samples
 */
public record Asset(
    String id,
    String name,
    String area,
    String oil,
    OilSupply supply,
    OptionalDouble oilVolumeL,
    OptionalDouble contaminationFactor,
    OptionalDouble changeCost,
    OptionalDouble coolingCost,
    OptionalDouble failureCost,
    OptionalInt samplingIntervalDays) {

  /** Sampling interval where the register has none: 30 days (tool convention). */
  public static final int DEFAULT_SAMPLING_INTERVAL_DAYS = 30;

  public Asset {
    Names.require("asset", id);
    Names.require("oil", oil);
    if (name.isBlank()) {
      name = id;
    }
    Quantity.positive("oil_volume_l", oilVolumeL);
    if (contaminationFactor.isPresent()) {
      Quantity.within("contamination_factor", contaminationFactor.getAsDouble(), 0, 1);
    }
    Quantity.notNegative("change_cost", changeCost);
    Quantity.notNegative("cooling_cost", coolingCost);
    Quantity.notNegative("failure_cost", failureCost);
    if (samplingIntervalDays.isPresent()) {
      Quantity.within("sampling_interval_days", samplingIntervalDays.getAsInt(), 1, 3660);
    }
  }

  /** Days between samples, the default where the register has none. */
  public int samplingDays() {
    return samplingIntervalDays.orElse(DEFAULT_SAMPLING_INTERVAL_DAYS);
  }
}
