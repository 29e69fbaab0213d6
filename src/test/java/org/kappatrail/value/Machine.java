package org.kappatrail.value;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.SplittableRandom;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.Oil;
import org.kappatrail.review.OneBearing;
import org.kappatrail.review.decision.BearingLife;
import org.kappatrail.review.decision.Cleanliness;
import org.kappatrail.tribology.AstmD7152Blend;
import org.kappatrail.tribology.Iso281RatedViscosity;
import org.kappatrail.tribology.OilViscosity;

/**
 * The truth of one machine: how warm it runs, what its oil truly is on a day after it was filled,
 * what a failure costs. Everything is drawn from a seed.
 */
final class Machine {
  /** Days of log before the first decision. */
  static final int BEFORE = 420;

  static final int MONTHS = 60;
  static final int MONTH = 30;
  static final int DAYS = BEFORE + MONTHS * MONTH;

  private static final int[] GRADES = {68, 100, 150, 220, 320, 460};
  private static final double INDEX = 97;
  private static final double HOURS_PER_DAY = 24;
  private static final double DYNAMIC_KN = 300;
  private static final double STATIC_KN = 340;

  final String name;
  final Trouble trouble;
  final int onset;
  final double severity;
  final double changeCost;
  final double coolingCost;
  final double failureCost;
  final String registered;
  final Map<String, Oil> oils = new LinkedHashMap<>();
  final OneBearing made;
  final Bearing bearing;
  final Cleanliness cleanliness;
  final double temperatureBias;
  private final double[] warmth = new double[DAYS];
  private final double foulingC;
  private final BearingLife life;

  Machine(long seed, int number) {
    SplittableRandom random = new SplittableRandom(seed * 1_000_003 + number);
    name = "M" + number;
    Trouble[] troubles = Trouble.values();
    trouble = random.nextDouble() < 0.25 ? Trouble.NONE : troubles[random.nextInt(troubles.length)];
    onset = BEFORE + random.nextInt(40 * MONTH);
    severity = random.nextDouble();
    changeCost = random.nextDouble(150, 900);
    coolingCost = random.nextDouble(500, 3000);
    failureCost = changeCost * Math.exp(random.nextDouble(Math.log(15), Math.log(300)));
    for (int grade : GRADES) {
      oils.put("mineral-" + grade, OneBearing.oil("mineral-" + grade, grade, grade, INDEX));
    }
    int grade = GRADES[random.nextInt(4)];
    registered = "mineral-" + grade;
    double rpm = Math.exp(random.nextDouble(Math.log(80), Math.log(1500)));
    double pitch = random.nextDouble(90, 260);
    double rated = Iso281RatedViscosity.ratedViscosityCst(rpm, pitch);
    double kappa = Math.exp(random.nextDouble(Math.log(0.8), Math.log(2.6)));
    double base =
        Math.min(95, Math.max(35, oil(registered).viscosity().law().temperatureC(kappa * rated)));
    double season = random.nextDouble(2, 8);
    foulingC = trouble == Trouble.FOULED_COOLER ? random.nextDouble(8, 20) : 0;
    temperatureBias = 1.5 * gaussian(random);
    double weather = 0;
    int phase = random.nextInt(365);
    for (int day = 0; day < DAYS; day++) {
      weather = 0.8 * weather + 0.6 * gaussian(random);
      warmth[day] = base + season * Math.cos(2 * Math.PI * (day + phase) / 365) + weather;
    }
    double wanted = Math.exp(random.nextDouble(Math.log(40_000), Math.log(300_000)));
    made =
        new OneBearing(name)
            .oilInUse(oil(registered))
            .bearing(pitch, rpm, DYNAMIC_KN, STATIC_KN, load(pitch, rpm, base, wanted))
            .costs(changeCost, coolingCost, failureCost);
    oils.values().stream().filter(o -> !o.id().equals(registered)).forEach(made::otherOil);
    bearing = made.bearing();
    cleanliness = made.cleanliness();
    life = new BearingLife(bearing);
  }

  /** The thickest oil on the shelf. */
  String thickest() {
    return "mineral-" + GRADES[GRADES.length - 1];
  }

