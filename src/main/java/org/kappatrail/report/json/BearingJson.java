package org.kappatrail.report.json;

import java.io.IOException;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.Film;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.trend.ChargeDrift;
import org.kappatrail.review.trend.Crossing;
import org.kappatrail.review.trend.Drift;
import org.kappatrail.review.trend.OilShift;
import org.kappatrail.review.trend.Outlook;
import org.kappatrail.review.trend.SampleAttribution;
import org.kappatrail.review.trend.SeasonalDip;
import org.kappatrail.tribology.ContaminationFactor;
import org.kappatrail.tribology.OilViscosity;

/** One bearing of the document. */
final class BearingJson {
  private final JsonOut json;
  private final BearingReview bearing;

  BearingJson(JsonOut json, BearingReview bearing) {
    this.json = json;
    this.bearing = bearing;
  }

  void write() throws IOException {
    json.text("bearing", bearing.bearing().id())
        .number("pitch_mm", bearing.bearing().pitchMm())
        .number("nominal_speed_rpm", bearing.bearing().speedRpm())
        .number("floor", bearing.floor())
        .object(
            "reference",
            bearing.reference(),
            reference ->
                json.number("temperature_c", reference.temperatureC())
                    .number("speed_rpm", reference.speedRpm()))
        .objects("trail", bearing.trail(), this::point)
        .objects("attributions", bearing.trend().attributions(), this::attribution)
        .objects("drift", bearing.trend().drifts(), this::drift)
        .object("outlook", bearing.trend().outlook(), this::outlook);
  }

  private void point(KappaPoint point) throws IOException {
    Optional<Film> film = point.film();
    json.text("sample", point.sample().id())
        .text("sampled_at", point.sample().sampledAtText())
        .whole("charge", point.charge().number())
        .number("viscosity_40c_cst", oil(point, OilViscosity::viscosity40Cst))
        .number("viscosity_100c_cst", oil(point, OilViscosity::viscosity100Cst))
        .text("viscosity_100c_source", point.viscosity().map(found -> found.source().label()))
        .number("temperature_c", point.point().temperatureC())
        .text("temperature_source", point.point().temperatureSource().label())
        .number("speed_rpm", point.point().speedRpm())
        .text("speed_source", point.point().speedSource().label())
        .number("operating_viscosity_cst", of(film, Film::operatingCst))
        .number("rated_viscosity_cst", of(film, Film::ratedCst))
        .number("kappa", of(film, Film::kappa))
        .number("kappa_low", of(film, known -> known.uncertainty().low()))
        .number("kappa_high", of(film, known -> known.uncertainty().high()))
        .number("probability_below_floor", of(film, Film::probabilityBelowFloor))
        .number("kappa_reference", point.kappaReference())
        .text("regime", film.map(known -> known.regime().label()))
        .text("level", film.map(known -> known.level().label()))
        .number("running_hours", point.runningHours())
        .number("mixed_hours", point.mixedHours())
        .number(
            "contamination_factor", of(point.life().contamination(), ContaminationFactor::value))
        .number("life_modification", point.life().lifeModification())
        .number("rating_life_h", point.life().ratingLifeH())
        .number("water_life_factor", point.life().waterLifeFactor());
  }

  private void attribution(SampleAttribution item) throws IOException {
    json.text("sample", item.sample())
        .text("from", item.from())
        .number("oil", item.parts().oil())
        .number("temperature", item.parts().temperature())
        .number("speed", item.parts().speed())
        .number("total", item.parts().total());
  }

  private void drift(ChargeDrift drift) throws IOException {
    json.whole("charge", drift.charge())
        .object("achieved", () -> trail(drift.achieved()))
        .object("reference", () -> trail(drift.reference()))
        .text("cusum_signal", ReviewJson.day(drift.oilShift().map(OilShift::day)));
  }

  private void trail(Drift drift) throws IOException {
    json.whole("samples", drift.samples())
        .number("slope_per_30d", drift.slopePer30Days())
        .number("slope_low", drift.slopeLowPer30Days())
        .number("slope_high", drift.slopeHighPer30Days())
        .whole("mann_kendall_s", drift.score())
        .number("p", drift.p())
        .text("direction", drift.direction().label());
  }

  private void outlook(Outlook outlook) throws IOException {
    json.text("next_sample", outlook.nextSample().toString())
        .object("at_present_point", () -> crossing(outlook.atPresentPoint()))
        .object("with_last_year", outlook.withLastYear(), this::crossing)
        .object("seasonal_dip", outlook.dip(), this::dip)
        .number("temperature_a_year_ago_c", outlook.yearAgoC())
        .objects(
            "fan",
            outlook.fan(),
            point ->
                json.text("date", point.date().toString())
                    .number("kappa_low", point.low())
                    .number("kappa", point.likely())
                    .number("kappa_high", point.high()));
  }

  private void crossing(Crossing crossing) throws IOException {
    json.text("earliest", ReviewJson.day(crossing.earliest()))
        .text("likely", ReviewJson.day(crossing.likely()))
        .text("latest", ReviewJson.day(crossing.latest()));
  }

  private void dip(SeasonalDip dip) throws IOException {
    json.text("from", dip.from().toString())
        .text("to", dip.to().toString())
        .number("least_kappa", dip.leastKappa())
        .flag("present", dip.present());
  }

  private static OptionalDouble oil(KappaPoint point, ToDoubleFunction<OilViscosity> quantity) {
    return of(point.viscosity(), quantity);
  }

  private static <T> OptionalDouble of(Optional<T> item, ToDoubleFunction<T> quantity) {
    return item.isPresent()
        ? OptionalDouble.of(quantity.applyAsDouble(item.get()))
        : OptionalDouble.empty();
  }
}
