package org.kappatrail.heldout;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.Random;

/**
 * A site of ten machines made from a seed: oils from VG 10 to VG 460 with and without ν100, oils so
 * thin that they have no index, recorded and inferred charges, codes and counts, and logs with
 * everything that goes wrong in logs.
 */
final class SeededSite {
  static final LocalDate START = LocalDate.of(2025, 2, 1);
  static final LocalDate AS_OF = LocalDate.of(2025, 6, 10);

  private static final OptionalDouble NONE = OptionalDouble.empty();

  private final Random random;
  private final List<Site.Bottle> bottles = new ArrayList<>();

  private SeededSite(long seed) {
    random = new Random(seed);
  }

  static Site of(long seed) {
    return new SeededSite(seed).site();
  }

  private Site site() {
    List<Site.Ring> rings = rings();
    bottles("dryer", 217, OptionalDouble.of(18.9), -0.0004, 14);
    bottles("press", 46, NONE, 0.0005, 19);
    bottles("spindle", 10, NONE, -0.006, 17);
    bottles("agitator", 455, NONE, 0.0001, 22);
    bottles("form-pump", 150, OptionalDouble.of(15.1), -0.0008, 25);
    bottles("fan", 68, OptionalDouble.of(8.7), 0.001, 16);
    bottles("sieve", 32, NONE, -0.0006, 20);
    bottles("stone-roll", 100, OptionalDouble.of(11.2), 0.0002, 18);
    bottles("oven", 320, NONE, 0.0007, 21);
    bottles("roof-fan", 14, OptionalDouble.of(3.2), -0.0002, 23);
    List<Site.Change> changes =
        List.of(
            new Site.Change("dryer", LocalDate.of(2025, 4, 3), ""),
            new Site.Change("oven", LocalDate.of(2025, 2, 9), "gear-320"),
            new Site.Change("oven", LocalDate.of(2025, 5, 2), "gear-460"),
            new Site.Change("fan", AS_OF.plusDays(2), ""));
    return new Site(
        oils(), assets(), rings, bottles, changes, new SeededReadings(random).of(rings), AS_OF);
  }

  private static List<Site.Oil> oils() {
    return List.of(
        oil("dryer-220", 220, NONE, 97),
        oil("hydraulic-46", 46, OptionalDouble.of(6.8), 0),
        oil("spindle-10", 10, OptionalDouble.of(2.6), 0),
        oil("gear-460", 460, NONE, 95),
        oil("circulating-150", 150, OptionalDouble.of(14.7), 0),
        oil("fan-68", 68, OptionalDouble.of(11.1), 0),
        oil("light-32", 32, NONE, 104),
        oil("circulating-100", 100, OptionalDouble.of(11.3), 0),
        oil("gear-320", 320, OptionalDouble.of(24.1), 0),
        oil("thin-15", 15, OptionalDouble.of(3.35), 0));
  }

  private static Site.Oil oil(String id, double v40, OptionalDouble v100, double index) {
    return new Site.Oil(id, v40, v100, v100.isPresent() ? NONE : OptionalDouble.of(index));
  }

  private static List<Site.Asset> assets() {
    return List.of(
        new Site.Asset("dryer", "dryer-220", true, NONE),
        new Site.Asset("press", "hydraulic-46", false, NONE),
        new Site.Asset("spindle", "spindle-10", true, NONE),
        new Site.Asset("agitator", "gear-460", false, NONE),
        new Site.Asset("form-pump", "circulating-150", true, NONE),
        new Site.Asset("fan", "fan-68", false, OptionalDouble.of(0.42)),
        new Site.Asset("sieve", "light-32", true, NONE),
        new Site.Asset("stone-roll", "circulating-100", false, NONE),
        new Site.Asset("oven", "gear-460", true, NONE),
        new Site.Asset("roof-fan", "thin-15", false, NONE));
  }

