package org.kappatrail.demo;

import java.time.LocalDate;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.kappatrail.tribology.OilViscosity;

/** The oil that truly is in an asset, day by day. */
final class OilTruth {
  private static final List<String> ADDITIVES =
      List.of("zinc_ppm", "phosphorus_ppm", "calcium_ppm", "boron_ppm");
  private static final double FRESH_ACID_NUMBER = 0.28;
  private static final double ACID_PER_1000_H = 0.011;
  private static final double BATCH_SPREAD = 0.001;

  private final AssetStory story;
  private final Running running;

  OilTruth(AssetStory story, Running running) {
    this.story = story;
    this.running = running;
  }

  /** An oil as the register describes it. */
  static OilState fresh(String oil) {
    Map<String, String> row = row(Register.OILS, "oil", oil);
    OilViscosity viscosity =
        OilViscosity.register(
            Rows.number(row, "viscosity_40c_cst"),
            optional(row, "viscosity_100c_cst"),
            optional(row, "viscosity_index"));
    Map<String, Double> additives = new LinkedHashMap<>();
    ADDITIVES.forEach(element -> additives.put(element, optional(row, element).orElse(0)));
    return new OilState(
        viscosity.viscosity40Cst(), viscosity.viscosity100Cst(), additives, FRESH_ACID_NUMBER);
  }

  /** The oil that a bottle filled on that day holds. */
  OilState at(LocalDate day) {
    LocalDate filled = filledBefore(day);
    double batch = BATCH_SPREAD * Noise.named("batch", story.asset(), filled.toString()).gaussian();
    OilState oil =
        fresh(Rows.text(row(Register.ASSETS, "asset", story.asset()), "oil"))
            .thickened(1 + batch, 0)
            .soured(ACID_PER_1000_H * hoursSince(filled, day) / 1000);
    for (Influence.OnOil influence : story.influences(Influence.OnOil.class)) {
      if (!influence.from().isBefore(filled) && day.isAfter(influence.from())) {
        oil = influence.change(oil, day);
      }
    }
    return oil;
  }

  /** True age of the oil on that day, hours at work. */
  double trueHours(LocalDate day) {
    return hoursSince(filledBefore(day), day);
  }

  /** Age of the oil as the site counts it, hours at work. */
  double countedHours(LocalDate day) {
    Stream<LocalDate> putBack =
        silent().filter(Influence.SilentChange::hoursPutBack).map(Influence.SilentChange::day);
    return hoursSince(latest(Stream.concat(recorded(), putBack), day), day);
  }

  private LocalDate filledBefore(LocalDate day) {
    return latest(Stream.concat(recorded(), silent().map(Influence.SilentChange::day)), day);
  }

  private double hoursSince(LocalDate filled, LocalDate day) {
    double before = filled.equals(Timeline.FIRST) ? story.hoursAtStart() : 0;
    return before + running.hours(filled, day);
  }

  private Stream<Influence.SilentChange> silent() {
    return story.influences(Influence.SilentChange.class).stream();
  }

  private Stream<LocalDate> recorded() {
    return Rows.of(Register.EVENTS).stream()
        .filter(row -> Rows.text(row, "asset").equals(story.asset()))
        .filter(row -> Rows.text(row, "event").equals("oil-change"))
        .map(row -> LocalDate.parse(Rows.text(row, "date")));
  }

  private static LocalDate latest(Stream<LocalDate> changes, LocalDate day) {
    return changes
        .filter(change -> change.isBefore(day))
        .max(LocalDate::compareTo)
        .orElse(Timeline.FIRST);
  }

  static Map<String, String> row(String table, String column, String value) {
    return Rows.of(table).stream()
        .filter(row -> Rows.text(row, column).equals(value))
        .findFirst()
        .orElseThrow(() -> new IllegalArgumentException("no " + column + " " + value));
  }

  static OptionalDouble optional(Map<String, String> row, String column) {
    String cell = Rows.text(row, column);
    return cell.isEmpty() ? OptionalDouble.empty() : OptionalDouble.of(Double.parseDouble(cell));
  }
}
