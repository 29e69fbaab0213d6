package org.kappatrail.demo;

import java.util.List;

/**
 * How an asset lives: what its oil carries and what happens to it.
 *
 * @param asset asset of the register
 * @param hoursAtStart age of its oil when the history begins
 * @param speed its speeds as a share of the nominal one
 * @param waterPpm usual water, mg/kg
 * @param particles4um usual particles above 4 µm(c) per ml
 * @param ironPpm iron of a charge that is a year old, mg/kg
 * @param bearings how its bearings warm up
 * @param influences what happens
 */
record AssetStory(
    String asset,
    double hoursAtStart,
    Speed speed,
    double waterPpm,
    double particles4um,
    double ironPpm,
    List<BearingHeat> bearings,
    List<Influence> influences) {

  /**
   * Speeds of an asset.
   *
   * @param low least share of the nominal speed
   * @param high highest share
   * @param holdDays how long a speed is held on average
   */
  record Speed(double low, double high, double holdDays) {}

  /**
   * Temperature of a bearing at work.
   *
   * @param bearing bearing of the register
   * @param baseC temperature at the year's mean ambient temperature and the nominal speed, °C
   * @param ambientShare how far it follows the ambient temperature, 0 to 1
   * @param speedC how much colder it would be at a nearly vanishing speed, °C
   */
  record BearingHeat(String bearing, double baseC, double ambientShare, double speedC) {}

  <T extends Influence> List<T> influences(Class<T> kind) {
    return influences.stream().filter(kind::isInstance).map(kind::cast).toList();
  }

  BearingHeat heat(String bearing) {
    return bearings.stream()
        .filter(item -> item.bearing().equals(bearing))
        .findFirst()
        .orElseThrow(() -> new IllegalArgumentException("no bearing " + bearing + " of " + asset));
  }
}
