package org.kappatrail.report.json;

import java.io.IOException;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.kappatrail.history.Charge;
import org.kappatrail.history.Measurement;
import org.kappatrail.history.Sample;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.Level;
import org.kappatrail.review.decision.FollowUp;
import org.kappatrail.review.decision.OilCause;
import org.kappatrail.review.trend.ViscosityChange;

/** One asset of the document. */
final class AssetJson {
  private final JsonOut json;
  private final AssetReview asset;

  AssetJson(JsonOut json, AssetReview asset) {
    this.json = json;
    this.asset = asset;
  }

  void write() throws IOException {
    json.text("asset", asset.asset().id())
        .text("name", asset.asset().name())
        .text("area", asset.asset().area())
        .text("oil", asset.oil().id())
        .text("level", asset.level().map(Level::label))
        .text("governing_bearing", asset.governing().map(found -> found.bearing().id()))
        .texts("story", asset.story())
        .object("decision", asset.decision(), decision -> new DecisionJson(json, decision).write())
        .objects("oil_causes", asset.oilCauses(), this::cause)
        .objects("follow_ups", asset.followUps(), this::followUp)
        .object("last_viscosity_change", asset.lastChange(), this::change)
        .objects("charges", asset.charges(), this::charge)
        .objects("samples", asset.samples(), this::sample)
        .objects("bearings", asset.bearings(), bearing -> new BearingJson(json, bearing).write())
        .objects("findings", asset.findings(), finding -> ReviewJson.finding(json, finding));
  }

  private void cause(OilCause cause) throws IOException {
    json.text("cause", cause.name())
        .texts("support", cause.support())
        .texts("objections", cause.objections())
        .whole("weight", cause.weight());
  }

  private void followUp(FollowUp done) throws IOException {
    json.text("date", done.date().toString())
        .text("act", done.act())
        .number("kappa_before", done.kappaBefore())
        .number("kappa_after", done.kappaAfter())
        .number("water_ppm_before", done.waterBefore())
        .number("water_ppm_after", done.waterAfter())
        .text("iso_4406_before", done.codeBefore())
        .text("iso_4406_after", done.codeAfter())
        .text("worked", done.worked().label())
        .text("sentence", done.sentence());
  }

  private void change(ViscosityChange change) throws IOException {
    json.text("from", change.from().toString())
        .text("to", change.to().toString())
        .number("from_cst", change.fromCst())
        .number("to_cst", change.toCst())
        .number("limit_cst", change.limitCst())
        .text("basis", change.basis())
        .flag("real", change.real());
  }

  private void charge(Charge charge) throws IOException {
    json.whole("charge", charge.number())
        .text("oil", charge.oil())
        .text("origin", charge.origin().name().toLowerCase(Locale.ROOT).replace('_', '-'))
        .text("start", ReviewJson.day(charge.start()))
        .text("end", ReviewJson.day(charge.end()));
  }

  private void sample(Sample sample) throws IOException {
    json.text("sample", sample.id())
        .text("sampled_at", sample.sampledAtText())
        .text("received_on", ReviewJson.day(sample.receivedOn()))
        .text("laboratory", sample.laboratory())
        .text("iso_4406", sample.cleanliness().map(Object::toString))
        .object("values", () -> values(sample.values()));
  }

  /** A number where the laboratory stated one, a text such as {@code <20} where it is censored. */
  private void values(Map<String, Measurement> values) throws IOException {
    List<Map.Entry<String, Measurement>> entries = List.copyOf(values.entrySet());
    for (Map.Entry<String, Measurement> entry : entries) {
      Measurement value = entry.getValue();
      if (value.censored()) {
        json.text(entry.getKey(), Censored.text(value));
      } else {
        json.number(entry.getKey(), value.stated());
      }
    }
  }
}
