package org.kappatrail.tribology;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalInt;

/**
 * Contamination factor e_C for oil lubrication, ISO 281:2007 Annex A (coefficients from memory):
 * e_C = min(1, c1 κ^0.68 Dpw^0.55) (1 − c2/Dpw^(1/3)), kept within 0…1, by the cleanest class whose
 * two limits cover the code's numbers for 6 and 14 µm(c). Dirtier than all classes: the last class,
 * as an upper bound. κ as the life formulas use it, at most 4.
 */
public final class Iso281ContaminationFactor {
  private static final List<CleanlinessClass> CLASSES =
      PublishedTable.rows("iso281-contamination.csv").stream()
          .map(
              row ->
                  new CleanlinessClass(
                      OilSupply.parse(row[0]).orElseThrow(),
                      Integer.parseInt(row[1]),
                      Integer.parseInt(row[2]),
                      Double.parseDouble(row[4]),
                      Double.parseDouble(row[5])))
          .toList();

  private Iso281ContaminationFactor() {}

  private record CleanlinessClass(
      OilSupply supply, int most6um, int most14um, double c1, double c2) {
    boolean covers(int number6um, int number14um) {
      return number6um <= most6um && number14um <= most14um;
    }
  }

  /**
   * Contamination factor.
   *
   * @param code cleanliness code
   * @param supply oil supply
   * @param kappa κ, above 0
   * @param pitchMm pitch diameter, mm
   * @return empty where the code lacks its 6 or 14 µm(c) number
   */
  public static Optional<ContaminationFactor> factor(
      CleanlinessCode code, OilSupply supply, double kappa, double pitchMm) {
    OptionalInt number6um = code.c6().effective();
    OptionalInt number14um = code.c14().effective();
    if (number6um.isEmpty() || number14um.isEmpty()) {
      return Optional.empty();
    }
    List<CleanlinessClass> classes =
        CLASSES.stream().filter(item -> item.supply() == supply).toList();
    Optional<CleanlinessClass> covering =
        classes.stream()
            .filter(item -> item.covers(number6um.getAsInt(), number14um.getAsInt()))
            .findFirst();
    CleanlinessClass chosen = covering.orElse(classes.get(classes.size() - 1));
    boolean bound = covering.isEmpty() || code.c6().bound() || code.c14().bound();
    String basis =
        String.format(
            Locale.ROOT,
            "%s, code -/%d/%d%s",
            supply.label(),
            chosen.most6um(),
            chosen.most14um(),
            covering.isEmpty() ? ", dirtier than every class" : "");
    return Optional.of(new ContaminationFactor(value(chosen, kappa, pitchMm), bound, basis));
  }

  private static double value(CleanlinessClass item, double kappa, double pitchMm) {
    Require.positive("pitch diameter", pitchMm, "mm");
    double growing =
        item.c1() * Math.pow(ViscosityRatio.clipped(kappa), 0.68) * Math.pow(pitchMm, 0.55);
    double factor = Math.min(1, growing) * (1 - item.c2() / Math.cbrt(pitchMm));
    return Math.max(0, Math.min(1, factor));
  }
}
