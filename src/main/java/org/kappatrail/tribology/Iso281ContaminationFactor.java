package org.kappatrail.tribology;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.stream.Collectors;

/**
 * Contamination factor e_C from the cleanliness code of the oil: min(1, c1 κ^0.68 Dpw^0.55) (1 −
 * c2/Dpw^(1/3)) with c1 and c2 of the cleanest class whose limits cover the numbers for 6 and 14
 * µm.
 *
 * <p>Units: Dpw in mm, κ and e_C none. κ is clipped to 0.1…4 and the result to 0…1. Without numbers
 * for 6 and 14 µm there is no factor; oil dirtier than every class gets the dirtiest one and is
 * marked as an upper bound. A number that is itself a lower bound counts as the next dirtier one.
 *
 * <p>Source: ISO 281:2007, Annex A (equations for oil with inline filter and for oil bath), from
 * memory.
 */
public final class Iso281ContaminationFactor {
  private static final List<OilClass> CLASSES =
      PublishedTable.rows("iso-281-contamination-factor.csv").stream()
          .map(Iso281ContaminationFactor::oilClass)
          .toList();

  private Iso281ContaminationFactor() {}

  private static final Map<OilSupply, List<OilClass>> BY_SUPPLY =
      CLASSES.stream()
          .collect(
              Collectors.groupingBy(
                  OilClass::supply, () -> new EnumMap<>(OilSupply.class), Collectors.toList()));

  private record OilClass(
      OilSupply supply,
      int highest6,
      int highest14,
      double c1,
      double c2,
      String within,
      String beyond) {
    boolean covers(int number6, int number14) {
      return number6 <= highest6 && number14 <= highest14;
    }

    double factor(double kappa, double pitchMm) {
      double film = Math.min(1, c1 * Math.pow(kappa, 0.68) * Math.pow(pitchMm, 0.55));
      return Math.min(1, Math.max(0, film * (1 - c2 / Math.cbrt(pitchMm))));
    }
  }

  public static Optional<ContaminationFactor> factor(
      CleanlinessCode code, OilSupply supply, double kappa, double pitchMm) {
    Require.positive("viscosity ratio", kappa, "");
    Require.positive("pitch diameter", pitchMm, "mm");
    OptionalInt number6 = code.c6().effectiveNumber();
    OptionalInt number14 = code.c14().effectiveNumber();
    if (number6.isEmpty() || number14.isEmpty()) {
      return Optional.empty();
    }
    List<OilClass> classes = BY_SUPPLY.getOrDefault(supply, List.of());
    OilClass used = classes.get(classes.size() - 1);
    boolean dirtier = true;
    for (OilClass candidate : classes) {
      if (candidate.covers(number6.getAsInt(), number14.getAsInt())) {
        used = candidate;
        dirtier = false;
        break;
      }
    }
    double clipped =
        Math.min(ViscosityRatio.HIGHEST_FOR_LIFE, Math.max(ViscosityRatio.LOWEST_FOR_LIFE, kappa));
    return Optional.of(
        new ContaminationFactor(
            used.factor(clipped, pitchMm), dirtier, dirtier ? used.beyond() : used.within()));
  }

  private static String supplyName(OilSupply supply) {
    return supply == OilSupply.BATH ? "oil bath" : "inline filter";
  }

  private static OilClass oilClass(List<String> row) {
    OilSupply supply = OilSupply.parse(row.get(0)).orElseThrow();
    int highest6 = PublishedTable.whole(row, 1);
    int highest14 = PublishedTable.whole(row, 2);
    String limit = highest6 + "/" + highest14;
    return new OilClass(
        supply,
        highest6,
        highest14,
        PublishedTable.number(row, 4),
        PublishedTable.number(row, 5),
        supplyName(supply) + ", up to -/" + limit,
        supplyName(supply) + ", dirtier than -/" + limit);
  }
}
