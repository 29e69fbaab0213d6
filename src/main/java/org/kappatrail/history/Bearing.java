package org.kappatrail.history;

import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.tribology.BearingType;
import org.kappatrail.tribology.Iso281FatigueLimit;

/**
 * A rolling bearing as the register describes it.
 *
 * @param asset asset it belongs to
 * @param id name within the asset
 * @param type family of ISO 281; without it there is no life
 * @param boreMm bore diameter, mm
 * @param outsideMm outside diameter, mm
 * @param pitchMm pitch diameter Dpw, mm; the mean of bore and outside where not given
 * @param speedRpm nominal speed, r/min
 * @param dynamicRatingKn basic dynamic load rating C, kN
 * @param staticRatingKn basic static load rating C0, kN
 * @param givenFatigueLimitKn fatigue load limit Cu as given, kN
 * @param equivalentLoadKn dynamic equivalent load P, kN
 * @param kappaFloor the site's own least κ for this bearing
 * @param temperatureOffsetC added to the logged temperature: from the sensor's place to the oil in
 *     the contact, °C
 */
public record Bearing(
    String asset,
    String id,
    Optional<BearingType> type,
    OptionalDouble boreMm,
    OptionalDouble outsideMm,
    double pitchMm,
    double speedRpm,
    OptionalDouble dynamicRatingKn,
    OptionalDouble staticRatingKn,
    OptionalDouble givenFatigueLimitKn,
    OptionalDouble equivalentLoadKn,
    OptionalDouble kappaFloor,
    double temperatureOffsetC) {

  public Bearing {
    Names.require("asset", asset);
    Names.require("bearing", id);
    Quantity.positive("bore_mm", boreMm);
    Quantity.positive("outside_mm", outsideMm);
    Quantity.within("pitch_mm", pitchMm, 1, 10_000);
    Quantity.within("speed_rpm", speedRpm, 0.01, 1_000_000);
    Quantity.positive("dynamic_rating_kn", dynamicRatingKn);
    Quantity.positive("static_rating_kn", staticRatingKn);
    Quantity.positive("fatigue_limit_kn", givenFatigueLimitKn);
    Quantity.positive("equivalent_load_kn", equivalentLoadKn);
    Quantity.positive("kappa_floor", kappaFloor);
    Quantity.within("temperature_offset_c", temperatureOffsetC, -100, 100);
  }

  public BearingKey key() {
    return new BearingKey(asset, id);
  }

  /** Fatigue load limit Cu, kN: as given, else from C0 by bearing family; empty without either. */
  public OptionalDouble fatigueLimitKn() {
    if (givenFatigueLimitKn.isPresent() || type.isEmpty() || staticRatingKn.isEmpty()) {
      return givenFatigueLimitKn;
    }
    return OptionalDouble.of(
        Iso281FatigueLimit.fatigueLoadLimitKn(type.get(), staticRatingKn.getAsDouble(), pitchMm));
  }

  /** True where the register gives all that a rating life needs: family, C, P and Cu or C0. */
  public boolean hasLoads() {
    return type.isPresent()
        && dynamicRatingKn.isPresent()
        && equivalentLoadKn.isPresent()
        && fatigueLimitKn().isPresent();
  }
}
