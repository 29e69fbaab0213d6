package org.kappatrail.heldout;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.apache.commons.math3.distribution.NormalDistribution;

/** What the tables should say of one bearing, from its raw readings. */
final class PlainTrail {
  private static final double SIGMA_T = 1.5;

  private final Site.Asset asset;
  private final Site.Ring ring;
  private final PlainCharges charges;
  private final PlainLog log;

  PlainTrail(Site site, Site.Asset asset, Site.Ring ring) {
    this.asset = asset;
    this.ring = ring;
    this.charges = new PlainCharges(site, asset);
    this.log = PlainLog.of(site, ring);
  }

  private record Point(
      Site.Bottle bottle, OptionalDouble temperature, String source, double speed) {}

  /** Rows of kappa-history.csv by sample; an absent cell is the empty text. */
  Map<String, Map<String, String>> samples() {
    List<Point> points = charges.bottles().stream().map(this::point).toList();
    Map<String, Map<String, String>> rows = new TreeMap<>();
    LocalDate previous = LocalDate.MIN;
    for (Point point : points) {
      Map<String, String> row = new TreeMap<>();
      row(point, row);
      reference(points, charges.measured(point.bottle()), row);
      hours(previous, point.bottle().day(), row);
      previous = point.bottle().day();
      rows.put(point.bottle().id(), row);
    }
    return rows;
  }

  private Point point(Site.Bottle bottle) {
    List<PlainLog.Span> window = log.between(bottle.day().minusDays(7), bottle.day());
    if (window.isEmpty()) {
      OptionalDouble form =
          bottle.temperature().isEmpty()
              ? OptionalDouble.empty()
              : OptionalDouble.of(Double.parseDouble(bottle.temperature()));
      return new Point(bottle, form, form.isPresent() ? "sample" : "none", ring.rpm());
    }
    double median = PlainLog.quantile(window, PlainLog.Span::temperature, 0.5);
    double speed = PlainLog.meanLoggedSpeed(window).orElse(ring.rpm());
    return new Point(bottle, OptionalDouble.of(median + ring.offset()), "log", speed);
  }

  private void row(Point point, Map<String, String> row) {
    Site.Bottle bottle = point.bottle();
    row.put("charge", Integer.toString(charges.number(bottle)));
    row.put("oil", charges.oil(bottle));
    row.put("temperature_source", point.source());
    put(row, "temperature_c", point.temperature());
    put(row, "speed_rpm", OptionalDouble.of(point.speed()));
    Optional<PlainOil> oil = charges.measured(bottle);
    row.put("viscosity_100c_source", oil.map(PlainOil::source).orElse(""));
    put(row, "viscosity_40c_cst", number(oil.map(PlainOil::v40)));
    put(row, "viscosity_100c_cst", number(oil.map(PlainOil::v100)));
    OptionalDouble water = water(bottle.water());
    put(
        row,
        "water_life_factor",
        water.isPresent() && water.getAsDouble() >= 25 && water.getAsDouble() <= 400
            ? OptionalDouble.of(Math.pow(100 / water.getAsDouble(), 0.6))
            : OptionalDouble.empty());
    if (oil.isPresent() && point.temperature().isPresent()) {
      film(point, oil.get(), row);
    } else {
      for (String column : Deviations.OF_A_FILM) {
        row.put(column, "");
      }
      put(row, "contamination_factor", asset.contamination());
    }
  }

  private void film(Point point, PlainOil oil, Map<String, String> row) {
    double temperature = point.temperature().getAsDouble();
    double viscosity = oil.at(temperature);
    double rated = PlainLife.rated(point.speed(), ring.meanDiameter());
    double kappa = viscosity / rated;
    double sigma = sigma(oil, temperature);
    double floor = ring.floor().orElse(1);
    double low = kappa * Math.exp(-1.96 * sigma);
    put(row, "operating_viscosity_cst", viscosity);
    put(row, "rated_viscosity_cst", rated);
    put(row, "kappa", kappa);
    put(row, "kappa_low", low);
    put(row, "kappa_high", kappa * Math.exp(1.96 * sigma));
    put(row, "sigma", sigma);
    double distance = Math.log(floor / kappa) / sigma;
    put(
        row,
        "probability_below_floor",
        new NormalDistribution(null, 0, 1).cumulativeProbability(distance));
    row.put("regime", kappa < 0.1 ? "boundary" : kappa < 1 ? "mixed" : "full film");
    row.put("level", kappa < floor ? "alarm" : low < floor ? "alert" : "clear");
    OptionalDouble factor = contamination(point.bottle(), kappa);
    put(row, "contamination_factor", factor);
    life(kappa, point.speed(), factor, row);
  }

