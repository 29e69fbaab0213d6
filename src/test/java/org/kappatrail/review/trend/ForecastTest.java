package org.kappatrail.review.trend;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.kappatrail.tribology.OilViscosity;

class ForecastTest {
  private static final LocalDate LAST = LocalDate.of(2026, 10, 1);
  private static final double PITCH_MM = 150;
  private static final OilViscosity OIL = OilViscosity.measured(150, 14.8);
  private static final FilmState NOW = new FilmState(OIL, 60, 300);

  /**
   * By hand: at the reference point itself the trail loses 0.01 a 30 days; from κ to a floor 5 %
   * lower in ln units takes 0.05/0.01 · 30 = 150 days.
   */
  @Test
  void theCrossingIsWhereTheSlopeReachesTheFloor() {
    Outlook outlook = forecast(falling(0.01), NOW.kappa(PITCH_MM) * Math.exp(-0.05), List.of());
    assertThat(outlook.atPresentPoint().likely()).contains(LAST.plusDays(150));
    assertThat(outlook.withLastYear()).isEmpty();
    assertThat(outlook.nextSample()).isEqualTo(LAST.plusDays(30));
    FanPoint end = outlook.fan().get(outlook.fan().size() - 1);
    double days = end.date().toEpochDay() - LAST.toEpochDay();
    assertThat(Math.log(end.likely() / NOW.kappa(PITCH_MM)))
        .isCloseTo(-0.01 * days / 30, within(1e-9));
  }

  @Test
  void aCrossingIsNeverBeforeTheLastSample() {
    Outlook outlook = forecast(falling(0.01), NOW.kappa(PITCH_MM) * 1.2, List.of());
    assertThat(outlook.atPresentPoint().earliest().orElse(LAST)).isEqualTo(LAST);
    assertThat(outlook.atPresentPoint().likely()).contains(LAST);
    assertThat(outlook.nextSample()).isEqualTo(LAST.plusDays(1));
  }

  @Test
  void theNextSampleIsHalfWayToTheEarliestCrossing() {
    Outlook outlook = forecast(falling(0.03), NOW.kappa(PITCH_MM) * Math.exp(-0.04), List.of());
    LocalDate earliest = outlook.atPresentPoint().first().orElseThrow();
    long half = (earliest.toEpochDay() - LAST.toEpochDay()) / 2;
    assertThat(half).isLessThan(30);
    assertThat(outlook.nextSample()).isEqualTo(LAST.plusDays(half));
  }

  @Test
  void aSteadyTrailForeseesNoCrossing() {
    Outlook outlook = forecast(falling(0), 0.5, List.of());
    assertThat(outlook.atPresentPoint()).isEqualTo(Crossing.NONE);
    assertThat(outlook.firstCrossing()).isEmpty();
  }

  @Test
  void aHotterSeasonToComeBringsTheCrossingForward() {
    double floor = NOW.kappa(PITCH_MM) * Math.exp(-0.2);
    Outlook outlook = forecast(falling(0.01), floor, seasons(8));
    LocalDate steady = outlook.atPresentPoint().likely().orElseThrow();
    LocalDate seasonal = outlook.withLastYear().orElseThrow().likely().orElseThrow();
    assertThat(seasonal).isBefore(steady).isAfter(LocalDate.of(2027, 4, 1));
  }

  @Test
  void theSeasonAloneMakesADipThatComesBack() {
    double floor = NOW.kappa(PITCH_MM) * Math.exp(-0.2);
    Outlook outlook = forecast(falling(0), floor, seasons(8));
    SeasonalDip dip = outlook.dip().orElseThrow();
    assertThat(dip.present()).isFalse();
    assertThat(dip.from()).isBetween(LocalDate.of(2027, 4, 1), LocalDate.of(2027, 7, 1));
    assertThat(dip.to()).isBetween(LocalDate.of(2027, 7, 2), LocalDate.of(2027, 9, 30));
    assertThat(dip.leastKappa()).isLessThan(floor);
  }

  @Test
  void noDipIsCalledWhereItIsHotterThanAYearAgo() {
    double floor = NOW.kappa(PITCH_MM) * Math.exp(-0.2);
    FilmState hot = NOW.at(70, 300);
    Forecast forecast =
        new Forecast(PITCH_MM, floor, LAST, hot, NOW, falling(0), OIL, seasons(8), 1.5);
    assertThat(forecast.outlook(120, 30).dip()).isEmpty();
  }

  @Test
  void aLogShorterThanAYearGivesNoSeasonalView() {
    List<DayPoint> half =
        seasons(8).stream().filter(day -> day.epochDay() > LAST.toEpochDay() - 200).toList();
    Outlook outlook = forecast(falling(0.01), 0.9, half);
    assertThat(outlook.withLastYear()).isEmpty();
    assertThat(outlook.yearAgoC()).isEmpty();
  }

  private static Outlook forecast(Drift drift, double floor, List<DayPoint> days) {
    return new Forecast(PITCH_MM, floor, LAST, NOW, NOW, drift, OIL, days, 1.5).outlook(120, 30);
  }

  /** Ten months that lose some ln κ every 30 days and end at the present oil. */
  private static Drift falling(double per30Days) {
    double[] days = new double[10];
    double[] values = new double[10];
    for (int i = 0; i < 10; i++) {
      days[i] = LAST.toEpochDay() - 30.0 * (9 - i);
      values[i] = NOW.lnKappa(PITCH_MM) + per30Days * (9 - i);
    }
    return Drift.of(days, values, 0.005);
  }

  /** Two years of days, warmest at the beginning of July; 60 °C at the beginning of October. */
  private static List<DayPoint> seasons(double amplitudeC) {
    List<DayPoint> days = new ArrayList<>();
    for (long day = LAST.toEpochDay() - 730; day <= LAST.toEpochDay(); day++) {
      double phase = 2 * Math.PI * (day - LAST.toEpochDay()) / 365;
      days.add(new DayPoint(day, 60 - amplitudeC * Math.sin(phase), 300));
    }
    return days;
  }
}
