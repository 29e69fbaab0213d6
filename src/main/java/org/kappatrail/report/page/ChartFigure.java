package org.kappatrail.report.page;

import java.util.Map;
import java.util.TreeMap;
import org.kappatrail.history.Sample;
import org.kappatrail.review.AssetReview;

/** An asset's chart, on which every sample can be pointed at and then shows its numbers. */
final class ChartFigure {
  private final AssetReview asset;
  private final Picture picture;
  private final String id;

  ChartFigure(AssetReview asset, Picture picture, String id) {
    this.asset = asset;
    this.picture = picture;
    this.id = id;
  }

  void write(Html html) {
    Map<String, Sample> samples = new TreeMap<>();
    asset.samples().forEach(sample -> samples.put(sample.id(), sample));
    new Figure(picture, id)
        .withChoices(
            html,
            "κ of "
                + asset.asset().id()
                + " against time, with viscosity, temperature and contamination; the numbers are in"
                + " the tables below",
            "samples of " + asset.asset().id() + " on the chart",
            i -> {
              Sample sample = samples.get(picture.spots().get(i).key());
              return sample == null ? "" : SampleLabel.of(sample, asset.governing());
            });
  }
}
