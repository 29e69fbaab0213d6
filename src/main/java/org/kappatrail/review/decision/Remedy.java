package org.kappatrail.review.decision;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * An act, weighed.
 *
 * @param kind its kind
 * @param name in words, with the oil, grade or temperature it means
 * @param outcomes what it does to each bearing, in the order of the register
 * @param failureProbability probability that any bearing of the asset fails within the horizon;
 *     empty where a load is missing
 * @param worth failure probability of staying less that of the act
 * @param price price of the act
 * @param netSaving worth times failure cost, less the price; empty without the costs
 * @param breakEvenRatio how many times the act's price a failure must cost for the act to pay
 * @param pays whether it does, by the site's costs or ratio, or by κ alone
 */
public record Remedy(
    RemedyKind kind,
    String name,
    List<Outcome> outcomes,
    OptionalDouble failureProbability,
    OptionalDouble worth,
    OptionalDouble price,
    OptionalDouble netSaving,
    OptionalDouble breakEvenRatio,
    boolean pays) {
  public Remedy {
    outcomes = List.copyOf(outcomes);
  }

  /** What it does to a bearing. */
  public Optional<Outcome> outcome(String bearing) {
    return outcomes.stream().filter(item -> item.bearing().equals(bearing)).findFirst();
  }
}
