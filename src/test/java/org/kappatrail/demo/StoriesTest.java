package org.kappatrail.demo;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.apache.commons.math3.stat.correlation.SpearmansCorrelation;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.kappatrail.tribology.AstmD2270;

class StoriesTest {
  private static final KappaTruth TRUTH = new KappaTruth();

  @ParameterizedTest(name = "{0} {1}: {2}")
  @CsvFileSource(resources = "/tarn-hollow-stories.csv", numLinesToSkip = 1)
  void kappaLiesWhereTheStorySays(
      String asset,
      String bearing,
      String story,
      LocalDate before,
      LocalDate now,
      double beforeLow,
      double beforeHigh,
      double nowLow,
      double nowHigh) {
    assertThat(TRUTH.kappa(asset, bearing, before)).as(story).isBetween(beforeLow, beforeHigh);
    assertThat(TRUTH.kappa(asset, bearing, now)).as(story).isBetween(nowLow, nowHigh);
  }

  @Test
  void theDilutedOilIsThinAndItsFreshOilIsNot() {
    NamedCsvRecord last = last(SampleHistory.samplesOf("SP-CRP"));
    double v40 = number(last, "viscosity_40c_cst");
    assertThat(v40 / 46).isBetween(0.68, 0.75);
    assertThat(number(last, "zinc_ppm")).isLessThan(460 * 0.96);
    assertThat(TRUTH.kappaWithFresh("hydraulic-46", "SP-CRP", "DE", LocalDate.of(2026, 10, 27)))
        .isGreaterThan(1);
  }

  @Test
  void theShearedOilLosesIndexAndKeepsItsAdditives() {
    NamedCsvRecord last = last(SampleHistory.samplesOf("UT-SCR"));
    double v40 = number(last, "viscosity_40c_cst");
    assertThat(v40 / 68).isBetween(0.79, 0.85);
    assertThat(AstmD2270.viscosityIndex(v40, number(last, "viscosity_100c_cst")))
        .isBetween(135.0, 144.0);
    assertThat(number(last, "zinc_ppm")).isCloseTo(610, within(50.0));
  }

  @Test
  void theWrongTopUpBringsZincIntoAnOilWithoutAny() {
    List<NamedCsvRecord> samples = SampleHistory.samplesOf("PM-WGB");
    for (NamedCsvRecord sample : samples) {
      boolean after = sample.getField("sampled_at").compareTo("2026-04-15") > 0;
      assertThat(SampleHistory.number(sample, "zinc_ppm").orElse(0) > 40).isEqualTo(after);
      assertThat(number(sample, "viscosity_40c_cst") < 280).isEqualTo(after);
    }
  }

  @Test
  void theSwappedBottlesCarryEachOthersOil() {
    assertThat(month("SP-AG1", "2026-10", "boron_ppm")).isBetween(40.0, 56.0);
    assertThat(month("SP-AG1", "2026-10", "viscosity_40c_cst")).isBetween(210.0, 230.0);
    assertThat(month("SP-PGB", "2026-10", "zinc_ppm")).isBetween(380.0, 460.0);
    assertThat(month("SP-PGB", "2026-10", "viscosity_40c_cst")).isBetween(143.0, 157.0);
  }

  @Test
  void theUnrecordedChangeTakesBackMoreThanHalfOfTheShiftWithTheHoursCountedOn() {
    double before = month("PM-HXF", "2026-01", "viscosity_40c_cst");
    double after = month("PM-HXF", "2026-02", "viscosity_40c_cst");
    assertThat(before - 100).isGreaterThan(12);
    assertThat(before - after).isGreaterThan((before - 100) / 2);
    assertThat(hours("PM-HXF")).isSorted();
  }

  @Test
  void theOilHoursOfTheStockPumpFallBackOnce() {
    List<Double> hours = hours("SP-P3");
    long falls =
        IntStream.range(1, hours.size()).filter(i -> hours.get(i) < hours.get(i - 1)).count();
    assertThat(falls).isEqualTo(1);
  }

  /** A rank correlation of 0.8 over thirty rounds is far past chance (p below 0.001 at 0.57). */
  @Test
  void ironFollowsWaterByOneSampleAtTheDryers() {
    assertThat(waterToIron(1)).isGreaterThan(0.8);
    assertThat(waterToIron(0)).isBetween(-0.4, 0.4);
  }

  @Test
  void onlyTheStuckSensorStandsStillForDays() {
    for (AssetStory story : Stories.all()) {
      Running running = new Running(story.asset());
      for (AssetStory.BearingHeat bearing : story.bearings()) {
        int longest = longestStandstill(new HeatLog(story, bearing.bearing(), running));
        if (story.asset().equals("PM-VP1") && bearing.bearing().equals("NDE")) {
          assertThat(longest).isGreaterThanOrEqualTo(200);
        } else {
          assertThat(longest).as(story.asset()).isLessThan(24);
        }
      }
    }
  }

  @Test
  void theAgitatorsOilOfTheNextGradesLiftsItOutOfTheMixedRegime() {
    LocalDate now = LocalDate.of(2026, 10, 27);
    assertThat(TRUTH.kappaWithFresh("circulating-150", "SP-AG4", "LOW", now)).isLessThan(0.7);
    assertThat(TRUTH.kappaWithFresh("gear-320", "SP-AG4", "LOW", now)).isGreaterThan(1);
  }

  private static double waterToIron(int lag) {
    List<NamedCsvRecord> samples = SampleHistory.samplesOf("PM-DRY");
    List<double[]> pairs = new ArrayList<>();
    for (int i = 0; i + lag < samples.size(); i++) {
      OptionalDouble water = SampleHistory.number(samples.get(i), "water_ppm");
      OptionalDouble iron = SampleHistory.number(samples.get(i + lag), "iron_ppm");
      if (water.isPresent() && iron.isPresent()) {
        pairs.add(new double[] {water.getAsDouble(), iron.getAsDouble()});
      }
    }
    return new SpearmansCorrelation()
        .correlation(
            pairs.stream().mapToDouble(pair -> pair[0]).toArray(),
            pairs.stream().mapToDouble(pair -> pair[1]).toArray());
  }

  private static int longestStandstill(HeatLog log) {
    int longest = 0;
    int run = 0;
    for (int hour = 1; hour < Timeline.HOURS; hour++) {
      boolean still = log.temperatureTenths[hour] == log.temperatureTenths[hour - 1];
      run = still && log.speedTenths[hour] > 0 ? run + 1 : 0;
      longest = Math.max(longest, run);
    }
    return longest;
  }

  private static List<Double> hours(String asset) {
    return SampleHistory.samplesOf(asset).stream()
        .map(row -> SampleHistory.number(row, "oil_hours"))
        .filter(OptionalDouble::isPresent)
        .map(OptionalDouble::getAsDouble)
        .toList();
  }

  private static double month(String asset, String month, String column) {
    return SampleHistory.samplesOf(asset).stream()
        .filter(row -> row.getField("sampled_at").startsWith(month))
        .findFirst()
        .map(row -> number(row, column))
        .orElseThrow();
  }

  private static double number(NamedCsvRecord row, String column) {
    return SampleHistory.number(row, column).orElseThrow();
  }

  private static NamedCsvRecord last(List<NamedCsvRecord> rows) {
    return rows.get(rows.size() - 1);
  }
}
