package org.kappatrail.report.chart;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.kappatrail.history.Charge;
import org.kappatrail.history.Event;
import org.kappatrail.history.EventKind;
import org.kappatrail.review.AssetReview;

/**
 * An event as a chart marks it.
 *
 * @param day when
 * @param kind how it is drawn
 * @param label what it is called
 */
record EventMark(LocalDate day, Kind kind, String label) {
  private static final int LONGEST_NOTE = 28;

  /** Ways of drawing. */
  enum Kind {
    OIL_CHANGE,
    INFERRED_CHANGE,
    BEARING_REPLACED,
    SHORT
  }

  /** What was noted, cut where it is long. */
  private static String other(String note) {
    String plain = PlainText.of(note).strip();
    if (plain.isEmpty()) {
      return EventKind.OTHER.label();
    }
    int[] points = plain.codePoints().toArray();
    return points.length <= LONGEST_NOTE
        ? plain
        : new String(points, 0, LONGEST_NOTE - 1).stripTrailing() + "…";
  }

  static List<EventMark> of(AssetReview asset) {
    List<EventMark> marks = new ArrayList<>();
    for (Event event : asset.events()) {
      marks.add(
          switch (event.kind()) {
            case OIL_CHANGE -> new EventMark(event.date(), Kind.OIL_CHANGE, "oil change");
            case BEARING_REPLACED ->
                new EventMark(event.date(), Kind.BEARING_REPLACED, "new bearing");
            case TOP_UP -> new EventMark(event.date(), Kind.SHORT, "top-up");
            case FILTER_CHANGED -> new EventMark(event.date(), Kind.SHORT, "filter");
            case OTHER -> new EventMark(event.date(), Kind.SHORT, other(event.note()));
          });
    }
    for (Charge charge : asset.charges()) {
      if (charge.origin() == Charge.Origin.INFERRED) {
        marks.add(
            new EventMark(
                charge.start().orElseThrow(), Kind.INFERRED_CHANGE, "oil change, inferred"));
      }
    }
    marks.sort(Comparator.comparing(EventMark::day).thenComparing(EventMark::kind));
    return marks;
  }
}
