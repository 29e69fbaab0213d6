package org.kappatrail.review;

import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import java.util.TreeSet;
import org.kappatrail.history.Charge;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;

/**
 * A sample unlike its own asset's others of the charge and like another asset's: a bottle with the
 * wrong label. Distance: root mean square, over viscosity at 40 °C and the additive elements of the
 * register, of the differences of logarithms from the charge's medians, each in units of the
 * scatter that is usual for it (a distance in the manner of Mahalanobis with a diagonal covariance;
 * scatter and limits are tool conventions).
 */
final class SwappedSamples {
  private static final double SCATTER_VISCOSITY = 0.012;
  private static final double SCATTER_ELEMENT = 0.06;
  private static final double UNLIKE = 6;
  private static final double LIKE = 2.5;
  private static final int LEAST_OTHERS = 3;
  private static final int LEAST_FEATURES = 3;
  private static final int SAME_ROUND_DAYS = 7;

  /** Additives below this are traces, and their ratios mean nothing, mg/kg. */
  private static final double TRACE_PPM = 3;

  private final TreeSet<String> features = new TreeSet<>();
  private final List<Profile> profiles = new ArrayList<>();

  /** What the samples of one charge have in common. */
  private record Profile(
      Charge charge, Map<String, Double> medians, List<Map<String, Double>> samples) {}

  private record Odd(Profile profile, Sample sample, Map<String, Double> values) {}

  private SwappedSamples(List<Charge> charges, PlantHistory history) {
    features.add(SampleColumns.VISCOSITY_40C);
    history.oils().forEach(oil -> features.addAll(oil.elementsPpm().keySet()));
    for (Charge charge : charges) {
      List<Map<String, Double>> samples = charge.samples().stream().map(this::values).toList();
      profiles.add(new Profile(charge, medians(samples), samples));
    }
  }

  /** Findings by asset. */
  static Map<String, List<Finding>> in(List<Charge> charges, PlantHistory history) {
    SwappedSamples search = new SwappedSamples(charges, history);
    Map<String, List<Finding>> found = new HashMap<>();
    List<Odd> odd = search.odd();
    for (Odd sample : odd) {
      search
          .finding(sample, odd)
          .ifPresent(
              finding ->
                  found.computeIfAbsent(finding.asset(), a -> new ArrayList<>()).add(finding));
    }
    return found;
  }

  private List<Odd> odd() {
    List<Odd> odd = new ArrayList<>();
    for (Profile profile : profiles) {
      List<Sample> samples = profile.charge().samples();
      if (samples.size() <= LEAST_OTHERS) {
        continue;
      }
      for (int i = 0; i < samples.size(); i++) {
        Map<String, Double> values = profile.samples().get(i);
        OptionalDouble distance = distance(values, profile.medians());
        if (distance.isPresent() && distance.getAsDouble() > UNLIKE) {
          odd.add(new Odd(profile, samples.get(i), values));
        }
      }
    }
    return odd;
  }

  private Optional<Finding> finding(Odd sample, List<Odd> odd) {
    List<Profile> like =
        profiles.stream()
            .filter(other -> !other.charge().asset().equals(sample.profile().charge().asset()))
            .filter(other -> other.samples().size() > LEAST_OTHERS)
            .filter(other -> inUse(other.charge(), sample.sample().day()))
            .filter(other -> distance(sample.values(), other.medians()).orElse(LIKE + 1) <= LIKE)
            .sorted(
                Comparator.comparing((Profile other) -> partner(sample, other, odd).isEmpty())
                    .thenComparingDouble(
                        other -> distance(sample.values(), other.medians()).orElse(LIKE))
                    .thenComparing(other -> other.charge().asset()))
            .toList();
    if (like.isEmpty()) {
      return Optional.empty();
    }
    Profile other = like.get(0);
    Optional<Odd> partner = partner(sample, other, odd);
    String asset = sample.profile().charge().asset();
    return Optional.of(
        Finding.ofSample(
            asset,
            sample.sample().id(),
            Level.ALERT,
            FindingKind.SWAPPED_SAMPLES,
            Say.text(
                "unlike the charge's other samples (%s of %s mm²/s at 40 °C; distance %s in"
                    + " viscosity and additives) and like those of %s (distance %s)%s; draw it"
                    + " again before acting on it",
                of(sample.values()),
                of(sample.profile().medians()),
                Say.significant(distance(sample.values(), sample.profile().medians()).orElse(0), 2),
                other.charge().asset(),
                Say.significant(distance(sample.values(), other.medians()).orElse(0), 2),
                partner
                    .map(
                        found ->
                            ", whose sample "
                                + found.sample().id()
                                + " of those days is like this asset's: the bottles look swapped")
                    .orElse(""))));
  }

  private static String of(Map<String, Double> values) {
    Double viscosity = values.get(SampleColumns.VISCOSITY_40C);
    return viscosity == null ? "?" : Say.viscosity(Math.exp(viscosity));
  }

  private Optional<Odd> partner(Odd sample, Profile other, List<Odd> odd) {
    return odd.stream()
        .filter(found -> found.profile().charge().asset().equals(other.charge().asset()))
        .filter(
            found ->
                Math.abs(ChronoUnit.DAYS.between(found.sample().day(), sample.sample().day()))
                    <= SAME_ROUND_DAYS)
        .filter(
            found -> distance(found.values(), sample.profile().medians()).orElse(LIKE + 1) <= LIKE)
        .findFirst();
  }

  private static boolean inUse(Charge charge, LocalDate day) {
    return charge.covers(day);
  }

  private Map<String, Double> values(Sample sample) {
    Map<String, Double> values = new TreeMap<>();
    for (String feature : features) {
      OptionalDouble value = sample.exact(feature);
      if (value.isPresent() && value.getAsDouble() >= TRACE_PPM) {
        values.put(feature, Math.log(value.getAsDouble()));
      } else if (value.isPresent() || sample.find(feature).isPresent()) {
        values.put(feature, Math.log(TRACE_PPM));
      }
    }
    return values;
  }

  private static Map<String, Double> medians(List<Map<String, Double>> samples) {
    Map<String, List<Double>> columns = new TreeMap<>();
    samples.forEach(
        sample ->
            sample.forEach(
                (feature, value) ->
                    columns.computeIfAbsent(feature, f -> new ArrayList<>()).add(value)));
    Map<String, Double> medians = new TreeMap<>();
    columns.forEach(
        (feature, values) -> {
          double[] sorted = values.stream().mapToDouble(v -> v).sorted().toArray();
          int half = sorted.length / 2;
          medians.put(
              feature,
              sorted.length % 2 == 1 ? sorted[half] : (sorted[half - 1] + sorted[half]) / 2);
        });
    return medians;
  }

  private static OptionalDouble distance(Map<String, Double> values, Map<String, Double> centre) {
    double sum = 0;
    int count = 0;
    for (Map.Entry<String, Double> value : values.entrySet()) {
      Double middle = centre.get(value.getKey());
      if (middle != null) {
        boolean viscosity = value.getKey().equals(SampleColumns.VISCOSITY_40C);
        double z = (value.getValue() - middle) / (viscosity ? SCATTER_VISCOSITY : SCATTER_ELEMENT);
        sum += z * z;
        count++;
      }
    }
    return count < LEAST_FEATURES
        ? OptionalDouble.empty()
        : OptionalDouble.of(Math.sqrt(sum / count));
  }
}
