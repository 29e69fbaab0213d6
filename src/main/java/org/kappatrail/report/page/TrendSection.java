package org.kappatrail.report.page;

import java.time.Month;
import java.time.YearMonth;
import java.time.format.TextStyle;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.KappaPoint;
import org.kappatrail.review.Moved;
import org.kappatrail.review.trend.Attribution;
import org.kappatrail.review.trend.ChargeDrift;
import org.kappatrail.review.trend.Crossing;
import org.kappatrail.review.trend.Drift;
import org.kappatrail.review.trend.Outlook;
import org.kappatrail.review.trend.SampleAttribution;
import org.kappatrail.review.trend.SeasonMonth;
import org.kappatrail.review.trend.ViscosityChange;

/** What moved κ of one bearing, how it drifts, where it leads, and the season. */
final class TrendSection {
  private final BearingReview bearing;
  private final KappaPoint latest;

  private TrendSection(BearingReview bearing, KappaPoint latest) {
    this.bearing = bearing;
    this.latest = latest;
  }

  static void write(Html html, BearingReview bearing) {
    bearing.latestFilm().ifPresent(latest -> new TrendSection(bearing, latest).write(html));
  }

  /** Whether the last change of viscosity is real, in words. */
  static void lastChange(Html html, AssetReview asset) {
    asset
        .lastChange()
        .ifPresent(
            change ->
                html.element("p", "Last change of viscosity at 40 °C: " + words(change) + "."));
  }

  private static String words(ViscosityChange change) {
    return Numbers.significant(change.fromCst(), 4)
        + " to "
        + Numbers.significant(change.toCst(), 4)
        + " mm²/s from "
        + change.from()
        + " to "
        + change.to()
        + ", "
        + (change.real() ? "more than" : "within")
        + " the ± "
        + Numbers.significant(change.limitCst(), 2)
        + " mm²/s that measuring alone may make ("
        + change.basis()
        + "): "
        + (change.real() ? "real" : "not shown to be real");
  }

  private void write(Html html) {
    html.raw("<ul class=\"moved\">\n");
    bearing
        .previousFilm()
        .ifPresent(before -> moved(html, "since the sample before", before.sample().id()));
    moved(html, "since the charge's first sample", SampleAttribution.CHARGE_START);
    moved(
        html, "since fresh oil at the charge's first operating point", SampleAttribution.FRESH_OIL);
    html.raw("</ul>\n");
    drift(html);
    outlook(html);
    season(html);
  }

  private void moved(Html html, String since, String from) {
    Optional<Attribution> parts = bearing.trend().attribution(latest.sample().id(), from);
    parts.ifPresent(found -> html.element("li", Moved.words(found) + " (" + since + ")").raw("\n"));
  }

  private void drift(Html html) {
    Optional<ChargeDrift> drift = bearing.trend().drift(latest.charge().number());
    if (drift.isEmpty()) {
      return;
    }
    html.raw(
            "<div class=\"scroll\"><table class=\"narrow\" data-name=\"drift\">\n<thead><tr><th>trail of charge ")
        .text(Integer.toString(latest.charge().number()))
        .raw("</th><th class=\"n\">samples</th><th class=\"n\">slope, % in 30 days</th>")
        .raw("<th class=\"n\">95 % limits</th><th class=\"n\">Mann–Kendall S</th>")
        .raw(
            "<th class=\"n\">p</th><th>direction</th><th>cumulative sum</th></tr></thead>\n<tbody>\n");
    row(html, "κ as achieved", drift.get().achieved(), "");
    row(
        html,
        "κ at reference conditions",
        drift.get().reference(),
        drift.get().oilShift().map(shift -> "signals on " + shift.day()).orElse("no signal"));
    html.raw("</tbody></table></div>\n");
  }

  private static void row(Html html, String trail, Drift drift, String sum) {
    OptionalDouble low = drift.slopeLowPer30Days();
    OptionalDouble high = drift.slopeHighPer30Days();
    html.raw("<tr>")
        .element("td", trail)
        .element("td class=\"n\"", Integer.toString(drift.samples()))
        .element("td class=\"n\"", percent(drift.slopePer30Days()))
        .element(
            "td class=\"n\"",
            low.isPresent() && high.isPresent() ? percent(low) + " to " + percent(high) : "")
        .element(
            "td class=\"n\"",
            drift.score().isPresent()
                ? Long.toString(drift.score().getAsLong()).replace('-', '−')
                : "")
        .element("td class=\"n\"", Numbers.significant(drift.p(), 2))
        .element("td", drift.direction().label())
        .element("td", sum)
        .raw("</tr>\n");
  }

  private static String percent(OptionalDouble slope) {
    if (slope.isEmpty()) {
      return "";
    }
    double value = Math.expm1(slope.getAsDouble()) * 100;
    String text = Numbers.fixed(Math.abs(value), 2);
    return text.equals("0.00") ? text : (value < 0 ? "−" : "+") + text;
  }

  private void outlook(Html html) {
    Optional<Outlook> found = bearing.trend().outlook();
    if (found.isEmpty()) {
      return;
    }
    Outlook outlook = found.get();
    StringBuilder text =
        new StringBuilder(
            "Outlook: at the present operating point " + dates(outlook.atPresentPoint()));
    outlook
        .withLastYear()
        .ifPresentOrElse(
            crossing -> text.append("; with last year's temperatures ").append(dates(crossing)),
            () -> text.append("; the log is too short for a seasonal view"));
    outlook
        .dip()
        .ifPresent(
            dip ->
                text.append(
                    "; the season takes κ below the floor from "
                        + dip.from()
                        + " to "
                        + dip.to()
                        + " (least "
                        + Numbers.significant(dip.leastKappa(), 3)
                        + ")"));
    html.element("p", text + ". Next sample by " + outlook.nextSample() + ".");
  }

  private static String dates(Crossing crossing) {
    if (crossing.first().isEmpty()) {
      return "no crossing of the floor is foreseen";
    }
    return "κ reaches the floor on "
        + crossing.likely().map(Object::toString).orElse("no day within ten years")
        + " (earliest "
        + crossing.earliest().map(Object::toString).orElse("unknown")
        + ", latest "
        + crossing.latest().map(Object::toString).orElse("never by this slope")
        + ")";
  }

  private void season(Html html) {
    Month month = latest.sample().day().getMonth();
    List<SeasonMonth> same =
        bearing.trend().season().stream()
            .filter(item -> item.month().getMonth() == month)
            .filter(item -> !item.month().isAfter(YearMonth.from(latest.sample().day())))
            .toList();
    if (same.size() < 2) {
      return;
    }
    html.raw("<div class=\"scroll\"><table class=\"narrow\" data-name=\"season\">\n<thead><tr><th>")
        .text(month.getDisplayName(TextStyle.FULL, Locale.ENGLISH) + " of")
        .raw("</th><th class=\"n\">running days</th><th class=\"n\">median T, °C</th>")
        .raw("<th class=\"n\">median κ</th><th class=\"n\">κ of the present oil there</th>")
        .raw("</tr></thead>\n<tbody>\n");
    for (SeasonMonth item : same) {
      html.raw("<tr>")
          .element("td", Integer.toString(item.month().getYear()))
          .element("td class=\"n\"", Integer.toString(item.days()))
          .element("td class=\"n\"", Numbers.fixed(item.temperatureC(), 1))
          .element("td class=\"n\"", Numbers.significant(item.kappa(), 3))
          .element("td class=\"n\"", Numbers.significant(item.kappaWithPresentOil(), 3))
          .raw("</tr>\n");
    }
    html.raw("</tbody></table></div>\n");
  }
}
