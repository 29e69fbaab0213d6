package org.kappatrail.review.decision;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.kappatrail.review.trend.Direction;

/**
 * Cases worked by hand with ASTM D341, ISO 281:2007 (9.3.3) and ISO/TR 1281-2, by a calculation of
 * their own outside this program. For the bearing of {@link Cases}: ν1 = 45000 · 300^−0.83 ·
 * 150^−0.5 = 32.2966 mm²/s; Cu = 600/8.2 · (100/150)^0.5 = 59.7437 kN; L10h = 10⁶/(60 · 300) ·
 * (535/100)^(10/3) = 14 879.0 h. With half of L10mh used, the chance of failing within a year is 1
 * − S(0.5 + 8760/L10mh)/S(0.5).
 *
 * <table>
 *   <caption>By hand</caption>
 *   <tr><th>ν40, ν100</th><th>°C</th><th>κ</th><th>a_ISO</th><th>L10mh, h</th><th>fails</th></tr>
 *   <tr><td>150, 14.8</td><td>70</td><td>1.18024</td><td>1.046013</td><td>15563.6</td><td>0.078395</td></tr>
 *   <tr><td>148.8, 14.7</td><td>70</td><td>1.17150</td><td>1.041046</td><td>15489.7</td><td>0.078820</td></tr>
 *   <tr><td>132, 13.5</td><td>70</td><td>1.05998</td><td>0.976454</td><td>14528.6</td><td>0.084783</td></tr>
 *   <tr><td>120, 12.6</td><td>70</td><td>0.97810</td><td>0.905853</td><td>13478.2</td><td>0.092367</td></tr>
 *   <tr><td>100, 11.1</td><td>70</td><td>0.84170</td><td>0.701213</td><td>10433.3</td><td>0.123915</td></tr>
 *   <tr><td>150, 14.8</td><td>86</td><td>0.68445</td><td>0.492691</td><td>7330.7</td><td>0.185936</td></tr>
 *   <tr><td>320, 25.5</td><td>70</td><td>2.23160</td><td>1.572369</td><td>23395.3</td><td>0.049559</td></tr>
 * </table>
 */
class HandWorkedCasesTest {
  @Test
  void theFiguresAreTheOnesByHand() {
    Decision decision = new Cases().oil(100, 11.1, 101.0, 100.0).decide();
    Remedy stay = remedy(decision, RemedyKind.STAY);
    Outcome outcome = stay.outcome("B").orElseThrow();
    assertThat(outcome.kappa()).isCloseTo(0.84170, within(5e-6));
    assertThat(outcome.lifeModification().orElseThrow()).isCloseTo(0.701213, within(5e-7));
    assertThat(outcome.ratingLifeH().orElseThrow()).isCloseTo(10433.3, within(0.05));
    assertThat(stay.failureProbability().orElseThrow()).isCloseTo(0.123915, within(5e-7));
    Remedy fresh = remedy(decision, RemedyKind.FRESH_OIL);
    assertThat(fresh.failureProbability().orElseThrow()).isCloseTo(0.078395, within(5e-7));
    assertThat(fresh.worth().orElseThrow()).isCloseTo(0.123915 - 0.078395, within(1e-6));
    assertThat(fresh.breakEvenRatio().orElseThrow()).isCloseTo(1 / 0.045520, within(1e-3));
    assertThat(fresh.netSaving().orElseThrow()).isCloseTo(0.045520 * 50_000 - 500, within(0.05));
  }

  /** −0.7 % is within R = 0.0594 % · 150^0.722 = 2.21 %; worth 0.000425 · 50 000 = 21 < 500. */
  @Test
  void aDropWithinTheReproducibilityKeepsTheOil() {
    Decision decision = new Cases().oil(148.8, 14.7, 149.1, 148.8).decide();
    assertThat(decision.real().answer()).isEqualTo(Answer.NO);
    assertThat(decision.matters().answer()).isEqualTo(Answer.NO);
    assertThat(decision.verdict()).isEqualTo(Verdict.KEEP);
  }

  /** −20 % is real; worth 0.092367 − 0.078395 = 0.013972, times 30 000 = 419 < 500. */
  @Test
  void aRealDropThatDoesNotMatterKeepsTheOil() {
    Decision decision = new Cases().oil(120, 12.6, 121.0, 120.0).costs(500, 2000, 30_000).decide();
    assertThat(decision.real().answer()).isEqualTo(Answer.YES);
    assertThat(decision.matters().answer()).isEqualTo(Answer.NO);
    assertThat(decision.oilToBlame().answer()).isEqualTo(Answer.YES);
    assertThat(decision.verdict()).isEqualTo(Verdict.KEEP);
    assertThat(decision.reason()).contains("κ stands below the floor, yet no act on the oil pays");
  }

