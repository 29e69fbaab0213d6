package org.kappatrail.review;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.SplittableRandom;
import java.util.function.Predicate;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * A seeded fleet of 400 made-up bearings whose truth is known: how often each trouble is found
 * within eight samples, and how often nothing is called something. Reviewed after every sample from
 * the fourth to the eighth of the charge, as an analyst would; one call is enough to count.
 */
@Tag("slow")
class DriftFleetTest {
  private static final int EACH = 100;
  private static final int SAMPLES = 8;
  private static final LocalDate CHARGE = LocalDate.of(2025, 6, 15);
  private static final double LABORATORY = 0.006;

  private enum Truth {
    OIL_DRIFT,
    TEMPERATURE_DRIFT,
    SEASON_ONLY,
    NONE
  }

  private record Called(boolean oil, boolean film, boolean heat) {}

  @Test
  void oilDriftIsFoundAndNothingIsSeldomCalledDrift() throws IOException {
    StringBuilder table =
        new StringBuilder("truth, bearings, oil-drift, film-drift, heat (share called)\n");
    Map<Truth, Rates> rates = new EnumMap<>(Truth.class);
    for (Truth truth : Truth.values()) {
      List<Called> called =
          IntStream.range(0, EACH).parallel().mapToObj(i -> called(truth, i)).toList();
      Rates found =
          new Rates(
              share(called, Called::oil), share(called, Called::film), share(called, Called::heat));
      rates.put(truth, found);
      table.append(
          String.format(
              Locale.ROOT,
              "%s, %d, %.2f, %.2f, %.2f%n",
              truth.name().toLowerCase(Locale.ROOT),
              EACH,
              found.oil(),
              found.film(),
              found.heat()));
    }
    Files.writeString(Path.of("target", "drift-fleet.txt"), table.toString());
    rates.forEach(DriftFleetTest::judge);
  }

  /** Shares of the bearings called. */
  private record Rates(double oil, double film, double heat) {}

  private static double share(List<Called> called, Predicate<Called> what) {
    return called.stream().filter(what).count() / (double) called.size();
  }

  private static void judge(Truth truth, Rates found) {
    if (truth == Truth.OIL_DRIFT) {
      assertThat(found.oil()).isGreaterThanOrEqualTo(0.9);
    } else {
      assertThat(found.oil()).as(truth + ": oil").isLessThan(0.05);
    }
    if (truth == Truth.TEMPERATURE_DRIFT) {
      assertThat(found.heat()).isGreaterThanOrEqualTo(0.9);
    } else {
      assertThat(found.heat()).as(truth + ": heat").isLessThan(0.05);
    }
    if (truth == Truth.SEASON_ONLY || truth == Truth.NONE) {
      assertThat(found.film()).as(truth + ": film").isLessThan(0.05);
    }
  }

  private static Called called(Truth truth, int number) {
    SplittableRandom random = new SplittableRandom(truth.name().hashCode() * 1000L + number);
    double season = truth == Truth.NONE ? 0 : random.nextDouble(2, 8);
    double base = random.nextDouble(50, 68);
    LocalDate charge = CHARGE.plusDays(random.nextInt(365));
    double heating = truth == Truth.TEMPERATURE_DRIFT ? random.nextDouble(8, 16) : 0;
    OneBearing made = new OneBearing("A" + number).oilChange(charge);
    LocalDate end = charge.plusDays(31L * SAMPLES);
    double[] weather = {0};
    for (LocalDate day = charge.minusDays(430); !day.isAfter(end); day = day.plusDays(1)) {
      double phase = 2 * Math.PI * (day.getDayOfYear() - 205) / 365.0;
      double since = Math.max(0, day.toEpochDay() - charge.toEpochDay()) / (31.0 * SAMPLES);
      weather[0] = 0.8 * weather[0] + 0.6 * gaussian(random);
      made.day(day, base + season * Math.cos(phase) + heating * since + weather[0]);
    }
    boolean oil = false;
    boolean film = false;
    boolean hot = false;
    for (int i = 0; i < SAMPLES; i++) {
      LocalDate day = charge.plusDays(20 + 30L * i + random.nextInt(9) - 4);
      double months = (day.toEpochDay() - charge.toEpochDay()) / 30.0;
      double trend = truth == Truth.OIL_DRIFT ? Math.exp(-0.0175 * months) : 1;
      made.sample(day, 150 * trend * Math.exp(LABORATORY * gaussian(random)));
      if (i >= 3) {
        for (Finding finding : made.review().findings()) {
          oil |= finding.kind() == FindingKind.OIL_DRIFT;
          film |= finding.kind() == FindingKind.FILM_DRIFT;
          hot |= finding.kind() == FindingKind.HEAT;
        }
      }
    }
    return new Called(oil, film, hot);
  }

  private static double gaussian(SplittableRandom random) {
    double radius = StrictMath.sqrt(-2 * StrictMath.log(1 - random.nextDouble()));
    return radius * StrictMath.cos(2 * Math.PI * random.nextDouble());
  }
}