  private static List<Site.Ring> rings() {
    OptionalDouble no = NONE;
    return List.of(
        ring("dryer", "DS", "radial-roller", 180, 300, 160, 830, 1270, no, 97, no, 0),
        ring("dryer", "TS", "thrust-roller", 120, 250, 160, 700, 0, some(98), 60, some(1.3), 4.5),
        ring("press", "DE", "radial-ball", 60, 110, 1480, 48, 29, no, 3.1, no, -2),
        ring("press", "NDE", "thrust-ball", 55, 105, 980, 90, 200, no, 6, some(0.8), 0),
        ring("spindle", "FRONT", "radial-ball", 40, 68, 6000, 17, 11, no, 0.9, no, 0),
        ring("agitator", "LOW", "radial-roller", 140, 250, 48, 520, 610, no, 70, no, 6),
        ring("form-pump", "DE", "radial-ball", 80, 140, 1480, 72, 54, no, 6, no, 3),
        ring("fan", "DE", "radial-roller", 100, 215, 990, 400, 430, no, 30, no, 0),
        ring("fan", "NDE", "radial-roller", 90, 190, 990, 330, 0, no, 24, no, 1.5),
        ring("sieve", "DRIVE", "", 70, 150, 1200, 0, 0, no, 0, some(1.5), 0),
        ring("sieve", "TABLE", "thrust-roller", 420, 580, 15, 900, 4000, no, 90, no, 0),
        ring("stone-roll", "IN", "radial-roller", 150, 270, 300, 640, 760, no, 80, no, 0),
        ring("stone-roll", "OUT", "radial-roller", 150, 270, 300, 640, 760, no, 84, no, 2),
        ring("oven", "HOT", "radial-ball", 130, 230, 90, 150, 140, no, 12, no, 5),
        ring("roof-fan", "DE", "radial-ball", 50, 90, 2900, 35, 23, no, 2, no, 0));
  }

  /** The first bearing of each kind gives its pitch diameter, the others bore and outside. */
  private static Site.Ring ring(
      String asset,
      String id,
      String type,
      double bore,
      double outside,
      double rpm,
      double c,
      double c0,
      OptionalDouble cu,
      double p,
      OptionalDouble floor,
      double offset) {
    boolean pitched = id.equals("DE") || id.equals("LOW");
    return new Site.Ring(
        asset,
        id,
        type,
        pitched ? NONE : some(bore),
        pitched ? NONE : some(outside),
        pitched ? some(bore + 0.48 * (outside - bore)) : NONE,
        rpm,
        above(c),
        above(c0),
        cu,
        above(p),
        floor,
        offset);
  }

  /** Samples of an asset every so many days; the oil shifts by a share a day. */
  private void bottles(String asset, double v40, OptionalDouble v100, double drift, int every) {
    double hours = 400 + random.nextInt(4000);
    LocalDate day = START.plusDays(9 + random.nextInt(6));
    for (int n = 1; !day.isAfter(AS_OF.plusDays(20)); n++) {
      double age = day.toEpochDay() - START.toEpochDay();
      double share = Math.exp(drift * age + 0.006 * random.nextGaussian());
      hours = asset.equals("press") && n == 4 ? 90 : hours + every * 20;
      bottles.add(bottle(asset, n, day, hours, v40 * share, v100, share));
      day = day.plusDays(every + random.nextInt(5));
    }
  }

  private Site.Bottle bottle(
      String asset,
      int n,
      LocalDate day,
      double hours,
      double v40,
      OptionalDouble v100,
      double share) {
    boolean counted = asset.length() % 2 == 0;
    double count6 = Math.pow(10, 1.6 + 2 * random.nextDouble());
    String water = random.nextInt(6) == 0 ? "<20" : Integer.toString(15 + random.nextInt(500));
    String viscosity = text(v40, 2);
    if (asset.equals("stone-roll") && n == 2) {
      viscosity = ">95";
    }
    if (asset.equals("roof-fan") && n == 3) {
      viscosity = "";
    }
    boolean formed = asset.equals("form-pump") || asset.equals("fan");
    return new Site.Bottle(
        asset + "-" + n,
        asset,
        day,
        Math.rint(hours),
        viscosity,
        v100.isPresent() && n != 2
            ? text(v100.getAsDouble() * Math.pow(share, 0.8) * (1 + gauss(0.004)), 3)
            : "",
        water,
        code(counted, n),
        counted && n % 4 != 0 ? text(count6 * 3.1, 0) : "",
        counted ? text(count6, 1) : "",
        counted ? text(count6 / 11, 2) : "",
        formed && n % 3 != 0 ? text(54 + gauss(5), 1) : "");
  }

  /** A code where no counts are, now and then with parts that are bounds or not measured. */
  private String code(boolean counted, int n) {
    if (counted) {
      return n == 3 ? "26/25/24" : "";
    }
    int middle = 12 + random.nextInt(7);
    return switch (n % 5) {
      case 1 -> "-/" + middle + "/" + (middle - 3);
      case 2 -> ">" + (middle + 2) + "/" + middle + "/" + (middle - 2);
      case 3 -> "*/*/" + (middle - 3);
      default -> (middle + 2) + "/" + middle + "/" + (middle - 3);
    };
  }

  private double gauss(double spread) {
    return spread * random.nextGaussian();
  }

  private static OptionalDouble some(double value) {
    return OptionalDouble.of(value);
  }

  private static OptionalDouble above(double value) {
    return value > 0 ? OptionalDouble.of(value) : NONE;
  }

  static String text(double value, int decimals) {
    return String.format(Locale.ROOT, "%." + decimals + "f", value);
  }
}