  /** −33 %: worth 0.045520 · 50 000 = 2276 > 500, and κ 0.84 is in the mixed regime. */
  @Test
  void aDropThatMattersAndFreshOilCuresIsChangedNow() {
    Decision decision = new Cases().oil(100, 11.1, 101.0, 100.0).decide();
    assertThat(decision.real().answer()).isEqualTo(Answer.YES);
    assertThat(decision.matters().answer()).isEqualTo(Answer.YES);
    assertThat(decision.oilToBlame().answer()).isEqualTo(Answer.YES);
    assertThat(decision.curable().answer()).isEqualTo(Answer.YES);
    assertThat(decision.urgent().answer()).isEqualTo(Answer.YES);
    assertThat(decision.verdict()).isEqualTo(Verdict.CHANGE_NOW);
  }

  /**
   * −12 %: worth 0.084783 − 0.078395 = 0.006388, times 100 000 = 639 > 500; κ 1.06 is full film.
   */
  @Test
  void aDropThatPaysButLeavesAFullFilmIsPlanned() {
    Cases made =
        new Cases().oil(132, 13.5, 133.0, 132.0).costs(500, 2000, 100_000).trend(Direction.FALLING);
    Decision decision = made.decide();
    assertThat(decision.urgent().answer()).isEqualTo(Answer.NO);
    assertThat(decision.verdict()).isEqualTo(Verdict.PLAN_CHANGE);
    Decision soon = made.crossing(Cases.sampled().plusDays(20)).decide();
    assertThat(soon.urgent().answer()).isEqualTo(Answer.YES);
    assertThat(soon.verdict()).isEqualTo(Verdict.CHANGE_NOW);
  }

  /** Cooling back: worth 0.185936 − 0.078395 = 0.107541, times 50 000 less 2000 = 3377. */
  @Test
  void whereHeatIsTheCauseTheHeatComesFirst() {
    Decision decision = new Cases().temperature(86, 70).decide();
    assertThat(decision.real().answer()).isEqualTo(Answer.NO);
    assertThat(decision.oilToBlame().answer()).isEqualTo(Answer.NO);
    assertThat(decision.curable().answer()).isEqualTo(Answer.NO);
    assertThat(decision.verdict()).isEqualTo(Verdict.FIX_CAUSE_FIRST);
    Remedy restored = remedy(decision, RemedyKind.RESTORE_TEMPERATURE);
    assertThat(restored.netSaving().orElseThrow())
        .isCloseTo(0.107541 * 50_000 - 2000, within(0.05));
    assertThat(decision.reason()).startsWith("the temperature is to blame");
  }

  /** As hot a year ago: the season, not a fault, so no temperature to go back to. */
  @Test
  void aSeasonIsNoFault() {
    Decision decision = new Cases().temperature(76, 66).yearAgo(75).decide();
    assertThat(Weights.find(decision.remedies(), RemedyKind.RESTORE_TEMPERATURE)).isEmpty();
  }

  /** Fresh oil at 86 °C has κ 0.684 too; ISO VG 320 there: more than 1, and pays. */
  @Test
  void aGradeThatWasWrongFromTheStartIsTheCause() {
    Decision decision =
        new Cases().temperature(86, 86).otherOil("mineral-320", 320, 320, 25.5).decide();
    assertThat(decision.oilToBlame().answer()).isEqualTo(Answer.NO);
    assertThat(decision.oilToBlame().why()).contains("the grade is to blame");
    assertThat(decision.verdict()).isEqualTo(Verdict.FIX_CAUSE_FIRST);
    assertThat(decision.reason()).contains("the grade is to blame").contains("320");
  }

  @Test
  void oneSampleOfTheChargeIsTooFewToActOn() {
    Decision decision = new Cases().oil(100, 11.1, 100.0).trend(Direction.UNKNOWN).decide();
    assertThat(decision.real().answer()).isEqualTo(Answer.UNKNOWN);
    assertThat(decision.real().why()).contains("draw another");
    assertThat(decision.verdict()).isEqualTo(Verdict.RESAMPLE);
  }

  @Test
  void oneOddSampleAgainstASteadyTrailIsDrawnAgain() {
    Decision decision = new Cases().oil(100, 11.1, 149.5, 100.0).decide();
    assertThat(decision.real().answer()).isEqualTo(Answer.NO);
    assertThat(decision.real().why()).contains("one odd sample");
    assertThat(decision.verdict()).isEqualTo(Verdict.RESAMPLE);
  }