  private void life(double kappa, double speed, OptionalDouble eC, Map<String, String> row) {
    OptionalDouble modification = OptionalDouble.empty();
    OptionalDouble hours = OptionalDouble.empty();
    boolean limited = ring.cu().isPresent() || ring.c0().isPresent();
    boolean loaded = ring.c().isPresent() && ring.p().isPresent() && limited;
    if (eC.isPresent() && loaded && !ring.type().isEmpty()) {
      double cu =
          ring.cu()
              .orElseGet(
                  () ->
                      PlainLife.fatigueLimit(
                          ring.type(), ring.c0().orElseThrow(), ring.meanDiameter()));
      double p = ring.p().getAsDouble();
      modification = PlainLife.modification(ring.type(), kappa, eC.getAsDouble(), cu, p);
      if (modification.isPresent()) {
        double factor = modification.getAsDouble();
        hours =
            OptionalDouble.of(
                PlainLife.hours(ring.type(), ring.c().getAsDouble(), p, speed, factor));
      }
    }
    put(row, "life_modification", modification);
    put(row, "rating_life_h", hours);
  }

  private OptionalDouble contamination(Site.Bottle bottle, double kappa) {
    if (asset.contamination().isPresent()) {
      return asset.contamination();
    }
    String[] parts = bottle.code().split("/", -1);
    boolean counted = !bottle.count6().isEmpty();
    if (!counted && (parts.length < 3 || parts[1].equals("*"))) {
      return OptionalDouble.empty();
    }
    int number6 = counted ? scale(bottle.count6()) : Integer.parseInt(parts[1]);
    int number14 = counted ? scale(bottle.count14()) : Integer.parseInt(parts[2]);
    return OptionalDouble.of(
        PlainLife.contamination(asset.filtered(), number6, number14, kappa, ring.meanDiameter()));
  }

  private static int scale(String count) {
    return PlainLife.scaleNumber(Double.parseDouble(count));
  }

  private static OptionalDouble water(String text) {
    return text.startsWith("<")
        ? OptionalDouble.of(Double.parseDouble(text.substring(1)) / 2)
        : OptionalDouble.of(Double.parseDouble(text));
  }

  /** σ(ln κ) by steps of the inputs: 1 % of ν40 with the index held, 0.1 °C. */
  private static double sigma(PlainOil oil, double temperature) {
    double clipped = Math.max(25, Math.min(150, oil.v40()));
    double sigma40 = 0.000594 * Math.pow(clipped, 0.722) / 2.77;
    double up = PlainOil.like(oil.v40() * 1.01, oil).at(temperature);
    double down = PlainOil.like(oil.v40() / 1.01, oil).at(temperature);
    double toV40 = Math.log(up / down) / (2 * Math.log(1.01));
    double toT = Math.log(oil.at(temperature + 0.1) / oil.at(temperature - 0.1)) / 0.2;
    return Math.sqrt(Math.pow(toV40 * sigma40, 2) + Math.pow(toT * SIGMA_T, 2));
  }

  private void reference(List<Point> points, Optional<PlainOil> oil, Map<String, String> row) {
    List<Point> known = points.stream().filter(point -> point.temperature().isPresent()).toList();
    if (oil.isEmpty() || known.isEmpty()) {
      row.put("kappa_reference", "");
      return;
    }
    double temperature =
        median(known.stream().mapToDouble(point -> point.temperature().getAsDouble()).toArray());
    double speed = median(known.stream().mapToDouble(Point::speed).toArray());
    double rated = PlainLife.rated(speed, ring.meanDiameter());
    put(row, "kappa_reference", oil.get().at(temperature) / rated);
  }

