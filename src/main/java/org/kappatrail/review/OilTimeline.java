package org.kappatrail.review;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.kappatrail.history.Charge;
import org.kappatrail.history.Oil;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Sample;
import org.kappatrail.tribology.OilViscosity;

/**
 * Viscosity of an asset's oil from day to day. Within a charge it runs linearly in time between
 * samples and is held before the first and after the last; a charge that starts with a recorded oil
 * change starts at the registered oil when fresh.
 */
final class OilTimeline {
  private final List<Span> spans = new ArrayList<>();
  private final Map<String, OilViscosity> bySample = new LinkedHashMap<>();

  private record Anchor(long epochDay, OilViscosity viscosity) {}

  private record Span(Charge charge, List<Anchor> anchors) {}

  OilTimeline(List<Charge> charges, PlantHistory history) {
    for (Charge charge : charges) {
      Oil oil = history.getOil(charge.oil());
      List<Anchor> anchors = new ArrayList<>();
      if (charge.origin() == Charge.Origin.RECORDED) {
        anchors.add(new Anchor(charge.start().orElseThrow().toEpochDay(), oil.viscosity()));
      }
      for (Sample sample : charge.samples()) {
        SampleViscosity.of(sample, oil.viscosity())
            .ifPresent(
                viscosity -> {
                  bySample.put(sample.id(), viscosity);
                  anchors.add(new Anchor(sample.day().toEpochDay(), viscosity));
                });
      }
      spans.add(new Span(charge, anchors));
    }
  }

  Optional<OilViscosity> ofSample(Sample sample) {
    return Optional.ofNullable(bySample.get(sample.id()));
  }

  /** Viscosity on a day, days since 1970-01-01; empty where no charge or no viscosity is known. */
  Optional<OilViscosity> on(long epochDay) {
    for (int i = spans.size() - 1; i >= 0; i--) {
      Span span = spans.get(i);
      if (span.charge().start().isEmpty() || epochDay >= span.charge().start().get().toEpochDay()) {
        return within(span.anchors(), epochDay);
      }
    }
    return Optional.empty();
  }

  private static Optional<OilViscosity> within(List<Anchor> anchors, long epochDay) {
    if (anchors.isEmpty()) {
      return Optional.empty();
    }
    int last = anchors.size() - 1;
    while (last >= 0 && anchors.get(last).epochDay() > epochDay) {
      last--;
    }
    if (last < 0) {
      return Optional.of(anchors.get(0).viscosity());
    }
    Anchor before = anchors.get(last);
    if (last == anchors.size() - 1) {
      return Optional.of(before.viscosity());
    }
    Anchor after = anchors.get(last + 1);
    double share = (double) (epochDay - before.epochDay()) / (after.epochDay() - before.epochDay());
    return Optional.of(OilViscosity.interpolate(before.viscosity(), after.viscosity(), share));
  }
}
