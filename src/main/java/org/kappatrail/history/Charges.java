package org.kappatrail.history;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Splits an asset's history into oil charges: at every recorded oil change, and where oil hours
 * fall back without one (tool convention). A sample of the very day of a change is the old oil's,
 * drawn at the drain, unless its oil hours have fallen back.
 */
public final class Charges {
  private Charges() {}

  /**
   * Charges of one asset in time.
   *
   * @param asset the asset
   * @param samples its samples
   * @param events its events; other kinds than oil changes are passed over
   */
  public static List<Charge> of(Asset asset, List<Sample> samples, List<Event> events) {
    List<Sample> inTime = samples.stream().sorted(Sample.IN_TIME).toList();
    List<Event> changes =
        events.stream()
            .filter(event -> event.kind() == EventKind.OIL_CHANGE)
            .sorted(Comparator.comparing(Event::date))
            .toList();
    List<Draft> drafts = new ArrayList<>();
    int nextChange = 0;
    OptionalDouble hours = OptionalDouble.empty();
    for (Sample sample : inTime) {
      while (nextChange < changes.size() && startsBefore(changes.get(nextChange), sample, hours)) {
        drafts.add(Draft.recorded(asset, changes.get(nextChange++), drafts));
        hours = OptionalDouble.empty();
      }
      if (drafts.isEmpty()) {
        drafts.add(new Draft(asset.oil(), Charge.Origin.BEFORE_HISTORY, Optional.empty()));
      } else if (hoursFellBack(hours, sample)) {
        String oil = drafts.get(drafts.size() - 1).oil;
        drafts.add(new Draft(oil, Charge.Origin.INFERRED, Optional.of(sample.day())));
      }
      drafts.get(drafts.size() - 1).samples.add(sample);
      OptionalDouble now = sample.exact(SampleColumns.OIL_HOURS);
      hours = now.isPresent() ? now : hours;
    }
    while (nextChange < changes.size()) {
      drafts.add(Draft.recorded(asset, changes.get(nextChange++), drafts));
    }
    return finish(asset, drafts);
  }

  private static boolean startsBefore(Event change, Sample sample, OptionalDouble hours) {
    int order = change.date().compareTo(sample.day());
    return order < 0 || (order == 0 && hoursFellBack(hours, sample));
  }

  /** True where a sample's hours are below the last known ones of its charge. */
  private static boolean hoursFellBack(OptionalDouble before, Sample sample) {
    OptionalDouble now = sample.exact(SampleColumns.OIL_HOURS);
    return before.isPresent() && now.isPresent() && now.getAsDouble() < before.getAsDouble();
  }

  private static List<Charge> finish(Asset asset, List<Draft> drafts) {
    List<Charge> charges = new ArrayList<>();
    for (int i = 0; i < drafts.size(); i++) {
      Draft draft = drafts.get(i);
      Optional<LocalDate> end = i + 1 < drafts.size() ? drafts.get(i + 1).start : Optional.empty();
      charges.add(
          new Charge(asset.id(), i + 1, draft.oil, draft.origin, draft.start, end, draft.samples));
    }
    return List.copyOf(charges);
  }

  /** A charge that is still being filled with samples. */
  private static final class Draft {
    private final String oil;
    private final Charge.Origin origin;
    private final Optional<LocalDate> start;
    private final List<Sample> samples = new ArrayList<>();

    private Draft(String oil, Charge.Origin origin, Optional<LocalDate> start) {
      this.oil = oil;
      this.origin = origin;
      this.start = start;
    }

    private static Draft recorded(Asset asset, Event change, List<Draft> before) {
      String usual = before.isEmpty() ? asset.oil() : before.get(before.size() - 1).oil;
      return new Draft(
          change.oil().orElse(usual), Charge.Origin.RECORDED, Optional.of(change.date()));
    }
  }
}
