package org.kappatrail.intake;

import java.time.LocalDate;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.kappatrail.history.Problem;
import org.kappatrail.history.SourceLine;

/**
 * A row of a register or of samples by canonical column. What cannot be used becomes a problem: a
 * required cell costs the row, any other only itself.
 */
final class Row {
  private final RawRow raw;
  private final Columns columns;
  private final SourceLine source;
  private final List<Problem> problems;
  private boolean rejected;
  private String faulty = "";

  Row(String file, RawRow raw, Columns columns, List<Problem> problems) {
    this.raw = raw;
    this.columns = columns;
    this.source = new SourceLine(file, raw.line());
    this.problems = problems;
    lookAtShape();
  }

  SourceLine source() {
    return source;
  }

  /** True where the row is to be left out. */
  boolean isRejected() {
    return rejected;
  }

  /** Why the row is left out, in the words of the account. */
  String rejection() {
    return faulty.isEmpty() ? "row cannot be read" : faulty + " cannot be used";
  }

  /** Text of a column as it stands, or the constant of the settings; empty where there is none. */
  String cell(String column) {
    Optional<String> constant = columns.constant(column);
    if (constant.isPresent()) {
      return Texts.clean(constant.get());
    }
    OptionalInt position = columns.position(column);
    return position.isPresent() ? raw.cell(position.getAsInt()) : "";
  }

  /** True where the cell is a workbook's own number or date. */
  boolean isPlain(String column) {
    OptionalInt position = columns.position(column);
    return columns.constant(column).isEmpty()
        && position.isPresent()
        && raw.isPlain(position.getAsInt());
  }

  /** A text, empty where missing. */
  String text(String column) {
    String text = cell(column);
    return Texts.isMissingName(text) ? "" : text;
  }

  /** A name without which the row is of no use. */
  Optional<String> requiredName(String column) {
    int before = problems.size();
    Optional<String> name = name(column);
    if (name.isEmpty() && problems.size() > before) {
      rejected = true;
    } else if (name.isEmpty()) {
      reject(column, cell(column), "is required and missing; fill it in");
    }
    return name;
  }

  /** A name. */
  Optional<String> name(String column) {
    String text = text(column);
    if (text.isEmpty()) {
      return Optional.empty();
    }
    if (text.indexOf('\0') >= 0 || text.indexOf(Texts.REPLACEMENT) >= 0) {
      problem(column, text, NumberText.PLAIN.complaint(text));
      return Optional.empty();
    }
    return Optional.of(text);
  }

  /** A number within its range. */
  OptionalDouble number(String column, Limit limit) {
    String text = cell(column);
    if (Texts.isMissing(text)) {
      return OptionalDouble.empty();
    }
    OptionalDouble number = NumberText.PLAIN.parse(text);
    if (number.isEmpty()) {
      problem(column, text, complaint(text));
      return number;
    }
    Optional<String> wrong = limit.complaint(number.getAsDouble());
    if (wrong.isPresent()) {
      problem(column, text, wrong.get());
      return OptionalDouble.empty();
    }
    return number;
  }

  /** A whole number within its range. */
  OptionalInt wholeNumber(String column, Limit limit) {
    OptionalDouble number = number(column, limit);
    if (number.isEmpty()) {
      return OptionalInt.empty();
    }
    if (number.getAsDouble() != Math.rint(number.getAsDouble())) {
      problem(column, cell(column), "not a whole number");
      return OptionalInt.empty();
    }
    return OptionalInt.of((int) number.getAsDouble());
  }

  /** A number without which the row is of no use. */
  OptionalDouble requiredNumber(String column, Limit limit) {
    int before = problems.size();
    OptionalDouble number = number(column, limit);
    if (number.isEmpty()) {
      if (problems.size() > before) {
        rejected = true;
      } else {
        reject(column, cell(column), "is required and missing; fill in a number " + limit.text());
      }
    }
    return number;
  }

  /** {@code yes} or {@code no}; no where missing. */
  boolean isYes(String column) {
    String text = cell(column).toLowerCase(Locale.ROOT);
    if (text.equals("yes")) {
      return true;
    }
    if (!text.equals("no") && !Texts.isMissing(text)) {
      problem(column, cell(column), "neither yes nor no; taken as no");
    }
    return false;
  }

  /** A day in ISO 8601. */
  Optional<LocalDate> day(String column, DateText dates) {
    String text = cell(column);
    if (Texts.isMissing(text)) {
      return Optional.empty();
    }
    Optional<DateText.Moment> moment = dates.parse(text, isPlain(column));
    if (moment.isEmpty()) {
      problem(column, text, dates.complaint(text));
      return Optional.empty();
    }
    LocalDate day = moment.get().at().toLocalDate();
    Optional<String> wrong = DateText.complaint(day);
    if (wrong.isPresent()) {
      problem(column, text, wrong.get());
      return Optional.empty();
    }
    return Optional.of(day);
  }

  /** Notes what is wrong with a cell; the row stays. */
  void problem(String column, String value, String text) {
    if (!rejected) {
      faulty = column;
    }
    problems.add(new Problem(source, column, printable(value), text));
  }

  /** Notes what is wrong and leaves the row out. */
  void reject(String column, String value, String text) {
    problem(column, value, text);
    rejected = true;
  }

  /** Leaves the row out for what was noted already. */
  void leaveOut() {
    rejected = true;
  }

  private void lookAtShape() {
    if (raw.fault().isPresent()) {
      reject("", raw.cell(0), raw.fault().get());
    } else if (columns.isHeader(raw)) {
      reject("", raw.cell(0), "the header stands here again; take the line out");
    } else if (raw.hasMoreThan(columns.width())) {
      reject(
          "",
          raw.cell(columns.width()),
          "the row has "
              + raw.cells().size()
              + " cells and the header "
              + columns.width()
              + "; put a cell that holds the delimiter into quotes");
    }
  }

  private static String complaint(String text) {
    String general = NumberText.PLAIN.complaint(text);
    return general.contains("decimal: comma")
        ? "not a number with a decimal point; write it like 1.5"
        : general;
  }

  private static String printable(String value) {
    return value.replace('\0', '\u2400').replaceAll("[\\r\\n]+", " ");
  }
}
