package org.kappatrail.review;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.duty.DutyLogs;
import org.kappatrail.intake.HistoryReader;
import org.kappatrail.intake.Intake;
import org.kappatrail.review.correlation.AssetSeries;
import org.kappatrail.review.correlation.CorrelationResults;
import org.kappatrail.review.correlation.Variable;

class CorrelationVariablesTest {
  @TempDir Path folder;

  @BeforeEach
  void register() throws IOException {
    put("assets.csv", "asset,oil\npress-1,TH-150\nidle-2,TH-150\nbare-3,TH-150\n");
    put(
        "bearings.csv",
        """
        asset,bearing,type,pitch_mm,speed_rpm
        press-1,FAST,radial-roller,270,600
        press-1,SLOW,radial-roller,270,60
        idle-2,DS,radial-roller,270,180
        """);
    put("oils.csv", "oil,viscosity_40c_cst,viscosity_100c_cst\nTH-150,150,14.9\n");
    put(
        "samples/lab.csv",
        """
        sample,asset,sampled_at,viscosity_40c_cst,temperature_c,water_ppm,iron_ppm,oil_hours,iso_4406,particles_4um_per_ml,sieve_residue
        S1,press-1,2024-01-05T12:00,150,60,<20,3,100,18/16/13,,0.5
        S2,press-1,2024-02-05,149,,35,4,800,18/>16/13,1000,
        S3,press-1,2024-03-05,151,62,>5000,,1500,,0,0.7
        B1,bare-3,2024-03-05,151,62,40,,1500,,,
        """);
  }

  @Test
  void theGoverningBearingsKappaComesFirstAndEveryFurtherColumnLast() {
    AssetSeries press = series(0);
    assertThat(press.variables().stream().map(Variable::name))
        .containsExactly(
            "kappa",
            "kappa_reference",
            "viscosity_40c_cst",
            "temperature_c",
            "oil_hours",
            "water_ppm",
            "particles_4um_per_ml",
            "particles_6um_per_ml",
            "particles_14um_per_ml",
            "iron_ppm",
            "sieve_residue");
    BearingReview slow = assets().get(0).bearings().get(1);
    assertThat(variable(press, "kappa").arithmetic(0))
        .isEqualTo(slow.trail().get(0).film().orElseThrow().kappa());
    assertThat(variable(press, "kappa").has(1)).as("no temperature, no κ").isFalse();
    assertThat(press.days().get(0)).isEqualTo(LocalDate.of(2024, 1, 5).toEpochDay() + 0.5);
  }

  /**
   * ISO 4406: scale number 18 holds counts above 1300 up to 2500 per ml, 16 above 320 up to 640.
   */
  @Test
  void aCodeAloneGivesTheLogarithmOfTheMiddleOfItsClass() {
    AssetSeries press = series(0);
    Variable four = variable(press, "particles_4um_per_ml");
    assertThat(four.arithmetic(0)).isCloseTo(Math.log10(Math.sqrt(1300.0 * 2500)), within(1e-12));
    assertThat(four.arithmetic(1)).as("counted").isCloseTo(3, within(1e-12));
    assertThat(four.arithmetic(2)).as("none counted").isLessThan(-2);
    Variable six = variable(press, "particles_6um_per_ml");
    assertThat(six.arithmetic(0)).isCloseTo(Math.log10(Math.sqrt(320.0 * 640)), within(1e-12));
    assertThat(six.order(1)).as(">16 lies above 16").isGreaterThan(six.order(0));
    assertThat(six.has(2)).isFalse();
  }

  @Test
  void censoredValuesKeepTheirSideAndHalfTheLimit() {
    Variable water = variable(series(0), "water_ppm");
    assertThat(water.arithmetic(0)).isEqualTo(10);
    assertThat(water.order(0)).isLessThan(water.order(1));
    assertThat(water.order(2)).isGreaterThan(water.order(1));
    assertThat(variable(series(0), "iron_ppm").has(2)).isFalse();
  }

  @Test
  void assetsWithoutSamplesOrBearingsHaveWhatThereIs() {
    assertThat(series(1).variables()).isEmpty();
    assertThat(series(2).variables().stream().map(Variable::name))
        .containsExactly("viscosity_40c_cst", "oil_hours", "water_ppm");
    assertThat(CorrelationVariables.correlate(assets())).isEqualTo(CorrelationResults.none());
  }

  private AssetSeries series(int asset) {
    return CorrelationVariables.of(assets().get(asset));
  }

  private List<AssetReview> assets() {
    Intake intake = HistoryReader.read(folder);
    assertThat(intake.problems()).isEmpty();
    return new Reviewer(
            intake.history(),
            intake.history(),
            intake.settings(),
            LocalDate.of(2024, 3, 31),
            Progress.SILENT)
        .review(DutyLogs.empty());
  }

  private static Variable variable(AssetSeries series, String name) {
    return series.variables().stream()
        .filter(variable -> variable.name().equals(name))
        .findFirst()
        .orElseThrow();
  }

  private void put(String name, String text) throws IOException {
    Path file = folder.resolve(name);
    Files.createDirectories(file.getParent());
    Files.writeString(file, text);
  }
}
