package org.kappatrail.review.trend;

import java.util.List;
import java.util.Optional;

/**
 * What the trail of one bearing says.
 *
 * @param attributions what moved κ, sample by sample
 * @param drifts drift by charge, in time
 * @param outlook where the present charge leads; empty where no κ is known
 * @param season months of the log, in time
 */
public record Trend(
    List<SampleAttribution> attributions,
    List<ChargeDrift> drifts,
    Optional<Outlook> outlook,
    List<SeasonMonth> season) {
  public Trend {
    attributions = List.copyOf(attributions);
    drifts = List.copyOf(drifts);
    season = List.copyOf(season);
  }

  /** What moved κ up to a sample from somewhere. */
  public Optional<Attribution> attribution(String sample, String from) {
    return attributions.stream()
        .filter(item -> item.sample().equals(sample) && item.from().equals(from))
        .map(SampleAttribution::parts)
        .findFirst();
  }

  /** Drift over a charge. */
  public Optional<ChargeDrift> drift(int charge) {
    return drifts.stream().filter(item -> item.charge() == charge).findFirst();
  }
}
