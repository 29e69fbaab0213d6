package org.kappatrail.tribology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.Random;
import org.junit.jupiter.api.Test;

class AstmD7152BlendTest {
  /**
   * The rule worked by hand with four-figure logarithms, no outside source: 46 mm²/s has W 0.22254,
   * 2.5 has −0.29658; 5 % by volume of the second gives 0.19658 and so 36.67 mm²/s.
   */
  @Test
  void thinDiluentDropsTheViscosityByTheLogLogRule() {
    assertThat(AstmD7152Blend.viscosityCst(46, 2.5, 0.05)).isEqualTo(36.67, within(0.03));
  }

  @Test
  void fractionComesBackFromTheBlend() {
    Random random = new Random(7152);
    for (int i = 0; i < 2000; i++) {
      double base = Math.exp(1 + 6 * random.nextDouble());
      double other = Math.exp(1 + 6 * random.nextDouble());
      double fraction = random.nextDouble();
      double blended = AstmD7152Blend.viscosityCst(base, other, fraction);
      assertThat(blended).isBetween(Math.min(base, other), Math.max(base, other));
      assertThat(AstmD7152Blend.viscosityCst(other, base, 1 - fraction))
          .isCloseTo(blended, withinPercentage(1e-8));
      if (Math.abs(Math.log(base / other)) > 0.05) {
        assertThat(AstmD7152Blend.fractionExplaining(base, other, blended))
            .hasValueCloseTo(fraction, within(1e-9));
      }
    }
  }

  @Test
  void endsAreTheOilsThemselves() {
    assertThat(AstmD7152Blend.viscosityCst(220, 46, 0)).isCloseTo(220, withinPercentage(1e-9));
    assertThat(AstmD7152Blend.viscosityCst(220, 46, 1)).isCloseTo(46, withinPercentage(1e-9));
    assertThat(AstmD7152Blend.viscosityCst(6.8, 1.05, 1)).isCloseTo(1.05, withinPercentage(0.03));
  }

  @Test
  void nothingExplainsAViscosityOutsideTheTwoOils() {
    assertThat(AstmD7152Blend.fractionExplaining(220, 46, 230)).isEmpty();
    assertThat(AstmD7152Blend.fractionExplaining(220, 46, 45)).isEmpty();
    assertThat(AstmD7152Blend.fractionExplaining(220, 220, 220)).isEmpty();
    assertThat(AstmD7152Blend.fractionExplaining(220, 46, 220)).hasValue(0);
    assertThat(AstmD7152Blend.fractionExplaining(220, 46, 46)).hasValue(1);
  }

  @Test
  void impossibleBlendsAreRefused() {
    assertThatThrownBy(() -> AstmD7152Blend.viscosityCst(220, 46, 1.01))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("volume fraction");
    assertThatThrownBy(() -> AstmD7152Blend.viscosityCst(0.1, 46, 0.5))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> AstmD7152Blend.fractionExplaining(220, Double.NaN, 46))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
