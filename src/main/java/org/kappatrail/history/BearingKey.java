package org.kappatrail.history;

import java.util.Comparator;

/**
 * Names one bearing of the plant: the asset it sits in and its own name there.
 *
 * @param asset asset of the register
 * @param bearing name within the asset
 */
public record BearingKey(String asset, String bearing) implements Comparable<BearingKey> {
  private static final Comparator<BearingKey> ORDER =
      Comparator.comparing(BearingKey::asset).thenComparing(BearingKey::bearing);

  public BearingKey {
    Names.require("asset", asset);
    Names.require("bearing", bearing);
  }

  @Override
  public int compareTo(BearingKey other) {
    return ORDER.compare(this, other);
  }

  @Override
  public String toString() {
    return asset + "/" + bearing;
  }
}
