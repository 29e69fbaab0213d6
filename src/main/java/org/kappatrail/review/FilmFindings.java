package org.kappatrail.review;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.kappatrail.tribology.ViscosityRatio;

/** Findings about where κ stands, and about samples that give none. */
final class FilmFindings {
  private FilmFindings() {}

  static List<Finding> of(BearingReview review) {
    List<Finding> findings = new ArrayList<>();
    review.latestFilm().ifPresent(point -> latest(review, point, findings));
    missing(review, findings);
    return findings;
  }

  private static void latest(BearingReview review, KappaPoint point, List<Finding> findings) {
    Film film = point.film().orElseThrow();
    String where =
        Say.text(
            "κ %s (%s to %s) on %s at %s °C and %s r/min",
            Say.kappa(film.kappa()),
            Say.kappa(film.uncertainty().low()),
            Say.kappa(film.uncertainty().high()),
            point.sample().day(),
            Say.oneDecimal(point.point().temperatureC().getAsDouble()),
            Say.whole(point.point().speedRpm()));
    String floor = Say.kappa(review.floor());
    String chance = Say.whole(film.probabilityBelowFloor() * 100);
    if (film.level() == Level.ALARM) {
      findings.add(
          finding(
              review,
              point,
              Level.ALARM,
              FindingKind.BELOW_FLOOR,
              where
                  + " lies below the floor "
                  + floor
                  + " ("
                  + film.regime().label()
                  + " regime)"));
    } else if (film.level() == Level.ALERT) {
      findings.add(
          finding(
              review,
              point,
              Level.ALERT,
              FindingKind.NEAR_FLOOR,
              where + " reaches below the floor " + floor + "; probability " + chance + " %"));
    }
    if (film.kappa() > ViscosityRatio.HIGHEST_FOR_LIFE) {
      findings.add(
          finding(
              review,
              point,
              Level.CLEAR,
              FindingKind.ABOVE_FOUR,
              where + " is above 4: more viscosity buys no more life and costs friction and heat"));
    }
    if (film.extrapolated()) {
      findings.add(
          finding(
              review,
              point,
              Level.CLEAR,
              FindingKind.EXTRAPOLATED,
              where + ": viscosity outside 10 to 130 °C is extrapolated"));
    }
  }

  private static void missing(BearingReview review, List<Finding> findings) {
    List<KappaPoint> without =
        review.trail().stream().filter(point -> point.point().temperatureC().isEmpty()).toList();
    if (without.size() == review.trail().size() && without.size() > 1) {
      findings.add(
          new Finding(
              review.bearing().asset(),
              Optional.of(review.bearing().id()),
              Optional.empty(),
              Level.ALERT,
              FindingKind.NO_TEMPERATURE,
              "no κ for any of its "
                  + without.size()
                  + " samples: no running reading in the days before them, and no temperature on"
                  + " the laboratory's forms"));
      return;
    }
    for (KappaPoint point : without) {
      findings.add(
          finding(
              review,
              point,
              Level.ALERT,
              FindingKind.NO_TEMPERATURE,
              "no κ on "
                  + point.sample().day()
                  + ": no running reading in the days before it, and no temperature on the"
                  + " laboratory's form"));
    }
    review.trail().stream()
        .filter(
            point ->
                point.viscosity().isPresent()
                    && point.point().temperatureC().isPresent()
                    && point.film().isEmpty())
        .forEach(
            point ->
                findings.add(
                    finding(
                        review,
                        point,
                        Level.ALERT,
                        FindingKind.NO_VISCOSITY,
                        "no κ on "
                            + point.sample().day()
                            + ": viscosity at "
                            + Say.oneDecimal(point.point().temperatureC().getAsDouble())
                            + " °C falls outside ASTM D341, or the bearing stood still")));
  }

  private static Finding finding(
      BearingReview review, KappaPoint point, Level level, FindingKind kind, String message) {
    return new Finding(
        review.bearing().asset(),
        Optional.of(review.bearing().id()),
        Optional.of(point.sample().id()),
        level,
        kind,
        message);
  }
}
