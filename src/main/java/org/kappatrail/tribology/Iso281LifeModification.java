package org.kappatrail.tribology;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

/**
 * Life modification factor a_ISO = 0.1 [1 − (c1 − c2/κ^c3)^m (e_C Cu/(d P))^w]^−q for systems of
 * lubricant, cleanliness and load.
 *
 * <p>No unit; loads in kN. Range: 0.1 ≤ κ ≤ 4; above it κ counts as 4, below it there is no factor.
 * Never above 50; where the bracket falls to 0 or below it is 50. The published coefficients do not
 * quite meet at κ = 0.4: for ball bearings the factor falls there by up to 0.1 % where e_C Cu/(d P)
 * is at most 1, and by more above; for roller bearings by about 0.001 %.
 *
 * <p>Source: ISO 281:2007, 9.3.3.3, equations for the four bearing families; the rule for effective
 * EP additives from memory.
 */
public final class Iso281LifeModification {
  /** Highest factor that the method allows. */
  public static final double HIGHEST = 50;

  private static final double EP_KAPPA_BELOW = 1;
  private static final double EP_LOWEST_CONTAMINATION_FACTOR = 0.2;
  private static final double EP_HIGHEST = 3;
  private static final Map<BearingType, List<Range>> RANGES = ranges();

  private Iso281LifeModification() {}

  private record Range(
      double kappaFrom,
      double c1,
      double c2,
      double c3,
      double termExponent,
      double loadExponent,
      double loadDivisor,
      double outerExponent) {
    double factor(double kappa, double loadTerm) {
      // At κ = 0.1 the rounded coefficients of the roller family leave −7e-5 where 0 is meant.
      double film = Math.max(0, c1 - c2 / Math.pow(kappa, c3));
      double bracket =
          1 - Math.pow(film, termExponent) * Math.pow(loadTerm / loadDivisor, loadExponent);
      return bracket <= 0 ? HIGHEST : Math.min(HIGHEST, 0.1 * Math.pow(bracket, outerExponent));
    }
  }

  /** The factor; empty below κ 0.1. */
  public static OptionalDouble factor(
      BearingType type,
      double kappa,
      double contaminationFactor,
      double fatigueLimitKn,
      double equivalentLoadKn) {
    Require.positive("viscosity ratio", kappa, "");
    Require.within("contamination factor", contaminationFactor, 0, 1, "");
    Require.positive("fatigue load limit", fatigueLimitKn, "kN");
    Require.positive("equivalent load", equivalentLoadKn, "kN");
    if (kappa < ViscosityRatio.LOWEST_FOR_LIFE) {
      return OptionalDouble.empty();
    }
    double clipped = Math.min(ViscosityRatio.HIGHEST_FOR_LIFE, kappa);
    double loadTerm = contaminationFactor * fatigueLimitKn / equivalentLoadKn;
    return OptionalDouble.of(range(type, clipped).factor(clipped, loadTerm));
  }

  /**
   * The factor where the oil has an EP additive proven to be effective: with κ below 1 and e_C of
   * at least 0.2, κ = 1 may be used; the result is then at most 3 and never below the plain factor.
   */
  public static OptionalDouble factorWithEffectiveEp(
      BearingType type,
      double kappa,
      double contaminationFactor,
      double fatigueLimitKn,
      double equivalentLoadKn) {
    OptionalDouble plain =
        factor(type, kappa, contaminationFactor, fatigueLimitKn, equivalentLoadKn);
    if (plain.isEmpty()
        || kappa >= EP_KAPPA_BELOW
        || contaminationFactor < EP_LOWEST_CONTAMINATION_FACTOR) {
      return plain;
    }
    double atOne =
        factor(type, EP_KAPPA_BELOW, contaminationFactor, fatigueLimitKn, equivalentLoadKn)
            .orElseThrow();
    return OptionalDouble.of(Math.max(plain.getAsDouble(), Math.min(EP_HIGHEST, atOne)));
  }

  private static Range range(BearingType type, double kappa) {
    List<Range> ranges = RANGES.getOrDefault(type, List.of());
    Range found = ranges.get(0);
    for (Range range : ranges) {
      if (kappa >= range.kappaFrom()) {
        found = range;
      }
    }
    return found;
  }

  private static Map<BearingType, List<Range>> ranges() {
    List<List<String>> rows = PublishedTable.rows("iso-281-life-modification.csv");
    Map<BearingType, List<Range>> ranges = new EnumMap<>(BearingType.class);
    for (BearingType type : BearingType.values()) {
      ranges.put(
          type,
          rows.stream()
              .filter(row -> row.get(0).equals(type.label()))
              .map(Iso281LifeModification::range)
              .toList());
    }
    return ranges;
  }

  private static Range range(List<String> row) {
    return new Range(
        PublishedTable.number(row, 1),
        PublishedTable.number(row, 3),
        PublishedTable.number(row, 4),
        PublishedTable.number(row, 5),
        PublishedTable.number(row, 6),
        PublishedTable.number(row, 7),
        PublishedTable.number(row, 8),
        PublishedTable.number(row, 9));
  }
}
