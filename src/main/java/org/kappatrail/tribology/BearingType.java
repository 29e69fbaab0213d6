package org.kappatrail.tribology;

import java.util.Arrays;
import java.util.Optional;

/** The four bearing families that ISO 281 tells apart. */
public enum BearingType {
  RADIAL_BALL("radial-ball", true),
  RADIAL_ROLLER("radial-roller", false),
  THRUST_BALL("thrust-ball", true),
  THRUST_ROLLER("thrust-roller", false);

  private final String label;
  private final boolean ball;

  BearingType(String label, boolean ball) {
    this.label = label;
    this.ball = ball;
  }

  /** The family of a label; case and blanks at the ends do not matter. */
  public static Optional<BearingType> parse(String text) {
    return Arrays.stream(values())
        .filter(type -> type.label.equalsIgnoreCase(text.strip()))
        .findFirst();
  }

  public String label() {
    return label;
  }

  public boolean isBall() {
    return ball;
  }
}
