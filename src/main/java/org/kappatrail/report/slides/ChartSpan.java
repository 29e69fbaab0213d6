package org.kappatrail.report.slides;

import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.kappatrail.history.Sample;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.BearingReview;
import org.kappatrail.review.trend.FanPoint;

/**
 * The stretch of calendar that an asset's charts share: its samples, at most of three years, and
 * the outlook.
 *
 * @param from first day, the first of a month
 * @param to last day
 */
record ChartSpan(LocalDate from, LocalDate to) {
  private static final int MOST_YEARS = 3;
  private static final int[] STEPS = {1, 2, 3, 4, 6, 12, 24, 60, 120};

  static Optional<ChartSpan> of(AssetReview asset) {
    List<LocalDate> days = asset.samples().stream().map(Sample::day).sorted().toList();
    if (days.isEmpty()) {
      return Optional.empty();
    }
    LocalDate last = days.get(days.size() - 1);
    LocalDate least = last.minusYears(MOST_YEARS);
    LocalDate first = days.get(0).isBefore(least) ? least : days.get(0);
    LocalDate end =
        Stream.concat(Stream.of(last.plusDays(7)), fan(asset).stream())
            .max(LocalDate::compareTo)
            .orElse(last);
    return Optional.of(new ChartSpan(first.withDayOfMonth(1), end));
  }

  private static List<LocalDate> fan(AssetReview asset) {
    return asset
        .governing()
        .flatMap((BearingReview bearing) -> bearing.trend().outlook())
        .map(outlook -> outlook.fan().stream().map(FanPoint::date).toList())
        .orElse(List.of());
  }

  boolean covers(LocalDate day) {
    return !day.isBefore(from) && !day.isAfter(to);
  }

  /** Months between ticks, so that there are no more than have room for their labels. */
  int stepMonths(int mostTicks) {
    long months = ChronoUnit.MONTHS.between(from, to) + 1;
    for (int step : STEPS) {
      if (months <= (long) mostTicks * step) {
        return step;
      }
    }
    return STEPS[STEPS.length - 1];
  }
}
