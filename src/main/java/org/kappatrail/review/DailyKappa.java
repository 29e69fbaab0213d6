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

  private final Bearing bearing;
  private final DutyCells cells;
  private final WeightedCells temperatures = new WeightedCells(0);
  private final WeightedCells kappas = new WeightedCells(0);
  private double mixedMillis;

  private DailyKappa(Bearing bearing, DutyCells cells) {
    this.bearing = bearing;
    this.cells = cells;
  }

  /** Days with running hours, in time. */
  static List<DayKappa> of(Bearing bearing, DutyCells cells, OilTimeline oil) {
    DailyKappa daily = new DailyKappa(bearing, cells);
    List<DayKappa> days = new ArrayList<>();
    for (int row = 0; row < cells.size(); ) {
      int end = DayRows.endOfDay(cells, row);
      daily.day(row, end, oil.on(cells.epochDay(row))).ifPresent(days::add);
      row = end;
    }
    return days;
  }

  private Optional<DayKappa> day(int from, int to, Optional<OilViscosity> oil) {
    temperatures.clear();
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
        speedMillis += weight * speedRpm(row);
      }
    }
    if (millis == 0) {
      return Optional.empty();
    }
    boolean known = oil.isPresent() && findKappas(from, to, oil.get());
    return Optional.of(
        new DayKappa(
            LocalDate.ofEpochDay(cells.epochDay(from)),
            millis / MS_PER_HOUR,
            temperatures.median().getAsDouble() + bearing.temperatureOffsetC(),
            speedMillis / millis,
            known ? kappas.quantile(0.5) : OptionalDouble.empty(),
            known ? kappas.quantile(0.05) : OptionalDouble.empty(),
            known ? kappas.quantile(0.95) : OptionalDouble.empty(),
            known ? OptionalDouble.of(mixedMillis / MS_PER_HOUR) : OptionalDouble.empty()));
  }

  /** False where the oil's law does not hold for every cell. */
  private boolean findKappas(int from, int to, OilViscosity oil) {
    kappas.clear();
    mixedMillis = 0;
    try {
      for (int row = from; row < to; row++) {
        if (cells.running(row)) {
          addKappas(row, oil);
        }
      }
      return true;
    } catch (IllegalArgumentException outsideTheLaw) {
      return false;
    }
  }

  private void addKappas(int row, OilViscosity oil) {
    double ratedCst = Iso281RatedViscosity.ratedViscosityCst(speedRpm(row), bearing.pitchMm());
    double kappa = kappa(cells.temperatureC(row), oil, ratedCst);
    double millis = cells.millis(row);
    if (cells.lowestC(row) == cells.highestC(row)) {
      kappas.add(kappa, kappa, kappa, cells.readings(row), millis);
    } else {
      kappas.add(
          kappa(cells.highestC(row), oil, ratedCst),
          kappa,
          kappa(cells.lowestC(row), oil, ratedCst),
          cells.readings(row),
          millis);
    }
    if (kappa < LubricationRegime.FULL_FILM_FROM) {
      mixedMillis += millis;
    }
  }

  /** κ at a logged temperature. */
  private double kappa(double loggedC, OilViscosity oil, double ratedCst) {
    return ViscosityRatio.kappa(oil.viscosityCst(loggedC + bearing.temperatureOffsetC()), ratedCst);
  }

  private double speedRpm(int row) {
    return cells.speedLogged(row) ? cells.speedRpm(row) : bearing.speedRpm();
  }
}
