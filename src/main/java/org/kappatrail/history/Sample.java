package org.kappatrail.history;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.Collections;
import java.util.Comparator;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.kappatrail.tribology.CleanlinessCode;
import org.kappatrail.tribology.Iso4406;

/**
 * One oil sample as the laboratory reported it.
 *
 * @param id unique name
 * @param asset asset it was drawn from
 * @param sampledAt when it was drawn, site time; start of the day where only the day is known
 * @param timed true where the time of day is known
 * @param receivedOn day the result came in
 * @param laboratory who measured; empty where unknown
 * @param values numbers by canonical column name; a missing value has no entry
 * @param statedCode ISO 4406 code as stated by the laboratory
 * @param source where it was read
 */
public record Sample(
    String id,
    String asset,
    LocalDateTime sampledAt,
    boolean timed,
    Optional<LocalDate> receivedOn,
    String laboratory,
    Map<String, Measurement> values,
    Optional<CleanlinessCode> statedCode,
    SourceLine source) {

  /** In time; samples of one moment by id, so that the order never depends on the files'. */
  public static final Comparator<Sample> IN_TIME =
      Comparator.comparing(Sample::sampledAt).thenComparing(Sample::id);

  public Sample {
    Names.require("sample", id);
    Names.require("asset", asset);
    values = Collections.unmodifiableSortedMap(new TreeMap<>(values));
  }

  /** Day of sampling, site time. */
  public LocalDate day() {
    return sampledAt.toLocalDate();
  }

  /** Date or date-time as it was given, ISO 8601. */
  public String sampledAtText() {
    return timed ? sampledAt.toString() : day().toString();
  }

  public Optional<Measurement> find(String column) {
    return Optional.ofNullable(values.get(column));
  }

  /** The value where it was measured exactly; empty where missing or censored. */
  public OptionalDouble exact(String column) {
    return values.get(column) instanceof Measurement.Exact exact
        ? OptionalDouble.of(exact.stated())
        : OptionalDouble.empty();
  }

  /** The value to calculate with ({@link Measurement#forArithmetic}); empty where missing. */
  public OptionalDouble arithmetic(String column) {
    Measurement value = values.get(column);
    return value == null ? OptionalDouble.empty() : OptionalDouble.of(value.forArithmetic());
  }

  /**
   * Cleanliness code: from the particle counts where those for 6 and 14 µm are given, else as
   * stated, else from what counts there are. Counts that grow with the size, which no sample can
   * have, give none.
   */
  public Optional<CleanlinessCode> cleanliness() {
    OptionalDouble count4 = arithmetic(SampleColumns.PARTICLES_4UM);
    OptionalDouble count6 = arithmetic(SampleColumns.PARTICLES_6UM);
    OptionalDouble count14 = arithmetic(SampleColumns.PARTICLES_14UM);
    boolean counted = count6.isPresent() && count14.isPresent();
    boolean any = counted || count4.isPresent() || count6.isPresent() || count14.isPresent();
    if (!any || (!counted && statedCode.isPresent())) {
      return statedCode;
    }
    return countsFallWithSize() ? Optional.of(Iso4406.code(count4, count6, count14)) : statedCode;
  }

  /** False where a count for larger particles is above one for smaller ones. */
  public boolean countsFallWithSize() {
    double above = Double.POSITIVE_INFINITY;
    for (String column : SampleColumns.PARTICLES) {
      OptionalDouble count = arithmetic(column);
      if (count.isPresent()) {
        if (count.getAsDouble() > above) {
          return false;
        }
        above = count.getAsDouble();
      }
    }
    return true;
  }
}
