package org.kappatrail.review;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Function;
import org.kappatrail.history.Measurement;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.review.correlation.AssetSeries;
import org.kappatrail.review.correlation.CorrelationResults;
import org.kappatrail.review.correlation.Correlations;
import org.kappatrail.review.correlation.Names;
import org.kappatrail.review.correlation.Value;
import org.kappatrail.review.correlation.Variable;
import org.kappatrail.tribology.CleanlinessCode;
import org.kappatrail.tribology.Iso4406;

/**
 * The variables of an asset that correlations are looked for between: κ as achieved and at
 * reference conditions and the operating temperature, of the governing bearing, else of the first;
 * the oil's viscosities, hours, water, particles, elements and acid number; then every further
 * numeric column by name. Particle counts are logarithms to base 10.
 *
 * <p>The temperature that a sample itself states is no variable of its own: where no log gives the
 * operating temperature, it is that already.
 */
public final class CorrelationVariables {
  private static final List<String> VISCOSITIES =
      List.of(SampleColumns.VISCOSITY_40C, SampleColumns.VISCOSITY_100C);

  private CorrelationVariables() {}

  /** Every correlation of these assets. */
  public static CorrelationResults correlate(List<AssetReview> assets) {
    return Correlations.of(assets.stream().map(CorrelationVariables::of).toList());
  }

  /** The series of an asset; a variable without any value is left out. */
  public static AssetSeries of(AssetReview asset) {
    List<Sample> samples = asset.samples();
    List<Variable> variables = new ArrayList<>();
    Map<String, KappaPoint> points = points(asset);
    Function<Function<KappaPoint, OptionalDouble>, Function<Sample, Optional<Value>>> ofPoint =
        quantity -> sample -> ofPoint(points, sample, quantity);
    add(variables, Names.KAPPA, samples, ofPoint.apply(CorrelationVariables::kappa));
    add(variables, Names.KAPPA_REFERENCE, samples, ofPoint.apply(KappaPoint::kappaReference));
    VISCOSITIES.forEach(column -> addColumn(variables, column, samples));
    add(
        variables,
        Names.TEMPERATURE,
        samples,
        ofPoint.apply(point -> point.point().temperatureC()));
    addColumn(variables, SampleColumns.OIL_HOURS, samples);
    addColumn(variables, SampleColumns.WATER, samples);
    particles(variables, samples);
    List<String> further = further(samples);
    further.stream()
        .filter(column -> column.endsWith(SampleColumns.ELEMENT_SUFFIX))
        .forEach(column -> addColumn(variables, column, samples));
    addColumn(variables, SampleColumns.ACID_NUMBER, samples);
    further.stream()
        .filter(column -> !column.endsWith(SampleColumns.ELEMENT_SUFFIX))
        .forEach(column -> addColumn(variables, column, samples));
    return new AssetSeries(
        asset.asset().id(), samples.stream().map(CorrelationVariables::day).toList(), variables);
  }

  /** The bearing whose κ stands for the asset; empty for an asset without bearings. */
  public static Optional<BearingReview> bearing(AssetReview asset) {
    Optional<BearingReview> governing = asset.governing();
    return governing.isPresent() ? governing : asset.bearings().stream().findFirst();
  }

  private static Map<String, KappaPoint> points(AssetReview asset) {
    Map<String, KappaPoint> points = new HashMap<>();
    bearing(asset)
        .ifPresent(
            bearing -> bearing.trail().forEach(point -> points.put(point.sample().id(), point)));
    return points;
  }

  private static Optional<Value> ofPoint(
      Map<String, KappaPoint> points,
      Sample sample,
      Function<KappaPoint, OptionalDouble> quantity) {
    return Optional.ofNullable(points.get(sample.id()))
        .map(quantity)
        .filter(OptionalDouble::isPresent)
        .map(value -> Value.measured(value.getAsDouble()));
  }

  private static OptionalDouble kappa(KappaPoint point) {
    return point.film().isPresent()
        ? OptionalDouble.of(point.film().get().kappa())
        : OptionalDouble.empty();
  }

  private static List<String> further(List<Sample> samples) {
    Set<String> columns = new TreeSet<>();
    samples.forEach(sample -> columns.addAll(sample.values().keySet()));
    SampleColumns.NUMERIC.forEach(columns::remove);
    return List.copyOf(columns);
  }

  private static void addColumn(List<Variable> variables, String column, List<Sample> samples) {
    add(variables, column, samples, sample -> sample.find(column).map(CorrelationVariables::value));
  }

  private static void add(
      List<Variable> variables,
      String name,
      List<Sample> samples,
      Function<Sample, Optional<Value>> value) {
    List<Optional<Value>> values = samples.stream().map(value).toList();
    if (values.stream().anyMatch(Optional::isPresent)) {
      variables.add(Variable.of(name, values));
    }
  }

  private static void particles(List<Variable> variables, List<Sample> samples) {
    List<Function<CleanlinessCode, CleanlinessCode.Part>> parts =
        List.of(CleanlinessCode::c4, CleanlinessCode::c6, CleanlinessCode::c14);
    for (int size = 0; size < parts.size(); size++) {
      String column = SampleColumns.PARTICLES.get(size);
      Function<CleanlinessCode, CleanlinessCode.Part> part = parts.get(size);
      add(variables, column, samples, sample -> count(sample, column, part));
    }
  }

  /** Logarithm of the count, else of the middle of its class in the code. */
  private static Optional<Value> count(
      Sample sample, String column, Function<CleanlinessCode, CleanlinessCode.Part> part) {
    Optional<Measurement> counted = sample.find(column);
    return counted.isPresent()
        ? counted.map(CorrelationVariables::value).map(CorrelationVariables::logarithm)
        : sample.cleanliness().map(part).flatMap(CorrelationVariables::classMiddle);
  }

  /** A count of none is the middle of scale number 0, since it has no logarithm. */
  private static Value logarithm(Value count) {
    double least = Iso4406.classMiddlePerMl(0);
    return new Value(Math.log10(Math.max(least, count.arithmetic())), count.range());
  }

  private static Optional<Value> classMiddle(CleanlinessCode.Part part) {
    OptionalInt number = part.number();
    if (number.isEmpty()) {
      return Optional.empty();
    }
    double middle = Math.log10(Iso4406.classMiddlePerMl(number.getAsInt()));
    return Optional.of(
        new Value(middle, part.atLeast() ? Value.Range.ABOVE : Value.Range.MEASURED));
  }

  private static Value value(Measurement measurement) {
    Value.Range range =
        measurement instanceof Measurement.Below
            ? Value.Range.BELOW
            : measurement instanceof Measurement.Above ? Value.Range.ABOVE : Value.Range.MEASURED;
    return new Value(measurement.forArithmetic(), range);
  }

  private static double day(Sample sample) {
    return sample.day().toEpochDay()
        + sample.sampledAt().toLocalTime().toSecondOfDay() / (24.0 * 60 * 60);
  }
}
