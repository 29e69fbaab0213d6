package org.kappatrail.review;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.kappatrail.history.Oil;
import org.kappatrail.review.decision.Answer;
import org.kappatrail.review.decision.FollowUp;
import org.kappatrail.review.decision.OilCause;
import org.kappatrail.tribology.OilViscosity;

/**
 * Blends by the one-temperature rule of ASTM D7152, worked by hand: W = log log(ν + 0.7) is 0.33808
 * for 150, 0.22302 for 46.2 and −0.29658 for 2.5 mm²/s; a quarter of the thinner oil gives W
 * 0.30932 and 108.6 mm²/s, a tenth of the thin diluent W 0.27461 and 75.5 mm²/s; at 100 °C, from
 * 14.8, 6.8 and 1.05 mm²/s, 11.95 and 9.71 mm²/s.
 */
class OilCausesTest {
  private static final LocalDate FIRST = LocalDate.of(2026, 1, 5);
  private static final Oil MINERAL = oil("mineral-150", 150, 14.8, Map.of("zinc_ppm", 400.0));
  private static final Oil OTHER = oil("thin-46", 46.2, 6.8, Map.of("calcium_ppm", 200.0));

  @Test
  void aBlendIsToldByItsViscositiesItsElementsAndTheTopUp() {
    double zinc = 300;
    double calcium = 50;
    List<OilCause> causes =
        asset()
            .sample(FIRST, 150, measured(14.8, 400, 0))
            .topUp(FIRST.plusDays(10), 25)
            .sample(FIRST.plusDays(30), 108.6, measured(11.95, zinc, calcium))
            .review()
            .oilCauses();
    assertThat(causes.get(0).name()).isEqualTo("25 % of thin-46 by volume");
    assertThat(causes.get(0).objections()).isEmpty();
    assertThat(causes.get(0).support()).hasSize(4);
    OilCause diluent = named(causes, "diluent");
    assertThat(diluent.weight()).isLessThan(causes.get(0).weight());
  }

  @Test
  void aThinDiluentIsToldByItsSlowLeak() {
    OneBearing made = asset();
    double[] viscosities = {150, 130, 111, 95, 82, 75.5};
    for (int i = 0; i < viscosities.length; i++) {
      made.sample(
          FIRST.plusDays(30L * i), viscosities[i], i == 5 ? measured(9.71, 360, 0) : Map.of());
    }
    List<OilCause> causes = made.review().oilCauses();
    assertThat(causes.get(0).name()).contains("10 % of a thin diluent");
    assertThat(named(causes, "thin-46").objections()).isNotEmpty();
  }

  @Test
  void thickeningWithAcidIsOxidation() {
    List<OilCause> causes =
        asset()
            .sample(FIRST, 151, Map.of("acid_number_mg_koh_g", 0.3))
            .sample(FIRST.plusDays(30), 158, Map.of("acid_number_mg_koh_g", 0.5))
            .sample(FIRST.plusDays(60), 166, Map.of("acid_number_mg_koh_g", 0.7))
            .sample(FIRST.plusDays(90), 175, Map.of("acid_number_mg_koh_g", 0.9))
            .review()
            .oilCauses();
    assertThat(causes.get(0).name()).startsWith("oxidation");
    assertThat(causes.get(0).support().get(0)).isEqualTo("acid number 0.9 mg KOH/g after 0.3");
  }

  @Test
  void lossOfIndexWithTheAdditivesKeptIsShear() {
    Oil multigrade =
        new Oil(
            "multigrade-68",
            OptionalInt.of(68),
            OilViscosity.register(68, OptionalDouble.empty(), OptionalDouble.of(156)),
            false,
            true,
            OptionalDouble.empty(),
            Map.of("zinc_ppm", 600.0));
    OneBearing made = new OneBearing("S").oilInUse(multigrade);
    double[] viscosities = {66, 63, 60, 57};
    for (int i = 0; i < viscosities.length; i++) {
      made.sample(
          FIRST.plusDays(30L * i),
          viscosities[i],
          Map.of("viscosity_100c_cst", 10.3 - 0.5 * i, "zinc_ppm", 590.0));
    }
    List<OilCause> causes = made.review().oilCauses();
    assertThat(causes.get(0).name()).startsWith("shear");
    assertThat(causes.get(0).support())
        .contains("the oil is VI-improved", "zinc 590 mg/kg, 600 when fresh");
  }

  @Test
  void withinTheScatterNothingIsSuspected() {
    assertThat(asset().sample(FIRST, 150).sample(FIRST.plusDays(30), 148).review().oilCauses())
        .isEmpty();
  }

  @Test
  void anOilChangeThatLiftedKappaHelpedAndOneThatDidNotIsSaid() {
    OneBearing made = asset();
    for (int i = 0; i < 200; i++) {
      made.day(FIRST.plusDays(i), 65);
    }
    List<FollowUp> found =
        made.sample(FIRST.plusDays(10), 100)
            .oilChange(FIRST.plusDays(20))
            .sample(FIRST.plusDays(40), 150)
            .oilChange(FIRST.plusDays(50))
            .sample(FIRST.plusDays(70), 149.5)
            .review()
            .followUps();
    assertThat(found).hasSize(2);
    assertThat(found.get(0).worked()).isEqualTo(Answer.NO);
    assertThat(found.get(0).sentence()).endsWith("it changed nothing that was measured");
    assertThat(found.get(1).worked()).isEqualTo(Answer.YES);
    assertThat(found.get(1).kappaAfter().orElseThrow())
        .isGreaterThan(found.get(1).kappaBefore().orElseThrow());
  }

  private static OneBearing asset() {
    return new OneBearing("A").oilInUse(MINERAL).otherOil(OTHER).volume(100);
  }

  private static Oil oil(String id, double v40, double v100, Map<String, Double> elements) {
    return new Oil(
        id,
        OptionalInt.empty(),
        OilViscosity.measured(v40, v100),
        false,
        false,
        OptionalDouble.empty(),
        elements);
  }

  private static Map<String, Double> measured(double v100, double zinc, double calcium) {
    return Map.of("viscosity_100c_cst", v100, "zinc_ppm", zinc, "calcium_ppm", calcium);
  }

  private static OilCause named(List<OilCause> causes, String part) {
    return causes.stream().filter(c -> c.name().contains(part)).findFirst().orElseThrow();
  }
}
