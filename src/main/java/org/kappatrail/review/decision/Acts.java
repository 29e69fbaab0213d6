package org.kappatrail.review.decision;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.kappatrail.history.Oil;
import org.kappatrail.review.trend.Forecast;
import org.kappatrail.tribology.CantleyWaterLife;
import org.kappatrail.tribology.Iso281RatedViscosity;
import org.kappatrail.tribology.Iso3448;
import org.kappatrail.tribology.OilViscosity;

/** Lists what could be done about an asset. */
final class Acts {
  private static final int CLEANER_CLASSES = 2;
  private static final double DRY_PPM = 100;
  private static final List<Integer> COOLER_C = List.of(5, 10);

  private final AssetCase asset;
  private final BearingCase governing;
  private final OilViscosity present;
  private final List<Act> acts = new ArrayList<>();

  private Acts(AssetCase asset) {
    this.asset = asset;
    this.governing = asset.governing();
    this.present = governing.now().oil();
  }

  static List<Act> of(AssetCase asset) {
    Acts list = new Acts(asset);
    list.add(RemedyKind.STAY, "stay as it is", list.present, 0, 0, OptionalDouble.of(0));
    list.oils();
    list.grades();
    list.cooling();
    list.contamination();
    return list.acts;
  }

  private void oils() {
    Oil registered = asset.candidate();
    add(
        RemedyKind.FRESH_OIL,
        "fresh charge of " + registered.id(),
        registered.viscosity(),
        0,
        0,
        changePrice(Optional.of(registered)));
    for (Oil other : asset.oils()) {
      if (!other.id().equals(registered.id())) {
        add(
            RemedyKind.OTHER_OIL,
            "charge of " + other.id(),
            other.viscosity(),
            0,
            0,
            changePrice(Optional.of(other)));
      }
    }
  }

  private void grades() {
    OptionalInt vg = asset.oil().gradeVg();
    if (vg.isEmpty()) {
      return;
    }
    Optional<Iso3448.Grade> up = Iso3448.oneUp(vg.getAsInt());
    up.ifPresent(grade -> grade(grade, "one grade up"));
    Iso3448.oneDown(vg.getAsInt()).ifPresent(grade -> grade(grade, "one grade down"));
    Optional<Iso3448.Grade> least = leastGrade();
    if (least.isPresent()
        && least.get().vg() != vg.getAsInt()
        && (up.isEmpty() || least.get().vg() > up.get().vg())) {
      grade(least.get(), "the least grade that reaches κ " + number(governing.floor(), 2));
    }
  }

  /** The thinnest grade at the same index whose fresh oil reaches the governing bearing's floor. */
  Optional<Iso3448.Grade> leastGrade() {
    return Iso3448.grades().stream()
        .filter(
            grade ->
                atGrade(grade)
                    .filter(
                        oil ->
                            governing.now().with(oil).kappa(governing.bearing().pitchMm())
                                >= governing.floor())
                    .isPresent())
        .findFirst();
  }

  private void grade(Iso3448.Grade grade, String which) {
    atGrade(grade)
        .ifPresent(
            oil ->
                add(
                    RemedyKind.GRADE,
                    grade + " at the same index, " + which,
                    oil,
                    0,
                    0,
                    changePrice(Optional.empty())));
  }

  private Optional<OilViscosity> atGrade(Iso3448.Grade grade) {
    OilViscosity registered = asset.oil().viscosity();
    try {
      return Optional.of(OilViscosity.withIndexOf(grade.midpointCst(), registered));
    } catch (IllegalArgumentException outsideTheLaw) {
      return Optional.empty();
    }
  }

