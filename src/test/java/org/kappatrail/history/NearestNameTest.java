package org.kappatrail.history;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

class NearestNameTest {
  @Test
  void theNearestByEditDistanceIsFoundWhateverTheCase() {
    assertThat(NearestName.of("KAPPA-FLOR", List.of("water-ppm", "kappa-floor")))
        .contains("kappa-floor");
    assertThat(NearestName.of("x", List.of())).isEmpty();
    assertThat(NearestName.of("b", List.of("a", "c"))).contains("a");
  }

  /** The textbook example of the edit distance: kitten to sitting takes three steps. */
  @Test
  void theDistanceCountsLettersPutInTakenOutAndReplaced() {
    assertThat(NearestName.distance("kitten", "sitting")).isEqualTo(3);
    assertThat(NearestName.distance("", "abc")).isEqualTo(3);
    assertThat(NearestName.distance("abc", "abc")).isZero();
  }
}
