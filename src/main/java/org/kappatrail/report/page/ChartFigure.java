package org.kappatrail.report.page;

import java.nio.charset.StandardCharsets;
import java.util.Base64;
import java.util.Locale;
import java.util.Optional;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.report.chart.AssetChart;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.KappaPoint;

/**
 * An asset's chart with a strip over every sample that can be pointed at, tapped or reached by
 * keyboard, and then shows the sample's numbers.
 */
final class ChartFigure {
  private final AssetReview asset;
  private final String picture;

  ChartFigure(AssetReview asset, String picture) {
    this.asset = asset;
    this.picture = picture;
  }

  void write(Html html) {
    if (picture.isEmpty()) {
      return;
    }
    String data = Base64.getEncoder().encodeToString(picture.getBytes(StandardCharsets.UTF_8));
    html.raw("<figure class=\"chart\"><img loading=\"lazy\" width=\"1180\" alt=\"")
        .text(
            "κ of "
                + asset.asset().id()
                + " against time, with viscosity, temperature and"
                + " contamination; the numbers are in the tables below")
        .raw("\" src=\"data:image/svg+xml;base64,")
        .raw(data)
        .raw("\">");
    AssetChart.places(asset).ifPresent(place -> spots(html, place));
    html.raw("</figure>\n");
  }

  private void spots(Html html, AssetChart.DayPlace place) {
    Optional<BearingReview> shown = asset.governing();
    html.raw("<div class=\"spots\" role=\"group\" aria-label=\"samples\">");
    for (Sample sample : asset.samples()) {
      double share = place.share(sample.day());
      html.raw("<button type=\"button\" class=\"spot")
          .raw(share > 0.7 ? " left" : "")
          .raw(
              "\" style=\"left:"
                  + String.format(Locale.ROOT, "%.3f", share * 100)
                  + "%\" data-tip=\"")
          .text(tip(sample, shown))
          .raw("\" aria-label=\"")
          .text(tip(sample, shown).replace('\n', ','))
          .raw("\"></button>");
    }
    html.raw("</div>");
  }

  private static String tip(Sample sample, Optional<BearingReview> shown) {
    StringBuilder text = new StringBuilder(sample.id() + ", " + sample.sampledAtText());
    Optional<KappaPoint> point =
        shown.flatMap(
            bearing ->
                bearing.trail().stream()
                    .filter(item -> item.sample().id().equals(sample.id()))
                    .findFirst());
    point
        .flatMap(KappaPoint::film)
        .ifPresent(
            film ->
                text.append("\nκ ")
                    .append(Numbers.significant(film.kappa(), 3))
                    .append(" (")
                    .append(FleetTable.interval(film))
                    .append("), ")
                    .append(film.level().label()));
    add(text, "ν40", Measured.text(sample, SampleColumns.VISCOSITY_40C, 4), "mm²/s");
    point.ifPresent(known -> add(text, "T", Numbers.fixed(known.point().temperatureC(), 1), "°C"));
    add(text, "water", Measured.text(sample, SampleColumns.WATER, 3), "mg/kg");
    add(text, "code", sample.cleanliness().map(Object::toString).orElse(""), "");
    add(text, "iron", Measured.text(sample, SampleColumns.IRON, 3), "mg/kg");
    return text.toString();
  }

  private static void add(StringBuilder text, String what, String value, String unit) {
    if (!value.isEmpty()) {
      text.append('\n').append(what).append(' ').append(value);
      if (!unit.isEmpty()) {
        text.append(' ').append(unit);
      }
    }
  }
}
