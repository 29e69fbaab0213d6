package org.kappatrail.demo;

import java.time.LocalDate;
import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import java.util.OptionalDouble;
import org.kappatrail.tribology.Iso281RatedViscosity;
import org.kappatrail.tribology.OilViscosity;
import org.kappatrail.tribology.ViscosityRatio;

/** κ of the sample history straight from its truth, without a laboratory between. */
final class KappaTruth {
  private static final int WINDOW_DAYS = 7;
  private static final double STANDSTILL_SHARE = 0.1;

  private final Map<String, HeatLog> logs = new HashMap<>();

  /**
   * A bearing's operating point over a week.
   *
   * @param temperatureC median of the readings at work, °C
   * @param speedRpm mean of the readings at work, r/min
   */
  record Point(double temperatureC, double speedRpm) {}

  /** κ with the oil that is in the machine on that day. */
  double kappa(String asset, String bearing, LocalDate day) {
    OilTruth truth = new OilTruth(Stories.of(asset), new Running(asset));
    return kappa(truth.at(day).viscosity(), asset, bearing, point(asset, bearing, day));
  }

  /** κ with a fresh oil of the register at the operating point of that day. */
  double kappaWithFresh(String oil, String asset, String bearing, LocalDate day) {
    return kappa(OilTruth.fresh(oil).viscosity(), asset, bearing, point(asset, bearing, day));
  }

  /** Operating point of the week that ends with that day, its readings at work. */
  Point point(String asset, String bearing, LocalDate day) {
    HeatLog log = log(asset, bearing);
    double nominal = Rows.number(HeatLog.registered(asset, bearing), "speed_rpm");
    int from = Timeline.hour(day.minusDays(WINDOW_DAYS - 1));
    int until = Timeline.hour(day.plusDays(1));
    double[] temperatures = new double[until - from];
    int count = 0;
    double speeds = 0;
    for (int hour = from; hour < until; hour++) {
      double speed = log.speedTenths[hour] / 10.0;
      if (log.logged[hour] && speed > STANDSTILL_SHARE * nominal) {
        temperatures[count++] = log.temperatureTenths[hour] / 10.0;
        speeds += speed;
      }
    }
    double[] sorted = Arrays.copyOf(temperatures, count);
    Arrays.sort(sorted);
    double median = (sorted[(count - 1) / 2] + sorted[count / 2]) / 2;
    return new Point(median, speeds / count);
  }

  private static double kappa(OilViscosity oil, String asset, String bearing, Point point) {
    Map<String, String> row = HeatLog.registered(asset, bearing);
    double offset = OilTruth.optional(row, "temperature_offset_c").orElse(0);
    OptionalDouble pitch = OilTruth.optional(row, "pitch_mm");
    double pitchMm =
        pitch.isPresent()
            ? pitch.getAsDouble()
            : Iso281RatedViscosity.pitchMm(
                Rows.number(row, "bore_mm"), Rows.number(row, "outside_mm"));
    return ViscosityRatio.kappa(
        oil.viscosityCst(point.temperatureC() + offset),
        Iso281RatedViscosity.ratedViscosityCst(point.speedRpm(), pitchMm));
  }

  private HeatLog log(String asset, String bearing) {
    return logs.computeIfAbsent(
        asset + "/" + bearing, key -> new HeatLog(Stories.of(asset), bearing, new Running(asset)));
  }
}
