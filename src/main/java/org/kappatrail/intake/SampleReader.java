package org.kappatrail.intake;

import java.time.LocalDate;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.regex.Pattern;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.Measurement;
import org.kappatrail.history.Problem;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.history.SourceLine;
import org.kappatrail.tribology.CleanlinessCode;

/** Reads one file of samples. */
final class SampleReader {
  private static final List<String> REQUIRED =
      List.of(SampleColumns.SAMPLE, SampleColumns.ASSET, SampleColumns.SAMPLED_AT);

  /** Some laboratories write the standard's name before the code. */
  private static final Pattern ISO = Pattern.compile("(?i)^iso(\\s*4406)?[\\s:]*");

  private final Context context;
  private final RawTable table;
  private final Columns columns;
  private final List<SampleColumn> numbers;
  private final DateText dates;
  private final Set<String> missing;

  /**
   * What all files of samples are read against.
   *
   * @param site the site's zone
   * @param assets assets of the register
   * @param left assets left out of the register
   * @param today day after which no sample can have been drawn, where the caller knows it
   * @param problems takes what cannot be used
   */
  record Context(
      ZoneId site,
      Set<String> assets,
      Map<String, SourceLine> left,
      Optional<LocalDate> today,
      List<Problem> problems) {}

  SampleReader(RawTable table, ExportMapping mapping, Context context) {
    this.context = context;
    this.table = table;
    this.columns = new Columns(table, mapping, known(), REQUIRED);
    this.dates =
        new DateText(
            mapping.dateFormat(),
            mapping.timezone().map(ZoneId::of).orElse(context.site()),
            context.site(),
            table.use1904());
    this.missing =
        mapping.missing().stream().map(Texts::clean).collect(java.util.stream.Collectors.toSet());
    this.numbers = SampleColumn.of(table, columns, mapping, missing);
  }

  SampleFile read() {
    List<Sample> samples = new ArrayList<>();
    Map<String, Long> rejected = new TreeMap<>();
    for (RawRow raw : table.rows()) {
      Row row = new Row(table.file(), raw, columns, context.problems());
      Optional<Sample> sample = row.isRejected() ? Optional.empty() : sample(row, raw);
      sample.ifPresentOrElse(samples::add, () -> rejected.merge(row.rejection(), 1L, Long::sum));
    }
    List<String> unused = new ArrayList<>(columns.further().values());
    List<String> notes = new ArrayList<>();
    table.notes().forEach(note -> notes.add(table.file() + ": " + note));
    for (SampleColumn column : numbers) {
      unused.remove(column.name());
      column.note().ifPresent(note -> notes.add(table.file() + ": " + note));
    }
    return new SampleFile(table.file(), rejected, samples, unused, notes);
  }

  private Optional<Sample> sample(Row row, RawRow raw) {
    Optional<String> id = row.requiredName(SampleColumns.SAMPLE);
    Optional<String> asset = row.requiredName(SampleColumns.ASSET);
    if (asset.isPresent() && !context.assets().contains(asset.get())) {
      row.reject(
          SampleColumns.ASSET,
          asset.get(),
          RegisterFolder.unknown(asset.get(), context.assets(), context.left(), AssetReader.FILE));
    }
    Optional<DateText.Moment> moment = sampledAt(row);
    if (row.isRejected() || id.isEmpty() || asset.isEmpty() || moment.isEmpty()) {
      return Optional.empty();
    }
    Optional<LocalDate> received = receivedOn(row, moment.get().at().toLocalDate());
    if (row.isRejected()) {
      return Optional.empty();
    }
    Map<String, Measurement> values = new TreeMap<>();
    for (SampleColumn column : numbers) {
      column.read(raw, row).ifPresent(value -> values.put(column.name(), value));
    }
    return Optional.of(
        new Sample(
            id.get(),
            asset.get(),
            moment.get().at(),
            moment.get().timed(),
            received,
            row.text(SampleColumns.LABORATORY),
            values,
            code(row),
            row.source()));
  }

  private Optional<DateText.Moment> sampledAt(Row row) {
    String column = SampleColumns.SAMPLED_AT;
    String text = row.cell(column);
    if (Texts.isMissing(text)) {
      row.reject(column, text, "is required and missing; fill in the day of sampling");
      return Optional.empty();
    }
    Optional<DateText.Moment> moment = dates.parse(text, row.isPlain(column));
    if (moment.isEmpty()) {
      row.reject(column, text, dates.complaint(text));
      return moment;
    }
    LocalDate day = moment.get().at().toLocalDate();
    Optional<String> wrong = DateText.complaint(day);
    if (wrong.isEmpty() && context.today().isPresent() && day.isAfter(context.today().get())) {
      wrong =
          Optional.of(
              "lies in the future, today being " + context.today().get() + "; correct the date");
    }
    if (wrong.isPresent()) {
      row.reject(column, text, wrong.get());
      return Optional.empty();
    }
    return moment;
  }

  private Optional<LocalDate> receivedOn(Row row, LocalDate sampled) {
    Optional<LocalDate> received = row.day(SampleColumns.RECEIVED_ON, dates);
    if (received.isPresent() && received.get().isBefore(sampled)) {
      row.reject(
          SampleColumns.SAMPLED_AT,
          row.cell(SampleColumns.SAMPLED_AT),
          "lies after received_on ("
              + received.get()
              + "): a sample cannot be drawn after its result came in; correct one of the dates");
    }
    return received;
  }

  private Optional<CleanlinessCode> code(Row row) {
    String text = row.cell(SampleColumns.ISO_4406);
    if (Texts.isMissing(text) || missing.contains(text)) {
      return Optional.empty();
    }
    try {
      return Optional.of(CleanlinessCode.parse(ISO.matcher(text).replaceFirst("")));
    } catch (IllegalArgumentException e) {
      row.problem(
          SampleColumns.ISO_4406, text, e.getMessage() + "; write it like 18/16/13, 0 to 30 each");
      return Optional.empty();
    }
  }

  private static List<String> known() {
    List<String> known = new ArrayList<>(SampleColumns.DESCRIPTIVE);
    known.addAll(SampleColumns.NUMERIC);
    return known;
  }
}
