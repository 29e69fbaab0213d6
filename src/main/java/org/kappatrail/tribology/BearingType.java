package org.kappatrail.tribology;

import java.util.Arrays;
import java.util.Optional;

/** Bearing families of ISO 281:2007. */
public enum BearingType {
  RADIAL_BALL("radial-ball"),
  RADIAL_ROLLER("radial-roller"),
  THRUST_BALL("thrust-ball"),
  THRUST_ROLLER("thrust-roller");

  private final String label;

  BearingType(String label) {
    this.label = label;
  }

  /** The word used in files. */
  public String label() {
    return label;
  }

  public boolean isBall() {
    return this == RADIAL_BALL || this == THRUST_BALL;
  }

  public static Optional<BearingType> parse(String label) {
    return Arrays.stream(values()).filter(type -> type.label.equals(label)).findFirst();
  }
}