  private void cooling() {
    OptionalDouble price = asset.asset().coolingCost();
    for (int cooler : COOLER_C) {
      add(RemedyKind.COOLER, "cooler by " + cooler + " °C", present, -cooler, 0, price);
    }
    OptionalDouble restored = restoredC();
    if (restored.isPresent()) {
      add(
          RemedyKind.RESTORE_TEMPERATURE,
          "back to the "
              + number(restored.getAsDouble(), 1)
              + (governing.yearAgoC().isPresent()
                  ? " °C of a year ago"
                  : " °C that the charge began with"),
          present,
          restored.getAsDouble() - governing.now().temperatureC(),
          0,
          price);
    }
    OptionalDouble target = targetC();
    if (target.isPresent()) {
      add(
          RemedyKind.TARGET_TEMPERATURE,
          "run at "
              + number(target.getAsDouble(), 1)
              + " °C, which gives κ "
              + number(governing.floor(), 2),
          present,
          target.getAsDouble() - governing.now().temperatureC(),
          0,
          price);
    }
  }

  /**
   * The temperature that things were at before they became hotter beyond measuring: a year ago at
   * this season where that is known, else when the charge began.
   */
  private OptionalDouble restoredC() {
    double now = governing.now().temperatureC();
    double before = governing.yearAgoC().orElse(governing.startC().orElse(now));
    return now > before && !Forecast.asLastYear(now, before, asset.uncertaintyC())
        ? OptionalDouble.of(before)
        : OptionalDouble.empty();
  }

  /** The exact temperature at which the present oil reaches the floor; empty where it does. */
  private OptionalDouble targetC() {
    if (governing.kappa() >= governing.floor()) {
      return OptionalDouble.empty();
    }
    double needed =
        governing.floor()
            * Iso281RatedViscosity.ratedViscosityCst(
                governing.now().speedRpm(), governing.bearing().pitchMm());
    return OptionalDouble.of(present.law().temperatureC(needed));
  }

  private void contamination() {
    boolean codes =
        asset.bearings().stream()
            .allMatch(item -> item.cleanliness().cleanerBy(CLEANER_CLASSES).isPresent());
    if (codes) {
      add(
          RemedyKind.CLEANER,
          "cleaner by " + CLEANER_CLASSES + " codes",
          present,
          0,
          CLEANER_CLASSES,
          OptionalDouble.empty());
    }
    OptionalDouble water = asset.waterPpm();
    if (water.isPresent() && water.getAsDouble() > DRY_PPM) {
      OptionalDouble now = CantleyWaterLife.factor(water.getAsDouble());
      add(
          RemedyKind.DRIER,
          "water from "
              + number(water.getAsDouble(), 0)
              + " down to 100 mg/kg"
              + (now.isPresent()
                  ? " (relative life by Cantley × " + number(1 / now.getAsDouble(), 1) + ")"
                  : " (beyond Cantley's 400 mg/kg)"),
          present,
          0,
          0,
          OptionalDouble.empty());
    }
  }

  /** Price of a change: as registered, corrected for a dearer oil, else volume times oil price. */
  private OptionalDouble changePrice(Optional<Oil> oil) {
    OptionalDouble volume = asset.asset().oilVolumeL();
    OptionalDouble change = asset.asset().changeCost();
    OptionalDouble usual = asset.oil().pricePerL();
    OptionalDouble its = oil.map(Oil::pricePerL).orElse(usual);
    boolean priced = volume.isPresent() && its.isPresent();
    if (change.isPresent()) {
      double more =
          priced && usual.isPresent()
              ? volume.getAsDouble() * (its.getAsDouble() - usual.getAsDouble())
              : 0;
      return OptionalDouble.of(Math.max(0, change.getAsDouble() + more));
    }
    return priced
        ? OptionalDouble.of(volume.getAsDouble() * its.getAsDouble())
        : OptionalDouble.empty();
  }

  private void add(
      RemedyKind kind,
      String name,
      OilViscosity oil,
      double warmerC,
      int cleanerBy,
      OptionalDouble price) {
    acts.add(new Act(kind, name, oil, warmerC, cleanerBy, price));
  }

  static String number(double value, int decimals) {
    BigDecimal rounded = BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_EVEN);
    return rounded.toPlainString();
  }
}
