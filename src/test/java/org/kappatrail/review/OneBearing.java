package org.kappatrail.review;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.TreeMap;
import java.util.function.Consumer;
import org.kappatrail.duty.BearingDuty;
import org.kappatrail.duty.DroppedReadings;
import org.kappatrail.duty.DutyCells;
import org.kappatrail.duty.DutyLog;
import org.kappatrail.history.Asset;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.Event;
import org.kappatrail.history.EventKind;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Measurement;
import org.kappatrail.history.Oil;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Problem;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.history.Settings;
import org.kappatrail.history.SourceLine;
import org.kappatrail.review.decision.Cleanliness;
import org.kappatrail.tribology.BearingType;
import org.kappatrail.tribology.CleanlinessCode;
import org.kappatrail.tribology.OilSupply;
import org.kappatrail.tribology.OilViscosity;

/** A made-up asset with one bearing, a log of one cell a day, and samples; for tests. */
public final class OneBearing {
  private static final long DAY_MS = 86_400_000;

  private final String id;
  private OptionalDouble volumeL = OptionalDouble.empty();
  private Asset asset;
  private Bearing bearing;
  private final List<Oil> oils = new ArrayList<>();
  private final List<Sample> samples = new ArrayList<>();
  private final List<Event> events = new ArrayList<>();
  private final TreeMap<LocalDate, double[]> days = new TreeMap<>();

  /** An asset with an ISO VG 150 oil of index 97 and a roller bearing under known loads. */
  public OneBearing(String id) {
    this.id = id;
    oils.add(oil("mineral-150", 150, 150, 97));
    this.asset =
        asset(
            "mineral-150", OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty());
    this.bearing = roller(150, 300, 535, 600, 60);
  }

  /** An oil of a viscosity at 40 °C and an index. */
  public static Oil oil(String name, int vg, double v40, double index) {
    return new Oil(
        name,
        OptionalInt.of(vg),
        OilViscosity.register(v40, OptionalDouble.empty(), OptionalDouble.of(index)),
        false,
        false,
        OptionalDouble.empty(),
        Map.of());
  }

  private Asset asset(
      String oil, OptionalDouble change, OptionalDouble cooling, OptionalDouble failure) {
    return new Asset(
        id,
        id,
        "",
        oil,
        OilSupply.BATH,
        volumeL,
        OptionalDouble.empty(),
        change,
        cooling,
        failure,
        OptionalInt.of(30));
  }

  private Bearing roller(double pitchMm, double rpm, double c, double c0, double p) {
    return new Bearing(
        id,
        "B",
        Optional.of(BearingType.RADIAL_ROLLER),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        pitchMm,
        rpm,
        OptionalDouble.of(c),
        OptionalDouble.of(c0),
        OptionalDouble.empty(),
        OptionalDouble.of(p),
        OptionalDouble.empty(),
        0);
  }

  public OneBearing oilInUse(Oil oil) {
    oils.removeIf(known -> known.id().equals(oil.id()));
    oils.add(oil);
    asset = asset(oil.id(), asset.changeCost(), asset.coolingCost(), asset.failureCost());
    return this;
  }

  public OneBearing otherOil(Oil oil) {
    oils.removeIf(known -> known.id().equals(oil.id()));
    oils.add(oil);
    return this;
  }

  public OneBearing costs(double change, double cooling, double failure) {
    asset =
        asset(
            asset.oil(),
            OptionalDouble.of(change),
            OptionalDouble.of(cooling),
            OptionalDouble.of(failure));
    return this;
  }

  public OneBearing bearing(double pitchMm, double rpm, double c, double c0, double p) {
    bearing = roller(pitchMm, rpm, c, c0, p);
    return this;
  }

