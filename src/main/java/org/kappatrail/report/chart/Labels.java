package org.kappatrail.report.chart;

import java.util.List;

/** Keeps labels at a plot's edge from overlapping. */
final class Labels {
  private static final double LINE_PX = 13;

  private Labels() {}

  /** The free place nearest below a wanted one; it is then taken. */
  static double free(List<Double> taken, double wanted) {
    double place = wanted;
    while (isTaken(taken, place)) {
      place += 1;
    }
    taken.add(place);
    return place;
  }

  private static boolean isTaken(List<Double> taken, double place) {
    return taken.stream().anyMatch(other -> Math.abs(other - place) < LINE_PX);
  }
}
