package org.kappatrail.review.correlation;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Both forms of one pair at one lag.
 *
 * @param measured the values as they are
 * @param detrended without each one's drift; empty where that could not be tested
 */
public record Link(PairCorrelation measured, Optional<PairCorrelation> detrended) {
  /** Greatest q of what is called, and greatest p of the detrended form that bears it out. */
  public static final double LIMIT = 0.05;

  /** The least likely to be chance first; of equals the larger one, then the nearer lag. */
  public static final Comparator<Link> SUREST =
      Comparator.comparingDouble((Link link) -> link.measured.p())
          .thenComparingDouble(link -> -Math.abs(link.measured.coefficient()))
          .thenComparingInt(link -> Math.abs(link.measured.lag()))
          .thenComparingInt(link -> link.measured.lag());

  public Link {
    if (measured.form() != Form.MEASURED
        || detrended.filter(form -> form.form() != Form.DETRENDED).isPresent()) {
      throw new IllegalArgumentException("forms of a link are mixed up");
    }
  }

  private record Key(String x, String y, int lag) {}

  private record Pair(String x, String y) {}

  /** The links of one asset's tests, or of the fleet's, in their order. */
  public static List<Link> of(List<PairCorrelation> tests) {
    Map<Key, PairCorrelation> detrended = new LinkedHashMap<>();
    for (PairCorrelation test : tests) {
      if (test.form() == Form.DETRENDED) {
        detrended.put(key(test), test);
      }
    }
    return tests.stream()
        .filter(test -> test.form() == Form.MEASURED)
        .map(test -> new Link(test, Optional.ofNullable(detrended.get(key(test)))))
        .toList();
  }

  /** The surest link of every pair, a called one before any other, in the order of the pairs. */
  public static List<Link> surestOfPairs(List<Link> links) {
    Map<Pair, Link> best = new LinkedHashMap<>();
    Comparator<Link> order = Comparator.comparing(Link::judgement).thenComparing(SUREST);
    for (Link link : links) {
      Pair pair = new Pair(link.measured.x(), link.measured.y());
      best.merge(pair, link, (a, b) -> order.compare(a, b) <= 0 ? a : b);
    }
    return new ArrayList<>(best.values());
  }

  /** What it comes to. */
  public Judgement judgement() {
    if (measured.byConstruction()) {
      return Judgement.BY_CONSTRUCTION;
    }
    if (!(measured.q().orElse(1) <= LIMIT)) {
      return Judgement.CHANCE;
    }
    return detrended.filter(this::bearsOut).isPresent() ? Judgement.CALLED : Judgement.DRIFT;
  }

  private boolean bearsOut(PairCorrelation other) {
    return other.p() <= LIMIT && other.coefficient() * measured.coefficient() > 0;
  }

  private static Key key(PairCorrelation test) {
    return new Key(test.x(), test.y(), test.lag());
  }
}
