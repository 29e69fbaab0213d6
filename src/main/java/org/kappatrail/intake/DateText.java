package org.kappatrail.intake;

import java.time.DateTimeException;
import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.OffsetDateTime;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.time.temporal.TemporalAccessor;
import java.time.temporal.TemporalQueries;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reads dates and times as one kind of file writes them: ISO 8601, or one stated pattern. A time
 * with an offset, and a local time of another zone than the site's, become site time.
 */
final class DateText {
  private static final Pattern ISO =
      Pattern.compile(
          "(\\d{4}-\\d{2}-\\d{2})"
              + "(?:[T ](\\d{2}:\\d{2}(?::\\d{2}(?:\\.\\d{1,9})?)?)\\s?(Z|[+-]\\d{2}(?::?\\d{2})?)?)?");
  private static final LocalDate EARLIEST = LocalDate.of(1950, 1, 1);
  private static final LocalDate LATEST = LocalDate.of(2200, 12, 31);

  private final Optional<String> pattern;
  private final Optional<DateTimeFormatter> formatter;
  private final ZoneId from;
  private final ZoneId site;
  private final LocalDate dayZero;

  /**
   * A moment in site time.
   *
   * @param at the moment; start of the day where only the day is given
   * @param timed true where a time of day is given
   */
  record Moment(LocalDateTime at, boolean timed) {}

  /**
   * The reader of one kind of file.
   *
   * @param pattern pattern of dates as {@link DatePattern} takes it; ISO 8601 where empty
   * @param from zone of local times in the file
   * @param site the site's zone
   * @param use1904 true for a workbook that counts days from 1904
   */
  DateText(Optional<String> pattern, ZoneId from, ZoneId site, boolean use1904) {
    this.pattern = pattern;
    this.formatter = pattern.filter(text -> !DatePattern.isEpoch(text)).map(DatePattern::formatter);
    this.from = from;
    this.site = site;
    this.dayZero = use1904 ? LocalDate.of(1904, 1, 1) : LocalDate.of(1899, 12, 30);
  }

  /** ISO 8601 in site time. */
  static DateText iso(ZoneId site) {
    return new DateText(Optional.empty(), site, site, false);
  }

  /**
   * The moment of a text; empty where it is none.
   *
   * @param plain true for a workbook's own date, which is ISO whatever the pattern
   */
  Optional<Moment> parse(String text, boolean plain) {
    try {
      if (plain && pattern.filter(DatePattern::isEpoch).isEmpty()) {
        OptionalDouble days = NumberText.PLAIN.parse(text);
        if (days.isEmpty()) {
          return iso(text);
        }
        Optional<Moment> moment = dayNumber(days.getAsDouble());
        boolean likely = moment.isPresent() && complaint(moment.get().at().toLocalDate()).isEmpty();
        return likely || formatter.isEmpty() ? moment : patterned(text, formatter.get());
      }
      if (pattern.isEmpty()) {
        return iso(text);
      }
      return formatter.isEmpty() ? epoch(text) : patterned(text, formatter.get());
    } catch (DateTimeException | ArithmeticException e) {
      return Optional.empty();
    }
  }

  /** Why a text is no date, with the remedy. */
  String complaint(String text) {
    if (pattern.isPresent()) {
      return "not a date of the form "
          + pattern.get()
          + ", or a day that does not exist; correct it or set date-format for this file";
    }
    if (ISO.matcher(text).matches()) {
      return "a day or time that does not exist; correct it";
    }
    if (text.matches("\\d{5}([.,]\\d+)?")) {
      return "looks like a spreadsheet's day number; format the column as a date and save it again";
    }
    return "not a date like 2024-03-31 or 2024-03-31T14:30; correct it or set date-format for this"
        + " file";
  }

  /** What is wrong with a day that does exist; empty where nothing is. */
  static Optional<String> complaint(LocalDate day) {
    return day.isBefore(EARLIEST) || day.isAfter(LATEST)
        ? Optional.of("lies outside " + EARLIEST + " to " + LATEST + "; correct the year")
        : Optional.empty();
  }

  private Optional<Moment> iso(String text) {
    Matcher matcher = ISO.matcher(text);
    if (!matcher.matches()) {
      return Optional.empty();
    }
    LocalDate day = LocalDate.parse(matcher.group(1));
    if (matcher.group(2) == null) {
      return Optional.of(new Moment(day.atStartOfDay(), false));
    }
    LocalDateTime local = day.atTime(LocalTime.parse(matcher.group(2)));
    String offset = matcher.group(3);
    return Optional.of(
        new Moment(
            offset == null
                ? shift(local)
                : local
                    .atZone(java.time.ZoneOffset.of(offset))
                    .withZoneSameInstant(site)
                    .toLocalDateTime(),
            true));
  }

  private Optional<Moment> patterned(String text, DateTimeFormatter format) {
    TemporalAccessor parsed = format.parse(DatePattern.even(text));
    LocalDate day = parsed.query(TemporalQueries.localDate());
    LocalTime time = parsed.query(TemporalQueries.localTime());
    if (day == null) {
      return Optional.empty();
    }
    if (time == null) {
      return Optional.of(new Moment(day.atStartOfDay(), false));
    }
    if (parsed.query(TemporalQueries.offset()) != null) {
      LocalDateTime moment = OffsetDateTime.from(parsed).atZoneSameInstant(site).toLocalDateTime();
      return Optional.of(new Moment(moment, true));
    }
    return Optional.of(new Moment(shift(day.atTime(time)), true));
  }

  /** A workbook's day number, which stands without a date format. */
  private Optional<Moment> dayNumber(double days) {
    long seconds = Math.round((days - Math.floor(days)) * 86_400);
    LocalDateTime at = dayZero.atStartOfDay().plusDays((long) Math.floor(days));
    return Optional.of(new Moment(at.plusSeconds(seconds), seconds != 0));
  }

  private Optional<Moment> epoch(String text) {
    OptionalDouble number = NumberText.PLAIN.parse(text);
    if (number.isEmpty()) {
      return Optional.empty();
    }
    double millis = DatePattern.millis(pattern.orElseThrow(), number.getAsDouble());
    Instant instant = Instant.ofEpochMilli(Math.round(millis));
    return Optional.of(new Moment(LocalDateTime.ofInstant(instant, site), true));
  }

  private LocalDateTime shift(LocalDateTime local) {
    return from.equals(site)
        ? local
        : local.atZone(from).withZoneSameInstant(site).toLocalDateTime();
  }
}
