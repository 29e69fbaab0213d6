package org.kappatrail.tribology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import org.junit.jupiter.api.Test;
import org.kappatrail.tribology.Iso3448.Grade;

class Iso3448Test {
  /** ISO 3448: twenty grades, six to the decade, each midpoint ±10 %. */
  @Test
  void gradesAreSixToTheDecadeWithTenPercentEitherWay() {
    assertThat(Iso3448.grades()).hasSize(20);
    for (int i = 0; i < 20; i++) {
      Grade grade = Iso3448.grades().get(i);
      double series = Math.pow(10, (i + 2) / 6.0);
      assertThat(grade.midpointCst()).isCloseTo(series, withinPercentage(3));
      assertThat(grade.minCst()).isEqualTo(0.9 * grade.midpointCst(), within(1e-9));
      assertThat(grade.maxCst()).isEqualTo(1.1 * grade.midpointCst(), within(1e-9));
    }
  }

  @Test
  void limitsBelongToTheGradeAndGapsToNone() {
    assertThat(Iso3448.gradeOf(41.4).map(Grade::vg)).contains(46);
    assertThat(Iso3448.gradeOf(50.6).map(Grade::vg)).contains(46);
    assertThat(Iso3448.gradeOf(41.39)).isEmpty();
    assertThat(Iso3448.gradeOf(50.61)).isEmpty();
    assertThat(Iso3448.gradeOf(Double.NaN)).isEmpty();
  }

  @Test
  void neighboursEndWithTheTable() {
    assertThat(Iso3448.oneUp(46).map(Grade::vg)).contains(68);
    assertThat(Iso3448.oneDown(46).map(Grade::vg)).contains(32);
    assertThat(Iso3448.oneUp(3200)).isEmpty();
    assertThat(Iso3448.oneDown(2)).isEmpty();
    assertThat(Iso3448.oneUp(47)).isEmpty();
    assertThat(Iso3448.find(47)).isEmpty();
    assertThat(Iso3448.find(100)).map(Grade::toString).contains("ISO VG 100");
  }
}
