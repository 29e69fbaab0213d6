package org.kappatrail.review.correlation;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.kappatrail.statistics.CorrelationTest;

class CorrelationSentencesTest {

  @Test
  void aLaggedLinkSaysWhoFollowsWhomAndHowSureThatIs() {
    Link link = link("kappa", "iron_ppm", 1, -0.71, 14, 0.01, -0.66, 0.02);
    assertThat(CorrelationSentences.of(List.of(link)))
        .containsExactly("Iron follows κ by one sample (−0.71, N* 14, q 0.01).");
  }

  @Test
  void atANegativeLagTheOtherOneLeads() {
    Link link = link("kappa", "water_ppm", -2, -0.8, 20, 0.0004, -0.7, 0.001);
    assertThat(CorrelationSentences.sentence(link))
        .isEqualTo("κ follows water by two samples (−0.80, N* 20, q below 0.001).");
  }

  @Test
  void whatLosesHalfOfItsCoefficientWithTheDriftIsNotCalled() {
    Link link = link("viscosity_40c_cst", "water_ppm", 0, 0.6, 21.4, 0.03, 0.08, 0.7);
    assertThat(link.judgement()).isEqualTo(Judgement.DRIFT);
    assertThat(CorrelationSentences.sentence(link))
        .isEqualTo(
            "Water moves with viscosity at 40 °C (0.60, N* 21, q 0.03), but both drift with age"
                + " (detrended 0.08).");
  }

  @Test
  void whatIsTooWeakWithoutTheDriftIsSaidToBe() {
    Link weak = link("oil_hours", "copper_ppm", 0, 0.9, 8, 0.02, 0.6, 0.09);
    assertThat(CorrelationSentences.sentence(weak))
        .endsWith("but without the drift of both it could be chance (detrended 0.60, p 0.09).");
    Link turned = link("oil_hours", "copper_ppm", 0, 0.9, 8, 0.02, -0.8, 0.004);
    assertThat(turned.judgement()).isEqualTo(Judgement.DRIFT);
    assertThat(CorrelationSentences.sentence(turned))
        .endsWith("they go the other way (detrended −0.80, p 0.004).");
  }

  @Test
  void pluralsAndUnknownColumnsReadAsWords() {
    assertThat(
            CorrelationSentences.sentence(
                link("kappa", "particles_4um_per_ml", 1, -0.7, 20, 0.01, -0.7, 0.01)))
        .startsWith("Particles ≥ 4 µm follow κ by one sample");
    assertThat(
            CorrelationSentences.sentence(
                link("kappa", "sieve_residue", 0, -0.7, 20, 0.01, -0.7, 0.01)))
        .startsWith("Sieve residue moves against κ");
    assertThat(Names.withUnit("chromium_ppm")).isEqualTo("chromium, mg/kg");
  }

  @Test
  void theFleetSaysHowManyAssetsStandBehindIt() {
    PairCorrelation measured =
        new PairCorrelation(
            Scope.FLEET,
            Optional.empty(),
            "iron_ppm",
            "copper_ppm",
            0,
            Form.MEASURED,
            400,
            15,
            new CorrelationTest(0.74, 52, 1e-9, 0.6, 0.8),
            OptionalDouble.of(1e-6),
            false);
    assertThat(CorrelationSentences.of(Link.of(List.of(measured))))
        .containsExactly(
            "Copper moves with iron (0.74, 15 assets, N* 52, q below 0.001), but without the drift"
                + " of both nothing can be tested.");
  }

  @Test
  void oneSentenceStandsForAPairAtItsSurestLagAndThoseOfKappaComeFirst() {
    List<Link> links =
        List.of(
            link("water_ppm", "iron_ppm", 0, 0.9, 20, 0.001, 0.9, 0.001),
            link("kappa", "iron_ppm", 0, -0.6, 20, 0.04, -0.6, 0.01),
            link("kappa", "iron_ppm", 1, -0.7, 20, 0.02, -0.7, 0.01),
            link("kappa", "water_ppm", 0, -0.3, 20, 0.4, -0.3, 0.2));
    assertThat(CorrelationSentences.of(links))
        .satisfiesExactly(
            first -> assertThat(first).startsWith("Iron follows κ by one sample"),
            second -> assertThat(second).startsWith("Iron moves with water"));
  }

  @Test
  void pairsByConstructionAndPairsThatCouldBeChanceAreNeverSaid() {
    PairCorrelation tied =
        new PairCorrelation(
            Scope.ASSET,
            Optional.of("A"),
            "kappa",
            "temperature_c",
            0,
            Form.MEASURED,
            30,
            1,
            new CorrelationTest(-0.99, 30, 0, -1, -0.9),
            OptionalDouble.empty(),
            true);
    List<Link> links =
        List.of(
            new Link(tied, Optional.empty()),
            link("kappa", "water_ppm", 0, -0.6, 20, 0.051, -0.6, 0.01));
    assertThat(CorrelationSentences.of(links)).containsExactly("Nothing that could not be chance.");
    assertThat(CorrelationSentences.of(List.of()))
        .containsExactly(
            "Too few samples: a correlation takes at least 5 pairs of values that vary.");
  }

  private static Link link(
      String x,
      String y,
      int lag,
      double measured,
      double nEffective,
      double q,
      double detrended,
      double detrendedP) {
    return new Link(
        test(x, y, lag, Form.MEASURED, measured, nEffective, q / 10, q),
        Optional.of(
            test(x, y, lag, Form.DETRENDED, detrended, nEffective, detrendedP, detrendedP)));
  }

  private static PairCorrelation test(
      String x,
      String y,
      int lag,
      Form form,
      double coefficient,
      double nEffective,
      double p,
      double q) {
    return new PairCorrelation(
        Scope.ASSET,
        Optional.of("A"),
        x,
        y,
        lag,
        form,
        30,
        1,
        new CorrelationTest(coefficient, nEffective, p, -1, 1),
        OptionalDouble.of(q),
        false);
  }
}
