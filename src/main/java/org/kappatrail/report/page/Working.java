package org.kappatrail.report.page;

import java.util.ArrayList;
import java.util.List;
import org.kappatrail.history.Bearing;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Film;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.OperatingPoint;
import org.kappatrail.tribology.OilViscosity;

/** How κ of one sample was computed, line by line, with the numbers that went in. */
public final class Working {
  private Working() {}

  /**
   * One line of the working.
   *
   * @param quantity what it is
   * @param value its value with unit
   * @param from where it comes from
   */
  public record Line(String quantity, String value, String from) {}

  /** Lines for a sample that has a κ. */
  static List<Line> of(BearingReview review, KappaPoint point) {
    Bearing bearing = review.bearing();
    OilViscosity oil = point.viscosity().orElseThrow();
    Film film = point.film().orElseThrow();
    OperatingPoint at = point.point();
    List<Line> lines = new ArrayList<>();
    lines.add(
        new Line(
            "ν40",
            Numbers.significant(oil.viscosity40Cst(), 6) + " mm²/s",
            "measured, sample " + point.sample().id()));
    lines.add(
        new Line(
            "ν100", Numbers.significant(oil.viscosity100Cst(), 6) + " mm²/s", source(oil, point)));
    lines.add(
        new Line(
            "A, B",
            Numbers.significant(oil.law().a(), 6) + ", " + Numbers.significant(oil.law().b(), 6),
            "ASTM D341: log log (ν + 0.7) = A − B log T through both points"));
    lines.add(
        new Line(
            "T",
            Numbers.fixed(at.temperatureC(), 2) + " °C",
            at.temperatureSource() == OperatingPoint.TemperatureSource.LOG
                ? "median of "
                    + Numbers.fixed(at.windowHours(), 1)
                    + " running hours before the sample"
                    + offset(bearing)
                : "the laboratory's form" + offset(bearing)));
    lines.add(
        new Line(
            "n",
            Numbers.significant(at.speedRpm(), 5) + " r/min",
            at.speedSource() == OperatingPoint.SpeedSource.LOG
                ? "mean of the same hours"
                : "nominal, from the register"));
    lines.add(
        new Line("ν", Numbers.significant(film.operatingCst(), 5) + " mm²/s", "ASTM D341 at T"));
    lines.add(
        new Line(
            "Dpw",
            Numbers.significant(bearing.pitchMm(), 5) + " mm",
            "register: pitch diameter, or mean of bore and outside"));
    lines.add(
        new Line(
            "ν1",
            Numbers.significant(film.ratedCst(), 5) + " mm²/s",
            at.speedRpm() < 1000
                ? "ISO 281: 45000 n^−0.83 Dpw^−0.5, n below 1000"
                : "ISO 281: 4500 n^−0.5 Dpw^−0.5, n from 1000"));
    lines.add(new Line("κ", Numbers.significant(film.kappa(), 4), "ν / ν1"));
    lines.add(
        new Line(
            "σ(ln κ)",
            Numbers.significant(film.uncertainty().sigmaLn(), 3),
            "∂lnν/∂lnν40 "
                + Numbers.significant(film.sensitivityToV40(), 3)
                + " × σ(ln ν40) "
                + Numbers.significant(film.sigmaLnV40(), 3)
                + ", and ∂lnν/∂T "
                + Numbers.significant(film.sensitivityToTemperature(), 3).replace('-', '−')
                + " per °C × σ(T), added as squares"));
    lines.add(
        new Line(
            "95 % interval",
            Numbers.significant(film.uncertainty().low(), 3)
                + " to "
                + Numbers.significant(film.uncertainty().high(), 3),
            "κ · exp(±1.96 σ)"));
    lines.add(
        new Line(
            "P(κ < floor)",
            Numbers.significant(film.probabilityBelowFloor(), 3),
            "Φ((ln floor − ln κ)/σ), floor " + Numbers.significant(review.floor(), 3)));
    return lines;
  }

  private static String source(OilViscosity oil, KappaPoint point) {
    return switch (oil.source()) {
      case MEASURED -> "measured, sample " + point.sample().id();
      case INDEX ->
          "where ASTM D2270 gives the registered oil's viscosity index ("
              + point.charge().oil()
              + ")";
      case SLOPE -> "slope B of the registered oil kept (" + point.charge().oil() + ")";
    };
  }

  private static String offset(Bearing bearing) {
    return bearing.temperatureOffsetC() == 0
        ? ""
        : ", offset "
            + Numbers.significant(bearing.temperatureOffsetC(), 3).replace('-', '−')
            + " °C added";
  }
}