  private static double median(double[] values) {
    double[] sorted = values.clone();
    Arrays.sort(sorted);
    int half = sorted.length / 2;
    return sorted.length % 2 == 1 ? sorted[half] : (sorted[half - 1] + sorted[half]) / 2;
  }

  private void hours(LocalDate previous, LocalDate day, Map<String, String> row) {
    List<PlainLog.Span> spans = log.between(previous, day);
    put(
        row,
        "running_hours",
        log.any() ? OptionalDouble.of(PlainLog.hours(spans)) : OptionalDouble.empty());
    boolean known = spans.stream().allMatch(span -> charges.on(span.day()).isPresent());
    row.put("mixed_hours_known", log.any() && known ? "yes" : "");
    put(row, "mixed_hours_least", known ? mixed(spans, 1) : 0);
    put(row, "mixed_hours_most", known ? mixed(spans, -1) : 0);
  }

  /**
   * Hours with κ below 1. A cell of the program is 0.5 °C and 1 % of the nominal speed wide, so a
   * reading may be counted with the oil that much colder and faster (side 1) or hotter and slower
   * (side −1), not more.
   */
  private double mixed(List<PlainLog.Span> spans, int side) {
    double hours = 0;
    for (PlainLog.Span span : spans) {
      PlainOil oil = charges.on(span.day()).orElseThrow();
      double speed = span.speed().orElse(ring.rpm()) + side * 0.01 * ring.rpm();
      if (kappa(oil, span.temperature() - side * 0.5, speed) < 1) {
        hours += span.hours();
      }
    }
    return hours;
  }

  private double kappa(PlainOil oil, double loggedTemperature, double speed) {
    return oil.at(loggedTemperature + ring.offset()) / PlainLife.rated(speed, ring.meanDiameter());
  }

  /** Rows of kappa-daily.csv by day. */
  Map<String, Map<String, String>> days() {
    Map<LocalDate, List<PlainLog.Span>> byDay = new TreeMap<>();
    for (PlainLog.Span span : log.running()) {
      byDay.computeIfAbsent(span.day(), day -> new ArrayList<>()).add(span);
    }
    Map<String, Map<String, String>> rows = new TreeMap<>();
    byDay.forEach((day, spans) -> rows.put(day.toString(), day(day, spans)));
    return rows;
  }

  private Map<String, String> day(LocalDate day, List<PlainLog.Span> spans) {
    Map<String, String> row = new TreeMap<>();
    double hours = PlainLog.hours(spans);
    put(row, "running_hours", hours);
    put(
        row,
        "temperature_c",
        PlainLog.quantile(spans, PlainLog.Span::temperature, 0.5) + ring.offset());
    double turns = 0;
    for (PlainLog.Span span : spans) {
      turns += span.hours() * span.speed().orElse(ring.rpm());
    }
    put(row, "speed_rpm", turns / hours);
    Optional<PlainOil> oil = charges.on(day);
    for (double share : new double[] {0.05, 0.5, 0.95}) {
      String column = share == 0.5 ? "kappa" : share < 0.5 ? "kappa_p05" : "kappa_p95";
      put(
          row,
          column,
          oil.isEmpty()
              ? OptionalDouble.empty()
              : OptionalDouble.of(
                  PlainLog.quantile(
                      spans,
                      span -> kappa(oil.get(), span.temperature(), span.speed().orElse(ring.rpm())),
                      share)));
    }
    row.put("mixed_hours_known", oil.isPresent() ? "yes" : "");
    put(row, "mixed_hours_least", oil.isPresent() ? mixed(spans, 1) : 0);
    put(row, "mixed_hours_most", oil.isPresent() ? mixed(spans, -1) : 0);
    return row;
  }

  private static OptionalDouble number(Optional<Double> value) {
    return value.map(OptionalDouble::of).orElse(OptionalDouble.empty());
  }

  private static void put(Map<String, String> row, String column, double value) {
    row.put(column, Double.toString(value));
  }

  private static void put(Map<String, String> row, String column, OptionalDouble value) {
    row.put(column, value.isPresent() ? Double.toString(value.getAsDouble()) : "");
  }
}
