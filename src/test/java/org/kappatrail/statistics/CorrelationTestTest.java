package org.kappatrail.statistics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class CorrelationTestTest {

  /** Values by R, version beside them; fifteen digits. */
  @ParameterizedTest
  @CsvSource({"pearson, pearson, 22", "weak_r, weak, 8"})
  void probabilityAndLimitsAgreeWithTheStatisticsPackage(String r, String prefix, int n) {
    Published.Values expected = Published.values("tied_pairs_values.csv");
    CorrelationTest test = CorrelationTest.of(expected.get(r), n);
    assertThat(test.p() / expected.get(prefix + "_p")).isCloseTo(1, within(1e-8));
    assertThat(test.low()).isCloseTo(expected.get(prefix + "_low"), within(1e-13));
    assertThat(test.high()).isCloseTo(expected.get(prefix + "_high"), within(1e-13));
  }

  /** Student's t at 1 degree of freedom is Cauchy's distribution, whose tail is an arc tangent. */
  @Test
  void threePairsGiveAProbabilityAndNoInterval() {
    CorrelationTest test = CorrelationTest.of(0.5, 3);
    double t = 0.5 / Math.sqrt(0.75);
    assertThat(test.p()).isCloseTo(1 - 2 / Math.PI * Math.atan(t), within(1e-12));
    assertThat(test.low()).isEqualTo(-1);
    assertThat(test.high()).isEqualTo(1);
  }

  @ParameterizedTest
  @ValueSource(doubles = {0, 1, 2})
  void twoPairsOrFewerProveNothing(double nEffective) {
    assertThat(CorrelationTest.of(1, nEffective))
        .isEqualTo(new CorrelationTest(1, nEffective, 1, -1, 1));
  }

  @ParameterizedTest
  @ValueSource(doubles = {-1, 1})
  void perfectCorrelationHasNoWidthAndNoProbability(double r) {
    assertThat(CorrelationTest.of(r, 10)).isEqualTo(new CorrelationTest(r, 10, 0, r, r));
  }

  @Test
  void noCorrelationHasProbabilityOne() {
    CorrelationTest test = CorrelationTest.of(0, 12);
    assertThat(test.p()).isEqualTo(1);
    assertThat(test.low()).isEqualTo(-test.high());
  }

  @Test
  void fewerEffectivePairsRaiseTheProbabilityAndWidenTheInterval() {
    CorrelationTest many = CorrelationTest.of(0.6, 24);
    CorrelationTest few = CorrelationTest.of(0.6, 7.5);
    assertThat(few.p()).isGreaterThan(many.p());
    assertThat(few.low()).isLessThan(many.low());
    assertThat(few.high()).isGreaterThan(many.high());
  }

  /** Of the n! orders two agree perfectly; full agreement of n ranks can be no rarer. */
  @ParameterizedTest
  @CsvSource({"3, 0.333333", "4, 0.0833333", "5, 0.0166667", "6, 0.00277778"})
  void perfectOrderOfFewRanksIsNoRarerThanChanceMakesIt(int n, double p) {
    assertThat(CorrelationTest.ofRanks(1, n).p()).isCloseTo(p, within(Published.halfUnit(p, 6)));
    assertThat(CorrelationTest.ofDetrendedRanks(1, n + 1.0).p())
        .isEqualTo(CorrelationTest.ofRanks(1, n).p());
  }

  /** Γ(5.5) = 945 √π / 32. */
  @Test
  void rankBoundHoldsBetweenWholeNumbers() {
    assertThat(CorrelationTest.ofRanks(-1, 4.5).p())
        .isCloseTo(2 * 32 / (945 * Math.sqrt(Math.PI)), within(1e-14));
  }

  @Test
  void twoSeriesThatMerelyBothAgeAreNoCertaintyHoweverManySamples() {
    double[] rising = IntStream.rangeClosed(1, 24).asDoubleStream().toArray();
    double[] falling = Arrays.stream(rising).map(rank -> 25 - rank).toArray();
    double nEffective = EffectiveSampleSize.pyperPeterman(rising, falling);
    CorrelationTest test = CorrelationTest.ofRanks(-1, nEffective);
    assertThat(nEffective).isBetween(4.0, 5.0);
    assertThat(test.p()).isBetween(2.0 / 120, 2.0 / 24);
  }

  @ParameterizedTest
  @ValueSource(doubles = {0, 1, 2})
  void twoRanksOrFewerProveNothing(double nEffective) {
    assertThat(CorrelationTest.ofRanks(1, nEffective).p()).isEqualTo(1);
    assertThat(CorrelationTest.ofDetrendedRanks(1, nEffective).p()).isEqualTo(1);
  }

  @Test
  void aLargerProbabilityIsNotTouchedByTheRankBound() {
    assertThat(CorrelationTest.ofRanks(0.5, 10)).isEqualTo(CorrelationTest.of(0.5, 10));
    assertThat(CorrelationTest.ofDetrendedRanks(0.5, 10)).isEqualTo(CorrelationTest.of(0.5, 10));
  }

  @ParameterizedTest
  @CsvSource({"1.01, 10", "NaN, 10", "0.5, NaN", "0.5, -1", "0.5, Infinity"})
  void impossibleInputIsRefused(double r, double nEffective) {
    assertThatIllegalArgumentException().isThrownBy(() -> CorrelationTest.of(r, nEffective));
  }
}
