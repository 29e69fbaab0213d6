package org.kappatrail.review.decision;

import java.util.List;
import java.util.Optional;
import org.kappatrail.review.trend.Attribution;

/**
 * What besides the oil may be to blame, and the acts that put it right: temperature where the
 * bearing is hotter than before beyond measuring; speed where it took the largest part of κ; the
 * grade where even fresh oil stands below the floor at the present operating point.
 */
enum Cause {
  TEMPERATURE,
  SPEED,
  GRADE,
  NONE;

  /** A part of ln κ below this is no cause, about 5 % of κ (tool convention). */
  private static final double LEAST_PART = -0.05;

  static Cause of(AssetCase asset, List<Remedy> remedies) {
    BearingCase governing = asset.governing();
    Optional<Attribution> parts = governing.fromFresh();
    boolean hotter = Weights.find(remedies, RemedyKind.RESTORE_TEMPERATURE).isPresent();
    if (hotter) {
      return TEMPERATURE;
    }
    boolean slower =
        parts
            .filter(found -> found.speed() < LEAST_PART)
            .filter(found -> found.speed() < Math.min(found.oil(), found.temperature()))
            .isPresent();
    double fresh =
        governing.now().with(asset.candidate().viscosity()).kappa(governing.bearing().pitchMm());
    if (fresh >= governing.floor()) {
      return NONE;
    }
    return slower ? SPEED : GRADE;
  }

  /** The act that puts the cause right: of those that do, the one that is worth most. */
  Optional<Remedy> cure(List<Remedy> remedies, String governing) {
    return remedies.stream()
        .filter(remedy -> cures(remedy, remedies, governing))
        .max(
            java.util.Comparator.comparing(Remedy::pays)
                .thenComparingDouble(remedy -> value(remedy, governing))
                .thenComparing(Remedy::name, java.util.Comparator.reverseOrder()));
  }

  private boolean cures(Remedy remedy, List<Remedy> remedies, String governing) {
    return switch (this) {
      case NONE -> false;
      case TEMPERATURE -> remedy.kind() == RemedyKind.RESTORE_TEMPERATURE;
      case SPEED, GRADE ->
          (remedy.kind() == RemedyKind.GRADE || remedy.kind() == RemedyKind.OTHER_OIL)
              && kappa(remedy, governing)
                  > Weights.find(remedies, RemedyKind.FRESH_OIL)
                      .map(fresh -> kappa(fresh, governing))
                      .orElse(0.0);
    };
  }

  /** Worth where it is known, else κ. */
  static double value(Remedy remedy, String governing) {
    return remedy.worth().orElseGet(() -> kappa(remedy, governing));
  }

  private static double kappa(Remedy remedy, String governing) {
    return remedy.outcome(governing).map(Outcome::kappa).orElse(0.0);
  }
}
