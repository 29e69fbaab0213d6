package org.kappatrail.history;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.kappatrail.tribology.OilSupply;

class ChargesTest {
  private static final Asset PRESS =
      new Asset(
          "press-1",
          "",
          "",
          "TH-150",
          OilSupply.BATH,
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalInt.empty());

  @Test
  void withoutEventsAndFallingHoursThereIsOneChargeFromBeforeTheHistory() {
    List<Charge> charges =
        Charges.of(PRESS, List.of(sample("B", 10, 200), sample("A", 5, 100)), List.of());
    assertThat(charges).hasSize(1);
    assertThat(charges.get(0).origin()).isEqualTo(Charge.Origin.BEFORE_HISTORY);
    assertThat(charges.get(0).oil()).isEqualTo("TH-150");
    assertThat(charges.get(0).samples()).extracting(Sample::id).containsExactly("A", "B");
    assertThat(charges.get(0).start()).isEmpty();
    assertThat(charges.get(0).end()).isEmpty();
  }

  @Test
  void nothingGivesNoCharge() {
    assertThat(Charges.of(PRESS, List.of(), List.of())).isEmpty();
  }

  @Test
  void anOilChangeStartsAChargeWithItsOilAndEndsTheOneBefore() {
    List<Charge> charges =
        Charges.of(
            PRESS,
            List.of(sample("A", 5, -1), sample("B", 15, -1)),
            List.of(change(10, "TH-220"), event(7, EventKind.TOP_UP)));
    assertThat(charges).extracting(Charge::number).containsExactly(1, 2);
    assertThat(charges).extracting(Charge::oil).containsExactly("TH-150", "TH-220");
    assertThat(charges.get(0).end()).contains(day(10));
    assertThat(charges.get(1).start()).contains(day(10));
    assertThat(charges.get(1).origin()).isEqualTo(Charge.Origin.RECORDED);
    assertThat(charges.get(1).samples()).extracting(Sample::id).containsExactly("B");
    assertThat(charges.get(0).covers(day(9))).isTrue();
    assertThat(charges.get(0).covers(day(10))).isFalse();
    assertThat(charges.get(1).covers(day(10))).isTrue();
  }

  @Test
  void aChangeWithoutAnOilKeepsTheOilThatWasIn() {
    List<Charge> charges =
        Charges.of(
            PRESS,
            List.of(sample("A", 5, -1)),
            List.of(change(10, "TH-220"), event(20, EventKind.OIL_CHANGE)));
    assertThat(charges).extracting(Charge::oil).containsExactly("TH-150", "TH-220", "TH-220");
  }

  @Test
  void hoursThatFallBackStartAnInferredCharge() {
    List<Charge> charges =
        Charges.of(
            PRESS,
            List.of(sample("A", 5, 900), sample("B", 9, 20), sample("C", 12, 90)),
            List.of());
    assertThat(charges).hasSize(2);
    assertThat(charges.get(1).origin()).isEqualTo(Charge.Origin.INFERRED);
    assertThat(charges.get(1).start()).contains(day(9));
    assertThat(charges.get(1).samples()).extracting(Sample::id).containsExactly("B", "C");
  }

  @Test
  void hoursThatFellBackAreSeenAcrossASampleWithoutHours() {
    List<Charge> charges =
        Charges.of(
            PRESS,
            List.of(sample("A", 5, 900), sample("B", 9, -1), sample("C", 12, 20)),
            List.of());
    assertThat(charges).hasSize(2);
    assertThat(charges.get(1).start()).contains(day(12));
    assertThat(charges.get(1).samples()).extracting(Sample::id).containsExactly("C");
  }

  @Test
  void hoursThatAreEqualOrMissingStartNoCharge() {
    List<Charge> charges =
        Charges.of(
            PRESS,
            List.of(sample("A", 5, 900), sample("B", 9, 900), sample("C", 12, -1)),
            List.of());
    assertThat(charges).hasSize(1);
  }

  @Test
  void aSampleOfTheDayOfAChangeIsTheOldOilsUnlessItsHoursFellBack() {
    List<Event> changes = List.of(change(10, "TH-150"));
    assertThat(
            Charges.of(PRESS, List.of(sample("A", 5, 900), sample("B", 10, 960)), changes)
                .get(0)
                .samples())
        .hasSize(2);
    assertThat(
            Charges.of(PRESS, List.of(sample("A", 5, 900), sample("B", 10, 2)), changes)
                .get(1)
                .samples())
        .extracting(Sample::id)
        .containsExactly("B");
  }

  @Test
  void hoursThatFallAcrossARecordedChangeStartNoSecondCharge() {
    List<Charge> charges =
        Charges.of(
            PRESS,
            List.of(sample("A", 5, 900), sample("B", 15, 100)),
            List.of(change(10, "TH-150")));
    assertThat(charges).hasSize(2);
  }

  private static LocalDate day(int day) {
    return LocalDate.of(2024, 3, day);
  }

  private static Event change(int day, String oil) {
    return new Event(
        "press-1",
        day(day),
        EventKind.OIL_CHANGE,
        Optional.of(oil),
        OptionalDouble.empty(),
        Optional.empty(),
        "");
  }

  private static Event event(int day, EventKind kind) {
    return new Event(
        "press-1", day(day), kind, Optional.empty(), OptionalDouble.empty(), Optional.empty(), "");
  }

  /** A sample; oil hours below 0 stand for none. */
  private static Sample sample(String id, int day, double hours) {
    return Samples.of(
        id, day(day), hours < 0 ? java.util.Map.of() : Samples.value("oil_hours", hours));
  }
}
