package org.kappatrail.review.correlation;

import java.util.Set;

/**
 * Pairs whose correlation is arithmetic, not news, at every lag:
 *
 * <ul>
 *   <li>κ with the viscosities, the temperature and κ at reference conditions, since it is
 *       calculated from the first two and shares the viscosity with the third;
 *   <li>κ at reference conditions with the viscosities; its temperature is one for all samples, so
 *       it is not tied to that of operation;
 *   <li>viscosities and indices of viscosity among themselves: one property of one oil, and the
 *       index is calculated from the viscosities;
 *   <li>particle counts among themselves: every particle of 14 µm counts as one of 6 µm and of 4 µm
 *       too, and scale numbers come from the counts.
 * </ul>
 */
public final class ByConstruction {
  private static final Set<String> KAPPAS = Set.of(Names.KAPPA, Names.KAPPA_REFERENCE);
  private static final String VISCOSITY = "viscosity";
  private static final String PARTICLES = "particles_";
  private static final String CODE = "iso_4406";

  private ByConstruction() {}

  /** True where the two are tied, whichever comes first. */
  public static boolean tied(String x, String y) {
    if (KAPPAS.contains(x) && KAPPAS.contains(y)) {
      return true;
    }
    if (counted(x) && counted(y)) {
      return true;
    }
    return (onViscosity(x) && onViscosity(y)) || onTemperature(x, y) || onTemperature(y, x);
  }

  private static boolean onViscosity(String name) {
    return KAPPAS.contains(name) || name.startsWith(VISCOSITY);
  }

  private static boolean onTemperature(String x, String y) {
    return x.equals(Names.KAPPA) && y.equals(Names.TEMPERATURE);
  }

  private static boolean counted(String name) {
    return name.startsWith(PARTICLES) || name.startsWith(CODE);
  }
}
