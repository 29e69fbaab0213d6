package org.kappatrail.tribology;

import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;

/**
 * Life modification factor a_ISO of ISO 281:2007, 9.3.3: a_ISO = 0.1 [1 − (c1 − c2/κ^c3)^e (e_C
 * Cu/(d P))^p]^q for four bearing families and three bands of κ. Capped at 50, also where the
 * bracket is not above 0; κ above 4 counts as 4; refused below 0.1.
 */
public final class Iso281LifeModification {
  /** Highest factor of the standard. */
  public static final double CAP = 50;

  /** Most that the rule for effective EP additives gives (from memory). */
  public static final double EP_CAP = 3;

  /** Least contamination factor at which that rule may be used (from memory). */
  public static final double EP_LEAST_CONTAMINATION_FACTOR = 0.2;

  private static final List<Band> BANDS =
      PublishedTable.rows("iso281-life-modification.csv").stream().map(Band::of).toList();

  private Iso281LifeModification() {}

  private record Band(
      BearingType type,
      double from,
      double to,
      double c1,
      double c2,
      double c3,
      double termExponent,
      double loadExponent,
      double loadDivisor,
      double outerExponent) {
    static Band of(String[] row) {
      return new Band(
          BearingType.valueOf(row[0].toUpperCase(Locale.ROOT)),
          PublishedTable.number(row[1]),
          PublishedTable.number(row[2]),
          PublishedTable.number(row[3]),
          PublishedTable.number(row[4]),
          PublishedTable.number(row[5]),
          PublishedTable.number(row[6]),
          PublishedTable.number(row[7]),
          PublishedTable.number(row[8]),
          PublishedTable.number(row[9]));
    }

    double factor(double kappa, double loadRatio) {
      double film = Math.pow(c1 - c2 / Math.pow(kappa, c3), termExponent);
      double bracket = 1 - film * Math.pow(loadRatio / loadDivisor, loadExponent);
      return bracket <= 0 ? CAP : Math.min(CAP, 0.1 * Math.pow(bracket, outerExponent));
    }
  }

  /**
   * Life modification factor.
   *
   * @param type bearing family
   * @param kappa κ, above 0
   * @param contaminationFactor e_C, 0 to 1
   * @param fatigueLimitKn fatigue load limit Cu, kN
   * @param equivalentLoadKn dynamic equivalent load P, kN
   * @return 0.1 to 50; empty below κ 0.1
   */
  public static OptionalDouble factor(
      BearingType type,
      double kappa,
      double contaminationFactor,
      double fatigueLimitKn,
      double equivalentLoadKn) {
    Require.within("contamination factor", contaminationFactor, "", 0, 1);
    Require.positive("fatigue load limit", fatigueLimitKn, "kN");
    Require.positive("equivalent load", equivalentLoadKn, "kN");
    double clipped = ViscosityRatio.clipped(kappa);
    if (clipped < ViscosityRatio.LEAST_FOR_LIFE) {
      return OptionalDouble.empty();
    }
    double loadRatio = contaminationFactor * fatigueLimitKn / equivalentLoadKn;
    for (Band band : BANDS) {
      boolean last = band.to() == ViscosityRatio.MOST_FOR_LIFE;
      if (band.type() == type && (clipped < band.to() || last)) {
        return OptionalDouble.of(band.factor(clipped, loadRatio));
      }
    }
    throw new IllegalStateException("no band of ISO 281 for " + type + " at κ " + clipped);
  }

  /**
   * Life modification factor by the rule for effective EP additives: with κ below 1 and e_C from
   * 0.2, κ = 1 may be used, the factor then at most 3 and not below the plain value (ISO 281:2007,
   * 9.3.3.3, from memory). Reported beside the plain value, never instead of it.
   *
   * @return empty where the rule does not apply
   */
  public static OptionalDouble factorWithEffectiveEp(
      BearingType type,
      double kappa,
      double contaminationFactor,
      double fatigueLimitKn,
      double equivalentLoadKn) {
    OptionalDouble plain =
        factor(type, kappa, contaminationFactor, fatigueLimitKn, equivalentLoadKn);
    if (plain.isEmpty() || kappa >= 1 || contaminationFactor < EP_LEAST_CONTAMINATION_FACTOR) {
      return OptionalDouble.empty();
    }
    double atOne =
        factor(type, 1, contaminationFactor, fatigueLimitKn, equivalentLoadKn).getAsDouble();
    return OptionalDouble.of(Math.max(plain.getAsDouble(), Math.min(EP_CAP, atOne)));
  }
}
