package org.kappatrail.heldout;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;

/** A bearing's raw readings with the time that each counts for. */
record PlainLog(List<Span> running, boolean any) {
  private static final long GAP_MS = 3_600_000;

  /** A reading while running. */
  record Span(LocalDate day, long ms, double temperature, OptionalDouble speed) {
    double hours() {
      return ms / 3.6e6;
    }
  }

  private record Good(long ms, LocalDate day, double temperature, OptionalDouble speed) {}

  static PlainLog of(Site site, Site.Ring ring) {
    List<Good> good = new ArrayList<>();
    for (Site.Reading reading : site.readings()) {
      boolean own = reading.asset().equals(ring.asset()) && reading.bearing().equals(ring.id());
      if (own && List.of("", "good", "192").contains(reading.quality())) {
        take(site, reading, good);
      }
    }
    good.sort(
        Comparator.comparingLong(Good::ms)
            .thenComparingDouble(reading -> reading.speed().orElse(-1))
            .thenComparingDouble(Good::temperature));
    List<Span> running = new ArrayList<>();
    for (int i = 0; i < good.size(); i++) {
      Good now = good.get(i);
      long ms = i + 1 < good.size() ? Math.min(GAP_MS, good.get(i + 1).ms() - now.ms()) : GAP_MS;
      if (ms > 0 && now.speed().orElse(ring.rpm()) > 0.1 * ring.rpm()) {
        running.add(new Span(now.day(), ms, now.temperature(), now.speed()));
      }
    }
    return new PlainLog(running, !good.isEmpty());
  }

  private static void take(Site site, Site.Reading reading, List<Good> good) {
    LocalDate day = reading.at().atZone(SiteFiles.ZONE).toLocalDate();
    if (reading.temperature().isEmpty() || day.isAfter(site.asOf())) {
      return;
    }
    double temperature = Double.parseDouble(reading.temperature());
    OptionalDouble speed =
        reading.speed().isEmpty()
            ? OptionalDouble.empty()
            : OptionalDouble.of(Double.parseDouble(reading.speed()));
    if (temperature >= -40 && temperature <= 200 && speed.orElse(0) >= 0) {
      good.add(new Good(reading.at().toEpochMilli(), day, temperature, speed));
    }
  }

  /** Readings of the days after one up to and with another. */
  List<Span> between(LocalDate after, LocalDate last) {
    return running.stream()
        .filter(span -> span.day().isAfter(after) && !span.day().isAfter(last))
        .toList();
  }

  static double hours(List<Span> spans) {
    return ms(spans) / 3.6e6;
  }

  private static long ms(List<Span> spans) {
    return spans.stream().mapToLong(Span::ms).sum();
  }

  /** The value up to which a share of the time lies. */
  static double quantile(List<Span> spans, ToDoubleFunction<Span> value, double share) {
    List<Span> sorted = spans.stream().sorted(Comparator.comparingDouble(value)).toList();
    double target = share * ms(spans);
    long below = 0;
    for (Span span : sorted) {
      below += span.ms();
      if (below >= target) {
        return value.applyAsDouble(span);
      }
    }
    return value.applyAsDouble(sorted.get(sorted.size() - 1));
  }

  /** Mean of the logged speeds; empty where none was logged. */
  static OptionalDouble meanLoggedSpeed(List<Span> spans) {
    double hours = 0;
    double sum = 0;
    for (Span span : spans) {
      if (span.speed().isPresent()) {
        hours += span.hours();
        sum += span.hours() * span.speed().getAsDouble();
      }
    }
    return hours == 0 ? OptionalDouble.empty() : OptionalDouble.of(sum / hours);
  }
}