  public OneBearing withoutLoads() {
    bearing =
        new Bearing(
            id,
            "B",
            Optional.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            bearing.pitchMm(),
            bearing.speedRpm(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            0);
    return this;
  }

  /** The register of this asset again, without samples, days and events. */
  public OneBearing copy() {
    OneBearing other = new OneBearing(id);
    other.asset = asset;
    other.bearing = bearing;
    other.oils.clear();
    other.oils.addAll(oils);
    return other;
  }

  public OneBearing withoutCosts() {
    asset =
        asset(asset.oil(), OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty());
    return this;
  }

  public Bearing bearing() {
    return bearing;
  }

  /** What the contamination factor rests on: the code that every sample here carries. */
  public Cleanliness cleanliness() {
    return new Cleanliness(
        OptionalDouble.empty(), CleanlinessCode.find("18/16/13"), asset.supply());
  }

  /** A day of 24 running hours at one temperature and the nominal speed. */
  public OneBearing day(LocalDate date, double temperatureC) {
    days.put(date, new double[] {temperatureC, bearing.speedRpm()});
    return this;
  }

  /** A sample with the viscosity at 40 °C, a code of 18/16/13, and others given. */
  public OneBearing sample(LocalDate date, double v40, Map<String, Double> others) {
    Map<String, Measurement> values = new TreeMap<>();
    values.put(SampleColumns.VISCOSITY_40C, Measurement.of(v40));
    others.forEach((column, value) -> values.put(column, Measurement.of(value)));
    samples.add(
        new Sample(
            id + "-" + date,
            id,
            date.atStartOfDay(),
            false,
            Optional.empty(),
            "",
            values,
            CleanlinessCode.find("18/16/13"),
            new SourceLine("samples/made-up.csv", samples.size() + 2)));
    return this;
  }

  public OneBearing sample(LocalDate date, double v40) {
    return sample(date, v40, Map.of());
  }

  public OneBearing oilChange(LocalDate date) {
    return oilChange(date, asset.oil());
  }

  public OneBearing oilChange(LocalDate date, String oil) {
    events.add(
        new Event(
            id,
            date,
            EventKind.OIL_CHANGE,
            Optional.of(oil),
            OptionalDouble.empty(),
            Optional.empty(),
            ""));
    return this;
  }

  /** A top-up of an oil that the record does not name. */
  public OneBearing topUp(LocalDate date, double litres) {
    events.add(
        new Event(
            id,
            date,
            EventKind.TOP_UP,
            Optional.empty(),
            OptionalDouble.of(litres),
            Optional.empty(),
            ""));
    return this;
  }

  /** Volume of a charge, litres. */
  public OneBearing volume(double litres) {
    volumeL = OptionalDouble.of(litres);
    asset = asset(asset.oil(), asset.changeCost(), asset.coolingCost(), asset.failureCost());
    return this;
  }

  /** Reviews the asset as of its latest sample. */
  public AssetReview review() {
    return review(Settings.defaults());
  }

  public AssetReview review(Settings settings) {
    PlantHistory history =
        new PlantHistory(oils, List.of(asset), List.of(bearing), samples, events);
    LocalDate asOf = samples.get(samples.size() - 1).day();
    return new Reviewer(history, history, settings, asOf, Progress.SILENT).review(log(asOf)).get(0);
  }

  private DutyLog log(LocalDate asOf) {
    DutyCells.Builder cells = new DutyCells.Builder();
    days.headMap(asOf, true)
        .forEach(
            (date, point) ->
                cells.add(
                    Math.toIntExact(date.toEpochDay()),
                    true,
                    DAY_MS,
                    24,
                    point[0],
                    point[0] - 0.1,
                    point[0] + 0.1,
                    true,
                    point[1]));
    BearingDuty duty = new BearingDuty(bearing.key(), cells.build(), DroppedReadings.NONE);
    return new DutyLog() {
      @Override
      public void forEachBearing(Consumer<BearingDuty> use) {
        if (!days.isEmpty()) {
          use.accept(duty);
        }
      }

      @Override
      public List<FileAccount> accounts() {
        return List.of();
      }

      @Override
      public List<Problem> problems() {
        return List.of();
      }

      @Override
      public void close() {}
    };
  }
}