  /**
   * By κ alone: ∂lnν/∂T is −0.0372 at 70 °C by D341, σ(ln ν40) = 2.21 %/2.77 and ∂lnν/∂lnν40 about
   * 0.85, so σ(ln κ) = hypot(0.85 · 0.0080, 0.0372 · 1.5) = 0.0562 and fresh oil's lower limit is
   * 1.180 · exp(−1.96 · 0.0562) = 1.057, clear of the floor of 1.
   */
  @Test
  void withoutLoadsKappaAloneDecides() {
    Decision low = new Cases().withoutLoads().oil(100, 11.1, 101.0, 100.0).decide();
    assertThat(low.matters().why()).startsWith("by κ alone");
    assertThat(low.curable().answer()).isEqualTo(Answer.YES);
    assertThat(low.verdict()).isEqualTo(Verdict.CHANGE_NOW);
    assertThat(remedy(low, RemedyKind.FRESH_OIL).worth()).isEmpty();
    Outcome fresh = remedy(low, RemedyKind.FRESH_OIL).outcome("B").orElseThrow();
    assertThat(fresh.kappaLow()).isCloseTo(1.057, within(0.001));
    Decision sound = new Cases().withoutLoads().decide();
    assertThat(sound.matters().answer()).isEqualTo(Answer.NO);
    assertThat(sound.verdict()).isEqualTo(Verdict.KEEP);
  }

  /** Thicker oil lifts κ: fresh oil would lower it, so it is worth nothing; the acid stands. */
  @Test
  void risingViscosityIsNoReasonButTheAcidStands() {
    Decision decision =
        new Cases()
            .oil(175, 16.4, 173.0, 175.0)
            .trend(Direction.RISING)
            .grounds("acid number 1.2 mg KOH/g has risen by 0.7, more than the site's limit 0.5")
            .decide();
    assertThat(decision.real().answer()).isEqualTo(Answer.YES);
    assertThat(decision.matters().answer()).isEqualTo(Answer.NO);
    assertThat(decision.oilToBlame().answer()).isEqualTo(Answer.NO);
    assertThat(decision.verdict()).isEqualTo(Verdict.KEEP);
    assertThat(decision.reason())
        .contains("viscosity gives no reason to change the oil")
        .contains("Something else may: acid number 1.2");
  }

  /** κ 0.30 with its upper limit below 0.4; fresh oil 0.42: outside the life model, so it pays. */
  @Test
  void aFilmTooThinForTheLifeModelIsLiftedWhateverTheCosts() {
    Decision decision =
        new Cases()
            .oil(100, 11.1, 101.0, 100.0)
            .speed(87)
            .load(10)
            .used(0)
            .costs(500, 2000, 1)
            .decide();
    Outcome stay = remedy(decision, RemedyKind.STAY).outcome("B").orElseThrow();
    Outcome fresh = remedy(decision, RemedyKind.FRESH_OIL).outcome("B").orElseThrow();
    assertThat(stay.kappaHigh()).isLessThan(0.4);
    assertThat(fresh.kappa()).isGreaterThan(0.4);
    assertThat(remedy(decision, RemedyKind.FRESH_OIL).pays()).isTrue();
    assertThat(decision.matters().answer()).isEqualTo(Answer.YES);
  }

  /** Palmgren–Miner over a duty of one point is that point's life. */
  @Test
  void aSteadyDutyHasTheLifeOfItsPoint() {
    AssetCase made = new Cases().build();
    BearingCase bearing = made.governing();
    BearingLife life = new BearingLife(bearing.bearing());
    double plain = life.ratingLifeH(bearing.kappa(), 300, bearing.cleanliness()).orElseThrow();
    double overDuty =
        life.ratingLifeH(Cases.FRESH, bearing.duty(), 0, bearing.cleanliness()).orElseThrow();
    assertThat(overDuty).isCloseTo(plain, within(1e-6));
    assertThat(plain).isCloseTo(15563.6, within(0.05));
  }

  /** The exact temperature: κ there is the floor. */
  @Test
  void theTargetTemperatureReachesTheFloor() {
    Decision decision = new Cases().temperature(86, 86).decide();
    Remedy target = remedy(decision, RemedyKind.TARGET_TEMPERATURE);
    assertThat(target.outcome("B").orElseThrow().kappa()).isCloseTo(1, within(1e-9));
  }

  private static Remedy remedy(Decision decision, RemedyKind kind) {
    return Weights.find(decision.remedies(), kind).orElseThrow();
  }
}