  /** The load under which fresh oil at the mean temperature gives a wanted L10mh. */
  private double load(double pitch, double rpm, double temperature, double wantedH) {
    Cleanliness clean = new OneBearing("load").cleanliness();
    OilViscosity fresh = oil(registered).viscosity();
    double kappa =
        fresh.viscosityCst(temperature) / Iso281RatedViscosity.ratedViscosityCst(rpm, pitch);
    double low = DYNAMIC_KN / 60;
    double high = DYNAMIC_KN / 2;
    for (int i = 0; i < 40; i++) {
      double middle = Math.sqrt(low * high);
      Bearing tried =
          new OneBearing("load").bearing(pitch, rpm, DYNAMIC_KN, STATIC_KN, middle).bearing();
      double hours = new BearingLife(tried).ratingLifeH(kappa, rpm, clean).orElseThrow();
      if (hours > wantedH) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return low;
  }

  Oil oil(String id) {
    Oil found = oils.get(id);
    if (found == null) {
      throw new IllegalArgumentException("no oil " + id);
    }
    return found;
  }

  /** True temperature on a day, the cooler having been put right on some day (or never). */
  double temperatureC(int day, int cooledOn) {
    double since = Math.max(0, day - onset) / 180.0;
    boolean fouled = trouble == Trouble.FOULED_COOLER && day >= onset && cooledOn < onset;
    return warmth[day] + (fouled ? foulingC * Math.min(1, since) : 0);
  }

  /** What is truly in the sump on a day. */
  OilViscosity oil(int day, String id, int filledOn) {
    OilViscosity fresh = oil(id).viscosity();
    double months = (day - Math.max(filledOn, 0)) / (double) MONTH;
    double leaking = (day - Math.max(filledOn, onset)) / (double) MONTH;
    return switch (trouble) {
      case SHEAR ->
          scaled(fresh, 1 - (0.08 + 0.2 * severity) * Math.pow(Math.min(1, months / 20), 0.8));
      case OXIDATION ->
          scaled(fresh, 1 + (0.1 + 0.3 * severity) * Math.pow(Math.min(1, months / 36), 1.3));
      case DILUTION ->
          leaking <= 0
              ? fresh
              : blended(fresh, 2.5, 1.05, Math.min(0.12, (0.002 + 0.006 * severity) * leaking));
      case WRONG_TOP_UP ->
          filledOn < onset && day >= onset
              ? blended(fresh, 32, 5.4, 0.08 + 0.25 * severity)
              : fresh;
      default -> fresh;
    };
  }

  private static OilViscosity scaled(OilViscosity fresh, double factor) {
    return factor == 1 ? fresh : OilViscosity.withIndexOf(fresh.viscosity40Cst() * factor, fresh);
  }

  private static OilViscosity blended(OilViscosity fresh, double v40, double v100, double share) {
    return OilViscosity.measured(
        AstmD7152Blend.viscosityCst(fresh.viscosity40Cst(), v40, share),
        AstmD7152Blend.viscosityCst(fresh.viscosity100Cst(), v100, share));
  }

  /**
   * Fresh oil of the present grade has κ below 1 at the temperature that the machine ought to have.
   */
  boolean tooThinByDesign(Policy.State state) {
    double kappa =
        oil(state.oil()).viscosity().viscosityCst(warmth[state.day()])
            / Iso281RatedViscosity.ratedViscosityCst(bearing.speedRpm(), bearing.pitchMm());
    return kappa < 1;
  }

  /** Fraction of L10mh used up on a day. */
  double damage(int day, String oil, int filledOn, int cooledOn) {
    return damage(oil(day, oil, filledOn), temperatureC(day, cooledOn));
  }

  private double damage(OilViscosity oil, double temperatureC) {
    double kappa =
        oil.viscosityCst(temperatureC)
            / Iso281RatedViscosity.ratedViscosityCst(bearing.speedRpm(), bearing.pitchMm());
    return HOURS_PER_DAY / life.ratingLifeH(kappa, bearing.speedRpm(), cleanliness).orElseThrow();
  }

  static double gaussian(SplittableRandom random) {
    double radius = StrictMath.sqrt(-2 * StrictMath.log(1 - random.nextDouble()));
    return radius * StrictMath.cos(2 * Math.PI * random.nextDouble());
  }
}
