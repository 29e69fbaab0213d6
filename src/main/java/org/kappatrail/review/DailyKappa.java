package org.kappatrail.review;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.duty.DutyCells;
import org.kappatrail.history.Bearing;
import org.kappatrail.tribology.Iso281RatedViscosity;
import org.kappatrail.tribology.LubricationRegime;
import org.kappatrail.tribology.OilViscosity;
import org.kappatrail.tribology.ViscosityRatio;

/** κ between samples, day by day from the day cells. */
final class DailyKappa {
  private static final double MS_PER_HOUR = 3_600_000.0;

  private DailyKappa() {}

  /** Days with running hours, in time. */
  static List<DayKappa> of(Bearing bearing, DutyCells cells, OilTimeline oil) {
    List<DayKappa> days = new ArrayList<>();
    for (int row = 0; row < cells.size(); ) {
      int end = DayRows.endOfDay(cells, row);
      day(bearing, cells, row, end, oil.on(cells.epochDay(row))).ifPresent(days::add);
      row = end;
    }
    return days;
  }

  private static Optional<DayKappa> day(
      Bearing bearing, DutyCells cells, int from, int to, Optional<OilViscosity> oil) {
    WeightedCells temperatures = new WeightedCells(to - from);
    double millis = 0;
    double speedMillis = 0;
    for (int row = from; row < to; row++) {
      if (cells.running(row)) {
        double weight = cells.millis(row);
        temperatures.add(
            cells.lowestC(row),
            cells.temperatureC(row),
            cells.highestC(row),
            cells.readings(row),
            weight);
        millis += weight;
        speedMillis += weight * speedRpm(bearing, cells, row);
      }
    }
    if (millis == 0) {
      return Optional.empty();
    }
    Optional<Kappas> kappas = oil.flatMap(viscosity -> kappas(bearing, cells, from, to, viscosity));
    return Optional.of(
        new DayKappa(
            LocalDate.ofEpochDay(cells.epochDay(from)),
            millis / MS_PER_HOUR,
            temperatures.median().getAsDouble() + bearing.temperatureOffsetC(),
            speedMillis / millis,
            quantile(kappas, 0.5),
            quantile(kappas, 0.05),
            quantile(kappas, 0.95),
            kappas
                .map(found -> OptionalDouble.of(found.mixedMillis() / MS_PER_HOUR))
                .orElse(OptionalDouble.empty())));
  }

  private record Kappas(WeightedCells values, double mixedMillis) {}

  private static Optional<Kappas> kappas(
      Bearing bearing, DutyCells cells, int from, int to, OilViscosity oil) {
    WeightedCells values = new WeightedCells(to - from);
    double mixedMillis = 0;
    try {
      for (int row = from; row < to; row++) {
        if (cells.running(row)) {
          double kappa = kappa(bearing, cells, row, cells.temperatureC(row), oil);
          values.add(
              kappa(bearing, cells, row, cells.highestC(row), oil),
              kappa,
              kappa(bearing, cells, row, cells.lowestC(row), oil),
              cells.readings(row),
              (double) cells.millis(row));
          if (kappa < LubricationRegime.FULL_FILM_FROM) {
            mixedMillis += cells.millis(row);
          }
        }
      }
    } catch (IllegalArgumentException outsideTheLaw) {
      return Optional.empty();
    }
    return Optional.of(new Kappas(values, mixedMillis));
  }

  /** κ of one cell at a logged temperature of it. */
  private static double kappa(
      Bearing bearing, DutyCells cells, int row, double loggedC, OilViscosity oil) {
    return ViscosityRatio.kappa(
        oil.viscosityCst(loggedC + bearing.temperatureOffsetC()),
        Iso281RatedViscosity.ratedViscosityCst(speedRpm(bearing, cells, row), bearing.pitchMm()));
  }

  private static double speedRpm(Bearing bearing, DutyCells cells, int row) {
    return cells.speedLogged(row) ? cells.speedRpm(row) : bearing.speedRpm();
  }

  private static OptionalDouble quantile(Optional<Kappas> kappas, double share) {
    return kappas.isPresent() ? kappas.get().values().quantile(share) : OptionalDouble.empty();
  }
}
