package org.kappatrail.report.page;

import java.util.ArrayList;
import java.util.List;
import org.kappatrail.history.Bearing;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Film;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.OperatingPoint;
import org.kappatrail.review.SinglePoint;
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

  /** What goes into the lines, with where each number comes from. */
  private record Inputs(
      OilViscosity oil,
      String v40From,
      String v100From,
      double temperatureC,
      String temperatureFrom,
      double speedRpm,
      String speedFrom,
      double pitchMm,
      String pitchFrom,
      Film film,
      double floor) {}

  /** Lines for a sample that has a κ. */
  public static List<Line> of(BearingReview review, KappaPoint point) {
    Bearing bearing = review.bearing();
    OilViscosity oil = point.viscosity().orElseThrow();
    OperatingPoint at = point.point();
    boolean logged = at.temperatureSource() == OperatingPoint.TemperatureSource.LOG;
    return lines(
        new Inputs(
            oil,
            "measured, sample " + point.sample().id(),
            source(oil, "sample " + point.sample().id(), point.charge().oil()),
            at.temperatureC().getAsDouble(),
            (logged
                    ? "median of " + Numbers.fixed(at.windowHours(), 1) + " running hours"
                    : "the laboratory's form")
                + offset(bearing),
            at.speedRpm(),
            at.speedSource() == OperatingPoint.SpeedSource.LOG
                ? "mean of the same hours"
                : "nominal, from the register",
            bearing.pitchMm(),
            "register: pitch diameter, or mean of bore and outside",
            point.film().orElseThrow(),
            review.floor()));
  }

  /** Lines for a point from bare numbers, with the usual floor of 1. */
  public static List<Line> of(SinglePoint point) {
    return lines(
        new Inputs(
            point.oil(),
            "given",
            point.oil().source() == OilViscosity.Source.MEASURED
                ? "given"
                : "where ASTM D2270 gives the viscosity index",
            point.temperatureC(),
            "given",
            point.speedRpm(),
            "given",
            point.pitchMm(),
            "given, or mean of bore and outside",
            point.film(),
            1));
  }

  private static List<Line> lines(Inputs in) {
    Film film = in.film();
    List<Line> lines = new ArrayList<>();
    lines.add(new Line("ν40", cst(in.oil().viscosity40Cst(), 6), in.v40From()));
    lines.add(new Line("ν100", cst(in.oil().viscosity100Cst(), 6), in.v100From()));
    lines.add(
        new Line(
            "A, B",
            Numbers.significant(in.oil().law().a(), 6)
                + ", "
                + Numbers.significant(in.oil().law().b(), 6),
            "ASTM D341: log log (ν + 0.7) = A − B log T through both points"));
    lines.add(new Line("T", Numbers.fixed(in.temperatureC(), 2) + " °C", in.temperatureFrom()));
    lines.add(new Line("n", Numbers.significant(in.speedRpm(), 5) + " r/min", in.speedFrom()));
    lines.add(new Line("ν", cst(film.operatingCst(), 5), "ASTM D341 at T"));
    lines.add(new Line("Dpw", Numbers.significant(in.pitchMm(), 5) + " mm", in.pitchFrom()));
    lines.add(
        new Line(
            "ν1",
            cst(film.ratedCst(), 5),
            in.speedRpm() < 1000
                ? "ISO 281: 45000 n^−0.83 Dpw^−0.5, n below 1000"
                : "ISO 281: 4500 n^−0.5 Dpw^−0.5, n from 1000"));
    lines.add(
        new Line(
            "κ",
            Numbers.significant(film.kappa(), 4),
            "ν / ν1; " + film.regime().label() + " regime"));
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
            "P(κ < " + Numbers.significant(in.floor(), 3) + ")",
            Numbers.probability(film.uncertainty().probabilityBelow(in.floor())),
            "Φ((ln floor − ln κ)/σ)"));
    return lines;
  }

  private static String cst(double value, int digits) {
    return Numbers.significant(value, digits) + " mm²/s";
  }

  private static String source(OilViscosity oil, String measuredBy, String registered) {
    return switch (oil.source()) {
      case MEASURED -> "measured, " + measuredBy;
      case INDEX ->
          "where ASTM D2270 gives the registered oil's viscosity index (" + registered + ")";
      case SLOPE -> "slope B of the registered oil kept (" + registered + ")";
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
