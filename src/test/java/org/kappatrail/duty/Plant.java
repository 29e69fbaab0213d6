package org.kappatrail.duty;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.kappatrail.history.Asset;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.Oil;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.tribology.OilSupply;
import org.kappatrail.tribology.OilViscosity;

/** Registers for tests. */
final class Plant {
  private Plant() {}

  /** A bearing of 120 mm with a nominal speed. */
  static Bearing bearing(String asset, String id, double speedRpm) {
    return new Bearing(
        asset,
        id,
        Optional.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        120,
        speedRpm,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        0);
  }

  /** A history of these bearings and their assets. */
  static PlantHistory of(Bearing... bearings) {
    List<Asset> assets = new ArrayList<>();
    for (Bearing bearing : bearings) {
      if (assets.stream().noneMatch(asset -> asset.id().equals(bearing.asset()))) {
        assets.add(asset(bearing.asset()));
      }
    }
    return new PlantHistory(List.of(oil()), assets, List.of(bearings), List.of(), List.of());
  }

  private static Asset asset(String id) {
    return new Asset(
        id,
        id,
        "",
        "VG 220",
        OilSupply.BATH,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalInt.empty());
  }

  private static Oil oil() {
    return new Oil(
        "VG 220",
        OptionalInt.of(220),
        OilViscosity.measured(220, 18.9),
        false,
        false,
        OptionalDouble.empty(),
        Map.of());
  }
}
