package org.kappatrail.review.decision;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.kappatrail.tribology.AstmD2270;

/** What must hold for every case, over seeded ones. */
class DecisionSweepTest {
  private static final int CASES = 400;

  @Test
  void moreViscosityLossNeverMakesTheVerdictMilder() {
    SplittableRandom random = new SplittableRandom(3);
    for (int i = 0; i < CASES; i++) {
      double temperature = random.nextDouble(55, 90);
      double start = temperature - (random.nextBoolean() ? 0 : random.nextDouble(0, 15));
      double load = random.nextDouble(40, 140);
      double used = random.nextDouble(0, 1.5);
      double failure = Math.exp(random.nextDouble(Math.log(3e3), Math.log(3e5)));
      Verdict before = Verdict.KEEP;
      for (double loss = 0; loss <= 0.5; loss += 0.02) {
        Verdict verdict =
            lost(loss)
                .temperature(temperature, start)
                .load(load)
                .used(used)
                .costs(500, 2000, failure)
                .decide()
                .verdict();
        assertThat(verdict).as("case %d at a loss of %.2f", i, loss).isGreaterThanOrEqualTo(before);
        before = verdict;
      }
    }
  }

  @Test
  void aHotterBearingNeverMakesFreshOilLookBetterThanItIs() {
    for (double loss : new double[] {0, 0.1, 0.3}) {
      double kappa = Double.POSITIVE_INFINITY;
      double low = Double.POSITIVE_INFINITY;
      double failing = 0;
      for (double temperature = 50; temperature <= 110; temperature += 2) {
        Remedy fresh = fresh(lost(loss).temperature(temperature, 50).decide());
        Outcome outcome = fresh.outcome("B").orElseThrow();
        assertThat(outcome.kappa()).isLessThan(kappa);
        assertThat(outcome.kappaLow()).isLessThan(low);
        assertThat(fresh.failureProbability().orElseThrow()).isGreaterThanOrEqualTo(failing);
        kappa = outcome.kappa();
        low = outcome.kappaLow();
        failing = fresh.failureProbability().orElseThrow();
      }
    }
  }

  @Test
  void aDearerActNeverRanksHigher() {
    SplittableRandom random = new SplittableRandom(4);
    for (int i = 0; i < CASES; i++) {
      double loss = random.nextDouble(0, 0.5);
      double temperature = random.nextDouble(55, 95);
      double failure = Math.exp(random.nextDouble(Math.log(3e3), Math.log(3e5)));
      int before = 0;
      for (double price : new double[] {0, 100, 500, 2000, 10_000}) {
        Decision decision =
            lost(loss).temperature(temperature, 60).costs(price, 1500, failure).decide();
        int rank = decision.remedies().indexOf(fresh(decision));
        assertThat(rank).isGreaterThanOrEqualTo(before);
        before = rank;
      }
    }
  }

  @Test
  void scalingAllCostsChangesNoRankingAndNoVerdict() {
    SplittableRandom random = new SplittableRandom(6);
    for (int i = 0; i < CASES; i++) {
      double loss = random.nextDouble(0, 0.5);
      double temperature = random.nextDouble(55, 95);
      double failure = Math.exp(random.nextDouble(Math.log(3e3), Math.log(3e5)));
      List<String> names = new ArrayList<>();
      Verdict verdict = Verdict.KEEP;
      for (double scale : new double[] {1, 0.125, 8}) {
        Decision decision =
            lost(loss)
                .temperature(temperature, 60)
                .costs(500 * scale, 1500 * scale, failure * scale)
                .decide();
        List<String> found = decision.remedies().stream().map(Remedy::name).toList();
        if (names.isEmpty()) {
          names.addAll(found);
          verdict = decision.verdict();
        }
        assertThat(found).isEqualTo(names);
        assertThat(decision.verdict()).isEqualTo(verdict);
      }
    }
  }

  /** An oil that lost a share of its viscosity at the same index, in both last samples. */
  private static Cases lost(double share) {
    double v40 = 150 * (1 - share);
    double index = AstmD2270.viscosityIndex(150, 14.8);
    return new Cases().oil(v40, AstmD2270.viscosity100Cst(v40, index).orElseThrow(), v40, v40);
  }

  private static Remedy fresh(Decision decision) {
    return Weights.find(decision.remedies(), RemedyKind.FRESH_OIL).orElseThrow();
  }
}
