package org.kappatrail.review.decision;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.kappatrail.history.Asset;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.Oil;
import org.kappatrail.history.Settings;
import org.kappatrail.review.trend.Direction;
import org.kappatrail.review.trend.FilmState;
import org.kappatrail.tribology.AstmD445Precision;
import org.kappatrail.tribology.BearingType;
import org.kappatrail.tribology.OilSupply;
import org.kappatrail.tribology.OilViscosity;

/**
 * Cases of one radial roller bearing, Dpw 150 mm, 300 r/min, C 535 kN, C0 600 kN, P 100 kN, e_C 0.5
 * by hand, running day and night, half of L10mh used; an oil of 150 mm²/s at 40 °C and 14.8 at 100.
 */
final class Cases {
  static final OilViscosity FRESH = OilViscosity.measured(150, 14.8);
  private static final LocalDate SAMPLED = LocalDate.of(2026, 10, 1);

  private OilViscosity present = FRESH;
  private List<Double> record = List.of(150.0, 150.0);
  private double temperatureC = 70;
  private double startC = 70;
  private OptionalDouble yearAgoC = OptionalDouble.empty();
  private Direction trend = Direction.STEADY;
  private double equivalentLoadKn = 100;
  private boolean loads = true;
  private double usedLife = 0.5;
  private OptionalDouble failureCost = OptionalDouble.of(50_000);
  private OptionalDouble changeCost = OptionalDouble.of(500);
  private OptionalDouble coolingCost = OptionalDouble.of(2000);
  private Optional<LocalDate> crossing = Optional.empty();
  private final List<Oil> others = new ArrayList<>();
  private List<String> grounds = List.of();
  private double speedRpm = 300;

  /** Present oil, and the last two samples of the charge. */
  Cases oil(double v40, double v100, Double... lastSamples) {
    present = OilViscosity.measured(v40, v100);
    record = List.of(lastSamples);
    return this;
  }

  Cases temperature(double now, double start) {
    temperatureC = now;
    startC = start;
    return this;
  }

  Cases yearAgo(double celsius) {
    yearAgoC = OptionalDouble.of(celsius);
    return this;
  }

  Cases trend(Direction direction) {
    trend = direction;
    return this;
  }

  Cases costs(double change, double cooling, double failure) {
    changeCost = OptionalDouble.of(change);
    coolingCost = OptionalDouble.of(cooling);
    failureCost = OptionalDouble.of(failure);
    return this;
  }

  Cases withoutCosts() {
    changeCost = OptionalDouble.empty();
    coolingCost = OptionalDouble.empty();
    failureCost = OptionalDouble.empty();
    return this;
  }

  Cases withoutLoads() {
    loads = false;
    return this;
  }

  Cases load(double kn) {
    equivalentLoadKn = kn;
    return this;
  }

  Cases speed(double rpm) {
    speedRpm = rpm;
    return this;
  }

  Cases used(double fraction) {
    usedLife = fraction;
    return this;
  }

  Cases crossing(LocalDate day) {
    crossing = Optional.of(day);
    return this;
  }

  Cases otherOil(String id, int vg, double v40, double v100) {
    others.add(oil(id, vg, OilViscosity.measured(v40, v100)));
    return this;
  }

  Cases grounds(String... texts) {
    grounds = List.of(texts);
    return this;
  }

  static LocalDate sampled() {
    return SAMPLED;
  }

  private static Oil oil(String id, int vg, OilViscosity viscosity) {
    return new Oil(
        id, OptionalInt.of(vg), viscosity, false, false, OptionalDouble.empty(), Map.of());
  }

  AssetCase build() {
    Oil registered = oil("mineral-150", 150, FRESH);
    List<Oil> oils = new ArrayList<>(List.of(registered));
    oils.addAll(others);
    double percent = AstmD445Precision.reproducibilityPercent(150);
    FilmState now = new FilmState(present, temperatureC, speedRpm);
    return new AssetCase(
        new Asset(
            "A",
            "A",
            "",
            "mineral-150",
            OilSupply.BATH,
            OptionalDouble.empty(),
            OptionalDouble.of(0.5),
            changeCost,
            coolingCost,
            failureCost,
            OptionalInt.of(30)),
        registered,
        registered,
        oils,
        List.of(
            new BearingCase(
                bearing(),
                1.0,
                now,
                Optional.of(new FilmState(FRESH, startC, speedRpm)),
                yearAgoC,
                DutyYear.steady(8760, temperatureC, speedRpm, "the present operating point"),
                new Cleanliness(OptionalDouble.of(0.5), Optional.empty(), OilSupply.BATH),
                loads ? OptionalDouble.of(usedLife) : OptionalDouble.empty(),
                "since the test began",
                crossing)),
        new OilRecord(record, 150, percent, "ASTM D445 reproducibility", trend, ""),
        "S-1",
        SAMPLED,
        OptionalDouble.empty(),
        new Settings.Decision(365, 60),
        1.5,
        AstmD445Precision.sigmaLn(percent / 100),
        grounds);
  }

  Decision decide() {
    return Weighing.of(build());
  }

  private Bearing bearing() {
    return new Bearing(
        "A",
        "B",
        loads ? Optional.of(BearingType.RADIAL_ROLLER) : Optional.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        150,
        300,
        loads ? OptionalDouble.of(535) : OptionalDouble.empty(),
        loads ? OptionalDouble.of(600) : OptionalDouble.empty(),
        OptionalDouble.empty(),
        loads ? OptionalDouble.of(equivalentLoadKn) : OptionalDouble.empty(),
        OptionalDouble.empty(),
        0);
  }
}
