package org.kappatrail.history;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.kappatrail.tribology.CleanlinessCode;

class SampleTest {
  private static final LocalDate DAY = LocalDate.of(2024, 3, 5);

  @Test
  void exactAndCensoredAndMissingAreThreeKinds() {
    Sample sample =
        Samples.of(
            "A",
            DAY,
            Map.of(
                "water_ppm", new Measurement.Below(20),
                "iron_ppm", new Measurement.Above(500),
                "zinc_ppm", Measurement.of(40)));
    assertThat(sample.exact("zinc_ppm")).hasValue(40);
    assertThat(sample.exact("water_ppm")).isEmpty();
    assertThat(sample.exact("copper_ppm")).isEmpty();
    assertThat(sample.arithmetic("water_ppm")).hasValue(10);
    assertThat(sample.arithmetic("iron_ppm")).hasValue(500);
    assertThat(sample.arithmetic("copper_ppm")).isEmpty();
    assertThat(sample.find("water_ppm")).contains(new Measurement.Below(20));
  }

  @Test
  void countsOfBothDecidingSizesGiveTheCodeEvenWhereOneIsStated() {
    CleanlinessCode stated = CleanlinessCode.parse("22/21/18");
    Sample withCounts =
        new Sample(
            "A",
            "press-1",
            DAY.atTime(8, 30),
            true,
            Optional.empty(),
            "",
            Map.of(
                SampleColumns.PARTICLES_6UM,
                Measurement.of(500),
                SampleColumns.PARTICLES_14UM,
                Measurement.of(70)),
            Optional.of(stated),
            new SourceLine("a.csv", 2));
    // ISO 4406: more than 320 up to 640 per ml is scale number 16, more than 40 up to 80 is 13.
    assertThat(withCounts.cleanliness()).hasToString("Optional[*/16/13]");
    assertThat(withCounts.sampledAtText()).isEqualTo("2024-03-05T08:30");
    assertThat(Samples.of("B", DAY, Map.of()).cleanliness()).isEmpty();
    assertThat(Samples.of("B", DAY, Map.of()).sampledAtText()).isEqualTo("2024-03-05");
  }

  @Test
  void samplesOfOneMomentStandInTheOrderOfTheirNames() {
    Sample later = Samples.of("A", DAY.plusDays(1), Map.of());
    List<Sample> inTime =
        List.of(later, Samples.of("C", DAY, Map.of()), Samples.of("B", DAY, Map.of())).stream()
            .sorted(Sample.IN_TIME)
            .toList();
    assertThat(inTime).extracting(Sample::id).containsExactly("B", "C", "A");
    assertThat(later.sampledAt()).isEqualTo(LocalDateTime.of(2024, 3, 6, 0, 0));
  }

  @Test
  void aSampleWithoutANameIsRefused() {
    assertThatThrownBy(() -> Samples.of(" ", DAY, Map.of()))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("sample has no name");
  }
}
