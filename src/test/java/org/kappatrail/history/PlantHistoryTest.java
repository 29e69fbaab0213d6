package org.kappatrail.history;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.kappatrail.tribology.OilSupply;
import org.kappatrail.tribology.OilViscosity;

class PlantHistoryTest {
  private static final LocalDate DAY = LocalDate.of(2024, 3, 5);
  private static final Oil OIL =
      new Oil(
          "TH-150",
          OptionalInt.of(150),
          OilViscosity.measured(150, 14.9),
          false,
          false,
          OptionalDouble.empty(),
          Map.of());

  @Test
  void recordsComeByAssetInTheOrderOfTheRegisterAndInTime() {
    PlantHistory history =
        new PlantHistory(
            List.of(OIL),
            List.of(asset("press-1", "TH-150"), asset("fan-3", "TH-150")),
            List.of(bearing("fan-3", "DE"), bearing("press-1", "NDE"), bearing("fan-3", "NDE")),
            List.of(Samples.of("B", DAY.plusDays(2), Map.of()), Samples.of("A", DAY, Map.of())),
            List.of(event(DAY.plusDays(3)), event(DAY)));
    assertThat(history.bearings())
        .extracting(bearing -> bearing.key().toString())
        .containsExactly("press-1/NDE", "fan-3/DE", "fan-3/NDE");
    assertThat(history.samples()).extracting(Sample::id).containsExactly("A", "B");
    assertThat(history.eventsOf("press-1")).extracting(Event::date).isSorted();
    assertThat(history.samplesOf("fan-3")).isEmpty();
    assertThat(history.findAsset("fan-3")).isPresent();
    assertThat(history.findOil("TH-68")).isEmpty();
    assertThat(history.getOil("TH-150")).isEqualTo(OIL);
  }

  @Test
  void aNameThatIsNotThereIsRefusedWithTheName() {
    List<Asset> assets = List.of(asset("press-1", "TH-150"));
    assertThatThrownBy(() -> new PlantHistory(List.of(), assets, List.of(), List.of(), List.of()))
        .hasMessage("no oil 'TH-150' in the register");
    assertThatThrownBy(
            () ->
                new PlantHistory(
                    List.of(OIL), assets, List.of(bearing("fan-3", "DE")), List.of(), List.of()))
        .hasMessage("no asset 'fan-3' in the register");
    PlantHistory history = new PlantHistory(List.of(OIL), assets, List.of(), List.of(), List.of());
    assertThatThrownBy(() -> history.getOil("TH-68")).hasMessage("no oil 'TH-68' in the register");
  }

  @Test
  void anIdThatStandsTwiceIsRefused() {
    assertThatThrownBy(
            () -> new PlantHistory(List.of(OIL, OIL), List.of(), List.of(), List.of(), List.of()))
        .hasMessage("'TH-150' stands twice in the register");
  }

  @Test
  void valuesThatCannotBeAreRefusedWithTheLimit() {
    assertThatThrownBy(() -> bearing("press-1", "DE", 0))
        .hasMessage("speed_rpm is 0.0, must be from 0.01 to 1000000.0");
    assertThatThrownBy(() -> asset("", "TH-150")).hasMessage("asset has no name");
  }

  private static Asset asset(String id, String oil) {
    return new Asset(
        id,
        "",
        "",
        oil,
        OilSupply.BATH,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalInt.empty());
  }

  private static Bearing bearing(String asset, String id) {
    return bearing(asset, id, 1480);
  }

  private static Bearing bearing(String asset, String id, double speedRpm) {
    return new Bearing(
        asset,
        id,
        Optional.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        125,
        speedRpm,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        0);
  }

  private static Event event(LocalDate day) {
    return new Event(
        "press-1",
        day,
        EventKind.OTHER,
        Optional.empty(),
        OptionalDouble.empty(),
        Optional.empty(),
        "");
  }
}
