package org.kappatrail.report.page;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.Color;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.kappatrail.report.chart.Palette;

class DarkChartsTest {
  private static final String NIGHT_PAPER = "20242a";

  /** CSS Color Module Level 4 gives these of sRGB's corners, to five digits (from memory). */
  @ParameterizedTest
  @CsvSource({
    "ff0000, 0.62796, 0.22486, 0.12585",
    "00ff00, 0.86644, -0.23389, 0.17950",
    "0000ff, 0.45201, -0.03246, -0.31153",
    "ffffff, 1.00000, 0.00000, 0.00000",
    "000000, 0.00000, 0.00000, 0.00000"
  })
  void oklabIsAsPublished(String hex, double lightness, double greenRed, double blueYellow) {
    Oklab colour = Oklab.of(hex);
    assertThat(colour.lightness()).isCloseTo(lightness, within(1e-5));
    assertThat(colour.greenRed()).isCloseTo(greenRed, within(1e-5));
    assertThat(colour.blueYellow()).isCloseTo(blueYellow, within(1e-5));
    assertThat(colour.hex()).isEqualTo(hex);
  }

  @ParameterizedTest
  @CsvSource({"fcfbf8, 20242a", "262b31, e6e4de"})
  void paperAndInkAreThoseOfThePage(String day, String night) {
    assertThat(DarkCharts.night(day)).isEqualTo(night);
  }

  /** WCAG 2.1, 1.4.3 (from memory): text wants a contrast of 4.5 to what is behind it. */
  @ParameterizedTest
  @ValueSource(strings = {"1d3f72", "b07a14", "a43b2a", "127c7a", "706891", "5e4026", "6a7179"})
  void everyInkStandsOutByNightAndKeepsItsHue(String day) {
    String night = DarkCharts.night(day);
    assertThat(contrast(night, NIGHT_PAPER)).isGreaterThan(4.5);
    double turned = Math.toDegrees(hue(Oklab.of(night)) - hue(Oklab.of(day)));
    assertThat(Math.abs(Math.IEEEremainder(turned, 360))).isLessThan(25);
  }

  @Test
  void theInksTestedAreThoseOfCharts() {
    assertThat(
            List.of(
                    Palette.KAPPA,
                    Palette.VISCOSITY,
                    Palette.TEMPERATURE,
                    Palette.WATER,
                    Palette.PARTICLES,
                    Palette.IRON,
                    Palette.QUIET_INK)
                .stream()
                .map(Palette::hex))
        .containsExactly(
            "#1d3f72", "#b07a14", "#a43b2a", "#127c7a", "#706891", "#5e4026", "#6a7179");
  }

  @Test
  void everyColourOfAChartGetsARule() {
    String svg = "<svg><rect fill=\"#fcfbf8\"/><line stroke=\"#262b31\"/></svg>";
    assertThat(DarkCharts.rules(List.of(Picture.ofText(svg))))
        .contains(".chart [fill=\"#fcfbf8\"] { fill: #20242a; }")
        .contains(".chart [stroke=\"#262b31\"] { stroke: #e6e4de; }");
    assertThat(DarkCharts.rules(List.of())).isEmpty();
  }

  private static double hue(Oklab colour) {
    return Math.atan2(colour.blueYellow(), colour.greenRed());
  }

  /** Contrast of WCAG 2.1. */
  private static double contrast(String a, String b) {
    double one = luminance(a);
    double other = luminance(b);
    return (Math.max(one, other) + 0.05) / (Math.min(one, other) + 0.05);
  }

  private static double luminance(String hex) {
    Color colour = Color.decode("#" + hex);
    return 0.2126 * channel(colour.getRed())
        + 0.7152 * channel(colour.getGreen())
        + 0.0722 * channel(colour.getBlue());
  }

  private static double channel(int value) {
    double share = value / 255.0;
    return share <= 0.03928 ? share / 12.92 : Math.pow((share + 0.055) / 1.055, 2.4);
  }
}
