package org.kappatrail.review.correlation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.kappatrail.review.correlation.CheckValues.asset;
import static org.kappatrail.review.correlation.CheckValues.find;
import static org.kappatrail.review.correlation.CheckValues.variable;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.kappatrail.statistics.CorrelationTest;

/** Two series that have nothing to do with each other, except that both drift. Seeded. */
class UnrelatedDriftTest {
  private static final int SAMPLES = 24;
  private static final double DRIFT_PER_SAMPLE = 0.25;

  @Test
  void driftMakesNaivePSmallButNoSentenceCallsIt() {
    CorrelationResults results = review(1);
    PairCorrelation measured = find(results.assets(), Names.KAPPA, "copper_ppm", 0, Form.MEASURED);
    double naive = CorrelationTest.of(measured.coefficient(), measured.n()).p();
    assertThat(naive).isLessThan(0.001);
    assertThat(find(results.assets(), Names.KAPPA, "copper_ppm", 0, Form.DETRENDED).p())
        .isGreaterThan(0.05);
    assertThat(Link.of(results.assets())).noneMatch(link -> link.judgement() == Judgement.CALLED);
    assertThat(CorrelationSentences.of(Link.of(results.assets())))
        .containsExactly(CorrelationSentences.NOTHING);
  }

  /** Of 300 such reviews the naive test would call all but a few; 5 % may be called by chance. */
  @Test
  void ofManySuchReviewsHardlyAnyCallsALink() {
    int naive = 0;
    int called = 0;
    for (int seed = 0; seed < 300; seed++) {
      CorrelationResults results = review(seed);
      PairCorrelation measured =
          find(results.assets(), Names.KAPPA, "copper_ppm", 0, Form.MEASURED);
      naive += CorrelationTest.of(measured.coefficient(), measured.n()).p() <= 0.05 ? 1 : 0;
      called +=
          Link.of(results.assets()).stream().anyMatch(link -> link.judgement() == Judgement.CALLED)
              ? 1
              : 0;
    }
    assertThat(naive).isGreaterThan(290);
    assertThat(called).isLessThanOrEqualTo(15);
  }

  private static CorrelationResults review(long seed) {
    Random random = new Random(seed);
    double[] falling = new double[SAMPLES];
    double[] rising = new double[SAMPLES];
    for (int i = 0; i < SAMPLES; i++) {
      falling[i] = -DRIFT_PER_SAMPLE * i + random.nextGaussian();
      rising[i] = DRIFT_PER_SAMPLE * i + random.nextGaussian();
    }
    return Correlations.of(
        List.of(asset("A", variable(Names.KAPPA, falling), variable("copper_ppm", rising))));
  }
}
