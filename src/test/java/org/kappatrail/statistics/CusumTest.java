package org.kappatrail.statistics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;

class CusumTest {

  private static final Published LUCAS_CROSIER = Published.table("fir_cusum_lucas_crosier.csv");
  private static final Published MONTGOMERY = Published.table("montgomery_cusum_example.csv");

  /** Lucas and Crosier 1982: sums to one decimal, signal at the seventh value. */
  @Test
  void upperSumSignalsAtTheSeventhValue() {
    Cusum.Result result = Cusum.upper(LUCAS_CROSIER.column("y"), 0.5, 5);
    assertSums(result, LUCAS_CROSIER.column("CUSUM_noFIR"));
    assertThat(result.firstSignal()).hasValue(6);
  }

  /** Lucas and Crosier 1982: the head start h/2 signals at the third value. */
  @Test
  void headStartSignalsAtTheThirdValue() {
    Cusum.Result result = Cusum.upper(LUCAS_CROSIER.column("y"), 0.5, 5, 2.5);
    assertSums(result, LUCAS_CROSIER.column("CUSUM_FIR_start2.5"));
    assertThat(result.firstSignal()).hasValue(2);
  }

  @Test
  void lowerSumMirrorsUpperSum() {
    double[] mirrored = Arrays.stream(LUCAS_CROSIER.column("y")).map(y -> -y).toArray();
    assertThat(Cusum.lower(mirrored, 0.5, 5, 2.5))
        .isEqualTo(Cusum.upper(LUCAS_CROSIER.column("y"), 0.5, 5, 2.5));
    assertThat(Cusum.lower(mirrored, 0.5, 5).firstSignal()).hasValue(6);
  }

  /** Montgomery and Runger, ch. 16: both sums about target 99 with K 1, in the measured unit. */
  @Test
  void bothSumsAgreeWithTheTextbookExample() {
    double[] fromTarget = Arrays.stream(MONTGOMERY.column("x")).map(x -> x - 99).toArray();
    Cusum.Result upper = Cusum.upper(fromTarget, 1, 10);
    Cusum.Result lower = Cusum.lower(fromTarget, 1, 10);
    assertSums(upper, MONTGOMERY.column("SH_K1"));
    assertSums(lower, MONTGOMERY.column("SL_K1"));
    assertThat(upper.firstSignal()).isEmpty();
    assertThat(lower.firstSignal()).isEmpty();
  }

  @Test
  void aSumThatOnlyReachesTheLimitDoesNotSignal() {
    assertThat(Cusum.upper(new double[] {5.5}, 0.5, 5).firstSignal()).isEmpty();
    assertThat(Cusum.upper(new double[] {5.75}, 0.5, 5).firstSignal()).hasValue(0);
  }

  @Test
  void noValuesGiveNoSumsAndOneValueOneSum() {
    assertThat(Cusum.lower(new double[0], 0.5, 5))
        .isEqualTo(new Cusum.Result(List.of(), OptionalInt.empty()));
    assertThat(Cusum.lower(new double[] {-2}, 0.5, 5).sums()).containsExactly(1.5);
  }

  @Test
  void valuesOnTargetNeverSignal() {
    Cusum.Result result = Cusum.lower(new double[100], 0.5, 5);
    assertThat(result.sums()).hasSize(100).containsOnly(0.0);
    assertThat(result.firstSignal()).isEmpty();
  }

  @Test
  void aLimitOfZeroIsRefused() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> Cusum.lower(new double[] {1}, 0.5, 0))
        .withMessageContaining("h 0.0 above 0");
  }

  private static void assertSums(Cusum.Result result, double[] expected) {
    assertThat(result.sums()).hasSize(expected.length);
    for (int i = 0; i < expected.length; i++) {
      assertThat(result.sums().get(i)).as("sum %d", i + 1).isCloseTo(expected[i], within(1e-9));
    }
  }
}
